using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>A high-pass in front of a receiver, capacitor in the line first, coils to ground. Immutable.</summary>
/// <remarks>
/// Method: the low-pass prototype with frequency inverted: C = 1/(g w R), L = R/(g w).
/// Valid: odd order, equal ends.
/// Source: matthaei-young-jones, section 4.03.
/// </remarks>
/// <param name="Prototype">Low-pass prototype of odd order.</param>
/// <param name="Edge">Edge of the prototype: the ripple edge for Chebyshev.</param>
/// <param name="Resistance">Both ends, above zero.</param>
public sealed record HighPassGuard(LowPassPrototype Prototype, Frequency Edge, Resistance Resistance)
{
    /// <summary>Highest edge as a share of the lowest wanted frequency (common practice).</summary>
    public const double HighestEdgeShare = 0.95;

    /// <summary>The ladder for analysis; no Q given means lossless.</summary>
    public Ladder ToLadder(double? coilQ = null, double? capacitorQ = null)
    {
        if (Prototype.Order % 2 == 0) throw new InvalidOperationException("A high-pass between equal ends needs an odd order.");
        var (w, r) = (Edge.RadiansPerSecond, Guard.Positive(Resistance.Ohm, nameof(Resistance)));
        return new(Prototype.Values.Select((g, k) => k % 2 == 0
            ? LadderElement.SeriesCapacitor(Capacitance.FromFarad(1 / (g * w * r)), capacitorQ)
            : LadderElement.ShuntInductor(Inductance.FromHenry(r / (g * w)), coilQ)));
    }

    /// <summary>Ideal lossless attenuation.</summary>
    public Decibels Attenuation(Frequency f) => Prototype.Attenuation(Edge / f);
}
