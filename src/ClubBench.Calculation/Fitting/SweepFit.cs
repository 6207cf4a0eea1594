using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Fitting;

/// <summary>Why a sweep names no part.</summary>
public enum FitRefusal
{
    /// <summary>It does.</summary>
    None,

    /// <summary>Fewer than 20 points.</summary>
    TooFewPoints,

    /// <summary>The sweep does not reach from well below to well above the cut-off.</summary>
    CoversTooLittle,

    /// <summary>Every angle is zero: sizes alone do not tell the parts apart.</summary>
    AnglesMissing,

    /// <summary>The residual is more than three times the noise: check calibration plane, connectors and solder bridges.</summary>
    ModelDoesNotFit,
}

/// <summary>How well a sweep shows a part: spread after over spread before the measurement.</summary>
public enum PartVisibility
{
    /// <summary>Above 0.8: the value is only the nominal one.</summary>
    NotVisible,

    /// <summary>Between 0.5 and 0.8.</summary>
    Faint,

    /// <summary>Below 0.5.</summary>
    WellSeen,
}

/// <summary>One part of the board as the sweep shows it.</summary>
/// <param name="Arm">Arm of the ladder, from 0.</param>
/// <param name="IsCoil">Coil or capacitor of that arm.</param>
/// <param name="Scale">Value over nominal value.</param>
/// <param name="StandardDeviation">Standard deviation of the scale, as a share (k = 1).</param>
/// <param name="SpreadRatio">Standard deviation after over before the measurement, above 0 to 1.</param>
/// <param name="MirrorArm">Arm that explains the sweep as well: "one or the other". Null where the arm is certain.</param>
public sealed record FittedPart(int Arm, bool IsCoil, double Scale, double StandardDeviation, double SpreadRatio, int? MirrorArm = null)
{
    /// <summary>How well the sweep shows it.</summary>
    public PartVisibility Visibility => SpreadRatio < 0.5 ? PartVisibility.WellSeen : SpreadRatio > 0.8 ? PartVisibility.NotVisible : PartVisibility.Faint;

    /// <summary>Whether it differs from nominal by more than two standard deviations and the sweep shows it.</summary>
    public bool Deviates => Visibility != PartVisibility.NotVisible && Math.Abs(Math.Log(Scale)) > 2 * StandardDeviation;

    /// <summary>Whether a capacitor is beyond its tolerance (a share, zero or above) by more than two standard deviations: a wrong part or one of a pair missing.</summary>
    public bool IsBeyond(double tolerance) => Deviates && Math.Abs(Scale - 1) > Guard.NotNegative(tolerance, nameof(tolerance)) + (2 * StandardDeviation);

    /// <summary>The E12 value that a capacitor beyond its tolerance measures like; null where it is within it. Nominal value above zero.</summary>
    public Capacitance? LooksLike(Capacitance nominal, double tolerance) => !IsCoil && IsBeyond(tolerance)
        ? Capacitance.FromPicofarad(PreferredValues.Nearest(Guard.Positive(nominal.Picofarad * Scale, nameof(nominal)), ESeries.E12))
        : null;

    /// <summary>Turns too many (or too few, below zero) of a coil that should have this many: N (sqrt(scale) - 1).</summary>
    public double SurplusTurns(int nominalTurns) => Guard.Within(nominalTurns, 1, 10_000, nameof(nominalTurns)) * (Math.Sqrt(Guard.Positive(Scale, nameof(Scale))) - 1);
}

/// <summary>A board's filter as its sweep shows it, or why the sweep names no part.</summary>
/// <param name="Refusal">The reason.</param>
/// <param name="Parts">Coils and capacitors in ladder order; empty where refused.</param>
/// <param name="CoilQ">Unloaded Q common to the coils; null where refused.</param>
/// <param name="Delay1Nanosecond">Cable or fixture at port 1 that the calibration left, ns; may be negative.</param>
/// <param name="Delay2Nanosecond">The same at port 2; zero where only the reflection was looked at.</param>
/// <param name="RmsResidual">What the model leaves, per real or imaginary part; zero where nothing was fitted.</param>
/// <param name="Noise">Noise it was weighed with; zero where nothing was fitted.</param>
/// <param name="Wanted">Frequencies a sweep should cover; null where the nominal filter has no cut-off.</param>
public sealed record SweepFit(
    FitRefusal Refusal,
    IReadOnlyList<FittedPart> Parts,
    double? CoilQ,
    double Delay1Nanosecond,
    double Delay2Nanosecond,
    double RmsResidual,
    double Noise,
    FrequencyRange? Wanted)
{
    /// <summary>Parts that differ from nominal.</summary>
    public IEnumerable<FittedPart> Deviating => Parts.Where(p => p.Deviates);
}
