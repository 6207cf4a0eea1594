namespace ClubBench.Calculation.Oscillators;

/// <summary>Halving an interval: slow beside Newton's rule, but it never leaves the bracket and never takes the wrong root.</summary>
internal static class Bisection
{
    private const int MostHalvings = 200;

    /// <summary>The place where <paramref name="isPast"/> turns from false to true, to within <paramref name="width"/>. The caller guarantees one turn.</summary>
    public static double TurningPoint(Func<double, bool> isPast, double low, double high, double width)
    {
        for (var i = 0; i < MostHalvings && high - low > width; i++)
        {
            var middle = 0.5 * (low + high);
            if (middle <= low || middle >= high) break;
            if (isPast(middle)) high = middle;
            else low = middle;
        }
        return 0.5 * (low + high);
    }
}
