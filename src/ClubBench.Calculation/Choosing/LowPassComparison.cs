using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Choosing;

/// <summary>What a low-pass is wanted for.</summary>
/// <param name="Requirement">Band, return loss, attenuation of harmonics.</param>
/// <param name="Ripple">Pass-band quality of the designs, at least as good as the return loss wanted.</param>
/// <param name="Edge">Ripple edge, above the band.</param>
/// <param name="Resistance">Both ends, above zero.</param>
/// <param name="CoilQ">Unloaded Q; null means lossless.</param>
/// <param name="CapacitorQ">Unloaded Q; null means lossless.</param>
/// <param name="Trial">Scatter of parts for the yield; null for none.</param>
public sealed record LowPassTask(
    LowPassRequirement Requirement, PassBandRipple Ripple, Frequency Edge, Resistance Resistance, double? CoilQ = null, double? CapacitorQ = null, ScatterTrial? Trial = null);

/// <summary>The families side by side for one task. Immutable.</summary>
/// <remarks>
/// Method: fewest parts first: Chebyshev of five, elliptic of five with its lowest notch on twice the middle of the band, then both of seven.
/// Valid: equal ends. The harmonics are met at both ends of the band, the lower of which is the harder.
/// Source: common practice.
/// </remarks>
/// <param name="Options">Chebyshev 5, elliptic 5, Chebyshev 7, elliptic 7, in the order in which they are to be tried.</param>
/// <param name="Others">Half-wave and Butterworth of five parts, to compare.</param>
public sealed record LowPassComparison(IReadOnlyList<LowPassOption> Options, IReadOnlyList<LowPassOption> Others)
{
    /// <summary>The first that meets everything; null where none does.</summary>
    public LowPassOption? First => Options.FirstOrDefault(o => o.MeetsAll);

    /// <summary>Compares the families. Throws where the edge does not lie above the band.</summary>
    public static LowPassComparison Of(LowPassTask task)
    {
        if (task.Edge <= task.Requirement.Band.High)
            throw new ArgumentException($"The edge ({task.Edge}) must lie above the band, which ends at {task.Requirement.Band.High}.", nameof(task));
        return new(
            [Chebyshev(task, 5), Elliptic(task, 5), Chebyshev(task, 7), Elliptic(task, 7)],
            [
                Option(task, LowPassFamily.HalfWave, 5, LowPassDesign.HalfWave(task.Requirement.Band.Middle, task.Resistance).ToLadder(task.CoilQ, task.CapacitorQ)),
                Option(task, LowPassFamily.Butterworth, 5, LowPassPrototype.Butterworth(5).Denormalise(task.Edge, task.Resistance).ToLadder(task.CoilQ, task.CapacitorQ)),
            ]);
    }

    private static LowPassOption Chebyshev(LowPassTask task, int order) => Option(
        task, LowPassFamily.Chebyshev, order, LowPassPrototype.Chebyshev(order, task.Ripple).Denormalise(task.Edge, task.Resistance).ToLadder(task.CoilQ, task.CapacitorQ));

    private static LowPassOption Elliptic(LowPassTask task, int order)
    {
        var design = EllipticDesign.WithLowestNotchAt(new(order, task.Ripple, task.Edge, task.Resistance), task.Requirement.Band.Middle.Harmonic(2));
        return design is { Refusal: EllipticRefusal.None, Filter: { } filter }
            ? Option(task, LowPassFamily.Elliptic, order, filter.ToLadder(task.CoilQ, task.CapacitorQ))
            : new(LowPassFamily.Elliptic, order, design.Refusal, null, null, null);
    }

    private static LowPassOption Option(LowPassTask task, LowPassFamily family, int order, Ladder ladder) => new(
        family,
        order,
        EllipticRefusal.None,
        ladder,
        LowPassFigures.Of(ladder, task.Resistance, task.Resistance, task.Requirement),
        task.Trial?.Of(ladder, task.Resistance, task.Requirement));
}
