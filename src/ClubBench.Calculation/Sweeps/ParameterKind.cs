using System.Numerics;

namespace ClubBench.Calculation.Sweeps;

/// <summary>Which parameters a file states.</summary>
internal enum ParameterKind
{
    /// <summary>Scattering.</summary>
    S,

    /// <summary>Admittance.</summary>
    Y,

    /// <summary>Impedance.</summary>
    Z,

    /// <summary>Hybrid.</summary>
    H,

    /// <summary>Inverse hybrid.</summary>
    G,
}

/// <summary>Other parameters as scattering parameters.</summary>
/// <remarks>Method: voltages over the root and currents times the root of the reference, then S by definition. Valid: real references. Source: pozar-microwave.</remarks>
internal static class ParameterConversion
{
    /// <summary>One port, normalised to its reference; null where it has no reflection that is finite.</summary>
    public static Complex? ToScattering(ParameterKind kind, Complex value) => kind switch
    {
        ParameterKind.S => value,
        ParameterKind.Y => Quotient(1 - value, 1 + value),
        _ => Quotient(value - 1, value + 1),
    };

    /// <summary>Two ports, normalised to their references; null where the network has no scattering parameters that are finite.</summary>
    public static Matrix2? ToScattering(ParameterKind kind, Matrix2 m)
    {
        if (kind == ParameterKind.S) return m;
        var cross = m.A12 * m.A21;
        var (up, down) = (m.A11 + 1, m.A22 + 1);
        var denominator = (up * down) - cross;
        if (denominator == Complex.Zero) return null;
        var (first, second) = (((m.A11 - 1) * down) - cross, (up * (m.A22 - 1)) - cross);
        var (s11, s12, s21, s22) = kind switch
        {
            ParameterKind.Z => (first, 2 * m.A12, 2 * m.A21, second),
            ParameterKind.Y => (-first, -2 * m.A12, -2 * m.A21, -second),
            ParameterKind.H => (first, 2 * m.A12, -2 * m.A21, -second),
            _ => (-first, -2 * m.A12, 2 * m.A21, second),
        };
        return new(s11 / denominator, s12 / denominator, s21 / denominator, s22 / denominator);
    }

    /// <summary>Parameters in ohm and siemens divided by their references.</summary>
    public static Matrix2 Normalised(ParameterKind kind, Matrix2 m, double ohm1, double ohm2)
    {
        var (both, ratio) = (Math.Sqrt(ohm1 * ohm2), Math.Sqrt(ohm2 / ohm1));
        return kind switch
        {
            ParameterKind.Z => new(m.A11 / ohm1, m.A12 / both, m.A21 / both, m.A22 / ohm2),
            ParameterKind.Y => new(m.A11 * ohm1, m.A12 * both, m.A21 * both, m.A22 * ohm2),
            ParameterKind.H => new(m.A11 / ohm1, m.A12 * ratio, m.A21 * ratio, m.A22 * ohm2),
            ParameterKind.G => new(m.A11 * ohm1, m.A12 / ratio, m.A21 / ratio, m.A22 / ohm2),
            _ => m,
        };
    }

    private static Complex? Quotient(Complex a, Complex b) => b == Complex.Zero ? null : a / b;
}
