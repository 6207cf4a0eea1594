using System.Collections.Immutable;
using System.Numerics;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.CrystalFilters;

/// <summary>How tightly the crystals of a ladder are coupled to each other and to equal ends, scaled to a 3 dB bandwidth of 1. Immutable.</summary>
/// <remarks>
/// Method: k and q of a low-pass prototype, referred to the half-power bandwidth; the equal-capacitor form has one coupling throughout and q = 1/k.
/// Valid: 2 to 12 crystals; Chebyshev ripple 0.01 to 3 dB.
/// Source: matthaei-young-jones, section 4.13; zverev-1967 and dishal-1951 for k and q; cohn-1959 for equal elements; all from memory, recomputed.
/// </remarks>
/// <param name="EndQ">q1 = qn: loaded Q of an end crystal times relative bandwidth.</param>
/// <param name="Couplings">k12, k23, ...: coupling coefficients over relative bandwidth, one fewer than crystals.</param>
/// <param name="ElementSum">Sum of the g-values scaled to the half-power edge, for the estimate of the loss.</param>
public sealed record CrystalFilterPrototype(double EndQ, ImmutableArray<double> Couplings, double ElementSum)
{
    private const int Fewest = 2;
    private const int Most = 12;

    /// <summary>Number of crystals.</summary>
    public int Order => Couplings.Length + 1;

    /// <summary>Flattest pass-band, least ringing, more loss.</summary>
    public static CrystalFilterPrototype Butterworth(int order) => Of(LowPassPrototype.Butterworth(Permitted(order)));

    /// <summary>Equal ripple, steep; wants matched crystals.</summary>
    public static CrystalFilterPrototype Chebyshev(int order, PassBandRipple ripple)
    {
        Guard.Within(ripple.Ripple.Db, 0.01 - 1e-9, 3 + 1e-9, nameof(ripple));
        return Of(LowPassPrototype.Chebyshev(Permitted(order), ripple));
    }

    /// <summary>
    /// One capacitor value throughout, terminated in its reactance: forgiving and least lossy. From six crystals on the pass-band dips
    /// by more than 3 dB beside its edges while loss does not round it. The half-power edge is the outermost one.
    /// </summary>
    public static CrystalFilterPrototype EqualCapacitor(int order)
    {
        var unit = new CrystalFilterPrototype(1, [.. Enumerable.Repeat(1.0, Permitted(order) - 1)], order);
        var k = 1 / OutermostHalfPower(unit);
        return new(1 / k, [.. Enumerable.Repeat(k, order - 1)], order / k);
    }

    /// <summary>
    /// Loss of the lossless coupled resonators at a distance from the middle given in halves of the bandwidth, either sign; at most 300 dB is told.
    /// Method: |S21| = (2/q) |A^-1|N1 of the tridiagonal A with j W + 1/q at the ends and j k between neighbours. Source: derived.
    /// </summary>
    public Decibels Loss(double halfBandwidths)
    {
        var w = Guard.Within(halfBandwidths, -1e6, 1e6, nameof(halfBandwidths));
        var (before, determinant) = (Complex.One, new Complex(1 / EndQ, w));
        for (var i = 1; i < Order; i++)
        {
            var own = new Complex(i == Order - 1 ? 1 / EndQ : 0, w);
            (before, determinant) = (determinant, (own * determinant) + (Couplings[i - 1] * Couplings[i - 1] * before));
        }

        var passed = 2 / EndQ * Couplings.Aggregate(1.0, (product, k) => product * k) / determinant.Magnitude;
        return Decibels.FromAmplitudeRatio(1 / Math.Max(passed, 1e-15));
    }

    private static CrystalFilterPrototype Of(LowPassPrototype prototype)
    {
        var (g, w3) = (prototype.Values, prototype.HalfPowerRatio);
        return new(g[0] * w3, [.. g.Zip(g.Skip(1), (a, b) => 1 / (w3 * Math.Sqrt(a * b)))], w3 * g.Sum());
    }

    // The network of unit couplings passes up to 2 and no further: come from outside, past the dips.
    private static double OutermostHalfPower(CrystalFilterPrototype unit)
    {
        var half = Decibels.FromPowerRatio(2);
        var outside = 3.0;
        while (unit.Loss(outside - 0.001) > half) outside -= 0.001;
        var inside = outside - 0.001;
        for (var i = 0; i < 60; i++)
        {
            var middle = 0.5 * (inside + outside);
            (inside, outside) = unit.Loss(middle) <= half ? (middle, outside) : (inside, middle);
        }

        return inside;
    }

    private static int Permitted(int order) => Guard.Within(order, Fewest, Most, nameof(order));
}
