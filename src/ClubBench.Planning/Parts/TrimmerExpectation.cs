using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Parts;

/// <summary>Where a trimmer stands when its circuit is peaked.</summary>
public static class TrimmerExpectation
{
    /// <summary>Expected reading of a trimmer's travel, 0 open to 1 meshed.</summary>
    /// <param name="stage">Stage key.</param>
    /// <param name="place">The tuned circuit.</param>
    /// <param name="at">Where it is peaked.</param>
    /// <param name="share">Share of the travel kept free at each end.</param>
    /// <param name="setUp">Text code of the set-up.</param>
    public static ExpectedReading For(string stage, TunablePlace place, Frequency at, double share, string setUp)
    {
        var travel = place.Travel(at);
        var (low, high) = Window(travel, share);
        return new($"{stage}.trimmer-travel", QuantityKind.Ratio, travel, low, high, setUp, InstrumentClass.Receiver, WindowSides.Both, new Dictionary<string, double>());
    }

    /// <summary>
    /// The share kept free at each end; where the plan itself puts the peak nearer to an end, half-way from there to the end, so that a board built right passes.
    /// A peak the trimmer does not reach has the usual window: the plan says so by other means.
    /// </summary>
    internal static (double Low, double High) Window(double travel, double share) =>
        (travel > 0 && travel < share ? travel / 2 : share, travel < 1 && travel > 1 - share ? (1 + travel) / 2 : 1 - share);
}
