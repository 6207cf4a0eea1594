using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Measuring;

/// <summary>A diode that charges a capacitor to the peak of the signal, read by a direct-voltage meter. Immutable.</summary>
/// <remarks>
/// Method: P = ((Vdc + Vf) k)^2 / 2 R.
/// Valid: readings of at least 1 V; below, the diode is no longer linear (30 % either way). Meter current of a few microampere.
/// Source: derived; diode drops are common practice (silicon 0.35 to 0.6 V, Schottky 0.15 to 0.3 V, germanium 0.1 to 0.25 V).
/// </remarks>
/// <param name="DiodeDrop">Voltage lost in the diode.</param>
/// <param name="Divider">Ratio of a divider ahead of the diode, 1 without.</param>
/// <param name="Load">Resistance the power goes into, above zero.</param>
public sealed record PeakDetector(Voltage DiodeDrop, double Divider, Resistance Load)
{
    /// <summary>Least reading that follows the law.</summary>
    public static readonly Voltage LeastReading = Voltage.FromVolt(1);

    /// <summary>Power of a reading; false below one volt, where the figure is only good to 30 %.</summary>
    public bool TryPower(Voltage reading, out Power power)
    {
        var peak = (reading + DiodeDrop) * Guard.Within(Divider, 1, 1e4, nameof(Divider));
        power = RfVoltage.FromPeakToPeak(peak * 2, Load);
        return reading >= LeastReading;
    }

    /// <summary>Reading to expect of a power; zero where the diode does not conduct.</summary>
    public Voltage Reading(Power power) =>
        Voltage.FromVolt(Math.Max(0, (RfVoltage.Peak(power, Load).Volt / Guard.Within(Divider, 1, 1e4, nameof(Divider))) - DiodeDrop.Volt));

    /// <summary>Reverse voltage the diode must stand: twice the peak it sees.</summary>
    public Voltage ReverseVoltage(Power power) => RfVoltage.PeakToPeak(power, Load) / Divider;
}
