using System.Globalization;

namespace ClubBench.Calculation.Sweeps;

/// <summary>A line without its comment.</summary>
internal sealed record TouchstoneLine(int Number, string Text)
{
    public string[] Words => Text.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries);

    public bool IsOptions => Text.StartsWith('#');

    public bool IsKeyword => Text.StartsWith('[');

    /// <summary>Name of the keyword in small letters, single spaces; empty where the bracket is not closed.</summary>
    public string Keyword => Text.IndexOf(']', StringComparison.Ordinal) is > 0 and var end
        ? string.Join(' ', Text[1..end].Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)).ToLowerInvariant()
        : "";

    /// <summary>What stands behind the keyword.</summary>
    public string Value => Text[(Text.IndexOf(']', StringComparison.Ordinal) + 1)..].Trim();
}

/// <summary>Faults as they are found, at most 100.</summary>
internal sealed class TouchstoneIssues
{
    private const int Most = 100;
    private readonly List<TouchstoneIssue> _all = [];

    public IReadOnlyList<TouchstoneIssue> All => [.. _all.OrderBy(i => i.Line)];

    public bool Any => _all.Count > 0;

    public void Add(int line, TouchstoneFault fault, string found = "", string expected = "")
    {
        if (_all.Count < Most) _all.Add(new(line, fault, found, expected));
    }
}

/// <summary>Text of a sweep file as lines without comments; decimal commas made points. Source: ibis-touchstone.</summary>
internal static class TouchstoneText
{
    private const string ByteOrderMark = "\uFEFF";

    /// <summary>Lines that hold anything, and whether the file has decimal commas.</summary>
    public static (IReadOnlyList<TouchstoneLine> Lines, bool Commas) Lines(string text, TouchstoneIssues issues)
    {
        var body = text.StartsWith(ByteOrderMark, StringComparison.Ordinal) ? text[1..] : text;
        var lines = body.ReplaceLineEndings("\n").Split('\n').Select((t, i) => new TouchstoneLine(i + 1, t.Split('!')[0].Trim())).Where(l => l.Text.Length > 0).ToList();
        var numbers = lines.Where(l => !l.IsKeyword).ToList();
        var comma = numbers.Find(l => l.Text.Contains(',', StringComparison.Ordinal));
        if (comma is null) return (lines, false);
        if (numbers.Exists(l => l.Text.Contains('.', StringComparison.Ordinal))) issues.Add(comma.Number, TouchstoneFault.MixedDecimalSigns, comma.Text);
        return ([.. lines.Select(l => l.IsKeyword ? l : l with { Text = l.Text.Replace(',', '.') })], true);
    }

    /// <summary>A finite number, or null.</summary>
    public static double? Number(string word) =>
        double.TryParse(word, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && double.IsFinite(value) ? value : null;
}
