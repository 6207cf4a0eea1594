using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>What couples a tuned circuit to its neighbours, and what that costs.</summary>
internal static class TunedCircuitSheets
{
    private const double MostTurns = 900;
    private static readonly SourceRef Derived = SourceRef.Derived("parallel resonant circuit, exact at every Q");
    private static readonly WorksheetInput Frequency = new("frequency", QuantityKind.Frequency, 7.1e6);
    private static readonly WorksheetInput Tapped = new("tapped-resistance", QuantityKind.Resistance, 50);

    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("loaded-circuit", "tuned-circuits", Derived,
            [Frequency, new("coil-reactance", QuantityKind.Resistance, 220), new("unloaded-q", QuantityKind.Number, 150), new("source-at-top", QuantityKind.Resistance, 4400), new("load-at-top", QuantityKind.Resistance, 4400)], v =>
        {
            var circuit = new ResonatorLoading(v.Hertz("frequency"), v.Ohm("coil-reactance"), v["unloaded-q"], v.Ohm("source-at-top"), v.Ohm("load-at-top"));
            return Of(Figure.Of("loaded-q", QuantityKind.Number, circuit.LoadedQ), Figure.Of("bandwidth", circuit.Bandwidth3dB), Figure.Of("loss", circuit.InsertionLoss));
        }),
        new("rejection", "tuned-circuits", SourceRef.Derived("one tuned circuit; far away the coupling decides"),
            [Frequency, new("unwanted-frequency", QuantityKind.Frequency, 25.1e6), new("loaded-q", QuantityKind.Number, 25)], v =>
        {
            var all = TunedCircuit.Rejection(v.Hertz("unwanted-frequency"), v.Hertz("frequency"), v["loaded-q"]);
            return Of(Figure.Of("rejection", all), Figure.Of("rejection-to-believe", all < TunedCircuit.RejectionLimit ? all : TunedCircuit.RejectionLimit));
        }),
        new("capacitive-divider", "tuned-circuits", Derived,
            [Frequency, new("top-capacitor", QuantityKind.Capacitance, 120e-12), new("bottom-capacitor", QuantityKind.Capacitance, 680e-12), Tapped], v =>
        {
            var top = new CapacitiveDivider(v.Farad("top-capacitor"), v.Farad("bottom-capacitor")).AtTop(v.Ohm(Tapped.Name), v.Hertz("frequency"));
            return Of(Figure.Of("resistance-at-top", top.Resistance), Figure.Of("capacitance-at-top", top.Capacitance));
        }),
        new("divider-design", "tuned-circuits", Derived,
            [Frequency, Tapped, new("wanted-at-top", QuantityKind.Resistance, 4000), new("wanted-capacitance", QuantityKind.Capacitance, 100e-12)], v =>
        {
            var design = CapacitiveDivider.Design(v.Ohm(Tapped.Name), v.Ohm("wanted-at-top"), v.Farad("wanted-capacitance"), v.Hertz("frequency"));
            return design.Divider is { } divider
                ? Of(Figure.Of("top-capacitor", divider.Top), Figure.Of("bottom-capacitor", divider.Bottom))
                : design.Refusal == TransformRefusal.NotAStepUp
                    ? Conflict("worksheet-conflict.not-a-step-up", Tapped.Name, "wanted-at-top")
                    : Conflict("worksheet-conflict.divider-too-small", "wanted-capacitance");
        }),
        new("series-capacitor", "tuned-circuits", Derived, [Frequency, Tapped, new("wanted-at-top", QuantityKind.Resistance, 3000)], v =>
            CapacitiveDivider.SeriesCapacitor(v.Ohm(Tapped.Name), v.Ohm("wanted-at-top"), v.Hertz("frequency")) is { } found
                ? Of(Figure.Of("series-capacitor", found.Series), Figure.Of("capacitance-at-top", found.Parallel))
                : Conflict("worksheet-conflict.not-a-step-up", Tapped.Name, "wanted-at-top")),
        new("link-winding", "tuned-circuits", SourceRef.Derived("link on a ring, ideal coupling"),
            [Frequency, new("index", QuantityKind.InductanceFactor, 4.9e-9), new("link-resistance", QuantityKind.Resistance, 50), new("external-q", QuantityKind.Number, 20)], Link),
    ];

    private static Outcome<WorksheetAnswer> Link(WorksheetValues v)
    {
        var (resistance, q, at, index) = (v.Ohm("link-resistance"), v["external-q"], v.Hertz("frequency"), v.Index("index"));
        var exact = LinkWinding.ExactTurns(resistance, q, at, index);
        if (exact > MostTurns) return Conflict("worksheet-conflict.link-far-too-long", "link-resistance", "external-q", "index");
        var best = LinkWinding.WholeTurns(resistance, q, at, index)[0];
        return Judged(
            Math.Abs((best.ExternalQ / q) - 1) <= LinkWinding.ClosestUseful ? "worksheet-verdict.link-near" : "worksheet-verdict.link-coarse",
            Figure.Of("exact-turns", QuantityKind.Number, exact) with { Digits = 4 },
            Figure.Of("turns", QuantityKind.Count, best.Turns),
            Figure.Of("external-q", QuantityKind.Number, best.ExternalQ));
    }
}
