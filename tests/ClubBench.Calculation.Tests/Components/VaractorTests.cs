using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Components;

public class VaractorTests
{
    [Fact]
    public void At_AbruptJunction_MatchesTheWorkedExample() =>
        Assert.Equal(27.79, new Varactor(Capacitance.FromPicofarad(72), 0.5).At(Voltage.FromVolt(4)).Picofarad, 0.005);

    [Fact]
    public void TryFit_TwoPoints_MatchesTheWorkedExample()
    {
        Assert.True(Varactor.TryFit(Point(1, 28), Point(8, 9), out var diode));

        Assert.Equal(0.6952, diode!.Exponent, 0.0001);
        Assert.Equal(51.88, diode.AtZero.Picofarad, 0.01);
        Assert.Equal(16.31, diode.At(Voltage.FromVolt(3)).Picofarad, 0.005);
    }

    [Fact]
    [Evidence(typeof(Varactor), EvidenceKind.RoundTrip)]
    public void TryFit_ThenAt_PassesThroughBothPoints() =>
        Gen.Select(Gen.Double[0, 3], Gen.Double[0.5, 10], Gen.Double[5, 50], Gen.Double[1.2, 6]).Sample((v, dv, pf, ratio) =>
        {
            var (low, high) = (Point(v, pf * ratio), Point(v + dv, pf));
            return Varactor.TryFit(low, high, out var diode)
                && Math.Abs((diode!.At(low.Reverse) / low.Capacitance) - 1) < 1e-9 && Math.Abs((diode.At(high.Reverse) / high.Capacitance) - 1) < 1e-9;
        });

    [Fact]
    public void TryFit_CapacitanceThatDoesNotFall_IsRefused()
    {
        Assert.False(Varactor.TryFit(Point(1, 9), Point(8, 28), out var diode));
        Assert.Null(diode);
    }

    [Fact]
    [Evidence(typeof(Varactor), EvidenceKind.ClosedFormLimit)]
    public void BackToBackAt_AnyVoltage_IsHalf() =>
        Assert.Equal(36, new Varactor(Capacitance.FromPicofarad(72), 0.5).BackToBackAt(Voltage.FromVolt(0)).Picofarad, 9);

    [Fact]
    public void WouldConduct_SwingBeyondTheBias_IsNoticed()
    {
        Assert.True(Varactor.WouldConduct(Voltage.FromVolt(1), Voltage.FromVolt(1.8)));
        Assert.False(Varactor.WouldConduct(Voltage.FromVolt(1), Voltage.FromVolt(1.6)));
    }

    [Fact]
    [Evidence(typeof(Varactor), EvidenceKind.ClosedFormLimit)]
    public void At_NoVoltageAndTheBuiltInOne_AreTheWholeAndItsRootShare()
    {
        var abrupt = new Varactor(Capacitance.FromPicofarad(72), 0.5);

        Assert.Equal(72, abrupt.At(default).Picofarad, 12);
        Assert.Equal(72 / Math.Sqrt(2), abrupt.At(Varactor.BuiltIn).Picofarad, 9);
    }

    [Fact]
    [Evidence(typeof(Varactor), EvidenceKind.Identity)]
    public void At_MoreVoltage_FallsMoreSteeplyTheLargerTheExponent() =>
        Gen.Select(Gen.Double[0.3, 2], Gen.Double[0, 10], Gen.Double[0.1, 10]).Sample((exponent, volt, more) =>
        {
            double Fall(double m) => new Varactor(Capacitance.FromPicofarad(50), m).At(Voltage.FromVolt(volt + more)) / new Varactor(Capacitance.FromPicofarad(50), m).At(Voltage.FromVolt(volt));
            return Fall(exponent) < 1 && Math.Abs(Fall(2 * exponent) - (Fall(exponent) * Fall(exponent))) < 1e-12;
        });

    private static VaractorPoint Point(double volt, double picofarad) => new(Voltage.FromVolt(volt), Capacitance.FromPicofarad(picofarad));
}
