using System.Globalization;

namespace ClubBench.Printing.Sheets;

/// <summary>Writes places on the board: three and more in a row become a span, "C15–C18".</summary>
internal static class Places
{
    private const int LeastForSpan = 3;

    /// <summary>The places, in order of name and number.</summary>
    public static string Text(IReadOnlyList<string> designators)
    {
        var parts = designators.Distinct(StringComparer.Ordinal).Select(Split).OrderBy(p => p.Letters, StringComparer.Ordinal).ThenBy(p => p.Number).ToList();
        var texts = new List<string>();
        for (var i = 0; i < parts.Count;)
        {
            var run = 1;
            while (i + run < parts.Count && Follows(parts[i + run - 1], parts[i + run])) run++;
            if (run >= LeastForSpan) texts.Add($"{parts[i].Name}–{parts[i + run - 1].Name}");
            else texts.AddRange(parts.Skip(i).Take(run).Select(p => p.Name));
            i += run;
        }
        return string.Join(", ", texts);
    }

    /// <summary>The letters a place begins with.</summary>
    public static string Letters(string designator) => designator.TrimEnd('0', '1', '2', '3', '4', '5', '6', '7', '8', '9');

    private static bool Follows((string Name, string Letters, int? Number) a, (string Name, string Letters, int? Number) b) =>
        a.Letters == b.Letters && a.Number is { } n && b.Number == n + 1;

    private static (string Name, string Letters, int? Number) Split(string name)
    {
        var letters = Letters(name);
        return (name, letters, int.TryParse(name[letters.Length..], NumberStyles.None, CultureInfo.InvariantCulture, out var n) ? n : null);
    }
}
