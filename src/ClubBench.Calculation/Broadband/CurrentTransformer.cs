using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Broadband;

/// <summary>
/// A current transformer: the line passes once through the ring, the winding carries a burden.
/// Valid: winding impedance ten times the burden or more at the lowest frequency, else the reading falls and its phase turns. Source: derived.
/// Immutable.
/// </summary>
/// <param name="Turns">Turns of the winding, one or more.</param>
/// <param name="Burden">Burden resistor, above zero.</param>
/// <param name="Line">Resistance of the line, above zero.</param>
public sealed record CurrentTransformer(int Turns, Resistance Burden, Resistance Line)
{
    private const double EnoughRatio = 10;

    /// <summary>Resistance inserted in the line: Rb/N^2.</summary>
    public Resistance Inserted => Burden / ((double)Turns * Turns);

    /// <summary>Loss on the line, zero or above: 20 log10(1 + Rb/(2 N^2 R0)).</summary>
    public Decibels Loss => Decibels.FromAmplitudeRatio(1 + (Inserted / Line / 2));

    /// <summary>Power in the burden against that on the line, negative: Rb/(N^2 R0).</summary>
    public Decibels Coupling => Decibels.FromPowerRatio(Inserted / Line);

    /// <summary>RMS voltage across the burden for a power into a matched line.</summary>
    public Voltage BurdenRms(Power power) => Voltage.FromVolt(Math.Sqrt(power.Watt / Line.Ohm) / Turns * Burden.Ohm);

    /// <summary>Whether a winding of this impedance in ohm is enough for the burden.</summary>
    public bool IsEnough(Complex windingImpedance) => Complex.Abs(windingImpedance) >= EnoughRatio * Burden.Ohm;
}

/// <summary>A bridge of three resistors equal to the line: the detector sees half the reflection coefficient. Source: derived. Immutable.</summary>
/// <param name="Line">Resistance of the arms, above zero.</param>
public sealed record ResistiveBridge(Resistance Line)
{
    /// <summary>Loss into a matched load.</summary>
    public static Decibels MatchedLoss => Decibels.FromPowerRatio(4);

    /// <summary>Detector over input voltage for a resistive load: half the reflection coefficient, 0 to 0.5. Null load: open.</summary>
    public double DetectorShare(Resistance? load) =>
        load is { } r ? Math.Abs(r.Ohm - Line.Ohm) / (2 * (r.Ohm + Line.Ohm)) : 0.5;

    /// <summary>Standing wave ratio at the source for a resistive load: never above 2. Null load: open.</summary>
    public double SourceStandingWaveRatio(Resistance? load)
    {
        var fixedArm = 2 * Line.Ohm;
        var input = load is { } r ? fixedArm * (Line.Ohm + r.Ohm) / (fixedArm + Line.Ohm + r.Ohm) : fixedArm;
        return Math.Max(input / Line.Ohm, Line.Ohm / input);
    }
}
