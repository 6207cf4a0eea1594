using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>One product of a transmit mixer: the absolute value of m times the local oscillator and n times the carrier, with signs.</summary>
/// <param name="OscillatorOrder">m, zero or above.</param>
/// <param name="CarrierOrder">n with its sign.</param>
/// <param name="Frequency">Where it falls.</param>
public sealed record TransmitProduct(int OscillatorOrder, int CarrierOrder, Frequency Frequency)
{
    /// <summary>How often the signals went through the non-linearity.</summary>
    public int Order => OscillatorOrder + Math.Abs(CarrierOrder);
}

/// <summary>What a transmit mixer makes besides the wanted signal.</summary>
/// <remarks>
/// Method: every combination of whole multiples up to an order, with the attenuations of the filters behind it.
/// Valid: two sine waves into one mixer. Levels at the mixer are measured, or rules of thumb with their doubt.
/// Source: derived.
/// </remarks>
public static class TransmitProducts
{
    /// <summary>Highest order worth listing. Source: common practice.</summary>
    public const int HighestOrder = 7;

    /// <summary>Products with 1 to 7 factors that fall into a range, by frequency.</summary>
    /// <param name="oscillator">Local oscillator.</param>
    /// <param name="carrier">Carrier oscillator or intermediate frequency.</param>
    /// <param name="window">Where to look.</param>
    public static IReadOnlyList<TransmitProduct> In(Frequency oscillator, Frequency carrier, FrequencyRange window) =>
    [
        .. from m in Enumerable.Range(0, HighestOrder + 1)
           from n in Enumerable.Range(-HighestOrder, (2 * HighestOrder) + 1)
           where m + Math.Abs(n) is >= 1 and <= HighestOrder && (m > 0 || n > 0)
           let hertz = Math.Abs((m * oscillator.Hertz) + (n * carrier.Hertz))
           where hertz >= window.Low.Hertz && hertz <= window.High.Hertz
           orderby hertz, m, n
           select new TransmitProduct(m, n, Frequency.FromHertz(hertz)),
    ];

    /// <summary>Level of a product at the antenna against the wanted one, from its level at the mixer and the loss of the filters at both frequencies.</summary>
    /// <param name="atMixer">Level at the mixer against the wanted product, usually below zero.</param>
    /// <param name="filterLoss">Loss of all filters behind the mixer at a frequency.</param>
    /// <param name="product">Where the product falls.</param>
    /// <param name="wanted">Where the wanted product falls.</param>
    public static Decibels AtAntenna(Decibels atMixer, Func<Frequency, Decibels> filterLoss, Frequency product, Frequency wanted) =>
        atMixer - (filterLoss(product) - filterLoss(wanted));

    /// <summary>Leak of the oscillator against the wanted product: oscillator less isolation less wanted.</summary>
    public static Decibels OscillatorLeak(PowerLevel oscillator, Decibels isolation, PowerLevel wanted) => oscillator - isolation - wanted;
}
