using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Keying;

/// <summary>Shape of a keying edge.</summary>
public enum EdgeShape
{
    /// <summary>A step.</summary>
    Hard,

    /// <summary>Charging through a resistor; rise time from 10 to 90 %.</summary>
    ResistorCapacitor,

    /// <summary>A straight ramp; its whole length.</summary>
    Linear,

    /// <summary>A raised cosine; its whole length.</summary>
    RaisedCosine,
}

/// <summary>Edges of keyed telegraphy and the spectrum they make. Immutable.</summary>
/// <remarks>
/// Method: Fourier transform of the edge relative to a step; lines of keyed dots.
/// Valid: a linear stage behind the shaping; class C and E stages sharpen the edge. About 5 ms is the accepted click-free value, 2 to 8 ms the usual range (common practice).
/// Source: derived.
/// </remarks>
/// <param name="Shape">Shape of rise and fall.</param>
/// <param name="RiseTime">Rise time as the shape defines it; above zero unless the edge is hard.</param>
public sealed record KeyingEnvelope(EdgeShape Shape, Duration RiseTime)
{
    private static readonly double RiseOverTimeConstant = Math.Log(9);

    /// <summary>10 to 90 % rise of a resistor and a capacitor. A switching transistor conducts over part of the swing only: the measured rise is two to four times shorter.</summary>
    public static Duration RiseOf(Resistance resistor, Capacitance capacitor) =>
        Duration.FromSecond(RiseOverTimeConstant * resistor.Ohm * capacitor.Farad);

    /// <summary>Level of the edge's spectrum against a hard edge, 0 or below; at nulls no less than -200 dB.</summary>
    /// <param name="offset">Distance from the carrier.</param>
    public Decibels EdgeLevel(Frequency offset) => Level(Transform(offset, atNulls: false));

    /// <summary>The same along the crests of its lobes: take this for a limit, since a null never falls where it is wanted.</summary>
    public Decibels EdgeCrest(Frequency offset) => Level(Transform(offset, atNulls: true));

    /// <summary>Level of keyed dots around an offset against the key-down carrier.</summary>
    /// <param name="offset">Distance from the carrier.</param>
    /// <param name="dot">Length of a dot, above zero.</param>
    /// <param name="crest">Whether to follow the crests of the edge's lobes.</param>
    public Decibels DotLevel(Frequency offset, Duration dot, bool crest = false)
    {
        var line = Math.PI * 2 * Guard.Positive(dot.Second, nameof(dot)) * offset.Hertz;
        return Decibels.FromAmplitudeRatio(1 / line) + (crest ? EdgeCrest(offset) : EdgeLevel(offset));
    }

    private double Transform(Frequency offset, bool atNulls)
    {
        if (Shape == EdgeShape.Hard) return 1;
        var x = offset.RadiansPerSecond * Guard.Positive(RiseTime.Second, nameof(RiseTime));
        return Shape switch
        {
            EdgeShape.ResistorCapacitor => 1 / Math.Sqrt(1 + Math.Pow(x / RiseOverTimeConstant, 2)),
            EdgeShape.Linear => atNulls ? Math.Min(1, 2 / x) : Math.Abs(Math.Sin(x / 2) / (x / 2)),
            _ => RaisedCosine(x, atNulls),
        };
    }

    // Both terms vanish together at x = pi, where the limit is pi / 4.
    private static double RaisedCosine(double x, bool atNulls)
    {
        var denominator = Math.Abs(1 - Math.Pow(x / Math.PI, 2));
        if (denominator < 1e-6) return Math.PI / 4;
        return atNulls && x > 2 * Math.PI ? 1 / denominator : Math.Abs(Math.Cos(x / 2)) / denominator;
    }

    private static Decibels Level(double ratio) => Decibels.FromAmplitudeRatio(Math.Max(ratio, 1e-10));
}
