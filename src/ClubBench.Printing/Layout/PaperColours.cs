using System.Text.RegularExpressions;

namespace ClubBench.Printing.Layout;

/// <summary>The black set of colours. Drawings name theirs <c>var(--ink,#17212A)</c> and the like; on paper each becomes a grey that a copier keeps.</summary>
internal static class PaperColours
{
    private static readonly Regex s_variable =
        new(@"var\(--(?<name>[a-z0-9-]+)(,[^)]*)?\)", RegexOptions.NonBacktracking | RegexOptions.ExplicitCapture | RegexOptions.CultureInvariant);

    private static readonly Dictionary<string, string> s_paper = new(StringComparer.Ordinal)
    {
        ["sheet"] = "#FFFFFF",
        ["old"] = "#555555",
        ["ink2"] = "#333333",
        ["keep"] = "#555555",
        ["line"] = "#777777",
        ["rule"] = "#BBBBBB",
        ["grid"] = "#DDDDDD",
        ["paint"] = "#FFFFFF",
        ["wire"] = "#000000",
    };

    /// <summary>The drawing with plain colours; a name without a grey of its own becomes black.</summary>
    public static string Apply(string svg) => s_variable.Replace(svg, m => s_paper.GetValueOrDefault(m.Groups["name"].Value, "#000000"));
}
