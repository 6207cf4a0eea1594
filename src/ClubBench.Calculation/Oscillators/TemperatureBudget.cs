using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>A capacitor across the tank of a free-running oscillator.</summary>
/// <param name="Value">Capacitance.</param>
/// <param name="PpmPerKelvin">Temperature coefficient in ppm/K: 0 for NP0, -150 for N150, -750 for N750.</param>
public sealed record TankCapacitor(Capacitance Value, double PpmPerKelvin);

/// <summary>
/// Temperature coefficient of a free-running oscillator: -(TC_L + sum of share times TC_C)/2. Valid: capacitors in parallel. Source: derived.
/// </summary>
public static class TemperatureBudget
{
    /// <summary>Residual that careful compensation leaves, ppm/K. Source: common practice.</summary>
    public const double WellCompensatedPpmPerKelvin = 3;

    /// <summary>Coefficient of the frequency in ppm/K from that of the coil (ppm/K) and the capacitors, of which there is at least one.</summary>
    public static double PpmPerKelvin(double coilPpmPerKelvin, IReadOnlyList<TankCapacitor> capacitors)
    {
        var totalF = Guard.Positive(capacitors.Sum(c => c.Value.Farad), nameof(capacitors));
        return -(coilPpmPerKelvin + capacitors.Sum(c => c.Value.Farad / totalF * c.PpmPerKelvin)) / 2;
    }

    /// <summary>
    /// Share (0..1) of the total capacitance to make of a type with <paramref name="compensatingPpmPerKelvin"/> so that coil and remaining capacitors are compensated;
    /// null when this type cannot do it.
    /// </summary>
    public static double? CompensatingShare(double coilPpmPerKelvin, double remainingPpmPerKelvin, double compensatingPpmPerKelvin)
    {
        var difference = compensatingPpmPerKelvin - remainingPpmPerKelvin;
        if (difference == 0) return null;
        var share = -(coilPpmPerKelvin + remainingPpmPerKelvin) / difference;
        return share is >= 0 and <= 1 ? share : null;
    }

    /// <summary>Highest frequency at which a residual (ppm/K, not zero) keeps the drift within <paramref name="driftHertz"/> over a rise above zero.</summary>
    public static Frequency HighestFrequency(double driftHertz, double residualPpmPerKelvin, TemperatureRise rise) =>
        Frequency.FromHertz(Guard.Positive(driftHertz, nameof(driftHertz)) * 1e6
            / (Math.Abs(residualPpmPerKelvin) * Guard.Positive(rise.Kelvin, nameof(rise))));

    /// <summary>Drift in Hz from a coefficient (ppm/K, either sign) over a rise.</summary>
    public static double DriftHertz(Frequency frequency, double ppmPerKelvin, TemperatureRise rise) =>
        Guard.Finite(frequency.Hertz * 1e-6 * Guard.Within(ppmPerKelvin, -1e6, 1e6, nameof(ppmPerKelvin)) * rise.Kelvin, nameof(rise));
}
