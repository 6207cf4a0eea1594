using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using Microsoft.Playwright;

namespace ClubBench.Browser.Tests.Pages;

/// <summary>What a page breaks of the published success criteria (WCAG 2.2 A and AA), as far as a program can tell.</summary>
internal static class SuccessCriteria
{
    private static readonly AxeRunOptions Rules = new()
    {
        RunOnly = new RunOnlyOptions { Type = "tag", Values = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"] },
        Rules = new Dictionary<string, RuleOptions>(StringComparer.Ordinal) { ["target-size"] = new() { Enabled = true } },
    };

    public static async Task<IEnumerable<string>> BrokenByAsync(IPage page) =>
        (await page.RunAxe(Rules)).Violations.Select(v => $"{v.Id} ({v.Help}): {string.Join(" | ", v.Nodes.Take(3).Select(n => n.Html[..Math.Min(160, n.Html.Length)]))}");
}
