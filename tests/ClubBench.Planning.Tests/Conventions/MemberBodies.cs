using System.Text.RegularExpressions;

namespace ClubBench.Planning.Tests.Conventions;

/// <summary>Bodies of methods and properties in a source file, found by the indentation this house keeps.</summary>
internal static partial class MemberBodies
{
    public sealed record Body(int Line, int Lines);

    /// <summary>Blocks that open on a line of their own and close at the same indentation, those of types left out.</summary>
    public static IEnumerable<Body> Of(IReadOnlyList<string> lines)
    {
        for (var i = 1; i < lines.Count; i++)
        {
            var indent = lines[i].Length - 1;
            if (lines[i].Trim() != "{" || indent is not (4 or 8) || TypeHead().IsMatch(HeadAbove(lines, i))) continue;
            var end = i;
            while (end < lines.Count && !lines[end].StartsWith(new string(' ', indent) + "}", StringComparison.Ordinal)) end++;
            yield return new Body(i + 1, end - i + 1);
        }
    }

    // A head may run over lines: up to the last one at the indentation of its brace.
    private static string HeadAbove(IReadOnlyList<string> lines, int brace)
    {
        var indent = lines[brace].Length - 1;
        var first = brace - 1;
        while (first > 0 && lines[first].Length - lines[first].TrimStart().Length > indent) first--;
        return lines[first];
    }

    [GeneratedRegex(@"\b(class|record|struct|enum|interface)\b", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex TypeHead();
}
