using System.Numerics;
using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Elliptic;

public class EllipticApproximationTests
{
    public static TheoryData<ReferenceRow> Recomputed => ReferenceTable.Theory("elliptic-recomputed");

    [Theory]
    [MemberData(nameof(Recomputed))]
    [Evidence(typeof(EllipticApproximation), EvidenceKind.IndependentRecomputation)]
    public void Of_RandomCase_AgreesWithThetaFunctionsAndRootFinding(ReferenceRow row)
    {
        var wanted = Ellipses.Of(row);

        Ellipses.Same(row, "notches", wanted.Notches);
        Ellipses.Same(row, "zeros", wanted.ReflectionZeros);
        Ellipses.Same(row, "modes", wanted.Modes.SelectMany(m => new[] { m.Real, m.Imaginary }).Append(wanted.RealMode));
        Assert.Equal(row.Number("stop_loss_db"), wanted.StopBandLoss.Db, row.Number("loss_tolerance"));
    }

    [Fact]
    [Evidence(typeof(EllipticApproximation), EvidenceKind.Identity)]
    public void Attenuation_AnyFilter_HasItsRippleBelowAndItsLossAbove() => Gen.Select(Ellipses.Any, Gen.Double[0, 1]).Sample((x, share) =>
    {
        var wanted = EllipticApproximation.Of(x.Order, x.Ripple, x.Angle);

        Assert.InRange(wanted.Attenuation(share).Db, 0, x.Ripple.Ripple.Db + 1e-9);
        Assert.Equal(x.Ripple.Ripple.Db, wanted.Attenuation(1).Db, 1e-9);
        Assert.InRange(wanted.Attenuation(wanted.StopBandEdge / Math.Max(share, 0.01)).Db, Math.Min(wanted.StopBandLoss.Db, 300) - 1e-6, 300.001);
        Assert.Equal(Math.Min(wanted.StopBandLoss.Db, 300), wanted.Attenuation(wanted.StopBandEdge).Db, 1e-6);
    });

    [Fact]
    [Evidence(typeof(EllipticApproximation), EvidenceKind.Identity)]
    public void Modes_AnyFilter_AreWhereReflectionAndTransmissionBalance() => Ellipses.Any.Sample(x =>
    {
        var wanted = EllipticApproximation.Of(x.Order, x.Ripple, x.Angle);

        // Feldtkeller: 1 + (eps R)^2 vanishes at every mode.
        foreach (var p in wanted.Modes.Append(wanted.RealMode)) Assert.Equal(0, (1 + Shape(wanted, p)).Magnitude, 1e-6);
    });

    [Theory]
    [InlineData(45)]
    [InlineData(30)]
    [Evidence(typeof(EllipticApproximation), EvidenceKind.RoundTrip)]
    public void FromStopBandEdge_EdgeOfAnAngle_GivesTheAngleBack(double angle)
    {
        var ripple = PassBandRipple.FromReflection(0.1);

        Assert.Equal(angle, EllipticApproximation.FromStopBandEdge(5, ripple, EllipticApproximation.Of(5, ripple, angle).StopBandEdge).ModularAngleDegrees, 1e-9);
    }

    [Theory]
    [InlineData(4, 0.1, 30)]
    [InlineData(9, 0.1, 30)]
    [InlineData(5, 0.1, 90)]
    [InlineData(5, 0.1, 0.5)]
    [InlineData(5, 0.1, double.NaN)]
    [InlineData(5, 0.9, 30)]
    [InlineData(5, 0.001, 30)]
    public void Of_OutsideItsRange_IsRefused(int order, double reflection, double angle) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => EllipticApproximation.Of(order, PassBandRipple.FromReflection(reflection), angle));

    private static Complex Shape(EllipticApproximation wanted, Complex s)
    {
        var (shape, scale) = (-s * s, Complex.One);
        for (var i = 0; i < wanted.Notches.Length; i++)
        {
            var (zero, notch) = (wanted.ReflectionZeros[i], wanted.Notches[i]);
            shape *= Complex.Pow(((s * s) + (zero * zero)) / ((s * s) + (notch * notch)), 2);
            scale *= Complex.Pow(((zero * zero) - 1) / ((notch * notch) - 1), 2);
        }

        return shape * Math.Pow(wanted.Ripple.Epsilon, 2) / scale;
    }
}
