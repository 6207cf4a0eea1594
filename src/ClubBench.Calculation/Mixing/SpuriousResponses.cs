using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>A signal that a mixer also turns into the intermediate frequency: m LO +- n RF = +-IF.</summary>
/// <param name="Frequency">Where the signal would have to be.</param>
/// <param name="OscillatorOrder">m, 0 or above.</param>
/// <param name="SignalOrder">n, 1 or above.</param>
/// <param name="Rank">How far it lies below the wanted response in the ranking model: for sorting, not a prediction.</param>
public sealed record SpuriousResponse(Frequency Frequency, int OscillatorOrder, int SignalOrder, Decibels Rank)
{
    /// <summary>What the front end takes off it against the wanted signal; zero while no front end is counted.</summary>
    public Decibels FrontEnd { get; init; }

    /// <summary>Rank and front end together: for sorting, not a prediction.</summary>
    public Decibels Total => Rank + FrontEnd;
}

/// <summary>
/// Spurious responses of a mixer. Method: every RF = |m LO +- IF|/n up to an order, 0.1 to 200 MHz; ranked by 20 log10(max(m, 1)), 25 dB for an even
/// order in a balanced mixer, and 25 dB for each step of n. Source: derived; the ranking agrees with makers' tables in order of magnitude only.
/// </summary>
public static class SpuriousResponses
{
    private const double BalanceDb = 25;

    // Intercept of +15 dBm less a strong signal of -10 dBm.
    private const double SignalStepDb = 25;

    private static readonly int[] Signs = [-1, 1];

    /// <summary>
    /// Responses up to m + n = <paramref name="highestOrder"/> (2..12), the strongest first, then by frequency. The wanted signal is among them.
    /// </summary>
    public static IReadOnlyList<SpuriousResponse> Of(Frequency oscillator, Frequency intermediate, int highestOrder = 7, bool balanced = true)
    {
        Guard.Within(highestOrder, 2, 12, nameof(highestOrder));
        return
        [
            .. from n in Enumerable.Range(1, highestOrder)
               from m in Enumerable.Range(0, highestOrder - n + 1)
               from sign in Signs
               where m > 0 || sign > 0
               let hertz = Math.Abs((m * oscillator.Hertz) + (sign * intermediate.Hertz)) / n
               where hertz is >= 0.1e6 and <= 200e6
               let rank = Rank(m, n, balanced)
               orderby rank, hertz
               select new SpuriousResponse(Frequency.FromHertz(hertz), m, n, rank),
        ];
    }

    /// <summary>
    /// Responses of direct conversion, where the product is an audio tone: RF = m LO/n, m and n from 1, each frequency once with its lowest orders.
    /// The strongest first, then by frequency; the wanted signal is among them.
    /// </summary>
    public static IReadOnlyList<SpuriousResponse> OfDirectConversion(Frequency oscillator, int highestOrder = 7, bool balanced = true)
    {
        Guard.Within(highestOrder, 2, 12, nameof(highestOrder));
        return
        [
            .. from n in Enumerable.Range(1, highestOrder - 1)
               from m in Enumerable.Range(1, highestOrder - n)
               where IsLowest(m, n)
               let hertz = m * oscillator.Hertz / n
               where hertz is >= 0.1e6 and <= 200e6
               let rank = Rank(m, n, balanced)
               orderby rank, hertz
               select new SpuriousResponse(Frequency.FromHertz(hertz), m, n, rank),
        ];
    }

    /// <summary>
    /// The same responses behind a front end, the strongest first: what its loss at a response exceeds that at the wanted signal by is added to
    /// the rank.
    /// </summary>
    public static IReadOnlyList<SpuriousResponse> Behind(IReadOnlyList<SpuriousResponse> responses, Func<Frequency, Decibels> frontEndLoss, Frequency wanted)
    {
        var onSignal = frontEndLoss(wanted);
        return [.. responses.Select(r => r with { FrontEnd = frontEndLoss(r.Frequency) - onSignal }).OrderBy(r => r.Total).ThenBy(r => r.Frequency)];
    }

    private static bool IsLowest(int m, int n) => System.Numerics.BigInteger.GreatestCommonDivisor(m, n) == 1;

    private static Decibels Rank(int m, int n, bool balanced)
    {
        var even = balanced && (m % 2 == 0 || n % 2 == 0) ? BalanceDb : 0;
        return Decibels.FromDb((20 * Math.Log10(Math.Max(m, 1))) + even + ((n - 1) * SignalStepDb));
    }
}
