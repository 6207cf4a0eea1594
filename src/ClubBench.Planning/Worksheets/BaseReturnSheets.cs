using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>The base return of a class C stage.</summary>
internal static class BaseReturnSheets
{
    private static readonly WorksheetInput DrivePeak = new("drive-peak", QuantityKind.Voltage, 1.6);

    /// <summary>Bias, angle of conduction and lost drive of one resistor.</summary>
    public static Worksheet WorkingPoint { get; } = new(
        "base-return", "transmitter", SourceRef.Derived("base current through the resistor, sine drive; the largest bias is common practice"),
        [
            new("base-resistor", QuantityKind.Resistance, 33),
            new("collector-current", QuantityKind.Current, 0.164),
            new("least-gain", QuantityKind.Number, 63, 1, 1e5),
            DrivePeak,
            new("base-emitter", QuantityKind.Voltage, 0.7),
        ],
        v => Answer(BaseReturn.Of(v.Ohm("base-resistor"), v.Ampere("collector-current"), v["least-gain"], v.Volt("drive-peak"), v.Volt("base-emitter"))));

    /// <summary>Drive needed on another frequency or with another resistor: a trend.</summary>
    public static Worksheet Trend { get; } = new(
        "base-return-trend", "transmitter", SourceRef.Derived("drive split between resistor and transistor; a trend, not a promise"),
        [
            new("known-frequency", QuantityKind.Frequency, 10.12e6),
            new("known-drive", QuantityKind.Power, 0.08),
            new("known-resistor", QuantityKind.Resistance, 33),
            DrivePeak,
            TransmitterWorksheets.LowFrequencyGain with { DefaultSi = 63 },
            new("transition", QuantityKind.Frequency, 190e6),
            new("new-frequency", QuantityKind.Frequency, 14.06e6),
            new("new-resistor", QuantityKind.Resistance, 33),
            new("available-drive", QuantityKind.Power, 0.094),
        ],
        v => BaseReturnGain.TryCreate(v.Hertz("known-frequency"), v.Watt("known-drive"), v.Ohm("known-resistor"), v.Volt("drive-peak"), new CurrentGain(v["low-frequency-gain"], v.Hertz("transition")), out var model)
            ? Of([.. Trends(v, model!)])
            : Conflict("worksheet-conflict.drive-all-lost", "known-drive", "known-resistor", "drive-peak"));

    private static Outcome<WorksheetAnswer> Answer(BaseReturn result)
    {
        List<Figure> figures =
        [
            Figure.Of("bias", QuantityKind.Voltage, result.Bias.Volt),
            Figure.Of("reverse-peak", QuantityKind.Voltage, result.ReversePeak.Volt),
            Figure.Of("drive-lost", result.DriveLost),
        ];
        if (result.Conduction is not { } angle) return Judged("worksheet-verdict.does-not-conduct", figures);
        figures.Insert(1, Figure.Of("conduction-angle", QuantityKind.Angle, angle.Degrees));
        return Judged(result.Bias <= BaseReturn.UsualBiasLimit ? "worksheet-verdict.bias-usual" : "worksheet-verdict.bias-high", figures);
    }

    private static IEnumerable<Figure> Trends(WorksheetValues v, BaseReturnGain model)
    {
        var (known, moved) = (v.Hertz("known-frequency"), v.Hertz("new-frequency"));
        yield return Figure.Of("drive-needed", model.DriveNeeded(moved, v.Ohm("new-resistor")));
        yield return Figure.Of("gain-lost-by-moving", model.LostByMoving(known, moved));
        yield return Figure.Of("gain-bought", model.Bought(v.Ohm("known-resistor"), v.Ohm("new-resistor")));
        yield return Figure.Of("drive-missing", model.Missing(v.Watt("available-drive"), moved, v.Ohm("new-resistor")));
        if (model.ReturnFor(v.Watt("available-drive"), moved) is { } enough) yield return Figure.Of("resistor-that-suffices", enough);
    }
}
