using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Components;

/// <summary>A point of a varactor's data sheet.</summary>
/// <param name="Reverse">Reverse voltage, zero or above.</param>
/// <param name="Capacitance">Capacitance there, above zero.</param>
public sealed record VaractorPoint(Voltage Reverse, Capacitance Capacitance);

/// <summary>
/// A capacitance diode: C = C0/(1 + V/phi)^m. Valid: between the data-sheet points it was fitted to and a fifth beyond. Source: derived (junction
/// capacitance); phi 0.7 V is common practice. Immutable.
/// </summary>
/// <param name="AtZero">Capacitance at zero volt, above zero.</param>
/// <param name="Exponent">0.33 graded, 0.5 abrupt, 0.75 to 2 hyper-abrupt.</param>
public sealed record Varactor(Capacitance AtZero, double Exponent)
{
    /// <summary>Built-in voltage of a silicon junction.</summary>
    public static readonly Voltage BuiltIn = Voltage.FromVolt(0.7);

    /// <summary>Capacitance at a reverse voltage of zero or above.</summary>
    public Capacitance At(Voltage reverse) =>
        AtZero / Math.Pow(1 + (Guard.NotNegative(reverse.Volt, nameof(reverse)) / BuiltIn.Volt), Exponent);

    /// <summary>Capacitance of two diodes back to back, halves of one: they share the RF voltage and their curvature mostly cancels.</summary>
    public Capacitance BackToBackAt(Voltage reverse) => At(reverse) / 2;

    /// <summary>Whether an RF swing would make a diode conduct: its peak reaches the lowest reverse voltage plus the built-in one.</summary>
    public static bool WouldConduct(Voltage lowestReverse, Voltage rfPeak) => rfPeak >= lowestReverse + BuiltIn;

    /// <summary>
    /// The diode through two points of its data sheet. False where capacitance does not fall with voltage; the result is then null.
    /// </summary>
    public static bool TryFit(VaractorPoint low, VaractorPoint high, out Varactor? varactor)
    {
        varactor = null;
        if (high.Reverse <= low.Reverse || high.Capacitance >= low.Capacitance) return false;
        var (v1, v2) = (BuiltIn.Volt + Guard.NotNegative(low.Reverse.Volt, nameof(low)), BuiltIn.Volt + high.Reverse.Volt);
        var exponent = Math.Log(low.Capacitance / high.Capacitance) / Math.Log(v2 / v1);
        varactor = new(low.Capacitance * Math.Pow(v1 / BuiltIn.Volt, exponent), exponent);
        return true;
    }
}
