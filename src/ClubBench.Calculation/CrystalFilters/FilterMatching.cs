using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.CrystalFilters;

/// <summary>Filters that can be built from one drawer of crystals.</summary>
/// <param name="Sets">One per filter, the tightest first, each within the limit.</param>
/// <param name="LeftOver">Places in the drawer of the crystals no filter takes, by rising frequency: for carriers and oscillators.</param>
/// <param name="Limit">Largest difference permitted within a filter, Hz.</param>
/// <param name="NextSpreadHertz">Spread of the best set that misses the limit; null where too few crystals are left for one.</param>
public sealed record FilterMatching(IReadOnlyList<MatchedSet> Sets, IReadOnlyList<int> LeftOver, double Limit, double? NextSpreadHertz)
{
    private const double WidestLimitHz = 200;

    /// <summary>Largest difference of the series resonances in a filter, Hz: a tenth of the bandwidth, at most 200 Hz. Source: common practice; check by analysis.</summary>
    public static double LimitFor(Frequency bandwidth) => Math.Min(bandwidth.Hertz / 10, WidestLimitHz);

    /// <summary>
    /// Takes filters of <paramref name="perFilter"/> crystals (2 to 12) for a bandwidth from a drawer.
    /// Method: the tightest window of the sorted resonances first, then again from what is left. Source: derived; the limit is common practice.
    /// </summary>
    public static FilterMatching Of(CrystalBatch drawer, int perFilter, Frequency bandwidth)
    {
        var limit = LimitFor(bandwidth);
        var windows = drawer.MatchAll(Guard.Within(perFilter, 2, 12, nameof(perFilter)));
        var sets = windows.TakeWhile(w => w.SpreadHertz <= limit).ToList();
        var taken = sets.SelectMany(s => s.Indices).ToHashSet();
        return new(
            sets,
            [.. Enumerable.Range(0, drawer.Frequencies.Count).Where(i => !taken.Contains(i)).OrderBy(i => drawer.Frequencies[i])],
            limit,
            windows.Count > sets.Count ? windows[sets.Count].SpreadHertz : null);
    }
}
