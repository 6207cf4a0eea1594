using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Tables;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Worksheets;

/// <summary>Parts, tuned circuits and windings.</summary>
internal static class PartWorksheets
{
    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("standard-value", "parts", SourceRef.Derived(), [new("wanted", QuantityKind.Resistance, 5100)], v =>
        [
            Figure.Of("nearest-e12", QuantityKind.Resistance, PreferredValues.Nearest(v["wanted"], ESeries.E12)),
            Figure.Of("nearest-e24", QuantityKind.Resistance, PreferredValues.Nearest(v["wanted"], ESeries.E24)),
        ]),
        new("resonance", "tuned-circuits", SourceRef.Derived(), [new("inductance", QuantityKind.Inductance, 2.304e-6), new("capacitance", QuantityKind.Capacitance, 107.3e-12)], v =>
        {
            var (coil, capacitor) = (Inductance.FromHenry(v["inductance"]), Capacitance.FromFarad(v["capacitance"]));
            var at = TunedCircuit.ResonantFrequency(coil, capacitor);
            return [Figure.Of("resonance", at), Figure.Of("reactance", TunedCircuit.Reactance(coil, at))];
        }),
        new("capacitance-for-resonance", "tuned-circuits", SourceRef.Derived(), [new("inductance", QuantityKind.Inductance, 2.304e-6), new("frequency", QuantityKind.Frequency, 10.12e6)], v =>
            [Figure.Of("capacitance", TunedCircuit.CapacitanceFor(Inductance.FromHenry(v["inductance"]), Frequency.FromHertz(v["frequency"])))]),
        new("toroid-turns", "windings", SourceRef.Derived(), [new("index", QuantityKind.InductanceFactor, 3.0e-9), new("wanted-inductance", QuantityKind.Inductance, 0.675e-6)], v =>
        {
            var choice = TurnsChoice.For(InductanceFactor.FromNanohenryPerTurnSquared(v["index"] * 1e9), Inductance.FromHenry(v["wanted-inductance"]));
            return [Figure.Of("turns", QuantityKind.Count, choice.Best.Turns), Figure.Of("inductance", choice.Best.Inductance), Figure.Of("error", QuantityKind.Ratio, choice.Best.Error)];
        }),
        new("winding-adjustment", "windings", SourceRef.Derived(), [new("turns", QuantityKind.Count, 15), new("wanted-inductance", QuantityKind.Inductance, 0.675e-6), new("read-inductance", QuantityKind.Inductance, 0.8e-6), new("uncertainty", QuantityKind.Ratio, 0.02)], v =>
        {
            var result = WindingAdjustment.For(new WindingReading((int)v["turns"], v["read-inductance"] / v["wanted-inductance"], v["uncertainty"]));
            return [Figure.Of("turn-change", QuantityKind.Number, result.TurnChange), Figure.Of("first-step", QuantityKind.Number, result.FirstStep)];
        }),
    ];
}
