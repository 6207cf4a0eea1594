using System.Numerics;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Broadband;

/// <summary>Verdict on a choke beside a node. Immutable.</summary>
/// <param name="Verdict">Leave, check or change.</param>
/// <param name="ImpedanceRatio">Impedance over the resistance of the node.</param>
public sealed record ChokeJudgement(Verdict Verdict, double ImpedanceRatio)
{
    private const double Enough = 10;
    private const double Least = 5;

    /// <summary>
    /// Ten times the resistance of the node and more is left, five to ten checked, less changed. Direct current is judged apart.
    /// A solenoid choke beyond self-resonance has dips of its own: keep the working frequency and its double 20 % away from them.
    /// Source: common practice.
    /// </summary>
    /// <param name="impedance">Impedance of the choke in ohm.</param>
    /// <param name="node">Parallel resistance of the node, above zero.</param>
    public static ChokeJudgement Of(Complex impedance, Resistance node)
    {
        var ratio = Complex.Abs(impedance) / Guard.Positive(node.Ohm, nameof(node));
        return new(ratio >= Enough ? Verdict.Leave : ratio >= Least ? Verdict.Check : Verdict.Change, ratio);
    }
}
