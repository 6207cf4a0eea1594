using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Components;

/// <summary>How two parts act together.</summary>
public enum PairKind
{
    /// <summary>Values add: capacitors in parallel, resistors or uncoupled inductors in series.</summary>
    Sum,

    /// <summary>a b/(a + b): capacitors in series, resistors or uncoupled inductors in parallel.</summary>
    Harmonic,
}

/// <summary>Relative tolerance of a combination (0.05 = 5 %).</summary>
/// <param name="WorstCase">Both parts at their limit.</param>
/// <param name="RootSumSquare">Independent parts.</param>
public readonly record struct PairTolerance(double WorstCase, double RootSumSquare);

/// <summary>One part, or two that together give a value. Values in one unit of the caller's choice. Immutable.</summary>
/// <param name="Larger">The larger (or only) part.</param>
/// <param name="Smaller">The smaller part; null for a single part.</param>
/// <param name="Kind">How the two act together.</param>
/// <param name="Wanted">The value asked for, above zero.</param>
public sealed record PartPair(double Larger, double? Smaller, PairKind Kind, double Wanted)
{
    /// <summary>Value of the combination.</summary>
    public double Value => Smaller is not { } b ? Larger : Kind == PairKind.Sum ? Larger + b : Larger * b / (Larger + b);

    /// <summary>Relative error against the wanted value; positive is too large.</summary>
    public double Error => (Value / Wanted) - 1;

    /// <summary>
    /// Tolerance of the combination from the relative tolerances of its parts. In a sum each counts by its share; in a harmonic combination
    /// the weights cross, so that the smaller part dominates. Source: derived (partial derivatives of the two laws).
    /// </summary>
    public PairTolerance Tolerance(double ofLarger, double ofSmaller)
    {
        if (Smaller is not { } b) return new(ofLarger, ofLarger);
        var share = (Kind == PairKind.Sum ? Larger : b) / (Larger + b);
        var (x, y) = (share * ofLarger, (1 - share) * ofSmaller);
        return new(x + y, Math.Sqrt((x * x) + (y * y)));
    }
}
