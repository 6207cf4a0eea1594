using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Worksheets;

/// <summary>Amplifiers and what leaves the antenna.</summary>
internal static class TransmitterWorksheets
{
    public static IReadOnlyList<Worksheet> All { get; } =
    [
        new("output-stage", "transmitter", SourceRef.Derived(), [new("supply", QuantityKind.Voltage, 11.65), new("saturation", QuantityKind.Voltage, 0.8, MayBeZero: true), new("load", QuantityKind.Resistance, 50), new("efficiency", QuantityKind.Ratio, 0.6), new("drive", QuantityKind.Power, 0.08, MayBeZero: true)], v =>
        {
            var stage = new OutputStage(Voltage.FromVolt(v["supply"]), Voltage.FromVolt(v["saturation"]));
            var output = stage.Power(Resistance.FromOhm(v["load"]));
            return [Figure.Of("output", output), Figure.Of("direct-current", stage.DirectCurrent(output, v["efficiency"])), Figure.Of("dissipation", OutputStage.Dissipation(output, v["efficiency"], Power.FromWatt(v["drive"])))];
        }),
        new("current-gain", "transmitter", SourceRef.Derived(), [new("low-frequency-gain", QuantityKind.Number, 100), new("transition", QuantityKind.Frequency, 190e6), new("frequency", QuantityKind.Frequency, 14.06e6)], v =>
            [Figure.Of("gain-there", QuantityKind.Number, new CurrentGain(v["low-frequency-gain"], Frequency.FromHertz(v["transition"])).At(Frequency.FromHertz(v["frequency"])))]),
        new("coupling-capacitor", "transmitter", SourceRef.Derived(), [new("capacitance", QuantityKind.Capacitance, 100e-9), new("frequency", QuantityKind.Frequency, 7.03e6), new("source-plus-load", QuantityKind.Resistance, 100)], v =>
            [Figure.Of("loss", CouplingCapacitor.Loss(Capacitance.FromFarad(v["capacitance"]), Frequency.FromHertz(v["frequency"]), Resistance.FromOhm(v["source-plus-load"])))]),
        new("emission-limit", "transmitter", SourceRef.CommonPractice("the figure of the set; the licence decides"), [new("power", QuantityKind.Power, 1.1), new("frequency", QuantityKind.Frequency, 14.06e6)], v =>
            EmissionLimitSet.Find(TargetDefaults.LimitSetId)?.Required(Power.FromWatt(v["power"]), Frequency.FromHertz(v["frequency"])).Attenuation is { } wanted ? [Figure.Of("limit", wanted)] : null),
    ];
}
