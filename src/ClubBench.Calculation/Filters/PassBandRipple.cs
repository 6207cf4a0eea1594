using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>Pass-band quality of a lossless filter. Ripple, reflection, return loss and SWR are one figure in four dresses. Immutable.</summary>
/// <remarks>Method: energy balance of a lossless two-port. Valid: lossless. Source: matthaei-young-jones, section 2.15.</remarks>
public readonly record struct PassBandRipple
{
    private PassBandRipple(double reflection) => Reflection = reflection;

    /// <summary>Largest reflection in the pass-band as a ratio of voltages, above 0 and below 1.</summary>
    public double Reflection { get; }

    /// <summary>The same as ripple of the loss.</summary>
    public Decibels Ripple => Decibels.FromDb(-10 * Math.Log10(1 - (Reflection * Reflection)));

    /// <summary>The same as smallest return loss.</summary>
    public Decibels ReturnLoss => Decibels.FromDb(-20 * Math.Log10(Reflection));

    /// <summary>The same as standing wave ratio, above 1.</summary>
    public double StandingWaveRatio => (1 + Reflection) / (1 - Reflection);

    /// <summary>The epsilon of the textbooks: reflected over passed voltage at the ripple edge.</summary>
    public double Epsilon => Reflection / Math.Sqrt(1 - (Reflection * Reflection));

    /// <summary>From a reflection above 0 and below 1.</summary>
    public static PassBandRipple FromReflection(double reflection) =>
        Guard.Positive(reflection, nameof(reflection)) < 1
            ? new(reflection)
            : throw new ArgumentOutOfRangeException(nameof(reflection), reflection, "The reflection must be below 1.");

    /// <summary>From a ripple of the loss above 0 dB.</summary>
    public static PassBandRipple FromRipple(Decibels ripple) =>
        new(Math.Sqrt(1 - Math.Pow(10, -Guard.Positive(ripple.Db, nameof(ripple)) / 10)));

    /// <summary>From a smallest return loss above 0 dB.</summary>
    public static PassBandRipple FromReturnLoss(Decibels returnLoss) =>
        new(Math.Pow(10, -Guard.Positive(returnLoss.Db, nameof(returnLoss)) / 20));

    /// <summary>From a largest standing wave ratio above 1.</summary>
    public static PassBandRipple FromStandingWaveRatio(double ratio) =>
        FromReflection((Guard.Positive(ratio, nameof(ratio)) - 1) / (ratio + 1));

    // Rounded, so that the ends of the range are inside it however they were given.
    internal double DesignRippleDb(string name) => Guard.Within(Math.Round(Ripple.Db, 9), 0.0001, 3, name);
}
