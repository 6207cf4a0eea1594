using ClubBench.Planning.Figures;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.SingleTunedFrontEnd;

/// <summary>What a front end has to say: does the trimmer reach the band, is it neither too broad nor too sharp. Limits: common practice.</summary>
internal static class FrontEndJudgement
{
    /// <summary>Below it broadcasters come through.</summary>
    public const double LeastLoadedQ = 4;

    /// <summary>Above it the coil's own loss and the band edges are felt.</summary>
    public const double MostLoadedQ = 25;

    public static IReadOnlyList<Finding> Of(FrontEndStage stage, FrontEndModel model, Surroundings surroundings, string key) =>
        [.. Tuning(stage, model, surroundings, key), .. Width(stage, model, key)];

    private static IEnumerable<Finding> Tuning(FrontEndStage stage, FrontEndModel model, Surroundings surroundings, string key)
    {
        IReadOnlyList<Figure> figures =
        [
            Figure.Of("low", model.Tank.Lowest) with { Digits = 4 },
            Figure.Of("high", model.Tank.Highest) with { Digits = 4 },
            Figure.Of("needed", model.Needed),
            Figure.Of("least", model.Tank.Least),
            Figure.Of("most", model.Tank.Most),
            Figure.Of("loss", model.Loss) with { Digits = 2 },
        ];
        var travel = model.Tank.WorstTravel(surroundings.Band);
        if (travel < 0)
            yield return new Finding("front-end.out-of-tune", Severity.Fault, key, stage.Winding.Designator, figures, StageAction.Change, OpenItemCodes.TunedCircuit);
        else if (travel < TunablePlace.BenchShare)
            yield return new Finding("front-end.trimmer-near-end", Severity.Warning, key, stage.Trimmer.Designator, figures, StageAction.Check);
    }

    private static IEnumerable<Finding> Width(FrontEndStage stage, FrontEndModel model, string key)
    {
        IReadOnlyList<Figure> figures =
        [
            Figure.Of("loaded-q", QuantityKind.Number, model.LoadedQ) with { Digits = 2 },
            Figure.Of("bandwidth", model.Bandwidth) with { Digits = 2 },
            Figure.Of("least-q", QuantityKind.Number, LeastLoadedQ),
            Figure.Of("most-q", QuantityKind.Number, MostLoadedQ),
        ];
        if (model.LoadedQ < LeastLoadedQ)
            yield return new Finding("front-end.too-broad", Severity.Warning, key, stage.Winding.Designator, figures, StageAction.Check);
        else if (model.LoadedQ > MostLoadedQ)
            yield return new Finding("front-end.too-sharp", Severity.Warning, key, stage.Winding.Designator, figures, StageAction.Check);
    }
}
