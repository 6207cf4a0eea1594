using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.BandPass;

/// <summary>How tightly equal resonators are coupled to each other and to the ends, scaled to a 3 dB bandwidth of 1. Immutable.</summary>
/// <remarks>
/// Method: k and q of a low-pass prototype, referred to the half-power bandwidth. The end Q includes the end resonator's own loss.
/// Valid: two or three resonators with equal ends.
/// Source: matthaei-young-jones, section 4.13; the tables of zverev-1967 recomputed.
/// </remarks>
/// <param name="Order">Number of resonators, 2 or 3.</param>
/// <param name="EndQ">q1 = qn: loaded Q of an end resonator times relative bandwidth.</param>
/// <param name="Coupling">k12 (= k23): coupling coefficient over relative bandwidth.</param>
/// <param name="HalfPowerRatio">Half-power bandwidth over the bandwidth the prototype is scaled to; 1 for Butterworth.</param>
/// <param name="ElementSum">Sum of the g-values, for the loss in the middle.</param>
public sealed record CouplingPrototype(int Order, double EndQ, double Coupling, double HalfPowerRatio, double ElementSum)
{
    /// <summary>Flattest pass-band.</summary>
    public static CouplingPrototype Butterworth(int order) => Of(LowPassPrototype.Butterworth(Guard.Within(order, 2, 3, nameof(order))));

    /// <summary>Equal ripple.</summary>
    public static CouplingPrototype Chebyshev(int order, PassBandRipple ripple) => Of(LowPassPrototype.Chebyshev(Guard.Within(order, 2, 3, nameof(order)), ripple));

    /// <summary>
    /// Loss in the middle of the band for coils of a Q above zero: 4.343 (f0/BWr) sum(g)/Qu, BWr the bandwidth the prototype is scaled to.
    /// Valid: loss small against the end coupling; a check on the network's loss, not a replacement. Source: cohn-1959.
    /// </summary>
    public Decibels MidbandLoss(Frequency center, Frequency bandwidth3dB, double unloadedQ) =>
        Decibels.FromDb(10 / Math.Log(10) * (center / bandwidth3dB) * HalfPowerRatio * ElementSum / Guard.Positive(unloadedQ, nameof(unloadedQ)));

    private static CouplingPrototype Of(LowPassPrototype prototype)
    {
        var (g, w3) = (prototype.Values, prototype.HalfPowerRatio);
        return new(prototype.Order, g[0] * w3, 1 / Math.Sqrt(g[0] * g[1]) / w3, w3, g.Sum());
    }
}
