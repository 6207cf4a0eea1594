using System.Collections.Immutable;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>One buildable filter and what it does.</summary>
/// <param name="Design">The filter with its real values.</param>
/// <param name="Capacitors">Parts of each capacitor place, in ladder order.</param>
/// <param name="Coils">Turns of each coil place, in ladder order.</param>
/// <param name="Figures">What it does with the Qs of the question.</param>
/// <param name="LosslessMargin">The margin of lossless parts, by which the search ranks.</param>
public sealed record LowPassCombination(
    LowPassDesign Design,
    IReadOnlyList<CapacitorChoice> Capacitors,
    IReadOnlyList<CoilChoice> Coils,
    LowPassFigures Figures,
    Decibels LosslessMargin);

/// <summary>How a search for real values ended.</summary>
public enum LowPassSearchEnding
{
    /// <summary>Nothing was tried.</summary>
    Unknown,

    /// <summary>The best combination meets every requirement.</summary>
    Met,

    /// <summary>The best combination is the nearest attempt: its smallest margin is below zero.</summary>
    FallsShort,

    /// <summary>A place has no candidate at all.</summary>
    PlaceWithoutCandidate,
}

/// <summary>Answer of the search.</summary>
/// <param name="Ending">Whether the best one meets the requirements.</param>
/// <param name="Best">Ranked combinations, best first; the nearest attempts where none meets the requirements; empty where a place has no candidate.</param>
/// <param name="Tried">Combinations compared.</param>
/// <param name="Exhausted">Whether every combination of the candidates was covered, so that the first is the true best of them.</param>
/// <param name="EmptyPlace">Place of the ladder, 0 nearest the source, that has no candidate; null where all have.</param>
public sealed record LowPassSearchResult(
    LowPassSearchEnding Ending, ImmutableArray<LowPassCombination> Best, long Tried, bool Exhausted, int? EmptyPlace);

/// <summary>Finds the real parts that make the best filter out of given candidates.</summary>
/// <remarks>
/// Method: meet in the middle. All left and all right halves are multiplied out once, then one product per pair gives
/// the lossless response at every frequency asked for; the best are told again with the Qs.
/// Margin = smallest of return loss and harmonic attenuations, each above its wanted value.
/// Within 0.1 dB of margin: fewer capacitors, fewer different values, equal turns, parts in stock.
/// Valid: low-pass ladders; exhaustive within the candidates unless told otherwise.
/// Source: derived.
/// </remarks>
public static class LowPassSearch
{
    /// <summary>Runs the search. Long ones tell how far they are, from 0 to 1, and can be cancelled (throws <see cref="OperationCanceledException"/>).</summary>
    public static LowPassSearchResult Run(LowPassSearchInput input, IProgress<double>? progress = null, CancellationToken cancellation = default)
    {
        Check(input);
        var places = CandidatePlaces.Of(input);
        if (places.FirstEmpty is { } empty) return new(LowPassSearchEnding.PlaceWithoutCandidate, [], 0, true, empty);
        var covered = places.ThinnedTo(input.MostCombinations);
        var ranking = new LosslessRanking(input, covered);
        var best = ranking.Best(progress, cancellation).Select(c => Told(input, covered, c.Choice, c.MarginDb)).ToList();
        var ranked = Ranked(best);
        var ending = ranked[0].Figures.Margin >= Decibels.Zero ? LowPassSearchEnding.Met : LowPassSearchEnding.FallsShort;
        return new(ending, ranked, covered.Combinations, ReferenceEquals(covered, places), null);
    }

    private static void Check(LowPassSearchInput input)
    {
        Guard.Within(input.Keep, 1, 1000, nameof(input.Keep));
        Guard.Within(input.PassPoints, 2, 201, nameof(input.PassPoints));
        if (input.Capacitors.Count != input.Exact.Capacitors.Length || input.Coils.Count != input.Exact.Coils.Length)
            throw new ArgumentException("Every place of the design needs its own list of candidates.", nameof(input));
    }

    private static LowPassCombination Told(LowPassSearchInput input, CandidatePlaces places, int[] choice, double marginDb)
    {
        var (capacitors, coils) = places.Parts(choice);
        var design = input.Exact with { Capacitors = [.. capacitors.Select(c => c.Value)], Coils = [.. coils.Select(l => l.Value)] };
        var figures = LowPassFigures.Of(design, input.Requirement, input.CoilQ, input.CapacitorQ, input.PassPoints);
        return new(design, capacitors, coils, figures, Decibels.FromDb(marginDb));
    }

    private static ImmutableArray<LowPassCombination> Ranked(List<LowPassCombination> found)
    {
        var top = found.Max(c => c.Figures.Margin.Db);
        return [.. found.OrderBy(c => (int)Math.Floor((top - c.Figures.Margin.Db) / 0.1))
            .ThenBy(c => c.Capacitors.Sum(p => p.Parts))
            .ThenBy(c => c.Capacitors.SelectMany(p => new[] { p.First, p.Second ?? p.First }).Distinct().Count())
            .ThenBy(c => c.Coils.Select(l => l.Turns).Distinct().Count())
            .ThenBy(c => c.Capacitors.Sum(p => p.StockRank))
            .ThenByDescending(c => c.Figures.Margin)];
    }
}
