using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Crystals;

/// <summary>
/// What ceramic resonators usually are. A variable capacitor alone pulls them by several per cent; they drift like a good coil and capacitor, so judge them
/// as such. Typical figures, to be replaced by a measurement. Source: common practice, from memory.
/// </summary>
public static class CeramicResonators
{
    /// <summary>C0/Cm.</summary>
    public static Spread<double> CapacitanceRatio { get; } = new(4, 6, 10);

    /// <summary>Unloaded Q.</summary>
    public static Spread<double> UnloadedQ { get; } = new(500, 1000, 2000);

    /// <summary>Size of the temperature coefficient, ppm/K, either sign.</summary>
    public static Spread<double> PpmPerKelvin { get; } = new(20, 35, 50);

    /// <summary>Initial tolerance, ppm.</summary>
    public const double TolerancePpm = 5000;

    /// <summary>Whether a resonator looks like a ceramic one: ratio within the usual spread and, where its resistance is stated, Q too.</summary>
    public static bool IsPlausible(CrystalParameters resonator) =>
        Within(resonator.CapacitanceRatio, CapacitanceRatio) && (resonator.UnloadedQ is not { } q || Within(q, UnloadedQ));

    /// <summary>Largest drift to expect over a rise of temperature, Hz.</summary>
    public static double LargestDriftHertz(Frequency frequency, TemperatureRise rise) =>
        Guard.Finite(frequency.Hertz * 1e-6 * PpmPerKelvin.High * Math.Abs(rise.Kelvin), nameof(rise));

    private static bool Within(double value, Spread<double> spread) => value >= spread.Low && value <= spread.High;
}
