using ClubBench.Calculation.Devices;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.TunedDriver;

/// <summary>What a tuned driver has to say: does the tank reach the band, is there drive enough, has the device gain left.</summary>
internal static class DriverJudgement
{
    /// <summary>Missing drive nobody hears.</summary>
    private const double UnnoticedDb = 1;

    public static IReadOnlyList<Finding> Of(DriverStage stage, DriverModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key) =>
        [.. Tank(stage, model, surroundings, key), .. Drive(stage, model, demands, key), .. Device(stage, model, key)];

    private static IEnumerable<Finding> Tank(DriverStage stage, DriverModel model, Surroundings surroundings, string key)
    {
        IReadOnlyList<Figure> figures =
        [
            Figure.Of("low", model.Tank.Lowest) with { Digits = 4 },
            Figure.Of("high", model.Tank.Highest) with { Digits = 4 },
            Figure.Of("needed", model.Needed),
            Figure.Of("least", model.Tank.Least),
            Figure.Of("most", model.Tank.Most),
        ];
        var travel = model.Tank.WorstTravel(surroundings.Band);
        if (travel < 0)
            yield return new Finding("driver.out-of-tune", Severity.Fault, key, stage.Winding.Designator, figures, StageAction.Change, OpenItemCodes.TunedCircuit);
        else if (travel < TunablePlace.ComfortableShare)
            yield return new Finding("driver.trimmer-near-end", Severity.Warning, key, stage.Trimmer.Designator, figures, StageAction.Check);
    }

    private static IEnumerable<Finding> Drive(DriverStage stage, DriverModel model, IReadOnlyList<Demand> demands, string key)
    {
        if (demands.FirstOrDefault(d => d.Code == DemandCodes.OutputPower) is not { } asked) yield break;
        var missing = 10 * Math.Log10(asked.Wanted.Si / model.Available.Watt);
        if (missing <= UnnoticedDb) yield break;
        yield return new Finding(
            "driver.too-little-drive",
            Severity.Warning,
            key,
            stage.Winding.Designator,
            [Figure.Of("given", model.Available), asked.Wanted with { Name = "wanted" }, Figure.Of("missing-drive", QuantityKind.Decibels, missing) with { Digits = 2 }],
            StageAction.Change);
    }

    private static IEnumerable<Finding> Device(DriverStage stage, DriverModel model, string key)
    {
        var ft = Transistors.Find(stage.Transistor.Type)?.TransitionFrequencyForVerdict;
        IReadOnlyList<Figure> figures = ft is { } f ? [Figure.Of("ratio", QuantityKind.Number, f / model.At) with { Digits = 2 }, Figure.Of("at", model.At)] : [];
        if (CurrentGain.Suitability(ft, model.At) is FrequencySuitability.Unsuitable)
            yield return new Finding("driver.device-too-slow", Severity.Fault, key, stage.Transistor.Designator, figures, StageAction.Change, OpenItemCodes.DeviceGain);
        else if (CurrentGain.Suitability(ft, model.At) is FrequencySuitability.LowGainFinalOnly)
            yield return new Finding("driver.device-little-gain", Severity.Warning, key, stage.Transistor.Designator, figures, StageAction.Check);
    }
}
