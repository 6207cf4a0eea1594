using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Windings;

/// <summary>How far the turns of a finished winding can be moved. Shares of its inductance (0.08 = 8 %). Immutable.</summary>
/// <param name="SpreadMaximum">How much spreading the turns lowers the inductance at most.</param>
/// <param name="SqueezeMaximum">How much squeezing them raises it at most.</param>
public sealed record AdjustmentLimits(double SpreadMaximum, double SqueezeMaximum)
{
    private const int FewTurns = 8;
    private const double CrowdedFill = 0.85;

    /// <summary>Iron powder, eight turns or more, with room left on the ring: 8 %. Source: common practice.</summary>
    public static AdjustmentLimits Usual { get; } = new(0.08, 0.08);

    /// <summary>A crowded or very short winding: 4 %. Source: common practice.</summary>
    public static AdjustmentLimits Crowded { get; } = new(0.04, 0.04);

    /// <summary>Ferrite, where the core holds the field: 2 %. Source: common practice.</summary>
    public static AdjustmentLimits Ferrite { get; } = new(0.02, 0.02);

    /// <summary>Open air coil: 15 %. Source: common practice.</summary>
    public static AdjustmentLimits AirCoil { get; } = new(0.15, 0.15);

    /// <summary>The limits to expect of a toroid winding. Source: common practice.</summary>
    public static AdjustmentLimits For(ToroidWinding winding)
    {
        if (winding.Core is FerriteCore) return Ferrite;
        return winding.Turns < FewTurns || winding.Fill is null or > CrowdedFill ? Crowded : Usual;
    }

    /// <summary>
    /// Share of inductance a trimmer still absorbs: distance to its nearer end over the total capacitance, less a fifth as reserve; zero at an end.
    /// All three are total capacitances of the circuit. Source: common practice.
    /// </summary>
    public static double TrimRange(Capacitance total, Capacitance totalAtMinimum, Capacitance totalAtMaximum)
    {
        Guard.Positive(total.Farad, nameof(total));
        var nearer = Math.Min(total.Farad - totalAtMinimum.Farad, totalAtMaximum.Farad - total.Farad);
        return Math.Max(0, 0.8 * nearer / total.Farad);
    }
}
