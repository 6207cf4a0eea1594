using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Emissions;

/// <summary>Collector current of a stage that conducts during part of a cycle: the top of a sine, relative to its peak. Immutable.</summary>
/// <remarks>
/// Method: Fourier series of the truncated sine.
/// Valid: current pulses of ideal shape; a real stage rounds them, so harmonics above the third are rather weaker.
/// Source: derived.
/// </remarks>
public readonly record struct ConductionAngle
{
    private ConductionAngle(double degrees) => Degrees = degrees;

    /// <summary>Whole angle of conduction in degrees: 180 is class B, less is class C.</summary>
    public double Degrees { get; }

    /// <summary>From the whole angle in degrees, 10 to 360.</summary>
    public static ConductionAngle FromDegrees(double degrees) => new(Guard.Within(degrees, 10, 360, nameof(degrees)));

    /// <summary>Direct current over peak current.</summary>
    public double DirectCurrent => (Math.Sin(Half) - (Half * Math.Cos(Half))) / Scale;

    /// <summary>Amplitude of a harmonic over peak current; 1 is the fundamental. Negative where the phase turns over.</summary>
    public double Amplitude(int harmonic)
    {
        var n = Guard.Within(harmonic, 1, 100, nameof(harmonic));
        return n == 1
            ? (Half - (Math.Sin(Half) * Math.Cos(Half))) / Scale
            : 2 * ((Math.Sin(n * Half) * Math.Cos(Half)) - (n * Math.Cos(n * Half) * Math.Sin(Half))) / (n * ((n * n) - 1) * Scale);
    }

    /// <summary>A harmonic of the current relative to the fundamental; null where it vanishes (more than 200 dB down).</summary>
    public Decibels? RelativeLevel(int harmonic)
    {
        var ratio = Math.Abs(Amplitude(harmonic) / Amplitude(1));
        return ratio < 1e-10 ? null : Decibels.FromAmplitudeRatio(ratio);
    }

    /// <summary>Collector efficiency at full voltage swing, 0 to 1.</summary>
    public double Efficiency => Amplitude(1) / (2 * DirectCurrent);

    private double Half => Degrees * Math.PI / 360;

    private double Scale => Math.PI * (1 - Math.Cos(Half));
}
