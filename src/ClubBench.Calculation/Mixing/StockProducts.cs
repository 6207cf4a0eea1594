using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>A multiple of one crystal, or a sum or difference of multiples of two, that lands in a segment.</summary>
/// <param name="First">Crystal.</param>
/// <param name="FirstMultiple">Its multiple, 1 or above.</param>
/// <param name="Second">The other crystal; null for a multiple of one alone.</param>
/// <param name="SecondMultiple">Multiple of the other: above zero added, below zero taken off; 0 without one.</param>
/// <param name="Product">Where it lands.</param>
public sealed record StockProduct(Frequency First, int FirstMultiple, Frequency? Second, int SecondMultiple, Frequency Product)
{
    /// <summary>Sum of the sizes of both multiples: low orders are strong and clean.</summary>
    public int Order => FirstMultiple + Math.Abs(SecondMultiple);
}

/// <summary>What a drawer of crystals can make in a segment. Method: every m A and m A +- n B up to an order. Source: derived.</summary>
public static class StockProducts
{
    /// <summary>
    /// Products inside a segment up to an order of 1 to 7, the lowest order first, then those of one crystal, then by frequency. Pull a multiplied
    /// crystal at its own frequency: range, offset and drift multiply with it.
    /// </summary>
    public static IReadOnlyList<StockProduct> In(FrequencyRange segment, IReadOnlyList<Frequency> stock, int highestOrder = 4)
    {
        Guard.Within(highestOrder, 1, 7, nameof(highestOrder));
        return
        [
            .. Alone(stock, highestOrder).Concat(Pairs(stock, highestOrder)).Where(p => segment.Contains(p.Product))
                .OrderBy(p => p.Order).ThenBy(p => p.Second is not null).ThenBy(p => p.Product),
        ];
    }

    private static IEnumerable<StockProduct> Alone(IReadOnlyList<Frequency> stock, int highestOrder) =>
        from a in stock.Distinct() from m in Enumerable.Range(1, highestOrder) select new StockProduct(a, m, null, 0, a.Harmonic(m));

    // Sums once (the lower crystal first); differences from the larger product.
    private static IEnumerable<StockProduct> Pairs(IReadOnlyList<Frequency> stock, int highestOrder) =>
        from a in stock.Distinct()
        from b in stock.Distinct()
        where a != b
        from m in Enumerable.Range(1, highestOrder)
        from n in Enumerable.Range(-highestOrder, (2 * highestOrder) + 1)
        where n != 0 && m + Math.Abs(n) <= highestOrder && (n < 0 || a < b)
        let hertz = (m * a.Hertz) + (n * b.Hertz)
        where hertz > 0
        select new StockProduct(a, m, b, n, Frequency.FromHertz(hertz));
}
