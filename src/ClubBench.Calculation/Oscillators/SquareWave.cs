using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>
/// Harmonics of a clock generator. A hard-switched mixer receives on three times the frequency only some 10 dB down: the front end must supply
/// the rest. Method: Fourier series of a rectangle, |sin(n pi D)|/(n sin(pi D)). Source: derived.
/// </summary>
public static class SquareWave
{
    /// <summary>Attenuation against the third harmonic that is wanted in all before a hard-switched mixer. Source: common practice.</summary>
    public static Decibels WantedHarmonicRejection { get; } = Decibels.FromDb(50);

    /// <summary>
    /// Level of a harmonic (1 to 100) against the fundamental for a share of the period spent high, 0.01 to 0.99; null where it vanishes (more than 200 dB down).
    /// </summary>
    public static Decibels? Level(int harmonic, double dutyCycle)
    {
        var (n, d) = (Guard.Within(harmonic, 1, 100, nameof(harmonic)), Guard.Within(dutyCycle, 0.01, 0.99, nameof(dutyCycle)));
        var ratio = Math.Abs(Math.Sin(n * Math.PI * d)) / (n * Math.Sin(Math.PI * d));
        return ratio > 1e-10 ? Decibels.FromAmplitudeRatio(ratio) : null;
    }

    /// <summary>
    /// What the front end has to take off a harmonic (2 to 100) before a hard-switched mixer, at least zero; null where the clock has no such harmonic.
    /// </summary>
    public static Decibels? FrontEndNeeded(int harmonic, double dutyCycle) =>
        Level(Guard.Within(harmonic, 2, 100, nameof(harmonic)), dutyCycle) is { } level ? Decibels.FromDb(Math.Max(0, WantedHarmonicRejection.Db + level.Db)) : null;

    /// <summary>Clock needed for quadrature by dividing by four; the part must reach it on the new band.</summary>
    public static Frequency ClockForQuadrature(Frequency signal) => signal * 4;

    /// <summary>Shift in Hz from an error of the reference in ppm, either sign.</summary>
    public static double ShiftHertz(Frequency output, double referencePpm) => output.Hertz * Guard.Within(referencePpm, -1e6, 1e6, nameof(referencePpm)) * 1e-6;
}
