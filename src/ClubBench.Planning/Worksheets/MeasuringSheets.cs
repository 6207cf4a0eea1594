using ClubBench.Calculation.Keying;
using ClubBench.Calculation.Measuring;
using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>What a reading means, and how a keyed signal sounds beside itself.</summary>
internal static class MeasuringSheets
{
    private static readonly WorksheetInput Load = new("load", QuantityKind.Resistance, 50);

    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("power-from-voltage", "measuring", SourceRef.Derived("sine wave across a resistor"), [new("peak-to-peak", QuantityKind.PeakToPeakVoltage, 20), Load], v =>
        {
            var power = RfVoltage.FromPeakToPeak(v.Volt("peak-to-peak"), v.Ohm(Load.Name));
            return Of(Figure.Of("power", power), Figure.Of("power-level", power.ToLevel()), Figure.Of("effective-voltage", QuantityKind.Voltage, RfVoltage.Rms(power, v.Ohm(Load.Name)).Volt));
        }),
        new("peak-detector", "measuring", SourceRef.CommonPractice("diode drop at a few microamperes"), [new("detector-reading", QuantityKind.Voltage, 21.7), new("diode-drop", QuantityKind.Voltage, 0.6, 0, 2), new("divider-ratio", QuantityKind.Number, 1, 1, 1000), Load], v =>
        {
            var detector = new PeakDetector(v.Volt("diode-drop"), v["divider-ratio"], v.Ohm(Load.Name));
            return detector.TryPower(v.Volt("detector-reading"), out var power)
                ? Of(Figure.Of("power", power), Figure.Of("reverse-voltage", QuantityKind.Voltage, detector.ReverseVoltage(power).Volt))
                : Conflict("worksheet-conflict.detector-not-linear", "detector-reading");
        }),
        new("two-tone", "measuring", SourceRef.Derived("two equal tones"), [new("crest-voltage", QuantityKind.Voltage, 22.36), Load], v =>
        {
            var tones = TwoTone.FromCrest(v.Volt("crest-voltage"), v.Ohm(Load.Name));
            return Of(Figure.Of("peak-envelope", tones.PeakEnvelope), Figure.Of("mean-power", tones.Average), Figure.Of("each-tone", tones.EachTone));
        }),
        new("directivity", "measuring", SourceRef.Derived("leak in unknown phase"), [new("return-loss", QuantityKind.Decibels, 20, 0.01, 80), new("directivity", QuantityKind.Decibels, 30, 0.01, 80)], v =>
        {
            var interval = ReturnLossInterval.Of(v.Db("return-loss"), v.Db("directivity"));
            return Of([Figure.Of("return-loss-least", interval.Least), .. interval.Most is { } most ? new[] { Figure.Of("return-loss-most", most) } : []]);
        }),
        new("mixer-level", "measuring", SourceRef.Derived("sine wave across a resistor; the window of 3 dB is common practice"), [new("peak-to-peak", QuantityKind.PeakToPeakVoltage, 1.416), Load, new("wanted-milliwatt", QuantityKind.Power, 5e-3)], v =>
        {
            var level = OscillatorLevel.FromPeakToPeak(v.Volt("peak-to-peak"), v.Ohm(Load.Name));
            return Judged(Phrases.CodeOf(OscillatorLevel.Judge(level, v.Watt("wanted-milliwatt").ToLevel())), Figure.Of("power-level", level));
        }),
        new("telegraph-speed", "measuring", new("itu-r-sm1138", "necessary bandwidth", SourceStatus.FromMemory), [new("words-per-minute", QuantityKind.Number, 25, 1, 100)], v =>
        {
            var speed = TelegraphySpeed.FromWordsPerMinute(v["words-per-minute"]);
            return Of(
                Figure.Of("dot", QuantityKind.Duration, speed.Dot.Second), Figure.Of("baud", QuantityKind.Number, speed.DesignatorBaud),
                Figure.Of("necessary-bandwidth", QuantityKind.Frequency, speed.NecessaryBandwidthHertz()), Figure.Of("necessary-bandwidth-steady", QuantityKind.Frequency, speed.NecessaryBandwidthHertz(fading: false)));
        }),
        new("keying-edge", "measuring", SourceRef.Derived("spectrum of an edge; 5 ms is common practice"), [new("words-per-minute", QuantityKind.Number, 20, 1, 100), new("rise-time", QuantityKind.Duration, 5e-3), new("offset", QuantityKind.Frequency, 258, 1)], v =>
        {
            var (dot, at, rise) = (TelegraphySpeed.FromWordsPerMinute(v["words-per-minute"]).Dot, v.Hertz("offset"), Duration.FromSecond(v["rise-time"]));
            Figure Level(string name, EdgeShape shape) => Figure.Of(name, QuantityKind.RelativeLevel, new KeyingEnvelope(shape, rise).DotLevel(at, dot, crest: true).Db);
            return Of(Level("hard-edge", EdgeShape.Hard), Level("soft-edge", EdgeShape.ResistorCapacitor), Level("raised-cosine", EdgeShape.RaisedCosine));
        }),
    ];
}
