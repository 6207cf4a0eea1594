using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Gain, input and stability of a common-emitter stage. Resistors of zero are left out.</summary>
internal static class DeviceGainSheet
{
    public static Worksheet Sheet { get; } = new(
        "device-gain", "transmitter", new("gray-meyer", "hybrid-pi model", SourceStatus.Published),
        [
            new("collector-current", QuantityKind.Current, 20e-3),
            TransmitterWorksheets.LowFrequencyGain,
            new("transition", QuantityKind.Frequency, 300e6),
            new("feedback-capacitance", QuantityKind.Capacitance, 3.5e-12),
            new("spreading-resistance", QuantityKind.Resistance, 20),
            new("base-shunt", QuantityKind.Resistance, 22, 0),
            new("emitter-resistor", QuantityKind.Resistance, 0, 0),
            new("collector-feedback", QuantityKind.Resistance, 0, 0),
            new("source", QuantityKind.Resistance, 50),
            new("load", QuantityKind.Resistance, 200),
            new("frequency", QuantityKind.Frequency, 7e6),
        ],
        v => HybridPi.TryCreate(v.Ampere("collector-current"), new(v["low-frequency-gain"], v.Hertz("transition")), v.Farad("feedback-capacitance"), v.Ohm("spreading-resistance"), out var model)
            ? Answer(v, model!.At(v.Hertz("frequency"), new StageResistors(v.OhmIfAny("base-shunt"), v.OhmIfAny("emitter-resistor"), v.OhmIfAny("collector-feedback"))))
            : Conflict("worksheet-conflict.device-contradicts", "collector-current", "transition", "feedback-capacitance"));

    private static Outcome<WorksheetAnswer> Answer(WorksheetValues v, AdmittanceTwoPort stage)
    {
        var input = stage.InputImpedance(v.Ohm("load"));
        return Judged(
            stage.IsUnconditionallyStable ? "worksheet-verdict.stable" : "worksheet-verdict.may-oscillate",
            Figure.Of("stage-gain", stage.TransducerGain(v.Ohm("source"), v.Ohm("load"))),
            Figure.Of("stability-factor", QuantityKind.Number, stage.StabilityFactor),
            Figure.Of("input-resistance", QuantityKind.Resistance, input.Real),
            Figure.Of("input-reactance", QuantityKind.Resistance, input.Imaginary));
    }
}
