namespace ClubBench.Printing.Layout;

/// <summary>Boxes to tick.</summary>
internal static class Ticks
{
    /// <summary>Edge of a box: five millimetres, enough for a blunt pencil and a tired hand.</summary>
    public static float BoxSize { get; } = PaperSize.Millimetres(5);

    public static void Box(ICardSurface surface, float x, float y) => surface.Box(new Area(x, y, BoxSize, BoxSize), 0.9f);
}

/// <summary>Things to tick one after the other, as many on a line as fit; each text stands right of its box.</summary>
internal sealed record TickRow(IReadOnlyList<string> Items) : IBlock
{
    private const float AfterBox = 4;
    private const float AfterItem = 12;
    private const float Gap = 4;

    private static float TextRoom(float width) => width - Ticks.BoxSize - AfterBox;

    public float Height(ICardSurface surface, float width) => Lines(surface, width).Sum(l => LineHeight(surface, l, width));

    public void Draw(ICardSurface surface, Area area)
    {
        var y = area.Y;
        foreach (var line in Lines(surface, area.Width))
        {
            var x = area.X;
            foreach (var item in line)
            {
                Ticks.Box(surface, x, y + (Gap / 2));
                var text = new Paragraph(item, TextStyle.Body);
                text.Draw(surface, new Area(x + Ticks.BoxSize + AfterBox, y + (Gap / 2), TextRoom(area.Width), 0));
                x += ItemWidth(surface, item);
            }
            y += LineHeight(surface, line, area.Width);
        }
    }

    public (IBlock Head, IBlock Tail)? CutAt(ICardSurface surface, float width, float room)
    {
        var fits = 0;
        while (fits < Items.Count && new TickRow([.. Items.Take(fits + 1)]).Height(surface, width) <= room) fits++;
        return fits == 0 || fits == Items.Count ? null : (new TickRow([.. Items.Take(fits)]), new TickRow([.. Items.Skip(fits)]));
    }

    /// <summary>Width with all items on one line.</summary>
    public float WidthOf(ICardSurface surface) => Items.Sum(i => ItemWidth(surface, i)) - AfterItem;

    private static float ItemWidth(ICardSurface surface, string item) =>
        Ticks.BoxSize + AfterBox + surface.Measure(item, TextStyle.Body) + AfterItem;

    private static float LineHeight(ICardSurface surface, List<string> line, float width) =>
        Math.Max(Ticks.BoxSize, line.Max(i => new Paragraph(i, TextStyle.Body).Height(surface, TextRoom(width)))) + Gap;

    private List<List<string>> Lines(ICardSurface surface, float width)
    {
        var lines = new List<List<string>>();
        var used = width + 1;
        foreach (var item in Items)
        {
            var wide = ItemWidth(surface, item);
            if (used + wide - AfterItem > width)
            {
                lines.Add([]);
                used = 0;
            }
            lines[^1].Add(item);
            used += wide;
        }
        return lines;
    }
}

/// <summary>A heading in the line and short names after it, each with its box behind: who is asked ticks from left to right.</summary>
internal sealed record LeadingTicks(string Lead, IReadOnlyList<string> Items) : IBlock
{
    private const float Gap = 4;
    private const float AfterBox = 10;

    public float Height(ICardSurface surface, float width) => (Lines(surface, width) * (Ticks.BoxSize + Gap));

    public void Draw(ICardSurface surface, Area area) => Walk(surface, area.Width, (text, style, x, line) =>
    {
        var top = area.Y + (line * (Ticks.BoxSize + Gap)) + (Gap / 2);
        surface.Text(text, area.X + x, top + (Ticks.BoxSize / 2) + (TextStyle.Body.CapHeight / 2), style);
        if (style.Weight == FontWeight.Regular) Ticks.Box(surface, area.X + x + surface.Measure(text, style) + Gap, top);
    });

    private int Lines(ICardSurface surface, float width)
    {
        var last = 0;
        Walk(surface, width, (_, _, _, line) => last = line);
        return last + 1;
    }

    private void Walk(ICardSurface surface, float width, Action<string, TextStyle, float, int> place)
    {
        place(Lead, TextStyle.Strong, 0, 0);
        var x = surface.Measure(Lead, TextStyle.Strong) + Gap + 2;
        var line = 0;
        foreach (var item in Items)
        {
            var wide = surface.Measure(item, TextStyle.Body) + Gap + Ticks.BoxSize;
            if (x + wide > width)
            {
                x = 0;
                line++;
            }
            place(item, TextStyle.Body, x, line);
            x += wide + AfterBox;
        }
    }
}
