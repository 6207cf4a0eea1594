using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>
/// Coil and resistor in series beside capacitor and resistor in series: the same resistance at every frequency, low ones through the coil. Immutable.
/// Method: L = R/(2 pi fx), C = 1/(2 pi fx R). Valid: lossless coil. Source: derived.
/// </summary>
/// <param name="Coil">Inductance.</param>
/// <param name="Capacitor">Capacitance.</param>
/// <param name="Termination">Resistance behind each, and what the mixer sees.</param>
public sealed record FirstOrderDiplexer(Inductance Coil, Capacitance Capacitor, Resistance Termination)
{
    /// <summary>Parts for a crossover and a resistance above zero.</summary>
    public static FirstOrderDiplexer For(Frequency crossover, Resistance termination)
    {
        var r = Guard.Positive(termination.Ohm, nameof(termination));
        return new(Inductance.FromHenry(r / crossover.RadiansPerSecond), Capacitance.FromFarad(1 / (crossover.RadiansPerSecond * r)), termination);
    }

    /// <summary>What the mixer sees at a frequency, ohm.</summary>
    public Complex Impedance(Frequency f)
    {
        var low = new Complex(Termination.Ohm, f.RadiansPerSecond * Coil.Henry);
        var high = new Complex(Termination.Ohm, -1 / (f.RadiansPerSecond * Capacitor.Farad));
        return low * high / (low + high);
    }
}
