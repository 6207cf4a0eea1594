namespace ClubBench.Printing.Layout;

/// <summary>Text in a cell, wrapped where it must be.</summary>
internal sealed record TextCell(string Text, TextStyle Style) : ICell
{
    public float Height(ICardSurface surface, float width) => new Paragraph(Text, Style).Height(surface, width);

    public void Draw(ICardSurface surface, Area area, TextSide side)
    {
        var text = new Paragraph(Text, Style);
        var height = text.Height(surface, area.Width);
        var room = area.Width - text.WidthOf(surface);
        var shift = room <= 0 ? 0 : side switch { TextSide.End => room, TextSide.Middle => room / 2, _ => 0 };
        text.Draw(surface, new Area(area.X + shift, area.Middle - (height / 2), area.Width, height));
    }
}

/// <summary>One box to tick.</summary>
internal sealed record TickCell : ICell
{
    public float Height(ICardSurface surface, float width) => Ticks.BoxSize + 2;

    public void Draw(ICardSurface surface, Area area, TextSide side) =>
        Ticks.Box(surface, area.X, area.Middle - (Ticks.BoxSize / 2));
}

/// <summary>Boxes to tick while winding: one for each pass where all fit on one line, else one for every five passes with the count beside it.</summary>
internal sealed record PassCell(int Passes) : ICell
{
    private const int Group = 5;
    private const float GroupGap = 4;
    private const float LineGap = 3;
    private const float AfterBox = 3;
    private const float AfterCount = 8;

    public float Height(ICardSurface surface, float width) => (Lines(surface, width) * (Ticks.BoxSize + LineGap)) + LineGap;

    public void Draw(ICardSurface surface, Area area, TextSide side)
    {
        var top = area.Middle - (Height(surface, area.Width) / 2) + LineGap;
        if (WidthOf(Passes) <= area.Width) DrawPasses(surface, area.X, top);
        else DrawCounts(surface, area, top);
    }

    private void DrawPasses(ICardSurface surface, float left, float top)
    {
        for (var pass = 0; pass < Passes; pass++) Ticks.Box(surface, left + (pass * Ticks.BoxSize) + (pass / Group * GroupGap), top);
    }

    private void DrawCounts(ICardSurface surface, Area area, float top)
    {
        var (step, perLine) = (StepOf(surface), PerLine(surface, area.Width));
        for (var i = 0; i < Counts.Count; i++)
        {
            var (x, y) = (area.X + (i % perLine * step), top + (i / perLine * (Ticks.BoxSize + LineGap)));
            Ticks.Box(surface, x, y);
            surface.Text(TextOf(Counts[i]), x + Ticks.BoxSize + AfterBox, y + (Ticks.BoxSize / 2) + (TextStyle.Body.CapHeight / 2), TextStyle.Body);
        }
    }

    /// <summary>5, 10, 15 and so on, and the last pass.</summary>
    private IReadOnlyList<int> Counts => [.. Enumerable.Range(1, (Passes + Group - 1) / Group).Select(g => Math.Min(g * Group, Passes))];

    private static float WidthOf(int passes) => (passes * Ticks.BoxSize) + ((passes - 1) / Group * GroupGap);

    private static string TextOf(int count) => count.ToString(System.Globalization.CultureInfo.CurrentCulture);

    private float StepOf(ICardSurface surface) => Ticks.BoxSize + AfterBox + surface.Measure(TextOf(Passes), TextStyle.Body) + AfterCount;

    private int PerLine(ICardSurface surface, float width) => Math.Max(1, (int)((width + AfterCount) / StepOf(surface)));

    private int Lines(ICardSurface surface, float width) =>
        WidthOf(Passes) <= width ? 1 : (Counts.Count + PerLine(surface, width) - 1) / PerLine(surface, width);
}

/// <summary>A line to write on, its unit at the end.</summary>
internal sealed record BlankCell(string Unit) : ICell
{
    public float Height(ICardSurface surface, float width) => TextStyle.Key.LineHeight;

    public void Draw(ICardSurface surface, Area area, TextSide side)
    {
        surface.Text(Unit, area.Right - 2, area.Middle + (TextStyle.Body.CapHeight / 2), TextStyle.Body with { Side = TextSide.End });
        surface.Line(area.X, area.Bottom - 2, area.Right, area.Bottom - 2, 1);
    }
}
