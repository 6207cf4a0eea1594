using System.Collections.Immutable;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>A low-pass filter scaled to 1 ohm and an edge at 1 rad/s, and its ideal attenuation. Immutable, thread safe.</summary>
/// <remarks>
/// Method: doubly terminated ladder prototypes, closed form.
/// Valid: order 1 to 12; Chebyshev ripple 0.0001 to 3 dB. An even Chebyshev order ends in another resistance than it starts with.
/// Source: matthaei-young-jones, sections 4.03 to 4.05.
/// </remarks>
public sealed class LowPassPrototype
{
    private const double Largest = 1e15;
    private readonly double? _epsilon;

    private LowPassPrototype(ImmutableArray<double> values, double load, double? epsilon) =>
        (Values, LoadRatio, _epsilon) = (values, load, epsilon);

    /// <summary>g1 to gn: farad or henry of the scaled filter, in ladder order.</summary>
    public ImmutableArray<double> Values { get; }

    /// <summary>Number of reactive parts.</summary>
    public int Order => Values.Length;

    /// <summary>g(n+1): the load of the scaled filter, a resistance after a last shunt part and a conductance after a last series part; 1 for equal ends.</summary>
    public double LoadRatio { get; }

    /// <summary>Edge at which half the power is lost, over the edge the prototype is scaled to (the ripple edge for Chebyshev).</summary>
    public double HalfPowerRatio => _epsilon is { } e ? Math.Cosh(Math.Acosh(Math.Max(1 / e, 1)) / Order) : 1;

    /// <summary>Flattest loss; the edge is the half-power frequency.</summary>
    public static LowPassPrototype Butterworth(int order)
    {
        Guard.Within(order, 1, 12, nameof(order));
        return new([.. Enumerable.Range(1, order).Select(k => 2 * Math.Sin(((2 * k) - 1) * Math.PI / (2 * order)))], 1, null);
    }

    /// <summary>Equal ripple in the pass-band; the edge is the last frequency with that ripple.</summary>
    public static LowPassPrototype Chebyshev(int order, PassBandRipple ripple)
    {
        Guard.Within(order, 1, 12, nameof(order));
        var rippleDb = ripple.DesignRippleDb(nameof(ripple));
        var beta = -Math.Log(Math.Tanh(rippleDb * Math.Log(10) / 40));
        var gamma = Math.Sinh(beta / (2 * order));
        var g = ImmutableArray.CreateBuilder<double>(order);
        g.Add(2 * A(1) / gamma);
        for (var k = 2; k <= order; k++) g.Add(4 * A(k - 1) * A(k) / (B(k - 1) * g[k - 2]));
        var load = order % 2 == 1 ? 1 : 1 / Math.Pow(Math.Tanh(beta / 4), 2);
        return new(g.MoveToImmutable(), load, ripple.Epsilon);

        double A(int k) => Math.Sin(((2 * k) - 1) * Math.PI / (2 * order));
        double B(int k) => (gamma * gamma) + Math.Pow(Math.Sin(k * Math.PI / order), 2);
    }

    /// <summary>Ideal lossless attenuation at a frequency given as a multiple of the edge, 0 or above; at most 300 dB is told.</summary>
    public Decibels Attenuation(double multiple)
    {
        Guard.NotNegative(multiple, nameof(multiple));
        var shape = Math.Min(Math.Abs(_epsilon is { } e ? e * ChebyshevPolynomial(multiple) : Math.Pow(multiple, Order)), Largest);
        return Decibels.FromPowerRatio(1 + (shape * shape));
    }

    /// <summary>Quick estimate of the loss in the pass-band that parts of finite Q bring: 4.343 (f/fc) sum(g/Q).</summary>
    /// <remarks>Valid: well below the edge; at the edge the truth is up to twice as much. Source: cohn-1959.</remarks>
    /// <param name="multiple">Frequency as a multiple of the edge, 0 to 1.</param>
    /// <param name="coilQ">Unloaded Q of the coils, above zero.</param>
    /// <param name="capacitorQ">Unloaded Q of the capacitors, above zero.</param>
    /// <param name="form">Which part comes first.</param>
    public Decibels LossEstimate(double multiple, double coilQ, double capacitorQ, LowPassForm form = LowPassForm.ShuntCapacitorFirst)
    {
        var (first, second) = form == LowPassForm.ShuntCapacitorFirst ? (capacitorQ, coilQ) : (coilQ, capacitorQ);
        var sum = Values.Select((g, k) => g / Guard.Positive(k % 2 == 0 ? first : second, nameof(coilQ))).Sum();
        return Decibels.FromDb(10 / Math.Log(10) * Guard.Within(multiple, 0, 1, nameof(multiple)) * sum);
    }

    /// <summary>The real filter: parts for an edge and a source resistance, both above zero.</summary>
    public LowPassDesign Denormalise(Frequency edge, Resistance source, LowPassForm form = LowPassForm.ShuntCapacitorFirst)
    {
        var (w, r) = (edge.RadiansPerSecond, Guard.Positive(source.Ohm, nameof(source)));
        var firstKind = Values.Where((_, k) => k % 2 == 0);
        var secondKind = Values.Where((_, k) => k % 2 == 1);
        var (capacitors, coils) = form == LowPassForm.ShuntCapacitorFirst ? (firstKind, secondKind) : (secondKind, firstKind);
        return new LowPassDesign(
            form,
            [.. capacitors.Select(g => Capacitance.FromFarad(g / (w * r)))],
            [.. coils.Select(g => Inductance.FromHenry(g * r / w))],
            source,
            Load(r, form));
    }

    // g(n+1) is a resistance behind a last capacitor and a conductance behind a last coil.
    private Resistance Load(double r, LowPassForm form)
    {
        var endsInCapacitor = (Order % 2 == 1) == (form == LowPassForm.ShuntCapacitorFirst);
        return Resistance.FromOhm(endsInCapacitor ? r * LoadRatio : r / LoadRatio);
    }

    private double ChebyshevPolynomial(double x) => x <= 1 ? Math.Cos(Order * Math.Acos(x)) : Math.Cosh(Order * Math.Acosh(x));
}
