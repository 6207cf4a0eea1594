using System.Collections.Immutable;
using System.Numerics;

namespace ClubBench.Calculation.Elliptic;

/// <summary>Takes a ladder of shunt capacitors and parallel traps out of an input admittance, one notch after the other.</summary>
/// <remarks>
/// Method: zero shifting: as much of a capacitor to ground as puts a zero of the admittance on the notch, then the trap that is the pole there.
/// Valid: input admittance of a lossless doubly terminated low-pass of odd order whose notches are all on the imaginary axis.
/// Source: zverev-1967, chapter on synthesis.
/// </remarks>
internal sealed class CauerExtraction
{
    private readonly ImmutableArray<double>.Builder _shunts = ImmutableArray.CreateBuilder<double>();
    private readonly ImmutableArray<EllipticTrap>.Builder _traps = ImmutableArray.CreateBuilder<EllipticTrap>();
    private double[] _numerator;
    private double[] _denominator;

    private CauerExtraction(double[] numerator, double[] denominator) => (_numerator, _denominator) = (numerator, denominator);

    /// <summary>The parts, in ladder order, for notches taken in the given order; a part below zero is told as it is.</summary>
    public static (ImmutableArray<double> Shunts, ImmutableArray<EllipticTrap> Traps) Of(EllipticApproximation wanted, IEnumerable<double> notches)
    {
        var (e, f) = (ModePolynomial(wanted), ReflectionPolynomial(wanted));
        // Both have a leading coefficient of 1, so the difference is one degree lower.
        var extraction = new CauerExtraction(Polynomials.Sum(e, f, 1), Polynomials.Sum(e, f, -1)[..^1]);
        foreach (var notch in notches) extraction.TakeOut(notch);
        extraction._shunts.Add(extraction._numerator[^1] / extraction._denominator[^1]);
        return (extraction._shunts.ToImmutable(), extraction._traps.ToImmutable());
    }

    private void TakeOut(double notch)
    {
        var at = new Complex(0, notch);
        var shunt = (Polynomials.At(_numerator, at) / Polynomials.At(_denominator, at)).Imaginary / notch;
        var rest = Polynomials.DividedBySquare(Polynomials.Sum(_numerator, Polynomials.Shifted(_denominator), -shunt), notch);
        var capacitance = (at * Polynomials.At(rest, at) / Polynomials.At(_denominator, at)).Real;
        var below = Polynomials.DividedBySquare(Polynomials.Sum(_denominator, Polynomials.Shifted(rest), -1 / capacitance), notch);
        _shunts.Add(shunt);
        _traps.Add(new EllipticTrap(1 / (notch * notch * capacitance), capacitance));
        (_numerator, _denominator) = (rest, below);
    }

    private static double[] ModePolynomial(EllipticApproximation wanted) =>
        wanted.Modes.Aggregate(new[] { -wanted.RealMode, 1 }, (product, p) => Polynomials.Product(product, [(p * Complex.Conjugate(p)).Real, -2 * p.Real, 1]));

    private static double[] ReflectionPolynomial(EllipticApproximation wanted) =>
        wanted.ReflectionZeros.Aggregate(new double[] { 0, 1 }, (product, w) => Polynomials.Product(product, [w * w, 0, 1]));
}
