using ClubBench.Calculation.Components;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Worksheets;

/// <summary>Parts, tuned circuits and windings.</summary>
internal static class PartWorksheets
{
    private static readonly SourceRef Thomson = SourceRef.Derived("resonance of coil and capacitor");

    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("standard-value", "parts", new("iec-60063", "preferred number series", SourceStatus.Published), [new("wanted", QuantityKind.Resistance, 5100)], v => WorksheetAnswer.Of(
            Figure.Of("nearest-e12", QuantityKind.Resistance, PreferredValues.Nearest(v["wanted"], ESeries.E12)),
            Figure.Of("nearest-e24", QuantityKind.Resistance, PreferredValues.Nearest(v["wanted"], ESeries.E24)))),
        PartPairSheets.Capacitors,
        PartPairSheets.Resistors,
        new("resonance", "tuned-circuits", Thomson, [new("inductance", QuantityKind.Inductance, 2.304e-6), new("capacitance", QuantityKind.Capacitance, 107.3e-12)], v =>
        {
            var at = TunedCircuit.ResonantFrequency(v.Henry("inductance"), v.Farad("capacitance"));
            return WorksheetAnswer.Of(Figure.Of("resonance", at), Figure.Of("reactance", TunedCircuit.Reactance(v.Henry("inductance"), at)));
        }),
        new("capacitance-for-resonance", "tuned-circuits", Thomson, [new("inductance", QuantityKind.Inductance, 2.304e-6), new("frequency", QuantityKind.Frequency, 10.12e6)], v =>
            WorksheetAnswer.Of(Figure.Of("capacitance", TunedCircuit.CapacitanceFor(v.Henry("inductance"), v.Hertz("frequency"))))),
        TrimmerCoverageSheet.Sheet,
        .. TunedCircuitSheets.All,
        new("toroid-turns", "windings", SourceRef.CommonPractice("definition of the inductance index"), [new("index", QuantityKind.InductanceFactor, 3.0e-9), new("wanted-inductance", QuantityKind.Inductance, 0.675e-6)], v =>
        {
            var choice = TurnsChoice.For(v.Index("index"), v.Henry("wanted-inductance"));
            return WorksheetAnswer.Of(Figure.Of("turns", QuantityKind.Count, choice.Best.Turns), Figure.Of("inductance", choice.Best.Inductance), Figure.Of("error", QuantityKind.Ratio, choice.Best.Error));
        }),
        ToroidFitSheet.Sheet,
        WindingAdjustmentSheet.Sheet,
        FerriteSheets.Choke,
        FerriteSheets.Winding,
        .. CoilSheets.All,
    ];
}
