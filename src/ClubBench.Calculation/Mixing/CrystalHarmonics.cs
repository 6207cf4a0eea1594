using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>Where the harmonics of a fixed crystal would be heard. Method: k X for k = 1 to 5. Source: derived; order and distance are common practice.</summary>
public static class CrystalHarmonics
{
    private const int Highest = 5;
    private const double NearHz = 5000;

    /// <summary>Lowest harmonic (1 is the crystal itself) that falls into a range, or null when none does.</summary>
    public static int? In(FrequencyRange range, Frequency crystal) => First(crystal, range.Contains);

    /// <summary>Lowest harmonic within 5 kHz of a frequency, or null when none is.</summary>
    public static int? Near(Frequency frequency, Frequency crystal) => First(crystal, f => Math.Abs(f.Hertz - frequency.Hertz) <= NearHz);

    private static int? First(Frequency crystal, Func<Frequency, bool> isHeard) =>
        Enumerable.Range(1, Highest).Where(k => isHeard(crystal.Harmonic(k))).Select(k => (int?)k).FirstOrDefault();
}
