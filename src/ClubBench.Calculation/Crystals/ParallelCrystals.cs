using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Crystals;

/// <summary>How well two crystals meant to run in parallel agree.</summary>
public enum PairMatch
{
    /// <summary>Within fs/Q: the resistance between the two resonances at most doubles.</summary>
    Matched,

    /// <summary>Above fs/Q: the oscillator may drop out between the two resonances.</summary>
    Loose,

    /// <summary>Above 10 fs/Q: the dial will have a dead gap; do not pair them.</summary>
    DeadGap,
}

/// <summary>Crystals connected in parallel to pull further.</summary>
public static class ParallelCrystals
{
    /// <summary>
    /// The one crystal that <paramref name="count"/> equal ones in parallel amount to: n Cm, n C0, Lm/n, Rm/n. Count 1..8.
    /// Source: derived (admittances add).
    /// </summary>
    public static CrystalParameters Of(CrystalParameters crystal, int count)
    {
        var n = Guard.Within(count, 1, 8, nameof(count));
        return crystal with
        {
            MotionalCapacitance = crystal.MotionalCapacitance * n,
            StaticCapacitance = crystal.StaticCapacitance * n,
            MotionalResistance = crystal.MotionalResistance / n,
        };
    }

    /// <summary>
    /// Resistance halfway between the series resonances of two crystals that differ by <paramref name="differenceHertz"/> (0 or above).
    /// The crystal must state its motional resistance. Method: R = (Rm/2)(1 + (Q d/fs)^2), C0 left out. Source: derived.
    /// </summary>
    public static Resistance MidwayResistance(CrystalParameters crystal, double differenceHertz)
    {
        var detuning = RelativeDetuning(crystal, differenceHertz);
        return crystal.MotionalResistance * (0.5 * (1 + (detuning * detuning)));
    }

    /// <summary>Judges a pair by the difference of its series resonances in Hz. Limits fs/Q and 10 fs/Q. Source: derived.</summary>
    public static PairMatch Judge(CrystalParameters crystal, double differenceHertz) => RelativeDetuning(crystal, differenceHertz) switch
    {
        <= 1 => PairMatch.Matched,
        <= 10 => PairMatch.Loose,
        _ => PairMatch.DeadGap,
    };

    private static double RelativeDetuning(CrystalParameters crystal, double differenceHertz)
    {
        var q = crystal.UnloadedQ ?? throw new ArgumentException("The motional resistance must be stated.", nameof(crystal));
        return q * Guard.NotNegative(differenceHertz, nameof(differenceHertz)) / crystal.SeriesResonance.Hertz;
    }
}
