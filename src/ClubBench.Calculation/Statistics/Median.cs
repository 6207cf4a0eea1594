namespace ClubBench.Calculation.Statistics;

/// <summary>Middle and spread that single wrong readings cannot pull.</summary>
public static class Median
{
    // Makes the median deviation of normally distributed readings equal their standard deviation.
    private const double NormalConsistency = 1.4826;

    /// <summary>The median of at least one value; the mean of the middle two for an even count.</summary>
    public static double Of(IReadOnlyCollection<double> values) =>
        values.Count > 0
            ? MathNet.Numerics.Statistics.Statistics.Median(values)
            : throw new ArgumentException("A median needs at least one value.", nameof(values));

    /// <summary>1.4826 times the median distance from the median: a standard deviation that outliers do not move. Source: common practice.</summary>
    public static double AbsoluteDeviation(IReadOnlyCollection<double> values)
    {
        var middle = Of(values);
        return NormalConsistency * Of([.. values.Select(v => Math.Abs(v - middle))]);
    }
}
