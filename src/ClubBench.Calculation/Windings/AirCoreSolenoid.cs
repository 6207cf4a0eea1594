using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Windings;

/// <summary>
/// A single-layer coil of round wire without a core. Valid: three turns or more, pitch not below the wire; leads add 0.8 to 1 nH a millimetre
/// (common practice). Immutable.
/// </summary>
/// <param name="Diameter">Diameter of the centre line of the wire: former plus one wire.</param>
/// <param name="Turns">Turns, three or more.</param>
/// <param name="Pitch">Distance from turn to turn.</param>
/// <param name="BareWire">Diameter of the copper, above zero and not above the pitch.</param>
public sealed record AirCoreSolenoid(Length Diameter, int Turns, Length Pitch, Length BareWire)
{
    private const double MillimetrePerInch = 25.4;

    /// <summary>Length of the equivalent current sheet, N p; measured over the wires a coil is (N - 1) p + d long.</summary>
    public Length CoilLength => Turns * Pitch;

    /// <summary>
    /// Inductance of the current sheet, mu0 N^2 area/length times Nagaoka's coefficient. Source: nagaoka-1909.
    /// </summary>
    public Inductance CurrentSheet
    {
        get
        {
            var radius = Diameter.Metre / 2;
            var area = Math.PI * radius * radius;
            return Inductance.FromHenry(Copper.VacuumPermeability * Turns * Turns * area / CoilLength.Metre * NagaokaCoefficient(Diameter / CoilLength));
        }
    }

    /// <summary>
    /// Inductance with the correction for round wire in place of a sheet. Valid: within 0.4 % of the sum over coaxial loops.
    /// Source: rosa-grover-1912, correction A + B; series for B as in grover-1946.
    /// </summary>
    public Inductance Inductance
    {
        get
        {
            Guard.Within(Turns, 3, 10_000, nameof(Turns));
            Guard.NotNegative(Pitch.Metre - BareWire.Metre, nameof(Pitch));
            double n = Turns;
            var a = 1.25 - Math.Log(2 * (Pitch / BareWire));
            var b = Math.Log(2 * Math.PI) - 1.5 - (Math.Log(n) / (6 * n)) - (0.33084 / n) - (1 / (120 * Math.Pow(n, 3))) + (1 / (504 * Math.Pow(n, 5)));
            var correctionMicrohenry = 0.004 * Math.PI * (Diameter.Centimetre / 2) * n * (a + b);
            return Inductance.FromMicrohenry(CurrentSheet.Microhenry - correctionMicrohenry);
        }
    }

    /// <summary>
    /// Quick estimate r^2 N^2/(9 r + 10 l), inches and microhenry. Valid: length above 0.8 of the radius, within 1 % of the current sheet.
    /// Source: wheeler-1928.
    /// </summary>
    public Inductance Wheeler
    {
        get
        {
            var (r, l) = (Diameter.Millimetre / 2 / MillimetrePerInch, CoilLength.Millimetre / MillimetrePerInch);
            return Inductance.FromMicrohenry(r * r * Turns * Turns / ((9 * r) + (10 * l)));
        }
    }

    /// <summary>
    /// Nagaoka's coefficient for a ratio of diameter to length above zero: 1 for a long coil, falling. Method: complete elliptic integrals by the
    /// arithmetic-geometric mean. Source: nagaoka-1909.
    /// </summary>
    public static double NagaokaCoefficient(double diameterOverLength)
    {
        var u2 = Guard.Positive(diameterOverLength, nameof(diameterOverLength)) * diameterOverLength;
        var k2 = u2 / (1 + u2);
        var (first, second) = EllipticIntegrals(k2);
        return 4 / (3 * Math.PI * Math.Sqrt(1 - k2)) * (((1 - k2) / k2 * first) + (((2 * k2) - 1) / k2 * second) - Math.Sqrt(k2));
    }

    // Complete elliptic integrals K and E of modulus squared k2, by the arithmetic-geometric mean.
    private static (double First, double Second) EllipticIntegrals(double k2)
    {
        var (a, b, c, weight, sum) = (1.0, Math.Sqrt(1 - k2), Math.Sqrt(k2), 0.5, 0.0);
        while (c > 1e-16)
        {
            sum += weight * c * c;
            (a, b, c, weight) = ((a + b) / 2, Math.Sqrt(a * b), (a - b) / 2, 2 * weight);
        }

        var first = Math.PI / (2 * a);
        return (first, first * (1 - sum));
    }
}
