using ClubBench.Calculation.Audio;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Switching;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Receiving: noise, taps, audio.</summary>
internal static class ReceiverWorksheets
{
    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("external-noise", "receiver", ExternalNoise.SourceOf(NoiseSite.Residential), [PreamplifierSheet.Frequency], v =>
            Of([.. new[] { ("city", NoiseSite.City), ("residential", NoiseSite.Residential), ("rural", NoiseSite.Rural), ("quiet-rural", NoiseSite.QuietRural) }
                .Select(s => Figure.Of(s.Item1, ExternalNoise.ManMade(s.Item2, v.Hertz("frequency"))))])),
        new("noise-degradation", "receiver", PreamplifierSheet.SystemNoise, [new("receiver-noise", QuantityKind.Decibels, 7, 0, 100), new("external-noise", QuantityKind.Decibels, 40, 0, 150)], v =>
            Of(Figure.Of("degradation", PreamplifierNeed.Degradation(v.Db("receiver-noise"), v.Db("external-noise"))))),
        PreamplifierSheet.Sheet,
        new("series-tuned-tap", "receiver", SourceRef.Derived("series resonance; on transmit the coil alone stands across the line"),
            [new("inductance", QuantityKind.Inductance, 6.8e-6), new("unloaded-q", QuantityKind.Number, 40), new("frequency", QuantityKind.Frequency, 10.12e6), new("line", QuantityKind.Resistance, 50), new("receiver-input", QuantityKind.Resistance, 50), new("power", QuantityKind.Power, 1.177)], v =>
        {
            var tap = new SeriesTunedTap(v.Henry("inductance"), v["unloaded-q"], v.Hertz("frequency"), v.Ohm("line"), v.Ohm("receiver-input"));
            return Of(
                Figure.Of("capacitance", tap.Capacitor), Figure.Of("loss", tap.Loss), Figure.Of("bandwidth", QuantityKind.Frequency, tap.BandwidthHertz),
                Figure.Of("diode-current", tap.DiodeCurrent(v.Watt("power"))), Figure.Of("transmit-return-loss", tap.TransmitReturnLoss));
        }),
        new("audio-band-pass", "receiver", SourceRef.Derived("one amplifier with two feedback paths"), [new("frequency", QuantityKind.Frequency, 700), new("section-q", QuantityKind.Number, 4), new("section-gain", QuantityKind.Number, 1.45), new("capacitance", QuantityKind.Capacitance, 10e-9)], v =>
            MultipleFeedbackBandPass.For(v.Hertz("frequency"), v["section-q"], v["section-gain"], v.Farad("capacitance")) is { } section
                ? Of(
                    Figure.Of("input-resistor", section.Input), Figure.Of("shunt-resistor", section.ToGround), Figure.Of("feedback-resistor", section.Feedback),
                    Figure.Of("bandwidth", QuantityKind.Frequency, section.Bandwidth3dBHertz), Figure.Of("two-section-bandwidth", QuantityKind.Frequency, section.TwoSectionBandwidth3dBHertz))
                : Conflict("worksheet-conflict.gain-above-q", "section-q", "section-gain")),
        new("sidetone-timer", "receiver", SourceRef.Derived("thresholds at one and two thirds of the supply"), [new("resistor-to-supply", QuantityKind.Resistance, 10e3, 0), new("resistor-to-capacitor", QuantityKind.Resistance, 100e3), new("capacitance", QuantityKind.Capacitance, 10e-9)], v =>
        {
            var timer = new TimerAstable(v.Ohm("resistor-to-supply"), v.Ohm("resistor-to-capacitor"), v.Farad("capacitance"));
            return Of(Figure.Of("pitch", timer.Frequency), Figure.Of("high-share", QuantityKind.Ratio, timer.HighShare));
        }),
    ];
}
