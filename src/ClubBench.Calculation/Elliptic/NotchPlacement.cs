using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Elliptic;

/// <summary>Which modular angle puts the lowest notch of an elliptic low-pass where it is wanted.</summary>
/// <remarks>
/// Method: the lowest notch 1/(k cd(K/n, k)) falls as the angle grows; bisection to the last digit. The ripple only limits the angle.
/// Valid: order 3, 5 or 7, angle 1 to 80 degrees.
/// Source: derived.
/// </remarks>
public static class NotchPlacement
{
    private const int Halvings = 60;

    /// <summary>Lowest notch as a multiple of the edge, for a modular angle of 1 to 80 degrees.</summary>
    public static double LowestNotch(int order, double angleDegrees)
    {
        Guard.Within(angleDegrees, EllipticApproximation.LeastAngleDegrees, EllipticApproximation.GreatestAngleDegrees, nameof(angleDegrees));
        var k = Math.Sin(angleDegrees * Math.PI / 180);
        return 1 / (k * new JacobiFunctions(k).Cd(1.0 / EllipticApproximation.GuardOrder(order)).Real);
    }

    /// <summary>The modular angle in degrees; null where no angle reaches that multiple of the edge (above zero).</summary>
    public static double? AngleDegreesFor(int order, double lowestNotch)
    {
        Guard.Positive(lowestNotch, nameof(lowestNotch));
        var (low, high) = (EllipticApproximation.LeastAngleDegrees, EllipticApproximation.GreatestAngleDegrees);
        if (lowestNotch > LowestNotch(order, low) || lowestNotch < LowestNotch(order, high)) return null;
        for (var i = 0; i < Halvings; i++)
        {
            var middle = 0.5 * (low + high);
            (low, high) = LowestNotch(order, middle) > lowestNotch ? (middle, high) : (low, middle);
        }

        return 0.5 * (low + high);
    }

    /// <summary>Largest modular angle with parts above zero, at most 80 degrees: a small ripple ends it earlier.</summary>
    public static double GreatestAngleDegrees(int order, PassBandRipple ripple)
    {
        var (low, high) = (EllipticApproximation.LeastAngleDegrees, EllipticApproximation.GreatestAngleDegrees);
        if (HasParts(high)) return high;
        while (high - low > 1e-6) (low, high) = HasParts(0.5 * (low + high)) ? (0.5 * (low + high), high) : (low, 0.5 * (low + high));
        return low;

        bool HasParts(double angle) => EllipticSynthesis.Of(EllipticApproximation.Of(order, ripple, angle)).Prototype is not null;
    }

    /// <summary>Between which frequencies the lowest notch can be put.</summary>
    public static FrequencyRange Reach(int order, PassBandRipple ripple, Frequency edge) => new(
        edge * LowestNotch(order, GreatestAngleDegrees(order, ripple)),
        edge * LowestNotch(order, EllipticApproximation.LeastAngleDegrees));
}
