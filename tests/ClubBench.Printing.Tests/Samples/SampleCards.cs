using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Sheets;

namespace ClubBench.Printing.Tests.Samples;

/// <summary>Cards of demonstration kit A, stage A5, moved from 30 m to 20 m; all invented. Figures as in the kit's table.</summary>
public static class SampleCards
{
    public static string Kind { get; } = StageKindList.All.FirstOrDefault(k => k.Description.Roles.Any(r => r.Name == "shunt-capacitor") && k.Description.Roles.Any(r => r.Name == "series-winding"))?.Description.Id ?? "";

    public static CardContext Context { get; } = new(
        "Marrowby Radio Constructors", "Quern-30", "C", "30 m", "20 m", "blue", "Q05", "Hana", 3, 4, new DateOnly(2026, 12, 1),
        "http://club.test/b/q05/a5", PaperSize.A4,
        new Dictionary<InstrumentClass, string> { [InstrumentClass.LcMeter] = "M2", [InstrumentClass.NetworkAnalyser] = "V1" });

    public static CardContent LowPass { get; } = LowPassWith(coils: 3);

    public static PrintedCard Card { get; } = new(LowPass, Context);

    /// <summary>A low-pass with so many coils; three make the kit's stage.</summary>
    public static CardContent LowPassWith(int coils)
    {
        var windings = Enumerable.Range(0, coils).Select(i => Winding($"L{4 + i}", i == 0 || i == coils - 1 ? 15 : 16)).ToList();
        return new CardContent(
            "A5",
            Kind,
            StageAction.Change,
            new Finding("filter.blocks-band", Severity.Fault, "A5", null, WhyFigures(), StageAction.Change),
            LowPassSchematic(coils),
            [.. Enumerable.Range(0, coils + 1).Select(i => Capacitor($"C{15 + i}", i == 0 || i == coils ? 270e-12 : 510e-12)), .. windings.Select(w => Coil(w.Designator, w.Turns, "T50-6"))],
            Fit(coils, windings),
            windings,
            Notes(),
            [.. windings.Select(Reading), .. Swept()]);
    }

    public static CardContent Kept { get; } = LowPass with
    {
        Action = StageAction.Keep,
        Why = null,
        Drawing = Untouched(LowPass.Drawing),
        Remove = [],
        Fit = [],
        Windings = [],
        Measure = [.. Swept()],
    };

    private static IReadOnlyList<Figure> WhyFigures() =>
    [
        Figure.Of("share", QuantityKind.Ratio, 0.21), Figure.Of("at", QuantityKind.Frequency, 14.05e6),
        Figure.Of("loss", QuantityKind.Decibels, 6.7), Figure.Of("return-loss", QuantityKind.Decibels, 1.5),
    ];

    private static Part Capacitor(string name, double farad, double? beside = null)
    {
        var values = new Dictionary<string, double> { [PartValue.Capacitance] = farad, [PartValue.RatedVoltage] = 100 };
        if (beside is { } f) values[PartValue.ParallelCapacitance] = f;
        return new Part(name, "shunt-capacitor", "NP0", values);
    }

    private static Part Coil(string name, int turns, string core) =>
        new(name, "series-winding", core, new Dictionary<string, double> { [PartValue.Turns] = turns, [PartValue.WireDiameter] = 0.4e-3 });

    private static WindingRow Winding(string name, int turns)
    {
        var henry = 3.0e-9 * turns * turns;
        return new WindingRow(name, "T37-6", "yellow", turns, null,
            Figure.Of("wire", QuantityKind.Length, 0.4e-3), Figure.Of("cut", QuantityKind.Length, turns == 15 ? 0.29 : 0.3), null,
            Figure.Of("low", QuantityKind.Inductance, henry * 0.95), Figure.Of("high", QuantityKind.Inductance, henry * 1.05));
    }

