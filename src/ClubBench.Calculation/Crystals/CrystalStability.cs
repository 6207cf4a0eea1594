using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Crystals;

/// <summary>How far a crystal may be from what is marked, in ppm each, zero or above. Immutable.</summary>
/// <remarks>
/// Method: worst case, the three added. Valid: AT cut, whose curve over temperature is cubic: near 25 degrees Celsius it falls by 0 to 0.3 ppm/K.
/// Source: common practice, from memory; a maker's sheet replaces the figures.
/// </remarks>
/// <param name="TolerancePpm">As delivered at 25 degrees Celsius.</param>
/// <param name="TemperaturePpm">Over the range of temperature.</param>
/// <param name="AgeingPpm">Over the time looked at.</param>
public sealed record CrystalStability(double TolerancePpm, double TemperaturePpm, double AgeingPpm)
{
    /// <summary>An economical AT cut from 0 to 50 degrees Celsius in its first year.</summary>
    public static CrystalStability Economical { get; } = new(30, 30, 5);

    /// <summary>All three together, either way.</summary>
    public double WorstPpm =>
        Guard.Within(TolerancePpm, 0, 1e5, nameof(TolerancePpm)) + Guard.Within(TemperaturePpm, 0, 1e5, nameof(TemperaturePpm)) + Guard.Within(AgeingPpm, 0, 1e5, nameof(AgeingPpm));

    /// <summary>Where a frequency may come to lie.</summary>
    public FrequencyRange Reach(Frequency marked) => new(marked * (1 - (WorstPpm * 1e-6)), marked * (1 + (WorstPpm * 1e-6)));
}
