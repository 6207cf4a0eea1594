using System.Collections.Immutable;
using System.Numerics;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Elliptic;

/// <summary>Equal ripple in the pass-band and an equal least loss in the stop-band, for an edge at 1 rad/s: what an elliptic low-pass does, without its parts. Immutable.</summary>
/// <remarks>
/// Method: Jacobi elliptic functions of the modulus k = sin(modular angle); zeros, notches and natural modes in closed form.
/// Valid: order 3, 5 or 7; ripple 0.0001 to 3 dB; modular angle 1 to 80 degrees.
/// Source: orfanidis-elliptic, from memory; zeros, notches and modes recomputed by theta functions and root finding.
/// </remarks>
public sealed class EllipticApproximation
{
    /// <summary>Smallest modular angle, degrees: flatter is a Chebyshev filter.</summary>
    public const double LeastAngleDegrees = 1;

    /// <summary>Largest modular angle, degrees.</summary>
    public const double GreatestAngleDegrees = 80;

    private const double Deepest = 1e30;
    private const double Farthest = 1e100;

    private EllipticApproximation(int order, PassBandRipple ripple, double angleDegrees)
    {
        (Order, Ripple, ModularAngleDegrees) = (order, ripple, angleDegrees);
        var k = Math.Sin(angleDegrees * Math.PI / 180);
        var jacobi = new JacobiFunctions(k);
        ImmutableArray<double> shares = [.. Enumerable.Range(1, order / 2).Select(i => ((2.0 * i) - 1) / order)];
        ReflectionZeros = [.. shares.Select(u => jacobi.Cd(u).Real)];
        Notches = [.. ReflectionZeros.Select(w => 1 / (k * w))];
        StopBandEdge = 1 / k;
        var discrimination = Math.Pow(k, order) * shares.Aggregate(1.0, (product, u) => product * Math.Pow(jacobi.Sn(u).Real, 4));
        StopBandLoss = Decibels.FromPowerRatio(1 + Math.Pow(ripple.Epsilon / discrimination, 2));
        var depth = new JacobiFunctions(discrimination).InverseSnOfImaginary(1 / ripple.Epsilon) / order;
        Modes = [.. shares.Select(u => Complex.ImaginaryOne * jacobi.Cd(new Complex(u, -depth)))];
        RealMode = (Complex.ImaginaryOne * jacobi.Sn(new Complex(0, depth))).Real;
    }

    /// <summary>Number of reactive branches counted as poles: 3, 5 or 7.</summary>
    public int Order { get; }

    /// <summary>Pass-band quality.</summary>
    public PassBandRipple Ripple { get; }

    /// <summary>Modular angle, degrees: the larger, the steeper and the shallower.</summary>
    public double ModularAngleDegrees { get; }

    /// <summary>Where the stop-band begins, as a multiple of the edge; above 1. The nearer to 1, the steeper.</summary>
    public double StopBandEdge { get; }

    /// <summary>Least loss everywhere above the stop-band edge.</summary>
    public Decibels StopBandLoss { get; }

    /// <summary>Multiples of the edge at which nothing is reflected, falling; zero itself belongs to them and is not listed.</summary>
    public ImmutableArray<double> ReflectionZeros { get; }

    /// <summary>Multiples of the edge at which nothing passes, rising.</summary>
    public ImmutableArray<double> Notches { get; }

    /// <summary>Natural modes of the upper half plane, one per notch; each has its conjugate.</summary>
    public ImmutableArray<Complex> Modes { get; }

    /// <summary>The natural mode on the real axis, below zero.</summary>
    public double RealMode { get; }

    /// <summary>From the modular angle.</summary>
    /// <param name="order">3, 5 or 7; an even order would need unequal ends.</param>
    /// <param name="ripple">Ripple 0.0001 to 3 dB.</param>
    /// <param name="angleDegrees">Modular angle, 1 to 80 degrees.</param>
    public static EllipticApproximation Of(int order, PassBandRipple ripple, double angleDegrees)
    {
        ripple.DesignRippleDb(nameof(ripple));
        return new(GuardOrder(order), ripple, Guard.Within(angleDegrees, LeastAngleDegrees, GreatestAngleDegrees, nameof(angleDegrees)));
    }

    /// <summary>From the stop-band edge as a multiple of the pass-band edge, 1.0155 to 57.2 (80 to 1 degrees).</summary>
    public static EllipticApproximation FromStopBandEdge(int order, PassBandRipple ripple, double stopBandEdge) =>
        Of(order, ripple, Math.Asin(1 / Math.Max(Guard.Positive(stopBandEdge, nameof(stopBandEdge)), 1)) * 180 / Math.PI);

    /// <summary>Ideal lossless attenuation at a multiple of the edge, 0 or above; at most 300 dB is told (a notch blocks without end).</summary>
    public Decibels Attenuation(double multiple)
    {
        Guard.NotNegative(multiple, nameof(multiple));
        var shape = Ripple.Epsilon * Shape(Math.Min(multiple, Farthest)) / Shape(1);
        return Decibels.FromPowerRatio(Math.Min(1 + (shape * shape), Deepest));
    }

    internal static int GuardOrder(int order) => order is 3 or 5 or 7
        ? order
        : throw new ArgumentOutOfRangeException(nameof(order), order, "The order must be 3, 5 or 7: an even one would need unequal ends.");

    // Pairs of a zero and a notch, so that neither product grows beyond what a double holds.
    private double Shape(double x)
    {
        var value = x;
        for (var i = 0; i < Notches.Length; i++)
            value *= ((x * x) - Math.Pow(ReflectionZeros[i], 2)) / Math.Max(Math.Abs((x * x) - Math.Pow(Notches[i], 2)), 1e-30);
        return Math.Abs(value);
    }
}
