using System.Text.RegularExpressions;

namespace ClubBench.Printing.Tests.Samples;

/// <summary>Finds colours in a drawing that no page can change.</summary>
internal static partial class FixedColours
{
    public static IReadOnlyList<string> In(string svg) =>
        [.. Pattern().Matches(Variable().Replace(svg, "")).Select(m => m.Value)];

    [GeneratedRegex(@"#[0-9A-Fa-f]{3,8}\b(?!\d*;)|rgba?\([^)]*\)|(?<=(fill|stroke)[=:]""?)(black|white|red|gr[ae]y)", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Pattern();

    [GeneratedRegex(@"var\(--[a-z0-9-]+,#[0-9A-Fa-f]{6}\)|&#\d+;", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Variable();
}
