using ClubBench.Browser.Tests.Site;
using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;

namespace ClubBench.Browser.Tests.Pages;

/// <summary>Every page against the published success criteria (WCAG 2.2 AA), light and dark, phone and laptop.</summary>
[Collection(HallCollection.Name)]
public sealed class AccessibilityTests(Hall hall)
{
    private static readonly AxeRunOptions Rules = new()
    {
        RunOnly = new RunOnlyOptions { Type = "tag", Values = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"] },
        Rules = new Dictionary<string, RuleOptions>(StringComparer.Ordinal) { ["target-size"] = new() { Enabled = true } },
    };

    [Theory]
    [InlineData(390, false)]
    [InlineData(1280, true)]
    public async Task EveryPage_MeetsTheSuccessCriteria(int width, bool dark)
    {
        var sights = await PagesToSee.AllAsync(hall.Site);
        var faults = new List<string>();
        foreach (var role in sights.Select(s => s.Role).Distinct())
        {
            await using var visitor = await hall.EnterAsync(role, width, 844, dark);
            foreach (var sight in sights.Where(s => s.Role == role))
            {
                await visitor.GoAsync(sight.Address);
                faults.AddRange((await visitor.Page.RunAxe(Rules)).Violations.Select(v => $"{sight.Name}: {v.Id} ({v.Help}) {string.Join(" | ", v.Nodes.Take(3).Select(n => n.Html[..Math.Min(120, n.Html.Length)]))}"));
            }
        }

        Assert.Empty(faults);
    }

    [Fact]
    public async Task BenchStep_WithAdvice_MeetsTheSuccessCriteria()
    {
        await using var phone = await hall.EnterAsync("builder", 390, 844);
        var bench = await BenchScreen.OfAsync(phone);
        var point = bench.PointAt(0);
        await bench.TypeAndSaveAsync(point, point.Typed());
        await bench.AllSentAsync();

        var result = await phone.Page.RunAxe(Rules);

        Assert.Empty(result.Violations.Select(v => $"{v.Id}: {string.Join(" | ", v.Nodes.Take(3).Select(n => n.Html))}"));
    }
}
