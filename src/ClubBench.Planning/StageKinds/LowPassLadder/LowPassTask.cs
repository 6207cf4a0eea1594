using ClubBench.Calculation.Components;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>One filter to find real parts for: the designer's values scaled to the band, what must be reached, and the drawers.</summary>
internal sealed record LowPassTask(LowPassStage Stage, StageDocument Document, LowPassDesign Exact, LowPassRequirement Requirement, Surroundings To, Shelf Shelf)
{
    /// <summary>Half width of the search window around the exact values; a narrower one hides the optimum.</summary>
    private const double Window = 0.12;

    /// <summary>Tolerance of the parts: a smaller part beside a larger one does nothing to rely on.</summary>
    private const double SmallestShare = 0.05;

    /// <summary>Boards drawn to rank the best combinations of a thorough search, and how many of those are offered per core.</summary>
    private const int RankingTrials = 1000;
    private const int OfferedPerCore = 2;
    private static readonly PartScatter Scatter = new(0.05, 0.05, 0.02);

    public static LowPassTask Of(StageDocument document, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf)
    {
        var stage = LowPassStage.Read(document);
        return new LowPassTask(stage, document, Scaled(stage.Design(from.Learnt), from.Reference / to.Reference), LowPassConversion.RequirementOf(to, demands), to, shelf);
    }

    /// <summary>Cores worth trying.</summary>
    public IReadOnlyList<ToroidCore> Cores => CoilCores.For(Stage.Coils[0], To.Band, Shelf);

    /// <summary>Bounded search inside the planner: mirrored ladders, few frequencies; null where a place has no candidate.</summary>
    public Alternative? Quick(ToroidCore core, bool pairs)
    {
        var result = LowPassSearch.Run(Input(core, TunedCapacitors.Values(Shelf, pairs), pairs) with { Keep = 1, PassPoints = 5, Symmetric = IsSymmetric });
        return result.Best.IsEmpty ? null : AlternativeOf($"{(pairs ? "pairs" : "singles")}:{core.Designation}", result.Best[0], core, result.Exhausted && !IsSymmetric);
    }

    /// <summary>The whole window of one core.</summary>
    public IReadOnlyList<Alternative> Thorough(ToroidCore core, ulong seed, IProgress<double>? progress, CancellationToken cancellation)
    {
        var result = LowPassSearch.Run(Input(core, TunedCapacitors.Values(Shelf, forPairs: false), pairs: true), progress, cancellation);
        return
        [
            .. result.Best.OrderByDescending(c => MarginOfMostBoards(c, seed, cancellation)).Take(OfferedPerCore)
                .Select((c, i) => AlternativeOf($"thorough:{core.Designation}:{i + 1}", c, core, result.Exhausted)),
        ];
    }

    /// <summary>Margin that 95 of 100 boards reach.</summary>
    private double MarginOfMostBoards(LowPassCombination combination, ulong seed, CancellationToken cancellation)
    {
        cancellation.ThrowIfCancellationRequested();
        return LadderYield.Of(new LadderYieldInput(combination.Design, Requirement, Scatter, seed, Stage.CoilQ, Stage.CapacitorQ) { Trials = RankingTrials }).Margin.Db;
    }

    private LowPassSearchInput Input(ToroidCore core, IReadOnlyList<(Capacitance Value, int StockRank)> values, bool pairs)
    {
        var index = WindingPart.IndexOf(core, To.Learnt);
        return new LowPassSearchInput(
            Exact,
            [.. Exact.Capacitors.Select(c => LowPassCandidates.Capacitors(c, values, Window, pairs, SmallestShare))],
            [.. Exact.Coils.Select(l => LowPassCandidates.Coils(l, index))],
            Requirement,
            Stage.CoilQ,
            Stage.CapacitorQ);
    }

    private bool IsSymmetric => Mirrored([.. Exact.Capacitors.Select(c => c.Farad)]) && Mirrored([.. Exact.Coils.Select(l => l.Henry)]);

    private static bool Mirrored(IReadOnlyList<double> values) =>
        Enumerable.Range(0, values.Count / 2).All(i => Math.Abs((values[i] / values[^(i + 1)]) - 1) < 1e-6);

    private static LowPassDesign Scaled(LowPassDesign design, double ratio) =>
        design with { Capacitors = [.. design.Capacitors.Select(c => c * ratio)], Coils = [.. design.Coils.Select(l => l * ratio)] };

    private Alternative AlternativeOf(string id, LowPassCombination best, ToroidCore core, bool exhaustive)
    {
        var parts = Stage.Capacitors.Select((c, i) => CapacitorPart.Holding(c, best.Capacitors[i].First, best.Capacitors[i].Second))
            .Concat(Stage.Coils.Select((l, i) => l.With((PartValue.Turns, best.Coils[i].Turns), (PartValue.Inductance, null), (PartValue.InductanceFactor, null)) with { Type = core.Designation }))
            .ToList();
        var after = Document.With(parts);
        var changes = PartChanges.Between(Document, after);
        return new Alternative(
            id,
            after,
            changes,
            Consequences(best, parts),
            FiguresOf(best),
            Figure.Of("worst-margin", best.Figures.Margin),
            changes.All(c => Places.Fits(c.After)),
            Stock.Covers(Shelf, changes, LowPassLadderKind.DescriptionOf),
            exhaustive);
    }

    private static IReadOnlyList<Figure> FiguresOf(LowPassCombination best) =>
    [
        Figure.Of("return-loss", best.Figures.WorstReturnLoss),
        .. best.Figures.Harmonics.Take(1).Select(h => Figure.Of("second-harmonic", h.Attenuation)),
        Figure.Of("loss", best.Figures.WorstPassLoss),
        Figure.Of("capacitors", QuantityKind.Count, best.Capacitors.Sum(c => c.Parts)),
    ];

    private IReadOnlyList<Finding> Consequences(LowPassCombination best, IReadOnlyList<Part> parts)
    {
        var more = best.Capacitors.Sum(c => c.Parts) - Stage.Capacitors.Count;
        var findings = new List<Finding>();
        if (more > 0) findings.Add(new Finding("filter.more-capacitors", Severity.Note, Document.Key, null, [Figure.Of("more", QuantityKind.Count, more)], StageAction.Keep));
        var tight = parts.Select(p => WindingPart.Of(p, LearntValues.None)).FirstOrDefault(w => w is { Winding.Fits: false });
        if (tight is not null)
            findings.Add(new Finding("winding.does-not-fit", Severity.Warning, Document.Key, tight.Part.Designator, [Figure.Of("capacity", QuantityKind.Count, tight.Winding.Capacity)], StageAction.Keep));
        return findings;
    }
}
