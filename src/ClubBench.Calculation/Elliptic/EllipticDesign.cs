using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Elliptic;

/// <summary>Why there is no such elliptic filter.</summary>
public enum EllipticRefusal
{
    /// <summary>There is.</summary>
    None,

    /// <summary>The parts would not do what is wanted to 1e-6 dB: reduce angle or order.</summary>
    PrecisionLost,

    /// <summary>A part would have to be negative: reduce angle or order.</summary>
    NegativePart,

    /// <summary>No modular angle puts the lowest notch there.</summary>
    NotchOutOfReach,

    /// <summary>A capacitor below 1 pF or a coil below 10 nH: strays and leads are larger.</summary>
    PartTooSmall,
}

/// <summary>What an elliptic low-pass shall do.</summary>
/// <param name="Order">3, 5 or 7.</param>
/// <param name="Ripple">Pass-band quality.</param>
/// <param name="Edge">Last frequency with the ripple.</param>
/// <param name="Resistance">Both ends, above zero.</param>
/// <param name="Form">Which part comes first.</param>
public sealed record EllipticTask(int Order, PassBandRipple Ripple, Frequency Edge, Resistance Resistance, LowPassForm Form = LowPassForm.ShuntCapacitorFirst);

/// <summary>An elliptic low-pass for a task, or why there is none and what would do.</summary>
/// <param name="Filter">The filter, told even where a part is too small to be built; null where there is none.</param>
/// <param name="Refusal">The reason.</param>
/// <param name="NotchReach">Where there is no filter: between which frequencies the lowest notch can be put with this order, ripple and edge. Null otherwise.</param>
public sealed record EllipticDesign(EllipticFilter? Filter, EllipticRefusal Refusal, FrequencyRange? NotchReach)
{
    /// <summary>With a given modular angle, 1 to 80 degrees.</summary>
    public static EllipticDesign Of(EllipticTask task, double angleDegrees)
    {
        var synthesis = EllipticSynthesis.Of(EllipticApproximation.Of(task.Order, task.Ripple, angleDegrees));
        if (synthesis.Prototype is not { } prototype) return Refused(task, synthesis.Refusal);
        var filter = prototype.Denormalise(task.Edge, task.Resistance, task.Form);
        return new(filter, filter.IsBuildable ? EllipticRefusal.None : EllipticRefusal.PartTooSmall, null);
    }

    /// <summary>With the lowest notch on a frequency, such as twice the middle of the band.</summary>
    public static EllipticDesign WithLowestNotchAt(EllipticTask task, Frequency notch) =>
        NotchPlacement.AngleDegreesFor(task.Order, notch / task.Edge) is { } angle ? Of(task, angle) : Refused(task, EllipticRefusal.NotchOutOfReach);

    private static EllipticDesign Refused(EllipticTask task, EllipticRefusal why) => new(null, why, NotchPlacement.Reach(task.Order, task.Ripple, task.Edge));
}
