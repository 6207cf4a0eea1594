using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Amplifiers and what leaves the antenna.</summary>
internal static class TransmitterWorksheets
{
    internal static readonly WorksheetInput LowFrequencyGain = new("low-frequency-gain", QuantityKind.Number, 100, 1, 1e5);

    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("output-stage", "transmitter", OutputSheet.Swing, [new("supply", QuantityKind.Voltage, 11.65), OutputSheet.Saturation, new("load", QuantityKind.Resistance, 50), OutputSheet.Efficiency, OutputSheet.Drive with { DefaultSi = 0.08 }], v =>
        {
            if (v["saturation"] >= v["supply"]) return Conflict("worksheet-conflict.no-swing-left", "supply", "saturation");
            var stage = new OutputStage(v.Volt("supply"), v.Volt("saturation"));
            var output = stage.Power(v.Ohm("load"));
            return Of(Figure.Of("output", output), Figure.Of("direct-current", stage.DirectCurrent(output, v["efficiency"])), Figure.Of("dissipation", OutputStage.Dissipation(output, v["efficiency"], v.Watt("drive"))));
        }),
        OutputSheet.LoadAndHeat,
        new("current-gain", "transmitter", SourceRef.Derived("one pole"), [LowFrequencyGain, new("transition", QuantityKind.Frequency, 190e6), new("frequency", QuantityKind.Frequency, 14.06e6)], v =>
            Of(Figure.Of("gain-there", QuantityKind.Number, new CurrentGain(v["low-frequency-gain"], v.Hertz("transition")).At(v.Hertz("frequency"))))),
        DeviceGainSheet.Sheet,
        BaseReturnSheets.WorkingPoint,
        BaseReturnSheets.Trend,
        new("coupling-capacitor", "transmitter", SourceRef.Derived("voltage divider; the limits are common practice"), [new("capacitance", QuantityKind.Capacitance, 10e-9), new("frequency", QuantityKind.Frequency, 1.9e6), new("source-plus-load", QuantityKind.Resistance, 100)], v =>
        {
            var (at, both) = (v.Hertz("frequency"), v.Ohm("source-plus-load"));
            return Judged(
                Phrases.CodeOf(CouplingCapacitor.Judge(v.Farad("capacitance"), at, both)),
                Figure.Of("loss", CouplingCapacitor.Loss(v.Farad("capacitance"), at, both)),
                Figure.Of("capacitance-wanted", CouplingCapacitor.Wanted(at, both)));
        }),
        EmissionLimitSheet.Sheet,
        .. MatchingSheets.All,
        SwitchingSheets.ClassE,
        SwitchingSheets.Gate,
    ];
}
