using ClubBench.Browser.Tests.Site;

namespace ClubBench.Browser.Tests.Pages;

/// <summary>Every page on a phone, on a laptop and in the dark: it opens, fits, meets the success criteria and is photographed.</summary>
[Collection(HallCollection.Name)]
public sealed class EveryPageTests(Hall hall)
{
    [Theory]
    [InlineData(390, 844, false)]
    [InlineData(1280, 800, false)]
    [InlineData(1280, 800, true)]
    public async Task EveryPage_Opened_FitsMeetsTheSuccessCriteriaAndIsPhotographed(int width, int height, bool dark)
    {
        var sights = await PagesToSee.AllAsync(hall.Site);
        var faults = new List<string>();
        foreach (var role in sights.Select(s => s.Role).Distinct())
        {
            await using var visitor = await hall.EnterAsync(role, width, height, dark);
            visitor.AnswersMayBeMissing = true;
            foreach (var sight in sights.Where(s => s.Role == role))
                faults.AddRange(await SeeAsync(visitor, sight, $"{sight.Name}-{width}{(dark ? "-dark" : "")}"));
        }

        await using var printer = await hall.EnterAsync(role: null, 1800, 1000);
        await Gallery.SheetAsync(printer.Page);
        Assert.True(faults.Count == 0, string.Join('\n', faults));
    }

    [Fact]
    public async Task Room_OnTheProjector_ShowsTwelveBoardsWithoutScrolling()
    {
        await using var projector = await hall.EnterAsync("coordinator", 1920, 1080);
        await projector.GoAsync("/room");
        await Gallery.TakeAsync(projector.Page, "room-1920");

        Assert.Equal(12, await projector.Page.Locator("table.grid tbody tr").CountAsync());
        Assert.True(await projector.Page.EvaluateAsync<bool>("() => document.documentElement.scrollHeight <= innerHeight && document.documentElement.scrollWidth <= innerWidth"));
    }

    private static async Task<IEnumerable<string>> SeeAsync(Visitor visitor, PagesToSee.Sight sight, string name)
    {
        var answer = await visitor.GoAsync(sight.Address);
        List<string> faults = [.. await Gallery.FaultsOfAsync(visitor.Page, name)];
        if (answer?.Status != (int)sight.Status) faults.Add($"{name}: answered {answer?.Status}");
        if (await visitor.Page.Locator("[data-problem], .blazor-error-boundary").CountAsync() > 0) faults.Add($"{name}: shows a problem");
        return faults;
    }
}
