using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>
/// A stage that conducts in pulses and is tuned to a multiple of its input. Immutable.
/// Method: harmonics of the truncated sine; a single tank of loaded Q takes 10 log10(1 + Q^2 (k/n - n/k)^2) off a neighbour.
/// Valid: ideal pulses. One tank is not enough for a transmitter: use two, or a band filter. Source: derived.
/// </summary>
/// <param name="Multiple">n: 2, 3, 4 or 5.</param>
/// <param name="Angle">Whole conduction angle.</param>
/// <param name="LoadedQ">Loaded Q of the tank at n times the input, above zero.</param>
public sealed record FrequencyMultiplier(int Multiple, ConductionAngle Angle, double LoadedQ)
{
    /// <summary>n, 2 to 5.</summary>
    public int Multiple { get; init; } = Guard.Within(Multiple, 2, 5, nameof(Multiple));

    /// <summary>Loaded Q of the tank, above zero.</summary>
    public double LoadedQ { get; init; } = Guard.Positive(LoadedQ, nameof(LoadedQ));

    /// <summary>Conduction angle that gives the most of a multiple (2 to 5) for a given peak current: 240 degrees over n.</summary>
    public static ConductionAngle BestAngle(int multiple) => ConductionAngle.FromDegrees(240.0 / Guard.Within(multiple, 2, 5, nameof(multiple)));

    /// <summary>Wanted harmonic current over peak current.</summary>
    public double OutputCurrent => Math.Abs(Angle.Amplitude(Multiple));

    /// <summary>How far the wanted harmonic current lies below that of the fundamental; null where it vanishes.</summary>
    public Decibels? BelowFundamental => Angle.RelativeLevel(Multiple) is { } level ? -level : null;

    /// <summary>
    /// A neighbour k (1 to 20, not n) behind the tank against the wanted multiple, below zero as a rule; null where either vanishes from the current.
    /// </summary>
    public Decibels? Neighbour(int k)
    {
        if (k == Multiple) throw new ArgumentOutOfRangeException(nameof(k), k, "A neighbour is another harmonic than the wanted one.");
        if ((Angle.RelativeLevel(Guard.Within(k, 1, 20, nameof(k))), Angle.RelativeLevel(Multiple)) is not ({ } other, { } wanted)) return null;
        var detuning = ((double)k / Multiple) - ((double)Multiple / k);
        return other - wanted - Decibels.FromPowerRatio(1 + (LoadedQ * LoadedQ * detuning * detuning));
    }
}
