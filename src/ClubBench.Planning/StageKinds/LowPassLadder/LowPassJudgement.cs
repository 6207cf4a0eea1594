using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>What a low-pass ladder has to say: does the band pass, is it matched, are the harmonics held. Limits: common practice.</summary>
internal static class LowPassJudgement
{
    /// <summary>Loss beyond which the final runs hot on what does not get out.</summary>
    public const double MostLossDb = 0.6;

    /// <summary>Return loss that a final of this power hardly feels (standing wave ratio 1.4).</summary>
    public const double LeastReturnLossDb = 15;

    /// <summary>Return loss aimed at when parts are chosen.</summary>
    public const double WantedReturnLossDb = 20;

    public static IReadOnlyList<Finding> Of(LowPassModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key) =>
        [.. Band(model, surroundings, key), .. Harmonics(model, demands, key)];

    private static IEnumerable<Finding> Band(LowPassModel model, Surroundings surroundings, string key)
    {
        IReadOnlyList<Figure> figures =
        [
            Figure.Of("loss", model.WorstLoss),
            Figure.Of("share", QuantityKind.Ratio, 1 / model.WorstLoss.PowerRatio),
            Figure.Of("return-loss", model.WorstReturnLoss),
            Figure.Of("at", surroundings.Reference),
        ];
        if (model.WorstLoss.Db > MostLossDb)
            yield return new Finding("filter.blocks-band", Severity.Fault, key, null, figures, StageAction.Change, OpenItemCodes.OutputFilter);
        else if (model.WorstReturnLoss.Db < LeastReturnLossDb)
            yield return new Finding("filter.poor-match", Severity.Warning, key, null, figures, StageAction.Change, OpenItemCodes.OutputFilter);
    }

    private static IEnumerable<Finding> Harmonics(LowPassModel model, IReadOnlyList<Demand> demands, string key)
    {
        var short_ = demands.Where(d => d.Code == DemandCodes.HarmonicAttenuation)
            .Select(d => (Demand: d, Given: model.LossAt(d.At) - model.Loss))
            .Select(x => (x.Demand, x.Given, Margin: x.Given.Db - x.Demand.Wanted.Si))
            .OrderBy(x => x.Margin).FirstOrDefault();
        if (short_.Demand is null || short_.Margin >= 0) yield break;
        yield return new Finding(
            "filter.passes-harmonic",
            Severity.Fault,
            key,
            null,
            [Figure.Of("at", short_.Demand.At), Figure.Of("given", short_.Given), short_.Demand.Wanted with { Name = "needed" }],
            StageAction.Change,
            OpenItemCodes.OutputFilter);
    }
}
