using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>The load a final stage needs for a power, and how hot its junction gets.</summary>
internal static class OutputSheet
{
    // Above this nothing is left to compute: every device has burnt out long before.
    private const double HottestCelsius = 1000;

    internal static readonly SourceRef Swing = SourceRef.Derived("sine across the load at full swing; saturation and efficiency are common practice");
    internal static readonly WorksheetInput Saturation = new("saturation", QuantityKind.Voltage, 0.8, 0);
    internal static readonly WorksheetInput Efficiency = new("efficiency", QuantityKind.Ratio, 0.6, 0.01, 1);
    internal static readonly WorksheetInput Drive = new("drive", QuantityKind.Power, 0, 0);

    public static Worksheet LoadAndHeat { get; } = new(
        "load-and-heat", "transmitter", Swing,
        [
            new("wanted-power", QuantityKind.Power, 5),
            new("collector-supply", QuantityKind.Voltage, 12),
            Saturation with { DefaultSi = 1 },
            Efficiency,
            Drive,
            new("junction-to-case", QuantityKind.Number, 2.1, 0),
            new("case-to-sink", QuantityKind.Number, 0.5, 0),
            new("sink-to-air", QuantityKind.Number, 12, 0),
            new("air", QuantityKind.Temperature, 40, -50, 150),
            new("junction-limit", QuantityKind.Temperature, 150, 0, 400),
        ],
        v =>
        {
            if (v["saturation"] >= v["collector-supply"]) return Conflict("worksheet-conflict.no-swing-left", "collector-supply", "saturation");
            var dissipated = OutputStage.Dissipation(v.Watt("wanted-power"), v["efficiency"], v.Watt("drive"));
            var path = new Heat(v.KelvinPerWatt("junction-to-case"), v.KelvinPerWatt("case-to-sink"), v.KelvinPerWatt("sink-to-air"));
            var rise = dissipated.Watt * (path.JunctionToCase + path.CaseToSink + path.SinkToAir).KelvinPerWatt;
            return v["air"] + rise > HottestCelsius
                ? Conflict("worksheet-conflict.far-too-hot", "wanted-power", "junction-to-case", "case-to-sink", "sink-to-air")
                : Answer(v, path, dissipated);
        });

    private static Outcome<WorksheetAnswer> Answer(WorksheetValues v, Heat path, Power dissipated)
    {
        var stage = new OutputStage(v.Volt("collector-supply"), v.Volt("saturation"));
        var junction = path.Junction(v.Celsius("air"), dissipated);
        return Judged(
            junction.Celsius <= v["junction-limit"] - Heat.Reserve.Kelvin ? "worksheet-verdict.cool-enough" : "worksheet-verdict.too-hot",
            Figure.Of("load-needed", stage.Load(v.Watt("wanted-power"))),
            Figure.Of("direct-current", stage.DirectCurrent(v.Watt("wanted-power"), v["efficiency"])),
            Figure.Of("peak-voltage", QuantityKind.Voltage, stage.PeakVoltage(StageClass.ClassCTuned).Volt),
            Figure.Of("dissipation", dissipated),
            Figure.Of("junction", junction));
    }
}
