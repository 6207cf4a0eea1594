using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Statistics;

namespace ClubBench.Calculation.Choosing;

/// <summary>Kind of low-pass.</summary>
public enum LowPassFamily
{
    /// <summary>Equal ripple in the pass-band, loss rising all the way.</summary>
    Chebyshev,

    /// <summary>Steepest, with notches; loss comes back above them.</summary>
    Elliptic,

    /// <summary>Two constant-k sections of equal reactances, matched in the middle of the band.</summary>
    HalfWave,

    /// <summary>Flattest loss, poorest use of its parts.</summary>
    Butterworth,
}

/// <summary>One filter that may be chosen, with its figures. Immutable.</summary>
/// <param name="Family">Kind.</param>
/// <param name="Order">Number of poles.</param>
/// <param name="Refusal">Why there is no elliptic filter; None for every other family.</param>
/// <param name="Ladder">The filter with exact values; null where refused.</param>
/// <param name="Figures">What it reaches; null where refused.</param>
/// <param name="Yield">Share of boards that meet everything; null where refused or no scatter was told.</param>
public sealed record LowPassOption(LowPassFamily Family, int Order, EllipticRefusal Refusal, Ladder? Ladder, LowPassFigures? Figures, Proportion? Yield)
{
    /// <summary>Number of coils to wind.</summary>
    public int Coils => Ladder?.Elements.Count(e => e.Inductance is not null) ?? 0;

    /// <summary>Number of capacitors, one for each place.</summary>
    public int Capacitors => Ladder?.Elements.Count(e => e.Capacitance is not null) ?? 0;

    /// <summary>Whether it meets everything that was wanted.</summary>
    public bool MeetsAll => Figures is { Margin.Db: >= 0 };
}