    private static IReadOnlyList<FittingRow> Fit(int coils, IReadOnlyList<WindingRow> windings)
    {
        var inner = Enumerable.Range(1, coils - 1).Select(i => $"C{15 + i}").ToList();
        var rows = new List<FittingRow> { new(["C15", $"C{15 + coils}"], Capacitor("C15", 180e-12, 22e-12), ["181", "22 or 220"], 2, true, "a") };
        if (inner.Count > 0) rows.Add(new FittingRow(inner, Capacitor(inner[0], 330e-12, 33e-12), ["331", "33 or 330"], 2, true, "b"));
        rows.AddRange(windings.GroupBy(w => w.Turns).Select((g, i) =>
            new FittingRow([.. g.Select(w => w.Designator)], Coil(g.First().Designator, g.Key, "T37-6"), ["yellow"], 1, true, ((char)('c' + i)).ToString())));
        return rows;
    }

    private static CardNotes Notes() => new(
        [Line.Of("line.look-at-joints"), Line.Of("line.through-under-one-ohm"), Line.Of("line.ends-to-ground-open")],
        null,
        [Line.Of("line.coil-off-a-little"), Line.Of("line.return-loss-low"), Line.Of("line.still-outside")],
        [Caution.Measuring("caution.no-key-down-before-filter"), Caution.Measuring("caution.rf-burns")],
        null);

    private static ExpectedReading Reading(WindingRow winding) => new(
        $"A5.{winding.Designator}.L", QuantityKind.Inductance, 3e-9 * winding.Turns * winding.Turns, winding.Low!.Si, winding.High!.Si,
        "set-up.coil-before-fitting", InstrumentClass.LcMeter, WindowSides.Both, new Dictionary<string, double>(),
        new WindingUnderTest(winding.Designator, winding.Turns, winding.Core, 0.08, 0.08, 0, 0.0123));

    private static IEnumerable<ExpectedReading> Swept() =>
    [
        new("A5.loss", QuantityKind.Decibels, 0.2, 0, 0.5, "set-up.swept-cold", InstrumentClass.NetworkAnalyser, WindowSides.AtMost, new Dictionary<string, double>()),
        new("A5.return-loss", QuantityKind.Decibels, 26.3, 18, 60, "set-up.swept-cold", InstrumentClass.NetworkAnalyser, WindowSides.AtLeast, new Dictionary<string, double>()),
        new("A5.second-harmonic", QuantityKind.Decibels, 41.4, 37, 100, "set-up.swept-cold", InstrumentClass.NetworkAnalyser, WindowSides.AtLeast, new Dictionary<string, double>()),
    ];

    private static Schematic LowPassSchematic(int coils)
    {
        var symbols = new List<Symbol> { new(SymbolKind.Terminal, 0, 4, Orientation.Down, "", "input", null, Marking.Untouched) };
        var wires = new List<Wire> { new(0, 4, 3, 4) };
        for (var i = 0; i <= coils; i++)
        {
            var x = 3 + (i * 10);
            var isEnd = i == 0 || i == coils;
            symbols.Add(new Symbol(SymbolKind.Capacitor, x, 4, Orientation.Down, $"C{15 + i}", isEnd ? "180 + 22 pF" : "330 + 33 pF", isEnd ? "270 pF" : "510 pF", Marking.Changed));
            symbols.Add(new Symbol(SymbolKind.Ground, x, 8, Orientation.Down, "", "", null, Marking.Untouched));
            if (i == coils) continue;
            symbols.Add(new Symbol(SymbolKind.ToroidCoil, x + 3, 4, Orientation.Across, $"L{4 + i}", i == 0 || i == coils - 1 ? "15 t T37-6" : "16 t T37-6", "15 t T50-6", Marking.Changed));
            wires.Add(new Wire(x, 4, x + 3, 4));
            wires.Add(new Wire(x + 7, 4, x + 10, 4));
        }
        var end = 3 + (coils * 10);
        wires.Add(new Wire(end, 4, end + 3, 4));
        symbols.Add(new Symbol(SymbolKind.Terminal, end + 3, 4, Orientation.Down, "", "output", null, Marking.Untouched));
        return new Schematic(symbols, wires, [new TestPoint("T1", 1, 4)]);
    }

    private static Schematic Untouched(Schematic schematic) =>
        schematic with { Symbols = [.. schematic.Symbols.Select(s => s with { OldValue = null, Marking = Marking.Untouched })] };
}
