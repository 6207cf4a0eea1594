using ClubBench.Planning.Drawings;
using ClubBench.Printing.Drawings;
using ClubBench.Printing.Fonts;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Schematics;

/// <summary>Writes names and values beside the symbols, clear of wires and of each other as far as there is room.</summary>
internal sealed class SchematicLabels(SvgDocument svg, Schematic schematic, IReadOnlyList<PlacedSymbol> symbols, float size)
{
    private const float Away = 5;

    /// <summary>Usual size of names and values, in drawing units.</summary>
    public const float UsualSize = 12.5f;

    private const float TestPointRadius = 4.5f;

    private readonly LabelPlacer _placer = new();

    private float LineHeight => 1.2f * size;

    /// <summary>Everything the drawing covers, labels included.</summary>
    public IReadOnlyList<Area> Covered => _placer.Taken;

    public void Draw()
    {
        foreach (var symbol in symbols)
        {
            _placer.Take(symbol.Body);
            _placer.Take(symbol.Leads);
        }
        foreach (var wire in schematic.Wires) _placer.Take(WireArea(wire));
        foreach (var point in schematic.TestPoints) DrawTestPoint(point);
        foreach (var symbol in symbols) DrawLabel(symbol);
    }

    private static Area WireArea(Wire w) => new(
        (Math.Min(w.X1, w.X2) * PlacedSymbol.Grid) - 1,
        (Math.Min(w.Y1, w.Y2) * PlacedSymbol.Grid) - 1,
        (Math.Abs(w.X2 - w.X1) * PlacedSymbol.Grid) + 2,
        (Math.Abs(w.Y2 - w.Y1) * PlacedSymbol.Grid) + 2);

    private static IReadOnlyList<TextLine> LinesOf(PlacedSymbol placed)
    {
        var symbol = placed.Symbol;
        var isRemoved = symbol.Marking == Marking.Removed;
        var name = new TextLine(symbol.Designator, FontWeight.Regular, placed.IsNew ? Colour.Ink2 : Colour.Old, false);
        var value = new TextLine(symbol.Value, placed.IsNew ? FontWeight.SemiBold : FontWeight.Regular, placed.IsNew ? Colour.Ink : Colour.Old, isRemoved);
        var old = new TextLine(symbol.OldValue ?? "", FontWeight.Regular, Colour.Old, true);
        return [.. new[] { name, value, old }.Where(l => l.Text.Length > 0)];
    }

    private void DrawLabel(PlacedSymbol placed)
    {
        var lines = LinesOf(placed);
        if (lines.Count == 0) return;
        if (SymbolShapes.IsNamedInside(placed.Symbol.Kind))
        {
            var inside = lines[0];
            svg.Text(inside.Text, placed.Body.X + (placed.Body.Width / 2), placed.Body.Middle + (0.36f * size), size, FontWeight.SemiBold, inside.Colour, TextSide.Middle);
            lines = [.. lines.Skip(1)];
            if (lines.Count == 0) return;
        }
        var width = lines.Max(l => PlexSans.Measure(l.Text, size, l.Weight));
        var height = lines.Count * LineHeight;
        var place = _placer.Place(Places(placed, width, height));
        var centred = Math.Abs(place.X + (width / 2) - placed.Body.X - (placed.Body.Width / 2)) < 1;
        var side = centred ? TextSide.Middle : place.X < placed.Body.X ? TextSide.End : TextSide.Start;
        for (var i = 0; i < lines.Count; i++) Write(lines[i], place, (i * LineHeight) + size - 1, side);
    }

    /// <summary>Where the label may stand, best liked first: above and below what lies, right and left of what stands.</summary>
    private Area[] Places(PlacedSymbol placed, float width, float height)
    {
        var body = placed.Body;
        var centre = body.X + (body.Width / 2) - (width / 2);
        var above = new Area(centre, body.Y - Away - height, width, height);
        var below = new Area(centre, body.Bottom + Away, width, height);
        var right = new Area(body.Right + Away, body.Middle - (height / 2), width, height);
        var left = new Area(body.X - Away - width, body.Middle - (height / 2), width, height);
        return placed.Symbol.Kind switch
        {
            SymbolKind.Terminal when EndsRight(placed) => [above with { X = placed.X + 2 - width }, below with { X = placed.X + 2 - width }, right, left],
            SymbolKind.Terminal => [above with { X = placed.X - 2 }, below with { X = placed.X - 2 }, left, right],
            SymbolKind.Mixer => [above with { X = body.Right }, above with { X = body.X - width }, below with { X = body.Right }, below with { X = body.X - width }],
            SymbolKind.Supply or SymbolKind.Antenna => [above, right, left],
            SymbolKind.TransistorNpn or SymbolKind.TransistorPnp or SymbolKind.Mosfet or SymbolKind.Jfet => [right, left, above, below],
            SymbolKind.Block or SymbolKind.Regulator or SymbolKind.Amplifier => [below, above, right, left],
            _ when placed.IsUpright => [right, left, right with { Y = body.Bottom + Away }, right with { Y = body.Y - Away - height }],
            _ => [above, below, right, left],
        };
    }

    /// <summary>Whether it stands in the right half: its word then ends at it and does not widen the drawing.</summary>
    private bool EndsRight(PlacedSymbol terminal) => terminal.X > (symbols.Min(s => s.X) + symbols.Max(s => s.X)) / 2;

    private void Write(TextLine line, Area place, float baseline, TextSide side)
    {
        var x = side switch { TextSide.Middle => place.X + (place.Width / 2), TextSide.End => place.Right, _ => place.X };
        svg.Text(line.Text, x, place.Y + baseline, size, line.Weight, line.Colour, side);
        if (!line.IsStruck) return;
        var width = PlexSans.Measure(line.Text, size, line.Weight);
        var start = side switch { TextSide.Middle => x - (width / 2), TextSide.End => x - width, _ => x };
        svg.Line(start - 1, place.Y + baseline - 4, start + width + 1, place.Y + baseline - 4, line.Colour, 1.2f);
    }

    private void DrawTestPoint(TestPoint point)
    {
        var x = point.X * PlacedSymbol.Grid;
        var y = point.Y * PlacedSymbol.Grid;
        svg.Circle(x, y, TestPointRadius, Colour.Sheet, Colour.Ink, 1.7f);
        _placer.Take(new Area(x - TestPointRadius, y - TestPointRadius, 2 * TestPointRadius, 2 * TestPointRadius));
        var width = PlexSans.Measure(point.Letter, size, FontWeight.Bold);
        var above = new Area(x - (width / 2), y - TestPointRadius - LineHeight - 1, width, LineHeight);
        var below = above with { Y = y + TestPointRadius + 1 };
        var place = _placer.Place(above, below, above with { X = x + 6 }, above with { X = x - 6 - width }, below with { X = x + 6 }, below with { X = x - 6 - width });
        svg.Text(point.Letter, place.X, place.Y + size - 1, size, FontWeight.Bold, Colour.Ink);
    }

    private readonly record struct TextLine(string Text, FontWeight Weight, string Colour, bool IsStruck);
}
