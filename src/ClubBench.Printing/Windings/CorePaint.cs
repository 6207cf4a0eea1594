namespace ClubBench.Printing.Windings;

/// <summary>Paint of a core on the screen. On paper every core is white; its colour stands beside it as a word.</summary>
internal static class CorePaint
{
    private static readonly Dictionary<string, string> s_paint = new(StringComparer.OrdinalIgnoreCase)
    {
        ["yellow"] = "#EBCB3C",
        ["red"] = "#CF4A3C",
        ["blue"] = "#3F72B5",
        ["white"] = "#F4F4F0",
        ["green"] = "#4E9A5B",
        ["grey"] = "#8F969A",
        ["gray"] = "#8F969A",
        ["black"] = "#3A3F42",
        ["brown"] = "#8A5A3B",
        ["orange"] = "#DE8A35",
        ["light blue"] = "#8FBBDD",
        ["tan"] = "#CDB189",
    };

    /// <summary>The variable of a paint, with its fall-back. Of a two-coloured core the first colour is the one that covers most of it; a bare core is dark grey.</summary>
    public static string Of(string colour)
    {
        var first = colour.Split('/', ',', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries).FirstOrDefault() ?? "";
        return $"var(--paint,{s_paint.GetValueOrDefault(first, "#6B7073")})";
    }
}
