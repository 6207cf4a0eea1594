using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;

namespace ClubBench.Calculation.CrystalFilters;

/// <summary>What crystals that differ do to a filter, against equal ones at their mean.</summary>
/// <param name="Equal">The filter with equal crystals.</param>
/// <param name="Actual">The filter with the crystals as they are; null where they tear the pass-band apart.</param>
public sealed record CrystalSpread(CrystalFilterResponse Equal, CrystalFilterResponse? Actual)
{
    /// <summary>Loss the spread adds; null without a pass-band.</summary>
    public Decibels? ExtraLoss => Actual?.Loss - Equal.Loss;

    /// <summary>Width the spread adds or, below zero, takes, Hz; null without a pass-band.</summary>
    public double? WidthChangeHertz => Actual?.Width3dBHertz - Equal.Width3dBHertz;

    /// <summary>
    /// Compares a filter built from measured crystals, one per mesh in order, with one of equal crystals at their mean; null where not even that
    /// has a pass-band of about the bandwidth. Method: analysis of both. Source: derived.
    /// </summary>
    public static CrystalSpread? Of(CrystalFilter filter, IReadOnlyList<Frequency> measured, Frequency bandwidth)
    {
        var mean = Frequency.FromHertz(measured.Average(f => f.Hertz));
        return CrystalFilterResponse.Of(filter.WithResonances([.. measured.Select(_ => mean)]), bandwidth) is { } equal
            ? new(equal, CrystalFilterResponse.Of(filter.WithResonances(measured), bandwidth))
            : null;
    }
}

/// <summary>What a spread does to many filters built from one drawer.</summary>
/// <param name="Builds">How many were tried.</param>
/// <param name="WithPassBand">How many of them have a single pass-band of about the bandwidth.</param>
/// <param name="ExtraLoss">Loss that nine out of ten of those stay within, against equal crystals.</param>
/// <param name="Ripple">Ripple that nine out of ten of those stay within.</param>
/// <param name="NarrowestHertz">Width at 3 dB that nine out of ten of those exceed, Hz.</param>
public sealed record CrystalSpreadTrial(int Builds, Proportion WithPassBand, Decibels ExtraLoss, Decibels Ripple, double NarrowestHertz)
{
    /// <summary>
    /// Builds filters with crystals drawn evenly from a spread (0 or above, Hz, highest less lowest) around those of <paramref name="filter"/>; null where none
    /// has a pass-band. The same seed gives the same answer. Method: Monte Carlo. Valid: 20 to 10 000 builds. Source: derived.
    /// </summary>
    public static CrystalSpreadTrial? Of(CrystalFilter filter, Frequency bandwidth, double spreadHertz, ulong seed, int builds = 200)
    {
        Guard.NotNegative(spreadHertz, nameof(spreadHertz));
        var random = new SeededRandom(seed);
        var equal = CrystalFilterResponse.Of(filter, bandwidth);
        var found = Enumerable.Range(0, Guard.Within(builds, 20, 10_000, nameof(builds)))
            .Select(_ => CrystalFilterResponse.Of(filter.WithResonances(Drawn(filter, spreadHertz, random)), bandwidth)).OfType<CrystalFilterResponse>().ToList();
        return equal is null || found.Count == 0 ? null : new(
            builds,
            new Proportion(found.Count, builds),
            Decibels.FromDb(NinthTenth(found.Select(r => r.Loss.Db)) - equal.Loss.Db),
            Decibels.FromDb(NinthTenth(found.Select(r => r.Ripple.Db))),
            -NinthTenth(found.Select(r => -r.Width3dBHertz)));
    }

    private static List<Frequency> Drawn(CrystalFilter filter, double spreadHertz, SeededRandom random) =>
        [.. filter.Meshes.Select(m => Frequency.FromHertz(m.Crystal.SeriesResonance.Hertz + random.Uniform(-0.5 * spreadHertz, 0.5 * spreadHertz)))];

    private static double NinthTenth(IEnumerable<double> values)
    {
        var sorted = values.Order().ToList();
        return sorted[(int)Math.Ceiling(0.9 * sorted.Count) - 1];
    }
}
