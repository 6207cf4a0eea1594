namespace ClubBench.Printing.Layout;

/// <summary>A warning in a heavy frame, with a triangle before it. The triangle is drawn: the typeface has none.</summary>
internal sealed record CautionBox(IReadOnlyList<Run> Text) : IBlock
{
    private const float Padding = 4;
    private const float TriangleSize = 20;

    private Paragraph Words => new(Text);

    public float Height(ICardSurface surface, float width) =>
        Math.Max(TriangleSize, Words.Height(surface, TextWidth(width))) + (2 * Padding);

    public void Draw(ICardSurface surface, Area area)
    {
        var frame = area with { Height = Height(surface, area.Width) };
        surface.Box(frame.Inset(0.9f), 1.8f);
        surface.Svg(WarningTriangle.Svg, new Area(area.X + Padding, frame.Middle - (TriangleSize / 2), TriangleSize, TriangleSize));
        var height = Words.Height(surface, TextWidth(area.Width));
        Words.Draw(surface, new Area(area.X + TriangleSize + (2 * Padding), frame.Middle - (height / 2), TextWidth(area.Width), height));
    }

    private static float TextWidth(float width) => width - TriangleSize - (3 * Padding);
}

/// <summary>The warning sign of ISO 7010: an upright triangle with an exclamation mark, in black.</summary>
internal static class WarningTriangle
{
    public const string Svg = """
        <svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 24 24"><path d="M12 2.5 22.5 21H1.5Z" fill="none" stroke="#000" stroke-width="2.2" stroke-linejoin="round"/><path d="M12 8.5v6.5M12 17v2.2" stroke="#000" stroke-width="2.4"/></svg>
        """;
}

/// <summary>Boxes to sign in, side by side, each with its caption.</summary>
/// <param name="Captions">Captions with their share of the width.</param>
internal sealed record SignOffBoxes(IReadOnlyList<(string Caption, float Share)> Captions) : IBlock
{
    private const float BoxHeight = 31;
    private const float Gap = 8;

    public float Height(ICardSurface surface, float width) => BoxHeight;

    public void Draw(ICardSurface surface, Area area)
    {
        var total = Captions.Sum(c => c.Share);
        var room = area.Width - (Gap * (Captions.Count - 1));
        var x = area.X;
        foreach (var (caption, share) in Captions)
        {
            var box = new Area(x, area.Y, room * share / total, BoxHeight);
            surface.Box(box, 0.9f);
            surface.Text(caption, box.X + 5, box.Y + 3 + TextStyle.Body.Ascent, TextStyle.Body);
            x += box.Width + Gap;
        }
    }
}
