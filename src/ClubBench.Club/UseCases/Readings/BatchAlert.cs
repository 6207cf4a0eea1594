using ClubBench.Planning.Advising;

namespace ClubBench.Club.UseCases.Readings;

/// <summary>Which way most boards are off.</summary>
public enum BatchSide
{
    /// <summary>Nothing to alert.</summary>
    None,

    Low,

    High,
}

/// <summary>
/// Tells a plan's fault from a builder's: when every board measured at a point is off to the same side by more than half the window, the plan (or the
/// whole lot of parts, or the instrument) is to blame, and no single board should be rewound. One outlier among good boards never alerts.
/// </summary>
public static class BatchAlert
{
    /// <summary>Fewest boards that say anything (common practice).</summary>
    public const int LeastBoards = 4;

    /// <summary>The side all boards are off to.</summary>
    /// <param name="nominalSi">Expected value.</param>
    /// <param name="lowSi">Lower end of the window.</param>
    /// <param name="highSi">Upper end.</param>
    /// <param name="sides">Which ends count.</param>
    /// <param name="valuesSi">One value per board, the newest, known offsets subtracted.</param>
    public static BatchSide Of(double nominalSi, double lowSi, double highSi, WindowSides sides, IReadOnlyList<double> valuesSi)
    {
        if (valuesSi.Count < LeastBoards) return BatchSide.None;
        var (low, high) = ((nominalSi + lowSi) / 2, (nominalSi + highSi) / 2);
        if (sides != WindowSides.AtMost && valuesSi.All(v => v < low)) return BatchSide.Low;
        return sides != WindowSides.AtLeast && valuesSi.All(v => v > high) ? BatchSide.High : BatchSide.None;
    }
}
