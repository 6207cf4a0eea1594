using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Resonators;

/// <summary>A resistance with a capacitance in parallel, seen at the top of a resonator.</summary>
/// <param name="Resistance">Parallel resistance.</param>
/// <param name="Capacitance">Parallel capacitance, to be taken off the resonator's capacitor.</param>
public sealed record ParallelEquivalent(Resistance Resistance, Capacitance Capacitance);

/// <summary>Why a divider or coupling capacitor cannot be designed.</summary>
public enum TransformRefusal
{
    /// <summary>It can.</summary>
    None,

    /// <summary>Capacitors at the top can only raise a resistance.</summary>
    NotAStepUp,

    /// <summary>The capacitance is too small for this step: see the smallest one.</summary>
    TooLittleCapacitance,
}

/// <summary>A designed divider, or why there is none and the smallest parallel capacitance with which there would be one.</summary>
/// <param name="Divider">The divider; null where refused.</param>
/// <param name="Refusal">The reason.</param>
/// <param name="SmallestCapacitance">Smallest parallel capacitance for this step; zero where it is no step up.</param>
public sealed record DividerDesign(CapacitiveDivider? Divider, TransformRefusal Refusal, Capacitance SmallestCapacitance);

/// <summary>
/// Capacitive divider: C1 from the top to the tap, C2 from the tap to ground, the resistance across C2.
/// Exact at every Q of the tap; the usual square of the capacitance ratio is low by 1 + 1/Qt^2, Qt = w R (C1 + C2), by a quarter and more at
/// 50 ohm. Source: derived. Immutable.
/// </summary>
/// <param name="Top">C1, above zero.</param>
/// <param name="Bottom">C2.</param>
public sealed record CapacitiveDivider(Capacitance Top, Capacitance Bottom)
{
    /// <summary>What a resistance above zero across C2 looks like at the top.</summary>
    public ParallelEquivalent AtTop(Resistance resistance, Frequency frequency)
    {
        var (c1, c2, r, w) = (Top.Farad, Bottom.Farad, Guard.Positive(resistance.Ohm, nameof(resistance)), frequency.RadiansPerSecond);
        var sum = c1 + c2;
        var rp = (r * sum * sum / (c1 * c1)) + (1 / (w * w * c1 * c1 * r));
        var cp = c1 * (1 + (w * w * r * r * c2 * sum)) / (1 + (w * w * r * r * sum * sum));
        return new(Resistance.FromOhm(rp), Capacitance.FromFarad(cp));
    }

    /// <summary>
    /// The divider that lifts a resistance to a higher one and shows this parallel capacitance at the top. Closed form, no iteration.
    /// </summary>
    /// <param name="resistance">Resistance across C2, above zero.</param>
    /// <param name="wanted">Resistance wanted at the top.</param>
    /// <param name="parallel">Capacitance wanted at the top.</param>
    /// <param name="frequency">Design frequency.</param>
    public static DividerDesign Design(Resistance resistance, Resistance wanted, Capacitance parallel, Frequency frequency)
    {
        var (r, rp, w) = (Guard.Positive(resistance.Ohm, nameof(resistance)), wanted.Ohm, frequency.RadiansPerSecond);
        if (rp <= r) return new(null, TransformRefusal.NotAStepUp, default);
        var smallest = Capacitance.FromFarad(Math.Sqrt((rp / r) - 1) / (w * rp));
        var qp = w * parallel.Farad * rp;
        var t = (r * (1 + (qp * qp)) / rp) - 1;
        if (t <= 0) return new(null, TransformRefusal.TooLittleCapacitance, smallest);
        var q2 = Math.Sqrt(t);
        var x1 = rp * (qp - q2) / (1 + (qp * qp));
        return new(new(Capacitance.FromFarad(1 / (w * x1)), Capacitance.FromFarad(q2 / (w * r))), TransformRefusal.None, smallest);
    }

    /// <summary>
    /// Capacitor in series from a resistance above zero to the top, with the parallel capacitance it adds there; null where the wanted
    /// resistance is not above the given one (a series capacitor can only raise it).
    /// </summary>
    public static (Capacitance Series, Capacitance Parallel)? SeriesCapacitor(Resistance resistance, Resistance wanted, Frequency frequency)
    {
        var (r, rp, w) = (Guard.Positive(resistance.Ohm, nameof(resistance)), wanted.Ohm, frequency.RadiansPerSecond);
        if (rp <= r) return null;
        var x = Math.Sqrt(r * (rp - r));
        return (Capacitance.FromFarad(1 / (w * x)), Capacitance.FromFarad(x / (w * ((r * r) + (x * x)))));
    }
}
