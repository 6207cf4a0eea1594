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

/// <summary>One box for each pass through the core, in groups of five, as many lines as it takes.</summary>
internal sealed record PassCell(int Passes) : ICell
{
    private const int Group = 5;
    private const float GroupGap = 4;
    private const float LineGap = 3;

    public float Height(ICardSurface surface, float width) => (Lines(width) * (Ticks.BoxSize + LineGap)) + LineGap;

    public void Draw(ICardSurface surface, Area area, TextSide side)
    {
        var top = area.Middle - (Height(surface, area.Width) / 2) + LineGap;
        var perLine = PerLine(area.Width);
        for (var pass = 0; pass < Passes; pass++)
        {
            var place = pass % perLine;
            var x = area.X + (place * Ticks.BoxSize) + (place / Group * GroupGap);
            Ticks.Box(surface, x, top + (pass / perLine * (Ticks.BoxSize + LineGap)));
        }
    }

    private static float WidthOf(int passes) => (passes * Ticks.BoxSize) + ((passes - 1) / Group * GroupGap);

    /// <summary>All on one line where they fit, else whole groups.</summary>
    private int PerLine(float width) =>
        WidthOf(Passes) <= width ? Passes : Group * Math.Max(1, (int)((width + GroupGap) / (WidthOf(Group) + GroupGap)));

    private int Lines(float width) => (Passes + PerLine(width) - 1) / PerLine(width);
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
