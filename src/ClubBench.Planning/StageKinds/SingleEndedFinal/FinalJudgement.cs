using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.SingleEndedFinal;

/// <summary>What a single-ended final has to say: power, gain on the new band, device, choke, coupling. Limits: common practice.</summary>
internal static class FinalJudgement
{
    /// <summary>A change of gain that nobody has to look at.</summary>
    private const double UnnoticedDb = 1;

    /// <summary>Resistors tried for the base return when gain falls, and when it rises.</summary>
    public static readonly double[] Upward = [47, 68];
    public static readonly double[] Downward = [27, 22];

    public static IReadOnlyList<Finding> Of(FinalStage stage, FinalModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key) =>
        [.. Power(model, demands, key), .. Gain(stage, model, key), .. Device(stage, model, key), .. Choke(stage, model, key), .. Coupling(stage, surroundings, key)];

    private static IEnumerable<Finding> Power(FinalModel model, IReadOnlyList<Demand> demands, string key)
    {
        if (demands.FirstOrDefault(d => d.Code == DemandCodes.OutputPower) is not { } asked || asked.Wanted.Si <= model.Output.Watt * 1.25) yield break;
        yield return new Finding("final.too-little-power", Severity.Warning, key, null, [Figure.Of("output", model.Output), asked.Wanted with { Name = "wanted" }], StageAction.Check, OpenItemCodes.DeviceGain);
    }

    /// <summary>What each base return would buy, and what stays missing (up) or to spare (down).</summary>
    private static IEnumerable<Finding> Gain(FinalStage stage, FinalModel model, string key)
    {
        var lost = model.Lost.Db;
        if (Math.Abs(lost) <= UnnoticedDb) yield break;
        var figures = new List<Figure>
        {
            Figure.Of("lost", QuantityKind.Decibels, Math.Abs(lost)) with { Digits = 2 },
            Figure.Of("gain", model.Gain(model.At)),
            Figure.Of("drive", model.DriveFor(model.Output, model.At)),
        };
        if (stage.Transition is { } ft) figures.Add(Figure.Of("transition-ratio", QuantityKind.Number, ft / model.At));
        foreach (var ohm in lost > 0 ? Upward : Downward)
            if (model.Bought(Resistance.FromOhm(ohm)) is { } bought)
            {
                figures.Add(Figure.Of($"bought-{ohm:0}", QuantityKind.Decibels, Math.Abs(bought.Db)) with { Digits = 2 });
                figures.Add(Figure.Of($"left-{ohm:0}", QuantityKind.Decibels, Math.Abs(lost) - Math.Abs(bought.Db)) with { Digits = 2 });
            }

        yield return new Finding(lost > 0 ? "final.gain-falls" : "final.gain-rises", Severity.Warning, key, stage.BaseReturn.Designator, figures, StageAction.Check);
    }

    private static IEnumerable<Finding> Device(FinalStage stage, FinalModel model, string key)
    {
        IReadOnlyList<Figure> figures = stage.TransitionForVerdict is { } ft ? [Figure.Of("transition", ft), Figure.Of("ratio", QuantityKind.Number, ft / model.At), Figure.Of("at", model.At)] : [];
        switch (CurrentGain.Suitability(stage.TransitionForVerdict, model.At))
        {
            case FrequencySuitability.Unsuitable:
                yield return new Finding("final.device-too-slow", Severity.Fault, key, stage.Transistor.Designator, figures, StageAction.Change, OpenItemCodes.DeviceGain);
                break;
            case FrequencySuitability.LowGainFinalOnly:
                yield return new Finding("final.device-little-gain", Severity.Warning, key, stage.Transistor.Designator, figures, StageAction.Check, OpenItemCodes.DeviceGain);
                break;
            case FrequencySuitability.Unknown:
                yield return new Finding("final.device-unknown", Severity.Warning, key, stage.Transistor.Designator, figures, StageAction.Check, OpenItemCodes.DeviceGain);
                break;
        }
    }

    private static IEnumerable<Finding> Choke(FinalStage stage, FinalModel model, string key)
    {
        if (model.Choke is { } z)
        {
            var judged = ChokeJudgement.Of(z, FinalStage.Load);
            IReadOnlyList<Figure> figures = [Figure.Of("impedance", QuantityKind.Resistance, z.Magnitude), Figure.Of("ratio", QuantityKind.Number, judged.ImpedanceRatio) with { Digits = 2 }];
            if (judged.Verdict == Calculation.Broadband.Verdict.Change)
                yield return new Finding("final.choke-too-small", Severity.Fault, key, stage.Choke.Designator, figures, StageAction.Change, OpenItemCodes.ChokeReactance);
            else if (judged.Verdict == Calculation.Broadband.Verdict.Check)
                yield return new Finding("final.choke-small", Severity.Warning, key, stage.Choke.Designator, figures, StageAction.Check);
        }

        if (model.BiasShare is not { } share) yield break;
        IReadOnlyList<Figure> bias = [Figure.Of("share", QuantityKind.Ratio, share), Figure.Of("current", model.SupplyCurrent)];
        if (FluxDensity.JudgeBias(share) == CoreLoad.Refuse)
            yield return new Finding("final.choke-saturates", Severity.Fault, key, stage.Choke.Designator, bias, StageAction.Change, OpenItemCodes.ChokeReactance);
        else if (FluxDensity.JudgeBias(share) == CoreLoad.Check)
            yield return new Finding("final.choke-biased", Severity.Warning, key, stage.Choke.Designator, bias, StageAction.Check);
    }

    private static IEnumerable<Finding> Coupling(FinalStage stage, Surroundings surroundings, string key)
    {
        if (stage.Coupling?.Value(PartValue.Capacitance) is not { } farad) yield break;
        var capacitor = Capacitance.FromFarad(farad);
        var both = FinalStage.Load * 2;
        if (CouplingCapacitor.Judge(capacitor, surroundings.Band.Low, both) == Calculation.Broadband.Verdict.Leave) yield break;
        var loss = CouplingCapacitor.Loss(capacitor, surroundings.Band.Low, both);
        var wanted = CouplingCapacitor.Wanted(surroundings.Band.Low, both);
        var change = CouplingCapacitor.Judge(capacitor, surroundings.Band.Low, both) == Calculation.Broadband.Verdict.Change;
        yield return new Finding("coupling.too-small", Severity.Warning, key, stage.Coupling.Designator, [Figure.Of("loss", loss), Figure.Of("wanted", wanted)], change ? StageAction.Change : StageAction.Check, change ? OpenItemCodes.CouplingCapacitors : null);
    }
}
