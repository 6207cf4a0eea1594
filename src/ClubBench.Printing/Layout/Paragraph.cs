namespace ClubBench.Printing.Layout;

/// <summary>A stretch of text in one style.</summary>
/// <param name="Text">Text.</param>
/// <param name="Style">Style.</param>
internal readonly record struct Run(string Text, TextStyle Style);

/// <summary>Running text of one or more styles, broken at spaces. A space that must not break is U+00A0.</summary>
internal sealed record Paragraph(IReadOnlyList<Run> Runs) : IBlock
{
    public Paragraph(string text, TextStyle style)
        : this([new Run(text, style)])
    {
    }

    public float Height(ICardSurface surface, float width) => Lines(surface, width).Sum(LineHeight);

    public void Draw(ICardSurface surface, Area area)
    {
        var y = area.Y;
        foreach (var line in Lines(surface, area.Width))
        {
            var baseline = y + line.Max(r => r.Style.Ascent);
            var x = area.X;
            foreach (var run in line)
            {
                surface.Text(run.Text, x, baseline, run.Style);
                x += surface.Measure(run.Text, run.Style);
            }
            y += LineHeight(line);
        }
    }

    /// <summary>Width of the text on one line.</summary>
    public float WidthOf(ICardSurface surface) => Runs.Sum(r => surface.Measure(r.Text, r.Style));

    private static float LineHeight(IReadOnlyList<Run> line) => line.Max(r => r.Style.LineHeight);

    private List<List<Run>> Lines(ICardSurface surface, float width)
    {
        var lines = new List<List<Run>> { new() };
        var used = 0f;
        foreach (var run in Runs)
            foreach (var word in Words(run.Text))
            {
                var wide = surface.Measure(word.TrimEnd(' '), run.Style);
                if (used + wide > width && lines[^1].Count > 0)
                {
                    lines.Add([]);
                    used = 0;
                }
                Append(lines[^1], word, run.Style);
                used += surface.Measure(word, run.Style);
            }
        return lines[0].Count == 0 ? [] : lines;
    }

    private static void Append(List<Run> line, string word, TextStyle style)
    {
        if (line.Count > 0 && line[^1].Style == style) line[^1] = new Run(line[^1].Text + word, style);
        else line.Add(new Run(word, style));
    }

    /// <summary>Words with the space that follows them.</summary>
    private static IEnumerable<string> Words(string text)
    {
        var start = 0;
        for (var i = 1; i <= text.Length; i++)
        {
            if (i < text.Length && !(text[i - 1] == ' ' && text[i] != ' ')) continue;
            yield return text[start..i];
            start = i;
        }
    }
}
