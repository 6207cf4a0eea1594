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
    public static IReadOnlyList<Alternative> Of(StageDocument document, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf)
    {
        var task = LowPassTask.Of(document, from, to, demands, shelf);
        return Ranked(task.Cores.SelectMany(core => new[] { false, true }.Select(pairs => task.Quick(core, pairs))).OfType<Alternative>());
    }

    /// <summary>The whole window, mirrored or not, the best of each core ranked by what 95 of 100 boards reach.</summary>
    public static IReadOnlyList<Alternative> Thoroughly(ThoroughSearch search, IProgress<double>? progress, CancellationToken cancellation)
    {
        var task = LowPassTask.Of(search.Stage, search.From, search.To, search.Demands, search.Shelf);
        var found = new List<Alternative>();
        for (var i = 0; i < task.Cores.Count; i++)
            found.AddRange(task.Thorough(task.Cores[i], search.Seed, Part(progress, i, task.Cores.Count), cancellation));
        return Ranked(found);
    }

    private static IReadOnlyList<Alternative> Ranked(IEnumerable<Alternative> found) =>
    [
        .. found
            .OrderByDescending(a => a.WorstMargin.Si >= 0)
            .ThenByDescending(a => a.InStock)
            .ThenByDescending(a => a.FitsPlaces)
            .ThenByDescending(a => Math.Round(a.WorstMargin.Si, 1))
            .ThenBy(a => a.Figures.First(f => f.Name == "capacitors").Si),
    ];

    private static Progress<double>? Part(IProgress<double>? whole, int part, int parts) =>
        whole is null ? null : new Progress<double>(share => whole.Report((part + share) / parts));

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
}
