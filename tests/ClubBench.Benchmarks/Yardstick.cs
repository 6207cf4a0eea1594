namespace ClubBench.Benchmarks;

/// <summary>A fixed piece of arithmetic, so that figures of different machines, and of a busy and a quiet one, can be compared.</summary>
internal static class Yardstick
{
    private const int Steps = 2_000_000;

    /// <summary>A chain of multiplications, additions and one square root per step that no compiler can shorten.</summary>
    public static double Run()
    {
        var (x, y) = (0.5, 0.25);
        for (var i = 0; i < Steps; i++)
            (x, y) = ((0.7 * x) - (0.6 * y) + 0.1, Math.Sqrt((x * x) + (y * y) + 1e-3));
        return x + y;
    }
}
