using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Statistics;

/// <summary>
/// Pseudo-random numbers that are the same for the same seed on every machine and in every release. Method: SplitMix64.
/// Valid: tolerance draws and resampling; not for secrets. Source: splitmix-2014, figure 17. Not thread safe: one per task.
/// </summary>
public sealed class SeededRandom(ulong seed)
{
    private ulong state = seed;

    /// <summary>The next 64 random bits.</summary>
    public ulong NextBits()
    {
        unchecked
        {
            state += 0x9E3779B97F4A7C15;
            var z = (state ^ (state >> 30)) * 0xBF58476D1CE4E5B9;
            z = (z ^ (z >> 27)) * 0x94D049BB133111EB;
            return z ^ (z >> 31);
        }
    }

    /// <summary>Evenly distributed from 0 (included) to 1 (excluded), 53 bits.</summary>
    public double NextUnit() => (NextBits() >> 11) * (1.0 / (1UL << 53));

    /// <summary>Evenly distributed from low (included) to high (excluded; equal to low where both agree).</summary>
    public double Uniform(double low, double high) => low + ((high - low) * NextUnit());

    /// <summary>A whole number from 0 to below <paramref name="count"/> (one or more), evenly distributed to 1 in 2^53.</summary>
    public int Below(int count) => (int)(Guard.Within(count, 1, int.MaxValue, nameof(count)) * NextUnit());

    /// <summary>Normally distributed with this mean and standard deviation (zero or above). Method: Box and Muller, one of the pair.</summary>
    public double Normal(double mean, double deviation)
    {
        var radius = Math.Sqrt(-2 * Math.Log(1 - NextUnit()));
        return mean + (Guard.NotNegative(deviation, nameof(deviation)) * radius * Math.Cos(2 * Math.PI * NextUnit()));
    }
}
