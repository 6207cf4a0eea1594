using ClubBench.Calculation.Components;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>Moves a low-pass ladder: scales the designer's own values to the new band, then searches real parts around them, core by core.
/// Ranked by the smallest margin over return loss and harmonics, the wish included.</summary>
internal static class LowPassConversion
{
    /// <summary>Half width of the search window around the exact values; a narrower one hides the optimum.</summary>
    private const double Window = 0.12;

    /// <summary>Tolerance of the parts: a smaller part beside a larger one does nothing to rely on.</summary>
    private const double SmallestShare = 0.05;

    public static IReadOnlyList<Alternative> Of(StageDocument document, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf)
    {
        var stage = LowPassStage.Read(document);
        var exact = Scaled(stage.Design(from.Learnt), from.Reference / to.Reference);
        var requirement = RequirementOf(to, demands);
        return
        [
            .. CoilCores.For(stage.Coils[0], to.Band, shelf)
                .SelectMany(core => new[] { false, true }.Select(pairs => Search(stage, document, exact, requirement, core, pairs, to, shelf)))
                .OfType<Alternative>()
                .OrderByDescending(a => a.WorstMargin.Si >= 0)
                .ThenByDescending(a => a.InStock)
                .ThenByDescending(a => a.FitsPlaces)
                .ThenByDescending(a => Math.Round(a.WorstMargin.Si, 1))
                .ThenBy(a => a.Figures.First(f => f.Name == "capacitors").Si),
        ];
    }

    /// <summary>What the ladder must reach: return loss over the band, and the wished attenuation at each harmonic the demands name.</summary>
    public static LowPassRequirement RequirementOf(Surroundings to, IReadOnlyList<Demand> demands) =>
        new(
            to.Band,
            Decibels.FromDb(LowPassJudgement.WantedReturnLossDb),
            [
                .. demands.Where(d => d.Code == DemandCodes.HarmonicAttenuationWish)
                    .GroupBy(d => (int)Math.Round(d.At / to.Band.Low))
                    .Where(g => g.Key is 2 or 3)
                    .Select(g => new HarmonicRequirement(g.Key, Decibels.FromDb(g.Max(d => d.Wanted.Si)))),
            ]);

    private static LowPassDesign Scaled(LowPassDesign design, double ratio) =>
        design with { Capacitors = [.. design.Capacitors.Select(c => c * ratio)], Coils = [.. design.Coils.Select(l => l * ratio)] };

    private static Alternative? Search(LowPassStage stage, StageDocument document, LowPassDesign exact, LowPassRequirement requirement, ToroidCore core, bool pairs, Surroundings to, Shelf shelf)
    {
        var index = WindingPart.IndexOf(core, to.Learnt);
        var input = new LowPassSearchInput(
            exact,
            [.. exact.Capacitors.Select(c => LowPassCandidates.Capacitors(c, TunedCapacitors.Values(shelf, pairs), Window, pairs, SmallestShare))],
            [.. exact.Coils.Select(l => LowPassCandidates.Coils(l, index))],
            requirement,
            stage.CoilQ,
            stage.CapacitorQ) { Keep = 1, PassPoints = 5, Symmetric = IsSymmetric(exact) };
        var result = LowPassSearch.Run(input);
        return result.Best.IsEmpty ? null : AlternativeOf(stage, document, result, core, pairs, shelf);
    }

    private static bool IsSymmetric(LowPassDesign d) =>
        Mirrored([.. d.Capacitors.Select(c => c.Farad)]) && Mirrored([.. d.Coils.Select(l => l.Henry)]);

    private static bool Mirrored(IReadOnlyList<double> values) =>
        Enumerable.Range(0, values.Count / 2).All(i => Math.Abs((values[i] / values[^(i + 1)]) - 1) < 1e-6);

    private static Alternative AlternativeOf(LowPassStage stage, StageDocument document, LowPassSearchResult result, ToroidCore core, bool pairs, Shelf shelf)
    {
        var best = result.Best[0];
        var parts = stage.Capacitors.Select((c, i) => CapacitorPart.Holding(c, best.Capacitors[i].First, best.Capacitors[i].Second))
            .Concat(stage.Coils.Select((l, i) => l.With((PartValue.Turns, best.Coils[i].Turns), (PartValue.Inductance, null), (PartValue.InductanceFactor, null)) with { Type = core.Designation }))
            .ToList();
        var after = document.With(parts);
        var changes = PartChanges.Between(document, after);
        return new Alternative(
            $"{(pairs ? "pairs" : "singles")}:{core.Designation}",
            after,
            changes,
            Consequences(best, stage, document.Key, parts),
            FiguresOf(best),
            Figure.Of("worst-margin", best.Figures.Margin),
            changes.All(c => Places.Fits(c.After)),
            Stock.Covers(shelf, changes, LowPassLadderKind.DescriptionOf),
            result.Exhausted);
    }

    private static IReadOnlyList<Figure> FiguresOf(LowPassCombination best) =>
    [
        Figure.Of("return-loss", best.Figures.WorstReturnLoss),
        .. best.Figures.Harmonics.Take(1).Select(h => Figure.Of("second-harmonic", h.Attenuation)),
        Figure.Of("loss", best.Figures.WorstPassLoss),
        Figure.Of("capacitors", QuantityKind.Count, best.Capacitors.Sum(c => c.Parts)),
    ];

    private static IReadOnlyList<Finding> Consequences(LowPassCombination best, LowPassStage stage, string key, IReadOnlyList<Part> parts)
    {
        var more = best.Capacitors.Sum(c => c.Parts) - stage.Capacitors.Count;
        var findings = new List<Finding>();
        if (more > 0) findings.Add(new Finding("filter.more-capacitors", Severity.Note, key, null, [Figure.Of("more", QuantityKind.Count, more)], StageAction.Keep));
        var tight = parts.Select(p => WindingPart.Of(p, LearntValues.None)).FirstOrDefault(w => w is { Winding.Fits: false });
        if (tight is not null)
            findings.Add(new Finding("winding.does-not-fit", Severity.Warning, key, tight.Part.Designator, [Figure.Of("capacity", QuantityKind.Count, tight.Winding.Capacity)], StageAction.Keep));
        return findings;
    }
}
