using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>From one resistance to another, and what a bad one does.</summary>
internal static class MatchingSheets
{
    private static readonly SourceRef Steps = SourceRef.Derived("series and parallel equivalents at one frequency");
    private static readonly WorksheetInput Frequency = new("frequency", QuantityKind.Frequency, 7.1e6);
    private static readonly WorksheetInput Higher = new("higher-resistance", QuantityKind.Resistance, 50);
    private static readonly WorksheetInput Lower = new("lower-resistance", QuantityKind.Resistance, 12.5);
    private static readonly WorksheetInput CoilQ = new("coil-q", QuantityKind.Number, 100);

    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("matching-l", "transmitter", Steps, [Frequency, Higher, Lower, CoilQ], v =>
            v[Lower.Name] >= v[Higher.Name] ? Conflict("worksheet-conflict.upside-down", Lower.Name, Higher.Name) : Parts(v, MatchingNetwork.L(v.Ohm(Lower.Name), v.Ohm(Higher.Name), v.Hertz(Frequency.Name)))),
        new("matching-pi", "transmitter", Steps, [Frequency, Higher, Lower, new("source-q", QuantityKind.Number, 3), CoilQ], v =>
            v[Lower.Name] > v[Higher.Name] ? Conflict("worksheet-conflict.upside-down", Lower.Name, Higher.Name)
            : MatchingNetwork.TryPi(v.Ohm(Higher.Name), v.Ohm(Lower.Name), v.Hertz(Frequency.Name), v["source-q"], out var pi) ? Parts(v, pi!)
            : Conflict("worksheet-conflict.q-too-low", "source-q")),
        new("matching-t", "transmitter", Steps, [Frequency, Lower, Higher, new("source-q", QuantityKind.Number, 3), CoilQ], v =>
            v[Lower.Name] > v[Higher.Name] ? Conflict("worksheet-conflict.upside-down", Lower.Name, Higher.Name)
            : MatchingNetwork.TryTee(v.Ohm(Lower.Name), v.Ohm(Higher.Name), v.Hertz(Frequency.Name), v["source-q"], out var tee) ? Parts(v, tee!)
            : Conflict("worksheet-conflict.q-too-low", "source-q")),
        new("resistive-pad", "transmitter", SourceRef.Derived("matched pad"), [new("attenuation", QuantityKind.Decibels, 6, 0.1, 60), new("line", QuantityKind.Resistance, 50), new("pad-as-t", QuantityKind.Count, 0, 0, 1)], v =>
        {
            var pad = ResistivePad.For(v.IsSet("pad-as-t") ? PadForm.Tee : PadForm.Pi, v.Db("attenuation"), v.Ohm("line"));
            return Of(Figure.Of("outer-resistors", pad.Outer), Figure.Of("inner-resistor", pad.Inner), Figure.Of("input-share", QuantityKind.Ratio, pad.InputResistorShare));
        }),
        new("mismatch", "transmitter", SourceRef.Derived("forward and reflected wave"), [new("power", QuantityKind.Power, 5), new("line", QuantityKind.Resistance, 50), new("standing-wave-ratio", QuantityKind.Number, 3, 1, 1000)], v =>
        {
            var stress = MismatchStress.FromDelivered(v.Watt("power"), v.Ohm("line"), v["standing-wave-ratio"]);
            return Of(Figure.Of("line-voltage", QuantityKind.Voltage, stress.Voltage.Volt), Figure.Of("line-current", stress.Current));
        }),
        new("feedback-stage", "transmitter", SourceRef.Derived("one transistor with two feedback resistors, large current gain"), [new("emitter-total", QuantityKind.Resistance, 10), new("source", QuantityKind.Resistance, 50), new("load", QuantityKind.Resistance, 200)], v =>
            FeedbackStage.TryCreate(v.Ohm("emitter-total"), v.Ohm("source"), v.Ohm("load"), out var stage)
                ? Of(Figure.Of("feedback-resistor", stage!.Feedback), Figure.Of("stage-gain", stage.Gain), Figure.Of("output-resistance", stage.OutputResistance))
                : Conflict("worksheet-conflict.no-feedback-resistor", "emitter-total", "source", "load")),
    ];

    private static Outcome<WorksheetAnswer> Parts(WorksheetValues v, MatchingNetwork network) => Of(
    [
        Figure.Of("network-q", QuantityKind.Number, Math.Max(network.SourceQ, network.LoadQ)) with { Digits = 3 },
        .. network.Ladder.Elements.Select((e, i) => e.Inductance is { } l ? Figure.Of($"part-{i + 1}", l) : Figure.Of($"part-{i + 1}", e.Capacitance!.Value)),
        Figure.Of("loss", network.EstimatedLoss(v[CoilQ.Name])),
        Figure.Of("second-harmonic", network.Ladder.Loss(network.Frequency * 2, network.Source, network.Load)),
    ]);
}
