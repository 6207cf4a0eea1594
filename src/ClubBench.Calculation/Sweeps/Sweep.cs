using System.Collections.Immutable;
using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Sweeps;

/// <summary>Scattering parameters at one frequency. What was not measured is null.</summary>
/// <param name="Frequency">Where.</param>
/// <param name="S11">Reflection at port 1.</param>
/// <param name="S21">Transmission from port 1 to port 2.</param>
/// <param name="S12">Transmission from port 2 to port 1.</param>
/// <param name="S22">Reflection at port 2.</param>
public sealed record SweepPoint(Frequency Frequency, Complex S11, Complex? S21 = null, Complex? S12 = null, Complex? S22 = null)
{
    /// <summary>Largest share of the power put into a port that comes out again; above 1 no passive part does that.</summary>
    public double LargestPowerOut => Math.Max(Out(S11, S21), Out(S22 ?? Complex.Zero, S12));

    private static double Out(Complex reflected, Complex? passed) => Square(reflected) + Square(passed ?? Complex.Zero);

    private static double Square(Complex s) => (s.Real * s.Real) + (s.Imaginary * s.Imaginary);
}

/// <summary>A measured or computed sweep, frequencies rising. Immutable, thread safe.</summary>
/// <param name="Points">At least one point; throws where a value is not finite or a frequency does not rise.</param>
/// <param name="Reference1">Reference of port 1, above zero.</param>
/// <param name="Reference2">Reference of port 2, above zero; without meaning for one port.</param>
public sealed record Sweep(ImmutableArray<SweepPoint> Points, Resistance Reference1, Resistance Reference2)
{
    /// <summary>Points of the sweep.</summary>
    public ImmutableArray<SweepPoint> Points { get; init => field = Sound(value); } = Sound(Points);

    /// <summary>1 or 2.</summary>
    public int Ports => Points[0].S21 is null ? 1 : 2;

    /// <summary>Lowest and highest frequency.</summary>
    public FrequencyRange Range => new(Points[0].Frequency, Points[^1].Frequency);

    /// <summary>The sweep an ideal analyser would show of a ladder.</summary>
    /// <remarks>Method: chain matrix. Source: pozar-microwave.</remarks>
    public static Sweep Of(Ladder ladder, IEnumerable<Frequency> frequencies, Resistance source, Resistance load) =>
        new([.. frequencies.Select(f => Point(f, ladder.At(f), source, load))], source, load);

    private static ImmutableArray<SweepPoint> Sound(ImmutableArray<SweepPoint> points)
    {
        if (points.IsDefaultOrEmpty) throw new ArgumentException("A sweep needs at least one point.", nameof(points));
        foreach (var point in points) Guard.Finite(point.LargestPowerOut, nameof(points));
        for (var i = 1; i < points.Length; i++)
            if (points[i].Frequency <= points[i - 1].Frequency) throw new ArgumentException($"The frequency does not rise at {points[i].Frequency}.", nameof(points));
        return points;
    }

    private static SweepPoint Point(Frequency f, TwoPort chain, Resistance source, Resistance load)
    {
        var passed = chain.S21(source, load);
        return new(f, chain.S11(source, load), passed, passed * chain.Determinant, chain.S22(source, load));
    }
}
