using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Statistics;

/// <summary>So many out of so many. Immutable.</summary>
/// <param name="Count">How many, from 0 to <paramref name="Of"/>.</param>
/// <param name="Of">Out of how many, one or more.</param>
public readonly record struct Proportion(int Count, int Of)
{
    /// <summary>The share, 0 to 1.</summary>
    public double Share => (double)Guard.Within(Count, 0, Of, nameof(Count)) / Guard.Within(Of, 1, int.MaxValue, nameof(Of));

    /// <summary>The expected number among other boards, rounded to whole boards.</summary>
    public int Expected(int boards) => (int)Math.Round(Share * boards, MidpointRounding.AwayFromZero);

    /// <summary>
    /// Limits the true share lies between, inside 0 to 1 also at none and all. Method: Wilson score interval. Valid: any count, also small.
    /// Source: wilson-1927.
    /// </summary>
    /// <param name="standardNormal">Quantile of the normal distribution, above zero: 1.96 for 95 %.</param>
    public (double Low, double High) Interval(double standardNormal = 1.959964)
    {
        var (n, p, z2) = ((double)Of, Share, standardNormal * Guard.Positive(standardNormal, nameof(standardNormal)));
        var middle = (p + (z2 / (2 * n))) / (1 + (z2 / n));
        var half = standardNormal / (1 + (z2 / n)) * Math.Sqrt((p * (1 - p) / n) + (z2 / (4 * n * n)));
        return (Math.Max(0, middle - half), Math.Min(1, middle + half));
    }
}
