using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Networks;

public class TwoPortTests
{
    private static readonly Resistance Fifty = Resistance.FromOhm(50);

    private static readonly Gen<TwoPort> Any = Gen.Select(Immittance(100), Immittance(0.02), Immittance(100), (a, y, b) => TwoPort.Series(a).Then(TwoPort.Shunt(y)).Then(TwoPort.Series(b)));

    [Fact]
    [Evidence(typeof(TwoPort), EvidenceKind.ClosedFormLimit)]
    public void LossAndReflection_OneResistor_AreOneLine()
    {
        Assert.Equal(0, TwoPort.Through.Loss(Fifty, Fifty).Db);
        Assert.Equal(120, TwoPort.Through.ReturnLoss(Fifty, Fifty).Db, 9);
        Assert.Equal(20 * Math.Log10(1.5), TwoPort.Series(50).Loss(Fifty, Fifty).Db, 12);
        Assert.Equal(20 * Math.Log10(1.5), TwoPort.Shunt(1 / 50.0).Loss(Fifty, Fifty).Db, 12);
        Assert.Equal(1 / 3.0, TwoPort.Series(50).S11(Fifty, Fifty).Real, 12);
        Assert.Equal(-1 / 3.0, TwoPort.Shunt(1 / 50.0).S11(Fifty, Fifty).Real, 12);
        Assert.Equal(300, TwoPort.Shunt(1e20).Loss(Fifty, Fifty).Db, 9);
    }

    [Fact]
    [Evidence(typeof(TwoPort), EvidenceKind.Identity)]
    public void Then_AnyThree_DoesNotDependOnTheGroupingAndKeepsTheDeterminant() =>
        Gen.Select(Any, Any, Any).Sample((a, b, c) =>
        {
            var (left, right) = (a.Then(b).Then(c), a.Then(b.Then(c)));
            return Near(left.A, right.A) && Near(left.B, right.B) && Near(left.C, right.C) && Near(left.D, right.D)
                && (a.Determinant - 1).Magnitude < 1e-9 * (1 + (a.A * a.D).Magnitude);
        });

    [Fact]
    [Evidence(typeof(TwoPort), EvidenceKind.Identity)]
    public void S11_AnyTwoPort_IsTheReflectionOfItsInputImpedance() =>
        Gen.Select(Any, Gen.Double[5, 500], Gen.Double[5, 500]).Sample((t, source, load) =>
        {
            var z = t.InputImpedance(load);
            return (((z - source) / (z + source)) - t.S11(Resistance.FromOhm(source), Resistance.FromOhm(load))).Magnitude < 1e-9;
        });

    private static Gen<Complex> Immittance(double size) => Gen.Select(Gen.Double[0, size], Gen.Double[-size, size], (re, im) => new Complex(re, im));

    private static bool Near(Complex a, Complex b) => (a - b).Magnitude <= 1e-9 * (1 + a.Magnitude);
}
