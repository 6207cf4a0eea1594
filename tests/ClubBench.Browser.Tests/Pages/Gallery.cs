using System.Text;
using ClubBench.Browser.Tests.Site;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Pages;

/// <summary>Pictures of pages, kept as test artefacts, with one contact sheet of them all.</summary>
internal static class Gallery
{
    private const string Look =
        "body{display:grid;grid-template-columns:repeat(8,1fr);gap:10px;font:13px sans-serif}figure{margin:0}img{width:100%;height:240px;object-fit:contain;object-position:top left;border:1px solid #888}";

    private static readonly string Folder = Directory.CreateDirectory(Path.Combine(Sources.Artefacts, "pages")).FullName;

    /// <summary>Photographs what the window shows.</summary>
    public static Task TakeAsync(IPage page, string name) => page.ScreenshotAsync(new() { Path = Path.Combine(Folder, $"{name}.png") });

    /// <summary>
    /// Photographs the page in a window as high as the page, so that bars fixed to the window's edges stand at the page's and cover nothing, and tells what
    /// is wrong with it there.
    /// </summary>
    public static async Task<IReadOnlyList<string>> FaultsOfAsync(IPage page, string name)
    {
        var size = page.ViewportSize!;
        await page.SetViewportSizeAsync(size.Width, Math.Max(size.Height, await page.EvaluateAsync<int>("() => document.documentElement.scrollHeight")));
        await page.EvaluateAsync("() => scrollTo(0, 0)");
        await TakeAsync(page, name);
        List<string> faults = [.. await SuccessCriteria.BrokenByAsync(page)];
        if (await page.EvaluateAsync<int>("() => document.documentElement.scrollWidth - innerWidth") is var over and > 0) faults.Add($"scrolls sideways by {over} pixels");
        await page.SetViewportSizeAsync(size.Width, size.Height);
        return [.. faults.Select(f => $"{name}: {f}")];
    }

    /// <summary>Puts every picture taken so far on one sheet.</summary>
    public static async Task SheetAsync(IPage page)
    {
        var sheet = new StringBuilder($"<style>{Look}</style>");
        foreach (var file in Directory.GetFiles(Folder, "*.png").Order(StringComparer.Ordinal))
            sheet.Append("<figure><img src=\"data:image/png;base64,").Append(Convert.ToBase64String(await File.ReadAllBytesAsync(file))).Append("\"><figcaption>").Append(Path.GetFileNameWithoutExtension(file)).Append("</figcaption></figure>");
        await page.SetContentAsync(sheet.ToString());
        await page.ScreenshotAsync(new() { Path = Path.Combine(Sources.Artefacts, "contact-sheet.png"), FullPage = true });
    }
}
