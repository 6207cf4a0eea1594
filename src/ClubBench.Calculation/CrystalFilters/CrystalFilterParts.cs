using System.Collections.Immutable;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.CrystalFilters;

/// <summary>Capacitors and ends of a crystal filter from k and q.</summary>
internal static class CrystalFilterParts
{
    // A mesh this near the largest elastance needs no capacitor: it would be a thousand times the couplings.
    private const double SameElastance = 1e-3;

    public static CrystalFilter For(CrystalFilterTask task, Frequency bandwidth)
    {
        var (crystal, prototype) = (task.Crystal, task.Prototype);
        ImmutableArray<Capacitance> couplings =
            [.. prototype.Couplings.Select(k => crystal.MotionalCapacitance * (crystal.SeriesResonance / bandwidth / k))];
        var elastances = Elastances(couplings);
        var largest = elastances.Max();
        var end = Resistance.FromOhm(bandwidth.RadiansPerSecond * crystal.MotionalInductance.Henry / prototype.EndQ);
        return new([.. elastances.Select(s => new CrystalMesh(crystal, Filling(largest, s)))], couplings, end, end);
    }

    private static Capacitance? Filling(double largest, double own) =>
        largest - own > SameElastance * largest ? Capacitance.FromFarad(1 / (largest - own)) : null;

    private static double[] Elastances(ImmutableArray<Capacitance> couplings) =>
        [.. Enumerable.Range(0, couplings.Length + 1).Select(i => (i > 0 ? 1 / couplings[i - 1].Farad : 0) + (i < couplings.Length ? 1 / couplings[i].Farad : 0))];
}
