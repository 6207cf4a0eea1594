using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>How many of many boards meet the readings' windows with parts as they come: capacitors and the core batch within 5 %, coil to coil within 2 % (common practice).</summary>
internal static class LowPassYield
{
    private const int Trials = 10_000;
    private static readonly PartScatter Scatter = new(0.05, 0.05, 0.02);

    public static BoardYield Of(LowPassStage stage, Surroundings surroundings, IReadOnlyList<Demand> demands, ulong seed)
    {
        var requirement = RequirementOf(stage, surroundings, demands);
        var cores = stage.Coils.Select(c => c.Type).Distinct(StringComparer.Ordinal).ToList();
        var input = new LadderYieldInput(stage.Design(surroundings.Learnt), requirement, ScatterOf(stage, surroundings.Learnt), seed, stage.CoilQ, stage.CapacitorQ)
        {
            Trials = Trials,
            CoreBatches = [.. stage.Coils.Select(c => cores.IndexOf(c.Type))],
        };
        var passed = LadderYield.Of(input).Passed;
        var (low, high) = passed.Interval();
        return new BoardYield(passed.Share, low, high, Trials, seed, RequirementFigures(requirement), ToleranceFigures(input.Scatter));
    }

    /// <summary>What the readings of a good board allow: the reading's return loss window, and the second harmonic within its window or what the limit asks, whichever is more.</summary>
    private static LowPassRequirement RequirementOf(LowPassStage stage, Surroundings surroundings, IReadOnlyList<Demand> demands)
    {
        var model = new LowPassModel(stage, surroundings);
        var needed = demands.Where(d => d.Code == DemandCodes.HarmonicAttenuation).Select(d => d.Wanted.Si).DefaultIfEmpty(0).Max();
        var second = Math.Max(needed, model.Second.Db - LowPassReadings.HarmonicRoomDb);
        return new LowPassRequirement(surroundings.Band, Decibels.FromDb(LowPassReadings.LeastReturnLossDb(model)), [new HarmonicRequirement(2, Decibels.FromDb(second))]);
    }

    /// <summary>A learnt core batch scatters no more than what was learnt.</summary>
    private static PartScatter ScatterOf(LowPassStage stage, LearntValues learnt) =>
        stage.Coils.All(c => learnt.InductanceFactors.ContainsKey(c.Type))
            ? Scatter with { CoreBatch = stage.Coils.Max(c => learnt.InductanceFactors[c.Type].ExpandedUncertainty / learnt.InductanceFactors[c.Type].NanohenryPerTurnSquared) }
            : Scatter;

    private static IReadOnlyList<Figure> RequirementFigures(LowPassRequirement r) =>
        [Figure.Of("return-loss", r.ReturnLoss), .. r.Harmonics.Select(h => Figure.Of("second-harmonic", h.Attenuation))];

    private static IReadOnlyList<Figure> ToleranceFigures(PartScatter s) =>
    [
        Figure.Of("capacitor-tolerance", QuantityKind.Ratio, s.Capacitor),
        Figure.Of("core-batch-tolerance", QuantityKind.Ratio, s.CoreBatch),
        Figure.Of("coil-tolerance", QuantityKind.Ratio, s.Coil),
    ];
}
