using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Networks;

/// <summary>How the unloaded Q of a coil moves with frequency: Q0 (f/f0)^a up to its peak, level above. Immutable.</summary>
/// <remarks>
/// Method: power law. Valid: inside a band a = 0; a = 0.5 for the skin effect below the peak of a coil; a = 1 for a series resistance that does not change.
/// Above the peak the law would promise what no coil has, so it stays level: the stop-band hardly depends on it except at a notch.
/// Source: common practice.
/// </remarks>
/// <param name="Q">Q0, above zero.</param>
/// <param name="At">Frequency of that Q.</param>
/// <param name="Exponent">a, 0 to 1.</param>
/// <param name="Peak">Frequency of the highest Q, at or above that of Q0.</param>
public sealed record UnloadedQ(double Q, Frequency At, double Exponent, Frequency Peak)
{
    /// <summary>Q at a frequency, above zero.</summary>
    public double Of(Frequency f)
    {
        if (Peak < At) throw new InvalidOperationException($"The peak ({Peak}) lies below the frequency of the Q ({At}).");
        var share = Math.Min(f.Hertz, Peak.Hertz) / At.Hertz;
        return Guard.Positive(Guard.Positive(Q, nameof(Q)) * Math.Pow(share, Guard.Within(Exponent, 0, 1, nameof(Exponent))), nameof(f));
    }
}
