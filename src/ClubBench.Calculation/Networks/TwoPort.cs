using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Networks;

/// <summary>A linear two-port at one frequency as a chain matrix: V1 = A V2 + B I2, I1 = C V2 + D I2, with I2 flowing out. Immutable.</summary>
/// <remarks>
/// Method: chain (ABCD) matrix; scattering parameters in the power-wave form for real references.
/// Valid: any linear two-port with a forward path; a passive reciprocal one has determinant 1.
/// Source: pozar-microwave, chain matrix.
/// </remarks>
/// <param name="A">Voltage ratio with the output open, no unit.</param>
/// <param name="B">Transfer impedance with the output shorted, ohm.</param>
/// <param name="C">Transfer admittance with the output open, siemens.</param>
/// <param name="D">Current ratio with the output shorted, no unit.</param>
public readonly record struct TwoPort(Complex A, Complex B, Complex C, Complex D)
{
    /// <summary>A straight connection.</summary>
    public static TwoPort Through => new(Complex.One, Complex.Zero, Complex.Zero, Complex.One);

    /// <summary>An impedance in the line.</summary>
    /// <param name="impedanceOhm">Complex impedance, ohm.</param>
    public static TwoPort Series(Complex impedanceOhm) => new(Complex.One, impedanceOhm, Complex.Zero, Complex.One);

    /// <summary>An admittance from the line to ground.</summary>
    /// <param name="admittanceSiemens">Complex admittance, siemens.</param>
    public static TwoPort Shunt(Complex admittanceSiemens) => new(Complex.One, Complex.Zero, admittanceSiemens, Complex.One);

    /// <summary>A D - B C: 1 for every passive reciprocal two-port.</summary>
    public Complex Determinant => (A * D) - (B * C);

    /// <summary>This two-port followed by another.</summary>
    public TwoPort Then(TwoPort next) => new(
        (A * next.A) + (B * next.C),
        (A * next.B) + (B * next.D),
        (C * next.A) + (D * next.C),
        (C * next.B) + (D * next.D));

    /// <summary>Forward transmission between two real resistances, both above zero. Its squared size is delivered over available power.</summary>
    public Complex S21(Resistance source, Resistance load)
    {
        var (rs, rl) = Terminations(source, load);
        return 2 * Math.Sqrt(rs * rl) / Denominator(rs, rl);
    }

    /// <summary>Input reflection with the load in place, referred to the source resistance.</summary>
    public Complex S11(Resistance source, Resistance load)
    {
        var (rs, rl) = Terminations(source, load);
        return ((A * rl) + B - (C * rs * rl) - (D * rs)) / Denominator(rs, rl);
    }

    /// <summary>Output reflection with the source in place, referred to the load resistance.</summary>
    public Complex S22(Resistance source, Resistance load)
    {
        var (rs, rl) = Terminations(source, load);
        return (-(A * rl) + B - (C * rs * rl) + (D * rs)) / Denominator(rs, rl);
    }

    /// <summary>Impedance seen at the input, ohm.</summary>
    /// <param name="loadOhm">Complex load impedance, ohm.</param>
    public Complex InputImpedance(Complex loadOhm) => ((A * loadOhm) + B) / ((C * loadOhm) + D);

    /// <summary>Impedance seen at the output, ohm.</summary>
    /// <param name="sourceOhm">Complex source impedance, ohm.</param>
    public Complex OutputImpedance(Complex sourceOhm) => ((D * sourceOhm) + B) / ((C * sourceOhm) + A);

    /// <summary>Transducer loss between two real resistances; at most 300 dB is told (a lossless notch blocks without end).</summary>
    public Decibels Loss(Resistance source, Resistance load) =>
        Decibels.FromAmplitudeRatio(1 / Math.Max(S21(source, load).Magnitude, 1e-15));

    /// <summary>Return loss at the input; at most 120 dB is told (a perfect match returns nothing).</summary>
    public Decibels ReturnLoss(Resistance source, Resistance load) =>
        Decibels.FromAmplitudeRatio(1 / Math.Max(S11(source, load).Magnitude, 1e-6));

    private Complex Denominator(double rs, double rl) => (A * rl) + B + (C * rs * rl) + (D * rs);

    private static (double Source, double Load) Terminations(Resistance source, Resistance load) =>
        (Guard.Positive(source.Ohm, nameof(source)), Guard.Positive(load.Ohm, nameof(load)));
}
