using ClubBench.Calculation.Quantities;
using MathNet.Numerics.Statistics;

namespace ClubBench.Calculation.Crystals;

/// <summary>Some crystals of a batch that lie close together.</summary>
/// <param name="Indices">Their places in the list they were chosen from, by rising frequency.</param>
/// <param name="SpreadHertz">Highest less lowest, Hz.</param>
public sealed record MatchedSet(IReadOnlyList<int> Indices, double SpreadHertz);

/// <summary>Series resonances of a batch of crystals, in the order they were measured. Source: derived (order statistics).</summary>
/// <param name="Frequencies">One per crystal.</param>
public sealed record CrystalBatch(IReadOnlyList<Frequency> Frequencies)
{
    /// <summary>Mean, Hz.</summary>
    public double MeanHertz => Hertz.Mean();

    /// <summary>Standard deviation with n - 1, Hz; zero for a single crystal.</summary>
    public double StandardDeviationHertz => Frequencies.Count > 1 ? Hertz.StandardDeviation() : 0;

    /// <summary>Crystals further than three standard deviations from the median, the deviation taken robustly from the median of distances.</summary>
    public IReadOnlyList<int> Outliers()
    {
        var median = Hertz.Median();
        var deviation = 1.4826 * Hertz.Select(h => Math.Abs(h - median)).Median();
        return [.. Frequencies.Select((f, i) => (f.Hertz, i)).Where(x => Math.Abs(x.Hertz - median) > 3 * deviation).Select(x => x.i)];
    }

    /// <summary>The <paramref name="count"/> crystals (1 to all) with the smallest spread; null when there are not that many.</summary>
    public MatchedSet? Match(int count) => Tightest([.. Enumerable.Range(0, Frequencies.Count)], Guard.Within(count, 1, 1000, nameof(count)));

    /// <summary>Sets of <paramref name="count"/> one after another, the tightest first, until too few crystals are left.</summary>
    public IReadOnlyList<MatchedSet> MatchAll(int count)
    {
        Guard.Within(count, 1, 1000, nameof(count));
        var left = Enumerable.Range(0, Frequencies.Count).ToList();
        var sets = new List<MatchedSet>();
        while (Tightest(left, count) is { } set)
        {
            sets.Add(set);
            left.RemoveAll(set.Indices.Contains);
        }
        return sets;
    }

    private IEnumerable<double> Hertz => Frequencies.Select(f => f.Hertz);

    private MatchedSet? Tightest(IReadOnlyList<int> among, int count)
    {
        var sorted = among.OrderBy(i => Frequencies[i]).ToList();
        return Enumerable.Range(0, Math.Max(0, sorted.Count - count + 1))
            .Select(start => sorted.GetRange(start, count))
            .Select(w => new MatchedSet(w, Frequencies[w[^1]].Hertz - Frequencies[w[0]].Hertz))
            .MinBy(s => s.SpreadHertz);
    }
}
