using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Choosing;

/// <summary>Where the edge of a low-pass belongs for a band, and how much room the band leaves it.</summary>
/// <remarks>
/// Method: parts that are all too large by their tolerance pull the edge down by half the sum of the tolerances; the edge stays above the band even then.
/// Valid: tolerances as shares, 0 to 0.5 each.
/// Source: common practice.
/// </remarks>
public static class LowPassEdge
{
    /// <summary>Least distance of the edge above the band, as a factor.</summary>
    public const double LeastFactor = 1.05;

    /// <summary>Distance beyond which attenuation is given away without need, as a factor.</summary>
    public const double UsualLimitFactor = 1.15;

    /// <summary>How far the edge may move down, as a share of it: 0.05 for coils and capacitors of 5 % each.</summary>
    public static double WorstPull(double coilTolerance, double capacitorTolerance) =>
        0.5 * (Guard.Within(coilTolerance, 0, 0.5, nameof(coilTolerance)) + Guard.Within(capacitorTolerance, 0, 0.5, nameof(capacitorTolerance)));

    /// <summary>Lowest ripple edge that stays above the band with the worst parts.</summary>
    public static Frequency For(FrequencyRange band, double coilTolerance, double capacitorTolerance) =>
        band.High * Math.Max(LeastFactor, 1 / (1 - WorstPull(coilTolerance, capacitorTolerance)));

    /// <summary>
    /// Lowest second harmonic over highest wanted frequency, at most 2: the room between pass-band and stop-band, which sets the order. 1 or less: no low-pass can serve
    /// the whole band.
    /// </summary>
    public static double HarmonicGap(FrequencyRange band) => 2 * (band.Low / band.High);

    /// <summary>Ripple edge of a filter whose catalogue states its half-power cut-off.</summary>
    public static Frequency FromHalfPower(Frequency cutOff3dB, LowPassPrototype prototype) => cutOff3dB / prototype.HalfPowerRatio;
}
