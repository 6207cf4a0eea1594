using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Audio;

/// <summary>
/// Band-pass section with one operational amplifier: R1 in, R2 to ground, R3 as feedback, two equal capacitors. Immutable.
/// Method: multiple-feedback band-pass. Valid: amplifier gain far above 2 Q^2 at the centre. Source: derived.
/// </summary>
/// <param name="Input">R1, above zero.</param>
/// <param name="ToGround">R2, above zero.</param>
/// <param name="Feedback">R3, above zero.</param>
/// <param name="Capacitor">Each of the two capacitors, above zero.</param>
public sealed record MultipleFeedbackBandPass(Resistance Input, Resistance ToGround, Resistance Feedback, Capacitance Capacitor)
{
    /// <summary>Width of two equal sections in a row against one: sqrt(sqrt(2) - 1).</summary>
    public static double TwoSectionShrink { get; } = Math.Sqrt(Math.Sqrt(2) - 1);

    /// <summary>Centre frequency, sqrt((R1 + R2)/(R1 R2 R3))/(2 pi C).</summary>
    public Frequency Centre => Frequency.FromHertz(
        Math.Sqrt((Input + ToGround).Ohm / (Input.Ohm * ToGround.Ohm * Feedback.Ohm)) / (2 * Math.PI * Capacitor.Farad));

    /// <summary>Q = pi f0 C R3.</summary>
    public double Q => Math.PI * Centre.Hertz * Capacitor.Farad * Feedback.Ohm;

    /// <summary>Voltage gain at the centre as a ratio, R3/(2 R1); the section inverts.</summary>
    public double CentreGain => Feedback / (2 * Input);

    /// <summary>Width at -3 dB in Hz, f0/Q.</summary>
    public double Bandwidth3dBHertz => Centre.Hertz / Q;

    /// <summary>Width at -3 dB in Hz of two such sections in a row.</summary>
    public double TwoSectionBandwidth3dBHertz => Bandwidth3dBHertz * TwoSectionShrink;

    /// <summary>
    /// Resistors for a centre, a Q and a voltage gain (both above zero) with a chosen capacitor, or null when the gain is 2 Q^2 or more,
    /// which this circuit cannot give. R1 = Q/(A w C), R2 = Q/((2 Q^2 - A) w C), R3 = 2 Q/(w C).
    /// </summary>
    public static MultipleFeedbackBandPass? For(Frequency centre, double q, double gain, Capacitance capacitor)
    {
        Guard.Positive(q, nameof(q));
        Guard.Positive(gain, nameof(gain));
        var spare = (2 * q * q) - gain;
        if (spare <= 0) return null;
        var unit = q / (centre.RadiansPerSecond * Guard.Positive(capacitor.Farad, nameof(capacitor)));
        return new MultipleFeedbackBandPass(Resistance.FromOhm(unit / gain), Resistance.FromOhm(unit / spare), Resistance.FromOhm(2 * unit), capacitor);
    }
}
