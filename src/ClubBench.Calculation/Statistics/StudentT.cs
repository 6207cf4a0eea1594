using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Statistics;

/// <summary>Widening factor for a mean of few readings.</summary>
public static class StudentT
{
    /// <summary>
    /// Factor that makes a standard uncertainty from this many readings (two or more) cover 95 % on both sides: 4.30 for three, falling to 1.96.
    /// Source: gum-2008, Annex G, table G.2 (quantile of Student's distribution).
    /// </summary>
    public static double Factor95(int readings) =>
        MathNet.Numerics.Distributions.StudentT.InvCDF(0, 1, Guard.Within(readings, 2, int.MaxValue, nameof(readings)) - 1, 0.975);
}
