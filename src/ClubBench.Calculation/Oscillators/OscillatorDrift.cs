using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>Temperature coefficients of the parts of a pulled crystal oscillator, each in ppm per kelvin, either sign.</summary>
/// <param name="InductorPpmPerKelvin">Series inductor; moulded chokes +100..+500, iron powder +35..+95.</param>
/// <param name="VariablePpmPerKelvin">Variable capacitor.</param>
/// <param name="OscillatorPpmPerKelvin">Feedback capacitors; 0 +/-30 for NP0.</param>
/// <param name="CrystalPpmPerKelvin">Crystal near 25 degrees Celsius; 0 to -0.3 for an AT cut.</param>
public sealed record LoopTemperatureCoefficients(
    double InductorPpmPerKelvin, double VariablePpmPerKelvin, double OscillatorPpmPerKelvin, double CrystalPpmPerKelvin);

/// <summary>Drift of a pulled crystal oscillator: each coefficient weighed by its sensitivity. Source: derived.</summary>
public static class OscillatorDrift
{
    /// <summary>Drift in ppm over a rise of temperature at one setting.</summary>
    public static double Ppm(PulledCrystalPoint point, LoopTemperatureCoefficients parts, TemperatureRise rise)
    {
        var s = point.Sensitivities;
        var perKelvin = (s.Inductor * parts.InductorPpmPerKelvin)
            + (s.Variable * parts.VariablePpmPerKelvin)
            + (s.Oscillator * parts.OscillatorPpmPerKelvin)
            + parts.CrystalPpmPerKelvin;
        return perKelvin * rise.Kelvin;
    }

    /// <summary>Drift in Hz over a rise of temperature at one setting.</summary>
    public static double Hertz(PulledCrystalPoint point, LoopTemperatureCoefficients parts, TemperatureRise rise) =>
        point.Frequency.Hertz * 1e-6 * Ppm(point, parts, rise);
}
