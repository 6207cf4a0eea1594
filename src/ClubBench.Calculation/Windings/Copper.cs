using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Windings;

/// <summary>Resistance of round copper wire at direct current and at radio frequency.</summary>
public static class Copper
{
    /// <summary>Magnetic constant in H/m. Source: si-2019 (measured since 2019; 4 pi 1e-7 to 1e-9 relative).</summary>
    internal const double VacuumPermeability = 4e-7 * Math.PI;

    // Annealed copper at 20 C, ohm metre, and its change per kelvin. Source: iec-60028.
    private const double ResistivityAt20 = 1.7241e-8;
    private const double ResistivityPerKelvin = 0.00393;

    /// <summary>Resistance of a wire of this bare diameter at direct current, 20 C unless stated. Source: iec-60028.</summary>
    public static Resistance DirectCurrent(Length wireLength, Length bareDiameter, double celsius = 20)
    {
        var resistivity = ResistivityAt20 * (1 + (ResistivityPerKelvin * (Guard.Finite(celsius, nameof(celsius)) - 20)));
        return Resistance.FromOhm(resistivity * wireLength.Metre / (Math.PI * Square(bareDiameter.Metre / 2)));
    }

    /// <summary>Skin depth at 20 C: 66.1 micrometre at 1 MHz, falling with the root of frequency.</summary>
    public static Length SkinDepth(Frequency frequency) =>
        Length.FromMetre(Math.Sqrt(ResistivityAt20 / (Math.PI * frequency.Hertz * VacuumPermeability)));

    /// <summary>
    /// Ratio of AC to DC resistance of a straight isolated round wire, 1 or above. Method: piecewise skin-effect factor of the cable standard.
    /// Valid: within 0.6 % of the Bessel solution for radius/skin depth 0.05 to 40; a wound coil adds proximity loss of two to three times.
    /// Source: iec-60287-1-1, skin effect factor.
    /// </summary>
    public static double SkinFactor(Length bareDiameter, Frequency frequency)
    {
        var x = bareDiameter.Metre / 2 / SkinDepth(frequency).Metre;
        if (x < 1.98) return 1 + (Math.Pow(x, 4) / (48 + (0.8 * Math.Pow(x, 4))));
        var y = Math.Sqrt(2) * x;
        return x < 2.69 ? 0.864 - (0.0177 * y) + (0.0563 * y * y) : (x / 2) + 0.267;
    }

    /// <summary>Resistance at a frequency, isolated wire.</summary>
    public static Resistance AlternatingCurrent(Length wireLength, Length bareDiameter, Frequency frequency) =>
        DirectCurrent(wireLength, bareDiameter) * SkinFactor(bareDiameter, frequency);

    private static double Square(double x) => x * x;
}
