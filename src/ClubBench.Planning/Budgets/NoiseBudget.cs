using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Budgets;

/// <summary>Receiver noise against the noise of the site: does the receiver need a preamplifier there?
/// Method: Friis cascade, then the degradation of ITU-R P.372, judged at the quiet hour. Direct conversion hears noise in both audio images, so its
/// single-sideband figure counts 3.01 dB less.</summary>
public sealed class NoiseBudget : IChainBudget
{
    private static readonly Resistance System = Resistance.FromOhm(50);

    /// <summary>A loss below this nobody hears or measures.</summary>
    private static readonly Decibels Noticeable = Decibels.FromDb(0.1);

    /// <inheritdoc/>
    public string Id => "noise";

    /// <inheritdoc/>
    public IEnumerable<Demand> Ask(string stage, Chain chain) => [];

    /// <inheritdoc/>
    public Budget Check(Chain chain)
    {
        var rows = chain.Paths.Receive.Stages.Select(s => (Stage: s, Noise: NoiseOf(s, chain))).Where(r => r.Noise is not null).ToList();
        if (rows.Count == 0 || rows.All(r => chain.Facet<IAddsNoise>(r.Stage) is null)) return new Budget(Id, [], []);
        var total = Cascade.NoiseFigure([.. rows.Select(r => r.Noise!)]);
        var heard = Heard(total, chain.Kit);
        var judgement = PreamplifierNeed.Judge(heard, chain.Conditions.Site, chain.Conditions.Reference);
        IReadOnlyList<Figure> figures =
        [
            Figure.Of("noise-figure", total),
            Figure.Of("counted", heard),
            Figure.Of("site-noise", judgement.Quiet.Figure),
            Figure.Of("degradation", judgement.AtQuietHour),
            Figure.Of("degradation-median", judgement.AtMedian),
            Figure.Of("largest", judgement.LargestNoiseFigureAndLoss),
        ];
        var lines = rows.Select(r => new BudgetLine(r.Stage, [Figure.Of("receive-gain", r.Noise!.Gain), Figure.Of("noise-figure", r.Noise.NoiseFigure)]));
        return new Budget(Id, [.. lines, new BudgetLine("", [.. figures.Where(IsWorthSaying)])], [FindingOf(judgement.Verdict, rows[0].Stage, figures)]);
    }

    /// <summary>A degradation nobody notices is not written as nothing: the finding says it in words.</summary>
    private static bool IsWorthSaying(Figure figure) => figure.Name is not ("degradation" or "degradation-median") || figure.Si >= Noticeable.Db;

    private static Decibels Heard(Decibels noiseFigure, Kit kit) =>
        kit.Scheme.Kind == SchemeKind.DirectConversion ? Decibels.FromDb(Math.Max(noiseFigure.Db - PreamplifierNeed.DirectConversionCredit.Db, 0)) : noiseFigure;

    private static Finding FindingOf(PreamplifierVerdict verdict, string stage, IReadOnlyList<Figure> figures) => verdict switch
    {
        PreamplifierVerdict.NotNeeded when figures.Single(f => f.Name == "degradation").Si < Noticeable.Db =>
            new Finding("budget.preamplifier-nothing-lost", Severity.Note, stage, null, [.. figures, Figure.Of("noticeable", Noticeable)], StageAction.Keep),
        PreamplifierVerdict.NotNeeded => new Finding("budget.preamplifier-not-needed", Severity.Note, stage, null, figures, StageAction.Keep),
        PreamplifierVerdict.Adequate => new Finding("budget.preamplifier-adequate", Severity.Note, stage, null, figures, StageAction.Keep),
        PreamplifierVerdict.Marginal => new Finding("budget.preamplifier-marginal", Severity.Warning, stage, null, figures, StageAction.Keep),
        _ => new Finding("budget.preamplifier-needed", Severity.Warning, stage, null, figures, StageAction.Keep),
    };

    private static ReceiverStage? NoiseOf(string stage, Chain chain)
    {
        var at = chain.Conditions.Reference;
        if (chain.Facet<IAddsNoise>(stage) is { } noisy) return new ReceiverStage(noisy.ReceiveGain(at), noisy.NoiseFigure(at));
        if (chain.Facet<IPasses>(stage) is not { } passive) return null;
        var loss = passive.At(at).Loss(System, System);
        return new ReceiverStage(-loss, Decibels.FromDb(Math.Max(loss.Db, 0)));
    }
}
