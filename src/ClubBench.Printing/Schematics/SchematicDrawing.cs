using ClubBench.Planning.Drawings;
using ClubBench.Planning.Text;
using ClubBench.Printing.Drawings;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Schematics;

/// <summary>Draws an abstract schematic: what changes bold, what stays thin and grey, names never turned.</summary>
public static class SchematicDrawing
{
    private const float LineWidth = 1.7f;
    private const float ChangedWidth = 2.6f;
    private const float HeavyWidth = 3f;
    private const float ChangedHeavyWidth = 4f;
    private const float Margin = 5;

    /// <summary>The drawing.</summary>
    /// <param name="schematic">What to draw.</param>
    /// <param name="title">Name of the stage.</param>
    /// <param name="stageKind">Stage kind, for the words of its ends; null writes them as they are.</param>
    public static Drawing Of(Schematic schematic, string title, string? stageKind = null) => Of(schematic, title, stageKind, SchematicLabels.UsualSize);

    /// <summary>The drawing with larger letters beside the same symbols: where paper is short, symbols may shrink and letters may not.</summary>
    internal static Drawing Of(Schematic schematic, string title, string? stageKind, float letterSize)
    {
        var symbols = schematic.Symbols.Select(s => new PlacedSymbol(Worded(s, stageKind))).ToList();
        var junctions = new Junctions(schematic, symbols);
        var svg = new SvgDocument();
        foreach (var wire in schematic.Wires) DrawWire(svg, wire, junctions);
        foreach (var symbol in symbols) DrawSymbol(svg, symbol);
        foreach (var (x, y) in junctions.Dots)
            svg.Circle(x * PlacedSymbol.Grid, y * PlacedSymbol.Grid, 3.2f, junctions.IsNew(x, y) ? Colour.Ink : Colour.Old);

        var labels = new SchematicLabels(svg, schematic, symbols, letterSize);
        labels.Draw();
        return svg.Finish(Around(labels.Covered), title, SchematicDescription.Of(schematic));
    }

    /// <summary>An end is named by its port; people read the port's word.</summary>
    private static Symbol Worded(Symbol symbol, string? stageKind) =>
        symbol.Kind == SymbolKind.Terminal && Phrases.Has("port." + symbol.Value, stageKind)
            ? symbol with { Value = Phrases.Say("port." + symbol.Value, stageKind) }
            : symbol;

    private static void DrawWire(SvgDocument svg, Wire wire, Junctions junctions)
    {
        var isNew = junctions.IsNew(wire.X1, wire.Y1) && junctions.IsNew(wire.X2, wire.Y2);
        svg.Line(wire.X1 * PlacedSymbol.Grid, wire.Y1 * PlacedSymbol.Grid, wire.X2 * PlacedSymbol.Grid, wire.Y2 * PlacedSymbol.Grid,
            isNew ? Colour.Ink : Colour.Old, isNew ? ChangedWidth : LineWidth);
    }

    private static void DrawSymbol(SvgDocument svg, PlacedSymbol placed)
    {
        var colour = placed.IsNew ? Colour.Ink : Colour.Old;
        var shape = placed.Shape;
        if (shape.Lines.Length > 0) svg.Stroke(shape.Lines, colour, placed.IsNew ? ChangedWidth : LineWidth, placed.Transform);
        if (shape.Heavy.Length > 0) svg.Stroke(shape.Heavy, colour, placed.IsNew ? ChangedHeavyWidth : HeavyWidth, placed.Transform);
        if (shape.Solid.Length > 0) svg.Fill(shape.Solid, colour, placed.Transform);
        if (placed.Symbol.Kind == SymbolKind.Terminal) svg.Circle(placed.X, placed.Y, 3, Colour.Sheet, colour, LineWidth);
        if (placed.Symbol.Marking == Marking.Removed) Cross(svg, placed.Body);
    }

    /// <summary>A part that leaves is crossed out, so that it is seen in grey and by colour-blind eyes.</summary>
    private static void Cross(SvgDocument svg, Area body)
    {
        svg.Line(body.X - 3, body.Y - 3, body.Right + 3, body.Bottom + 3, Colour.Ink, LineWidth);
        svg.Line(body.X - 3, body.Bottom + 3, body.Right + 3, body.Y - 3, Colour.Ink, LineWidth);
    }

    private static Area Around(IReadOnlyList<Area> covered)
    {
        if (covered.Count == 0) return new Area(0, 0, Margin, Margin);
        var left = covered.Min(a => a.X) - Margin;
        var top = covered.Min(a => a.Y) - Margin;
        return new Area(left, top, covered.Max(a => a.Right) + Margin - left, covered.Max(a => a.Bottom) + Margin - top);
    }
}
