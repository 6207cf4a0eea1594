using ClubBench.Planning.Drawings;
using ClubBench.Printing.Schematics;
using ClubBench.Printing.Tests.Samples;

namespace ClubBench.Printing.Tests.Schematics;

/// <summary>Which way round the demonstration kit's diodes are drawn, told by what their ends are joined to.</summary>
public class DiodeDirectionTests
{
    private static readonly Schematic s_final = SamplePlans.QuernOn("20 m").Stage("A4").Drawing;
    private static readonly Schematic s_detector = SamplePlans.QuernOn("20 m").Stage("A8").Drawing;

    [Fact]
    public void Draw_RegulatorOfTheDetector_HasItsCathodeAtTheSupplyAndItsAnodeAtGround()
    {
        var zener = new PlacedSymbol(Assert.Single(s_detector.Symbols, s => s.Designator == "ZD2"));

        Assert.Equal(SymbolKind.ZenerDiode, zener.Symbol.Kind);
        Assert.Contains(SymbolKind.Supply, JoinedTo(s_detector, Cathode(zener)));
        Assert.Contains(SymbolKind.Ground, JoinedTo(s_detector, Anode(zener)));
    }

    [Theory]
    [InlineData("20 m")]
    [InlineData("40 m")]
    public void Draw_EveryZener_IsTheRightWayRound(string band)
    {
        var drawings = SamplePlans.QuernOn(band).Stages.Select(s => s.Drawing).ToList();

        Assert.Equal(["ZD1", "ZD2"], drawings.SelectMany(d => d.Symbols).Where(s => s.Kind == SymbolKind.ZenerDiode).Select(s => s.Designator).Order(StringComparer.Ordinal));
        Assert.All(drawings, d => Assert.Empty(Reversed(d)));
    }

    [Fact]
    public void Draw_PolarityDiode_ConductsFromTheFuseToTheReservoir()
    {
        var drawing = SamplePlans.QuernOn("20 m").Stage("A12").Drawing;
        var diode = new PlacedSymbol(Assert.Single(drawing.Symbols, s => s.Designator == "D5"));

        Assert.Contains(SymbolKind.Fuse, JoinedTo(drawing, Anode(diode)));
        Assert.Contains(SymbolKind.Electrolytic, JoinedTo(drawing, Cathode(diode)));
    }

    [Fact]
    public void Reversed_ClampTurnedOver_IsFound()
    {
        var planted = s_final with { Symbols = [.. s_final.Symbols.Select(s => s.Kind == SymbolKind.ZenerDiode ? s with { Y = s.Y - 4, Orientation = Orientation.Down } : s)] };

        Assert.Equal(["ZD1"], Reversed(planted));
    }

    [Fact]
    public void Reversed_RegulatorWithItsEndsExchanged_IsFound()
    {
        var zener = new PlacedSymbol(s_detector.Symbols.Single(s => s.Designator == "ZD2"));
        var (anode, cathode) = (Anode(zener), Cathode(zener));
        var supply = s_detector.Symbols.Single(s => s.Kind == SymbolKind.Supply);
        var planted = new Schematic(
            [.. s_detector.Symbols.Select(s => s.Kind == SymbolKind.Ground && (s.X, s.Y) == anode ? s with { X = cathode.X, Y = cathode.Y } : s)],
            [
                .. s_detector.Wires.Where(w => (w.X1, w.Y1) != cathode && (w.X2, w.Y2) != cathode),
                new Wire(anode.X, anode.Y, anode.X, anode.Y - 3), new Wire(anode.X, anode.Y - 3, supply.X, anode.Y - 3), new Wire(supply.X, anode.Y - 3, supply.X, supply.Y),
            ],
            s_detector.TestPoints);

        Assert.Equal(["ZD2"], Reversed(planted));
    }

    [Theory]
    [InlineData(SymbolKind.Diode)]
    [InlineData(SymbolKind.ZenerDiode)]
    public void Shape_OfADiode_PointsAtTheBarBeforeItsSecondTerminal(SymbolKind kind)
    {
        var shape = SymbolShapes.Of(kind);

        Assert.Equal([(0, 0), (4, 0)], shape.Terminals);
        Assert.Contains("M24 -9V9L40 0Z", shape.Lines, StringComparison.Ordinal);
        Assert.Contains("V9", shape.Heavy[shape.Heavy.IndexOf("40", StringComparison.Ordinal)..], StringComparison.Ordinal);
    }

    private static (int X, int Y) Anode(PlacedSymbol diode) => diode.Terminals.First();

    private static (int X, int Y) Cathode(PlacedSymbol diode) => diode.Terminals.Last();

    /// <summary>Zener diodes that do not hold up the line from ground: anode not at ground, or cathode there.</summary>
    private static List<string> Reversed(Schematic drawing) =>
        [.. drawing.Symbols.Where(s => s.Kind == SymbolKind.ZenerDiode).Select(s => new PlacedSymbol(s))
            .Where(z => !JoinedTo(drawing, Anode(z)).Contains(SymbolKind.Ground) || JoinedTo(drawing, Cathode(z)).Contains(SymbolKind.Ground))
            .Select(z => z.Symbol.Designator)];

    /// <summary>Every symbol with a terminal on the wires that meet a point.</summary>
    private static HashSet<SymbolKind> JoinedTo(Schematic drawing, (int X, int Y) start)
    {
        var net = new HashSet<Wire>();
        while (drawing.Wires.FirstOrDefault(w => !net.Contains(w) && (Touches(w, start) || net.Any(n => Meet(n, w)))) is { } next) net.Add(next);
        return [.. drawing.Symbols.Where(s => new PlacedSymbol(s).Terminals.Any(t => t == start || net.Any(w => Touches(w, t)))).Select(s => s.Kind)];
    }

    private static bool Meet(Wire a, Wire b) => Touches(a, (b.X1, b.Y1)) || Touches(a, (b.X2, b.Y2)) || Touches(b, (a.X1, a.Y1)) || Touches(b, (a.X2, a.Y2));

    private static bool Touches(Wire wire, (int X, int Y) p) =>
        ((wire.X2 - wire.X1) * (p.Y - wire.Y1)) == ((wire.Y2 - wire.Y1) * (p.X - wire.X1))
        && p.X >= Math.Min(wire.X1, wire.X2) && p.X <= Math.Max(wire.X1, wire.X2)
        && p.Y >= Math.Min(wire.Y1, wire.Y2) && p.Y <= Math.Max(wire.Y1, wire.Y2);
}
