using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Crystals;

/// <summary>
/// AT-cut plate with round electrodes: what to expect of a crystal before it is measured. For plausibility, not as data. Immutable.
/// Method: thickness 1.66 mm MHz/f; 40 pF/m times electrode area over thickness; Cm a two-hundredth to a two-hundred-and-fiftieth of it.
/// Valid: fundamental of an AT cut. Source: vig-quartz-tutorial (40 pF/m); the thickness from memory.
/// </summary>
/// <param name="Fundamental">Fundamental frequency.</param>
/// <param name="ElectrodeDiameter">Diameter of both electrodes, above zero.</param>
public sealed record QuartzPlate(Frequency Fundamental, Length ElectrodeDiameter)
{
    private const double ThicknessMetreHertz = 1.66e3;
    private const double FaradPerMetre = 40e-12;

    /// <summary>Thickness; makers shrink the electrodes as it falls.</summary>
    public Length Thickness => Length.FromMetre(ThicknessMetreHertz / Fundamental.Hertz);

    /// <summary>Capacitance of the electrodes alone; a holder adds about 1 pF.</summary>
    public Capacitance ElectrodeCapacitance
    {
        get
        {
            var radius = 0.5 * Guard.Positive(ElectrodeDiameter.Metre, nameof(ElectrodeDiameter));
            return Capacitance.FromFarad(FaradPerMetre * Math.PI * radius * radius / Thickness.Metre);
        }
    }

    /// <summary>Cm on an odd overtone, 1 for the fundamental: falls with its square.</summary>
    public Spread<Capacitance> MotionalCapacitance(int overtone = 1)
    {
        if (overtone < 1 || overtone % 2 == 0) throw new ArgumentOutOfRangeException(nameof(overtone), overtone, "An overtone is an odd number from 1 on.");
        var each = ElectrodeCapacitance / (overtone * overtone);
        return new(each / 250, each / 225, each / 200);
    }
}
