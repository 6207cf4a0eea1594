using ClubBench.Browser.Tests.Site;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Pages;

/// <summary>Photographs every page on a phone, on a laptop and in the dark, and puts the pictures on one sheet.</summary>
[Collection(HallCollection.Name)]
public sealed class GalleryTests(Hall hall)
{
    private static readonly string Folder = Directory.CreateDirectory(Path.Combine(Sources.Artefacts, "pages")).FullName;

    [Fact]
    public async Task EveryPage_OnPhoneLaptopAndInTheDark_OpensWithoutErrorAndIsPhotographed()
    {
        var sights = await PagesToSee.AllAsync(hall.Site);
        foreach (var role in sights.Select(s => s.Role).Distinct())
        {
            foreach (var (width, height, dark) in new[] { (390, 844, false), (1280, 800, false), (1280, 800, true) })
            {
                await using var visitor = await hall.EnterAsync(role, width, height, dark);
                foreach (var sight in sights.Where(s => s.Role == role)) await PhotographAsync(visitor, sight, width, dark);
            }
        }

        await using (var phone = await hall.EnterAsync("builder", 390, 844)) await BenchStepsAsync(phone, "");
        await using (var phone = await hall.EnterAsync("builder", 390, 844, dark: true)) await BenchStepsAsync(phone, "-dark");
        await using (var projector = await hall.EnterAsync("coordinator", 1920, 1080))
        {
            await projector.GoAsync("/room");
            await projector.Page.ScreenshotAsync(new() { Path = Path.Combine(Folder, "room-1920.png") });
        }

        await ContactSheetAsync();
    }

    private static async Task PhotographAsync(Visitor visitor, PagesToSee.Sight sight, int width, bool dark)
    {
        var answer = await visitor.GoAsync(sight.Address);
        Assert.True(answer is { Ok: true }, $"{sight.Address} answered {answer?.Status}");
        Assert.Equal(0, await visitor.Page.Locator("[data-problem], .blazor-error-boundary").CountAsync());
        await visitor.Page.ScreenshotAsync(new() { Path = Path.Combine(Folder, $"{sight.Name}-{width}{(dark ? "-dark" : "")}.png"), FullPage = true });
    }

    private static async Task BenchStepsAsync(Visitor phone, string suffix)
    {
        var bench = await BenchScreen.OfAsync(phone);
        var point = bench.PointAt(0);
        await bench.GoToAsync(point);
        await bench.Field(point).FillAsync(point.Typed(0.05));
        await phone.Page.ScreenshotAsync(new() { Path = Path.Combine(Folder, $"bench-typing-390{suffix}.png"), FullPage = true });
        await bench.SaveAsync(point);
        await bench.AllSentAsync();
        await phone.Page.ScreenshotAsync(new() { Path = Path.Combine(Folder, $"bench-advice-390{suffix}.png"), FullPage = true });
    }

    private async Task ContactSheetAsync()
    {
        await using var visitor = await hall.EnterAsync(role: null, 1600, 1000);
        var figures = Directory.GetFiles(Folder, "*.png").Order(StringComparer.Ordinal)
            .Select(f => $"<figure><img src=\"data:image/png;base64,{Convert.ToBase64String(File.ReadAllBytes(f))}\"><figcaption>{Path.GetFileNameWithoutExtension(f)}</figcaption></figure>");
        await visitor.Page.SetContentAsync(
            $"<style>body{{display:grid;grid-template-columns:repeat(6,1fr);gap:12px;font:13px sans-serif}}figure{{margin:0}}img{{width:100%;height:300px;object-fit:cover;object-position:top;border:1px solid #888}}</style>{string.Concat(figures)}");
        await visitor.Page.ScreenshotAsync(new() { Path = Path.Combine(Sources.Artefacts, "contact-sheet.png"), FullPage = true });
    }
}
