using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>A place on the dial where a whistle or a second tuning of the same signal crosses the wanted response.</summary>
/// <param name="Signal">Dial setting.</param>
/// <param name="OscillatorOrder">m, or the harmonic p of the oscillator.</param>
/// <param name="OtherOrder">Size of n for the signal, or q for the beat oscillator; 0 for a harmonic of the oscillator alone.</param>
/// <param name="IsInside">Inside the band; otherwise just outside, which is worth a warning.</param>
public sealed record Birdie(Frequency Signal, int OscillatorOrder, int OtherOrder, bool IsInside)
{
    /// <summary>Sum of the two orders; low ones are loud.</summary>
    public int Order => OscillatorOrder + OtherOrder;
}

/// <summary>
/// Whistles inside a tuned band. Method: with LO = s f + c the condition m LO + n f = +-IF is linear in the dial setting f and is solved for
/// each pair of orders. Source: derived.
/// </summary>
public static class Birdies
{
    /// <summary>Margin beside the band that is looked at too, as a share of its edges.</summary>
    public const double Margin = 0.005;

    private static readonly int[] Signs = [-1, 1];

    /// <summary>Crossings of signal products up to an order (2..12), by frequency and then order. Empty for direct conversion.</summary>
    public static IReadOnlyList<Birdie> WithSignal(FrequencyScheme scheme, FrequencyRange band, int highestOrder = 7)
    {
        Guard.Within(highestOrder, 2, 12, nameof(highestOrder));
        if (scheme.Intermediate is not { } intermediate) return [];
        var (s, c) = Law(scheme, intermediate.Hertz);
        return Sorted(
            from m in Enumerable.Range(0, highestOrder + 1)
            from n in Enumerable.Range(-highestOrder, (2 * highestOrder) + 1)
            where m + Math.Abs(n) <= highestOrder && (m * s) + n != 0
            from sign in Signs
            select At(((sign * intermediate.Hertz) - (m * c)) / ((m * s) + n), m, Math.Abs(n), band));
    }

    /// <summary>
    /// Whistles that need no antenna: harmonics p of the oscillator and q of the beat oscillator that fall on the dial setting or on the
    /// intermediate frequency, up to p + q = <paramref name="highestOrder"/> (2..12). Empty for direct conversion.
    /// </summary>
    public static IReadOnlyList<Birdie> Internal(FrequencyScheme scheme, FrequencyRange band, Frequency beat, int highestOrder = 12)
    {
        Guard.Within(highestOrder, 2, 12, nameof(highestOrder));
        if (scheme.Intermediate is not { } intermediate) return [];
        var (s, c) = Law(scheme, intermediate.Hertz);
        return Sorted(
            from p in Enumerable.Range(0, highestOrder)
            from q in Enumerable.Range(1, highestOrder - p)
            from side in Signs
            let signed = side * q * beat.Hertz
            from birdie in OnDial(p, q, signed).Concat(OnIntermediate(p, q, signed))
            select birdie);

        // p (s f + c) + q BFO = +-f
        IEnumerable<Birdie?> OnDial(int p, int q, double beatHz) =>
            from sign in Signs where (p * s) - sign != 0 select At(-((p * c) + beatHz) / ((p * s) - sign), p, q, band);

        // p (s f + c) + q BFO = +-IF
        IEnumerable<Birdie?> OnIntermediate(int p, int q, double beatHz) =>
            from sign in Signs where p > 0 select At(((sign * intermediate.Hertz) - (p * c) - beatHz) / (p * s), p, q, band);
    }

    private static (int Slope, double OffsetHz) Law(FrequencyScheme scheme, double intermediateHz) => scheme.Side switch
    {
        InjectionSide.HighSide => (1, intermediateHz),
        InjectionSide.LowSide => (1, -intermediateHz),
        _ => (-1, intermediateHz),
    };

    private static Birdie? At(double hertz, int m, int other, FrequencyRange band)
    {
        if (hertz < band.Low.Hertz * (1 - Margin) || hertz > band.High.Hertz * (1 + Margin)) return null;
        var signal = Frequency.FromHertz(hertz);
        return new Birdie(signal, m, other, band.Contains(signal));
    }

    private static List<Birdie> Sorted(IEnumerable<Birdie?> found) =>
        [.. found.OfType<Birdie>().DistinctBy(b => (Math.Round(b.Signal.Hertz), b.OscillatorOrder, b.OtherOrder)).OrderBy(b => b.Signal).ThenBy(b => b.Order)];
}
