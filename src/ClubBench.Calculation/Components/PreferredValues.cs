using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Components;

/// <summary>The preferred number series of IEC 60063, named by their members per decade.</summary>
public enum ESeries
{
    /// <summary>10, 22, 47.</summary>
    E3,

    /// <summary>Six a decade, usual tolerance 20 %.</summary>
    E6,

    /// <summary>Twelve a decade, usual tolerance 10 %.</summary>
    E12,

    /// <summary>Twenty-four a decade, usual tolerance 5 %.</summary>
    E24,

    /// <summary>Forty-eight a decade, usual tolerance 2 %.</summary>
    E48,

    /// <summary>Ninety-six a decade, usual tolerance 1 %.</summary>
    E96,

    /// <summary>One hundred and ninety-two a decade, usual tolerance 0.5 % or better.</summary>
    E192,
}

/// <summary>
/// Preferred values in any unit. Members come from the table or the rounding rule of the standard, with its one exception (920, not 919),
/// and are the double nearest to the printed number, so that 2.2e-9 is found as the literal 2.2e-9.
/// Source: iec-60063. Immutable, thread safe.
/// </summary>
public static class PreferredValues
{
    /// <summary>Two values closer than this (relative) are the same part.</summary>
    internal const double SameValue = 1e-9;

    private static readonly int[] E24 = [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91];

    private static readonly int[] E192 =
        [.. Enumerable.Range(0, 192).Select(i => i == 185 ? 920 : (int)Math.Round(100 * Math.Pow(10, i / 192.0), MidpointRounding.AwayFromZero))];

    private static readonly Dictionary<ESeries, int[]> BySeries = new()
    {
        [ESeries.E3] = Every(8, E24),
        [ESeries.E6] = Every(4, E24),
        [ESeries.E12] = Every(2, E24),
        [ESeries.E24] = E24,
        [ESeries.E48] = Every(4, E192),
        [ESeries.E96] = Every(2, E192),
        [ESeries.E192] = E192,
    };

    /// <summary>Members of one decade as printed: two figures (10 to 91) up to E24, three figures (100 to 988) from E48 on.</summary>
    public static IReadOnlyList<int> Mantissas(ESeries series) => BySeries[series];

    /// <summary>
    /// The member nearest to <paramref name="value"/> (above zero, any unit), across decades; a tie goes to the smaller.
    /// Logarithmic compares ratios (boundary at the geometric mean), which is right wherever tolerances are relative; linear compares differences.
    /// </summary>
    public static double Nearest(double value, ESeries series, bool logarithmic = true)
    {
        var (below, above) = Neighbours(value, series);
        var takeBelow = logarithmic ? value * value <= below * above : value - below <= above - value;
        return takeBelow ? below : above;
    }

    /// <summary>Largest member at or below and smallest member at or above a value above zero; both are the member itself where it is one.</summary>
    public static (double Below, double Above) Neighbours(double value, ESeries series)
    {
        var i = IndexAtOrBelow(value, series);
        var below = Member(i, series);
        return IsSame(below, value) ? (below, below) : (below, Member(i + 1, series));
    }

    /// <summary>Smallest member at or above a value above zero.</summary>
    public static double NextUp(double value, ESeries series) => Neighbours(value, series).Above;

    /// <summary>All members within a relative window (0.1 = 10 %) around a value above zero, ascending; empty where there is none.</summary>
    public static IReadOnlyList<double> Within(double value, double relativeWindow, ESeries series)
    {
        Guard.Positive(value, nameof(value));
        Guard.Within(relativeWindow, 0, 0.99, nameof(relativeWindow));
        return Between(value * (1 - relativeWindow), value * (1 + relativeWindow), series);
    }

    /// <summary>All members from low to high (above zero), both included, ascending.</summary>
    public static IReadOnlyList<double> Between(double low, double high, ESeries series)
    {
        var members = new List<double>();
        var i = IndexAtOrBelow(low, series);
        if (!IsSame(Member(i, series), low)) i++;
        for (; Member(i, series) <= high * (1 + SameValue); i++) members.Add(Member(i, series));
        return members;
    }

    private static int IndexAtOrBelow(double value, ESeries series)
    {
        var n = BySeries[series].Length;
        var i = (int)Math.Floor(n * Math.Log10(Guard.Positive(value, nameof(value))));
        while (Member(i, series) > value * (1 + SameValue)) i--;
        while (Member(i + 1, series) <= value * (1 + SameValue)) i++;
        return i;
    }

    // Index 0 is 1.0; dividing by an exact power of ten gives the double nearest to the decimal number.
    private static double Member(int index, ESeries series)
    {
        var mantissas = BySeries[series];
        var decade = (int)Math.Floor((double)index / mantissas.Length);
        var exponent = decade - (mantissas[0] == 10 ? 1 : 2);
        var mantissa = mantissas[index - (decade * mantissas.Length)];
        return exponent < 0 ? mantissa / Math.Pow(10, -exponent) : mantissa * Math.Pow(10, exponent);
    }

    private static bool IsSame(double a, double b) => Math.Abs(a - b) <= SameValue * b;

    private static int[] Every(int step, int[] members) => [.. members.Where((_, i) => i % step == 0)];
}
