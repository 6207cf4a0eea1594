using ClubBench.Planning.Drawings;
using ClubBench.Printing.Schematics;
using ClubBench.Printing.Tests.Samples;

namespace ClubBench.Printing.Tests.Schematics;

/// <summary>The drawings of the demonstration kit's stages, held against the terminals of the symbols they use.</summary>
public class StageDrawingsTests
{
    public static TheoryData<string> Stages() => [.. Enumerable.Range(1, 12).Select(i => $"A{i}")];

    [Theory]
    [MemberData(nameof(Stages))]
    public void Draw_EveryStage_LeavesNoWireEndInTheAir(string stage) => Assert.Empty(LooseEnds(SamplePlans.QuernOn("20 m").Stage(stage).Drawing));

    [Theory]
    [MemberData(nameof(Stages))]
    public void Draw_EveryStage_ConnectsEveryTwoTerminalPart(string stage)
    {
        var drawing = SamplePlans.QuernOn("40 m").Stage(stage).Drawing;
        var symbols = drawing.Symbols.Select(s => new PlacedSymbol(s)).ToList();

        foreach (var symbol in symbols.Where(s => s.Shape.Terminals.Count <= 2))
            Assert.All(symbol.Terminals, t => Assert.True(IsMet(t, drawing, symbols.Where(s => s != symbol)), $"{symbol.Symbol.Designator} {symbol.Symbol.Kind} at {t}"));
    }

    [Fact]
    public void LooseEnds_WirePastItsPart_IsFound()
    {
        var part = new Symbol(SymbolKind.Resistor, 0, 0, Orientation.Across, "R1", "1 kΩ", null, Marking.Untouched);

        Assert.Equal([(9, 0)], LooseEnds(new Schematic([part], [new Wire(4, 0, 9, 0)], [])));
        Assert.Equal([(5, 0), (9, 0)], LooseEnds(new Schematic([part], [new Wire(5, 0, 9, 0)], [])));
    }

    [Fact]
    public void Draw_ClampAndRegulatorDiodes_HaveTheirCathodesAtTheLine()
    {
        var plan = SamplePlans.QuernOn("20 m");

        Assert.Equal(Orientation.Up, Assert.Single(plan.Stage("A4").Drawing.Symbols, s => s.Kind == SymbolKind.ZenerDiode).Orientation);
        Assert.Equal(
            [Orientation.Down, Orientation.Down, Orientation.Up, Orientation.Up],
            plan.Stage("A6").Drawing.Symbols.Where(s => s.Kind == SymbolKind.Diode).OrderBy(s => s.Designator, StringComparer.Ordinal).Select(s => s.Orientation));
    }

    private static List<(int X, int Y)> LooseEnds(Schematic drawing)
    {
        var terminals = drawing.Symbols.SelectMany(s => new PlacedSymbol(s).Terminals).ToHashSet();
        var ends = drawing.Wires.SelectMany(w => new[] { (w.X1, w.Y1), (w.X2, w.Y2) });
        return [.. ends.Where(e => !terminals.Contains(e) && drawing.Wires.Count(w => Touches(w, e)) < 2)];
    }

    private static bool IsMet((int X, int Y) terminal, Schematic drawing, IEnumerable<PlacedSymbol> others) =>
        drawing.Wires.Any(w => Touches(w, terminal)) || others.Any(o => o.Terminals.Contains(terminal));

    private static bool Touches(Wire wire, (int X, int Y) p) =>
        ((wire.X2 - wire.X1) * (p.Y - wire.Y1)) == ((wire.Y2 - wire.Y1) * (p.X - wire.X1))
        && p.X >= Math.Min(wire.X1, wire.X2) && p.X <= Math.Max(wire.X1, wire.X2)
        && p.Y >= Math.Min(wire.Y1, wire.Y2) && p.Y <= Math.Max(wire.Y1, wire.Y2);
}
