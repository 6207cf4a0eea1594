using ClubBench.Browser.Tests.Site;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Pages;

/// <summary>Every screen of a stage with coils on a phone, light and dark, with what it says after an entry.</summary>
[Collection(HallCollection.Name)]
public sealed class BenchStepsTests(Hall hall)
{
    private const string Stage = "A5";

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public async Task EveryStep_OfAStageWithCoils_FitsMeetsTheSuccessCriteriaAndIsPhotographed(bool dark)
    {
        await using var phone = await hall.EnterAsync("builder", 390, 844, dark);
        var bench = await BenchScreen.OfAsync(phone);
        var faults = new List<string>();
        foreach (var step in await bench.StepsAsync(Stage))
        {
            await bench.GoToStepAsync(step);
            faults.AddRange(await SeeAsync(phone.Page, $"bench-{step.Replace('.', '-')}", dark));
        }

        Assert.True(faults.Count == 0, string.Join('\n', faults));
    }

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public async Task Entry_FromTypingToAdvice_MeetsTheSuccessCriteriaAndIsPhotographed(bool dark)
    {
        await using var phone = await hall.EnterAsync("builder", 390, 844, dark);
        var bench = await BenchScreen.OfAsync(phone);
        var point = bench.Points.First(p => p.Point.StartsWith($"{Stage}.L", StringComparison.Ordinal));
        var faults = new List<string>();
        await bench.GoToAsync(point);
        await bench.Field(point).FillAsync(point.Typed(0.05));
        faults.AddRange(await SeeAsync(phone.Page, "bench-1-typing", dark));
        await bench.TypeAndSaveAsync(point, point.Slipped(10));
        faults.AddRange(await SeeAsync(phone.Page, "bench-2-ten-times", dark));
        await bench.TypeAndSaveAsync(point, point.Typed(0.8));
        await bench.AllSentAsync();
        faults.AddRange(await SeeAsync(phone.Page, "bench-3-advice", dark));
        await phone.SetOfflineAsync(true);
        await bench.TypeAndSaveAsync(point, point.Typed());
        await Assertions.Expect(bench.Sync).ToContainTextAsync("waits on this phone");
        faults.AddRange(await SeeAsync(phone.Page, "bench-4-away", dark));
        await phone.SetOfflineAsync(false);
        await bench.AllSentAsync();

        Assert.True(faults.Count == 0, string.Join('\n', faults));
    }

    private static Task<IReadOnlyList<string>> SeeAsync(IPage page, string name, bool dark) => Gallery.FaultsOfAsync(page, $"{name}-390{(dark ? "-dark" : "")}");
}
