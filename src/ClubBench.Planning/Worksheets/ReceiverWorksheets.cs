using ClubBench.Calculation.Audio;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Switching;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Worksheets;

/// <summary>Receiving: noise, taps, audio.</summary>
internal static class ReceiverWorksheets
{
    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("external-noise", "receiver", ExternalNoise.SourceOf(NoiseSite.Residential), [new("frequency", QuantityKind.Frequency, 14.06e6)], v =>
            [.. new[] { ("city", NoiseSite.City), ("residential", NoiseSite.Residential), ("rural", NoiseSite.Rural), ("quiet-rural", NoiseSite.QuietRural) }
                .Select(s => Figure.Of(s.Item1, ExternalNoise.ManMade(s.Item2, Frequency.FromHertz(v["frequency"]))))]),
        new("noise-degradation", "receiver", SourceRef.Derived(), [new("receiver-noise", QuantityKind.Decibels, 7), new("external-noise", QuantityKind.Decibels, 40)], v =>
            [Figure.Of("degradation", PreamplifierNeed.Degradation(Decibels.FromDb(v["receiver-noise"]), Decibels.FromDb(v["external-noise"])))]),
        new("series-tuned-tap", "receiver", SourceRef.Derived(), [new("inductance", QuantityKind.Inductance, 6.8e-6), new("unloaded-q", QuantityKind.Number, 40), new("frequency", QuantityKind.Frequency, 10.12e6), new("line", QuantityKind.Resistance, 50), new("receiver-input", QuantityKind.Resistance, 50)], v =>
        {
            var tap = new SeriesTunedTap(Inductance.FromHenry(v["inductance"]), v["unloaded-q"], Frequency.FromHertz(v["frequency"]), Resistance.FromOhm(v["line"]), Resistance.FromOhm(v["receiver-input"]));
            return [Figure.Of("capacitance", tap.Capacitor), Figure.Of("loss", tap.Loss), Figure.Of("bandwidth", QuantityKind.Frequency, tap.BandwidthHertz)];
        }),
        new("audio-band-pass", "receiver", SourceRef.Derived(), [new("frequency", QuantityKind.Frequency, 700), new("section-q", QuantityKind.Number, 4), new("section-gain", QuantityKind.Number, 1.45), new("capacitance", QuantityKind.Capacitance, 10e-9)], v =>
            MultipleFeedbackBandPass.For(Frequency.FromHertz(v["frequency"]), v["section-q"], v["section-gain"], Capacitance.FromFarad(v["capacitance"])) is { } section
                ? [Figure.Of("input-resistor", section.Input), Figure.Of("shunt-resistor", section.ToGround), Figure.Of("feedback-resistor", section.Feedback)]
                : null),
    ];
}
