using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Switching finals and the gates that drive them.</summary>
internal static class SwitchingSheets
{
    public static Worksheet ClassE { get; } = new(
        "class-e", "transmitter", new("sokal-2001", "polynomials for a finite loaded Q", SourceStatus.FromMemory),
        [
            new("wanted-power", QuantityKind.Power, 5),
            new("collector-supply", QuantityKind.Voltage, 12),
            OutputSheet.Saturation with { DefaultSi = 0.5 },
            new("frequency", QuantityKind.Frequency, 7.1e6),
            new("loaded-q", QuantityKind.Number, 5, 1.8, 50),
            new("device-output", QuantityKind.Capacitance, 100e-12),
        ],
        v =>
        {
            if (v["saturation"] >= v["collector-supply"]) return Conflict("worksheet-conflict.no-swing-left", "collector-supply", "saturation");
            var stage = ClassEStage.Of(new(v.Volt("collector-supply"), v.Volt("saturation"), v.Watt("wanted-power"), v.Hertz("frequency"), v["loaded-q"]));
            return Judged(
                stage.HasRoomFor(v.Farad("device-output")) ? "worksheet-verdict.device-fits" : "worksheet-verdict.device-too-big",
                Figure.Of("load-needed", stage.Load),
                Figure.Of("switch-capacitor", stage.Shunt),
                Figure.Of("series-capacitor", stage.Series),
                Figure.Of("series-coil", stage.SeriesCoil),
                Figure.Of("peak-voltage", QuantityKind.Voltage, ClassEStage.PeakVoltageRatio * v["collector-supply"]),
                Figure.Of("device-highest", stage.HighestFrequency(v.Farad("device-output"))));
        });

    public static Worksheet Gate { get; } = new(
        "gate-drive", "transmitter", SourceRef.Derived("charging current of the gate"),
        [
            new("input-capacitance", QuantityKind.Capacitance, 180e-12),
            new("reverse-capacitance", QuantityKind.Capacitance, 0, 0),
            new("stage-voltage-gain", QuantityKind.Number, 0, 0, 1000),
            new("gate-peak", QuantityKind.Voltage, 6),
            new("gate-resistance", QuantityKind.Resistance, 5, 0),
            new("frequency", QuantityKind.Frequency, 7.1e6),
        ],
        v =>
        {
            var seen = GateDrive.EffectiveInput(v.Farad("input-capacitance"), v.Farad("reverse-capacitance"), v["stage-voltage-gain"]);
            var peak = GateDrive.PeakCurrent(v.Hertz("frequency"), seen, v.Volt("gate-peak"));
            return Of(Figure.Of("capacitance", seen), Figure.Of("peak-current", peak), Figure.Of("drive-lost", GateDrive.LossIn(v.Ohm("gate-resistance"), peak)));
        });
}
