using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>Why there is no high-pass that keeps a station out.</summary>
public enum HighPassRefusal
{
    /// <summary>There is.</summary>
    None,

    /// <summary>The station lies at or above the edge: no high-pass helps.</summary>
    StationNotBelow,

    /// <summary>Seven parts do not reach the wanted loss: no small filter helps.</summary>
    StationTooNear,
}

/// <summary>The smallest high-pass that keeps a strong station out, or why there is none.</summary>
/// <remarks>
/// Method: orders 3, 5 and 7 with the edge as near to the band as is sound; the first that reaches the loss.
/// Valid: equal ripple, lossless.
/// Source: common practice for the edge; matthaei-young-jones for the loss.
/// </remarks>
/// <param name="Filter">The filter; the one of seven parts where the station is too near, null where it is not below the edge.</param>
/// <param name="Refusal">The reason.</param>
/// <param name="Reached">Loss of that filter at the station; null without a filter.</param>
/// <param name="LowestThatWorks">Where the station is too near: lowest wanted frequency with which seven parts would do. Null otherwise.</param>
public sealed record HighPassChoice(HighPassGuard? Filter, HighPassRefusal Refusal, Decibels? Reached, Frequency? LowestThatWorks)
{
    private static readonly int[] Orders = [3, 5, 7];

    /// <summary>Chooses the filter.</summary>
    /// <param name="lowestWanted">Lowest frequency to be received.</param>
    /// <param name="station">Frequency to be kept out.</param>
    /// <param name="wanted">Loss wanted there, 0 to 300 dB.</param>
    /// <param name="ripple">Pass-band quality.</param>
    /// <param name="resistance">Both ends, above zero.</param>
    public static HighPassChoice Of(Frequency lowestWanted, Frequency station, Decibels wanted, PassBandRipple ripple, Resistance resistance)
    {
        Guard.Within(wanted.Db, 0, 300, nameof(wanted));
        var edge = lowestWanted * HighPassGuard.HighestEdgeShare;
        if (station >= edge) return new(null, HighPassRefusal.StationNotBelow, null, null);
        var guards = Orders.Select(n => new HighPassGuard(LowPassPrototype.Chebyshev(n, ripple), edge, resistance)).ToList();
        return guards.Find(g => g.Attenuation(station) >= wanted) is { } enough
            ? new(enough, HighPassRefusal.None, enough.Attenuation(station), null)
            : new(guards[^1], HighPassRefusal.StationTooNear, guards[^1].Attenuation(station), Lowest(guards[^1].Prototype, station, wanted));
    }

    // Chebyshev: eps cosh(n acosh x) at the wanted loss, solved for x = edge over station.
    private static Frequency Lowest(LowPassPrototype prototype, Frequency station, Decibels wanted)
    {
        var (low, high) = (1.0, 1e3);
        while (high / low > 1 + 1e-12) (low, high) = prototype.Attenuation(Math.Sqrt(low * high)) >= wanted ? (low, Math.Sqrt(low * high)) : (Math.Sqrt(low * high), high);
        return station * high / HighPassGuard.HighestEdgeShare;
    }
}
