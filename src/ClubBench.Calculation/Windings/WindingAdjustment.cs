using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Windings;

/// <summary>What to do to a winding after it was measured, cheapest first.</summary>
public enum WindingAction
{
    /// <summary>Good as it is.</summary>
    None,

    /// <summary>The trimmer takes it up.</summary>
    Trim,

    /// <summary>The deviation is no larger than the uncertainty of the reading: measure again, leave the winding alone.</summary>
    Remeasure,

    /// <summary>Spread the turns: lowers inductance.</summary>
    Spread,

    /// <summary>Squeeze the turns together: raises inductance.</summary>
    Squeeze,

    /// <summary>Take turns off.</summary>
    Remove,

    /// <summary>Add turns.</summary>
    Add,

    /// <summary>Turns are missing and the tails are too short to add them: wind anew.</summary>
    Rewind,

    /// <summary>One turn is too coarse here: change the capacitor.</summary>
    ChangeCapacitor,
}

/// <summary>A measured winding. Shares are relative (0.02 = 2 %). Immutable.</summary>
/// <param name="Turns">Turns on the core, one or more.</param>
/// <param name="Ratio">Measured over wanted inductance, above zero.</param>
/// <param name="Uncertainty">Expanded uncertainty (k = 2) of the ratio, 0 to below 1.</param>
public sealed record WindingReading(int Turns, double Ratio, double Uncertainty)
{
    /// <summary>Deviation that needs no action at all; zero unless given.</summary>
    public double Acceptable { get; init; }

    /// <summary>Deviation that the trimmer still absorbs; see <see cref="AdjustmentLimits.TrimRange"/>.</summary>
    public double Trim { get; init; }

    /// <summary>How far the turns can be moved.</summary>
    public AdjustmentLimits Limits { get; init; } = AdjustmentLimits.Usual;

    /// <summary>Whether the tails are long enough for more turns.</summary>
    public bool TailAllowsAdding { get; init; } = true;

    /// <summary>Measured over wanted inductance from the frequencies of one circuit: (f wanted / f measured)^2. A low frequency is a large coil.</summary>
    public static double RatioFrom(Frequency wanted, Frequency measured) => wanted / measured * (wanted / measured);

    /// <summary>Expanded uncertainty of a ratio from frequency: 2 sqrt((2 uf)^2 + uC^2), relative standard uncertainties of frequency and capacitor.</summary>
    public static double UncertaintyFrom(double frequency, double capacitor) =>
        2 * Math.Sqrt((4 * frequency * frequency) + (capacitor * capacitor));
}

/// <summary>
/// Which way and how many turns. Too large an inductance (frequency too low) asks for spreading or fewer turns, too small for squeezing or more.
/// Method: the cheapest action that reaches the target, turns only where nothing else does and only as many as the reading's uncertainty vouches
/// for; the same inductance law L ~ N^2 for all. Valid: a spread winding below a third of its self-resonance. Source: common practice. Immutable.
/// </summary>
/// <param name="Action">What to do.</param>
/// <param name="TurnChange">Turns to change in all; negative is off.</param>
/// <param name="FirstStep">Turns to change before measuring again; the same sign, at least one where turns change.</param>
/// <param name="IsFirm">Whether both ends of the uncertainty ask for the same number of turns.</param>
/// <param name="Residual">Relative deviation left after all turns; the present one where no turns change.</param>
/// <param name="RatioAfterFirstStep">Expected measured over wanted inductance after the first step.</param>
/// <param name="CapacitanceFactor">What the total capacitance would be multiplied by to tune this winding as it is: 1/ratio.</param>
public sealed record WindingAdjustment(
    WindingAction Action, int TurnChange, int FirstStep, bool IsFirm, double Residual, double RatioAfterFirstStep, double CapacitanceFactor)
{
    /// <summary>The action for a measured winding.</summary>
    public static WindingAdjustment For(WindingReading reading)
    {
        Guard.Within(reading.Turns, 1, 10_000, nameof(reading.Turns));
        Guard.Positive(reading.Ratio, nameof(reading.Ratio));
        Guard.Within(reading.Uncertainty, 0, 0.99, nameof(reading.Uncertainty));
        return WithoutTurns(reading) is { } action ? Keeping(reading, action) : ByTurns(reading);
    }

    /// <summary>Frequency to expect after the first step, from the one measured with the same capacitors.</summary>
    public Frequency ExpectedReading(Frequency measured, WindingReading before) =>
        measured * Math.Sqrt(before.Ratio / RatioAfterFirstStep);

    private static WindingAction? WithoutTurns(WindingReading r)
    {
        var deviation = r.Ratio - 1;
        if (Math.Abs(deviation) <= r.Acceptable) return WindingAction.None;
        if (Math.Abs(deviation) <= r.Trim) return WindingAction.Trim;
        if (Math.Abs(deviation) <= r.Uncertainty) return WindingAction.Remeasure;
        if (deviation > 0) return 1 - (1 / r.Ratio) <= r.Limits.SpreadMaximum ? WindingAction.Spread : null;
        return (1 / r.Ratio) - 1 <= r.Limits.SqueezeMaximum ? WindingAction.Squeeze : null;
    }

    private static WindingAdjustment ByTurns(WindingReading r)
    {
        var change = ChangeFor(r.Turns, r.Ratio);
        var residual = After(r, change) - 1;
        var reach = r.Trim + (residual > 0 ? r.Limits.SpreadMaximum : r.Limits.SqueezeMaximum);
        if (change == 0 || Math.Abs(residual) > reach) return Keeping(r, WindingAction.ChangeCapacitor);

        var (low, high) = (ChangeFor(r.Turns, r.Ratio * (1 - r.Uncertainty)), ChangeFor(r.Turns, r.Ratio * (1 + r.Uncertainty)));
        var first = Math.Sign(change) * Math.Max(1, Math.Min(Math.Abs(low), Math.Abs(high)));
        var action = change < 0 ? WindingAction.Remove : r.TailAllowsAdding ? WindingAction.Add : WindingAction.Rewind;
        return new(action, change, first, low == high, residual, After(r, first), 1 / r.Ratio);
    }

    private static WindingAdjustment Keeping(WindingReading r, WindingAction action) =>
        new(action, 0, 0, IsFirm: true, r.Ratio - 1, r.Ratio, 1 / r.Ratio);

    // Whole number of turns with the smallest deviation, as a change; at least one turn stays.
    private static int ChangeFor(int turns, double ratio)
    {
        var below = Math.Max(1, (int)Math.Floor(turns / Math.Sqrt(ratio)));
        double Deviation(int n) => Math.Abs((ratio * n * n / ((double)turns * turns)) - 1);
        return (Deviation(below) <= Deviation(below + 1) ? below : below + 1) - turns;
    }

    private static double After(WindingReading r, int change)
    {
        var share = (double)(r.Turns + change) / r.Turns;
        return r.Ratio * share * share;
    }
}
