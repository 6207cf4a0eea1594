using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>
/// Series circuit to the next stage beside a parallel circuit and a resistor to ground: the mixer sees one resistance at every frequency, the
/// intermediate frequency goes on, the rest is absorbed. It does not change with the band while the intermediate frequency stays. Immutable.
/// Method: Ls = QR/w, Cs = 1/(wQR), Lp = R/(wQ), Cp = Q/(wR). Valid: Q 1 to 5, lossless coils. Source: derived.
/// </summary>
/// <param name="SeriesCoil">Ls, to the next stage.</param>
/// <param name="SeriesCapacitor">Cs, to the next stage.</param>
/// <param name="ShuntCoil">Lp, in the absorbing branch.</param>
/// <param name="ShuntCapacitor">Cp, in the absorbing branch.</param>
/// <param name="Termination">Input of the next stage, the absorbing resistor, and what the mixer sees.</param>
public sealed record BandPassDiplexer(Inductance SeriesCoil, Capacitance SeriesCapacitor, Inductance ShuntCoil, Capacitance ShuntCapacitor, Resistance Termination)
{
    /// <summary>Parts for an intermediate frequency, a Q of 0.5 to 20 (1 to 5 is usual) and a resistance above zero.</summary>
    public static BandPassDiplexer For(Frequency intermediate, double q, Resistance termination)
    {
        var (w, r) = (intermediate.RadiansPerSecond, Guard.Positive(termination.Ohm, nameof(termination)));
        Guard.Within(q, 0.5, 20, nameof(q));
        return new(
            Inductance.FromHenry(q * r / w), Capacitance.FromFarad(1 / (w * q * r)), Inductance.FromHenry(r / (w * q)), Capacitance.FromFarad(q / (w * r)), termination);
    }

    /// <summary>What the mixer sees at a frequency, ohm.</summary>
    public Complex Impedance(Frequency f)
    {
        var onward = new Complex(Termination.Ohm, (f.RadiansPerSecond * SeriesCoil.Henry) - (1 / (f.RadiansPerSecond * SeriesCapacitor.Farad)));
        var conductance = 1 / Termination.Ohm;
        var susceptance = (f.RadiansPerSecond * ShuntCapacitor.Farad) - (1 / (f.RadiansPerSecond * ShuntCoil.Henry));
        // The parallel circuit is an open end at its resonance: written without its impedance.
        var absorbing = new Complex(0, susceptance) / new Complex(1, susceptance / conductance);
        return 1 / ((1 / onward) + absorbing);
    }
}
