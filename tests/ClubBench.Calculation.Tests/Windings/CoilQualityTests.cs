using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;

namespace ClubBench.Calculation.Tests.Windings;

public class CoilQualityTests
{
    private static readonly ToroidWinding Coil = new(Cores.FindToroid("T50-2")!, 33, Wire.Millimetre(0.5));

    [Fact]
    public void Estimate_InsideTheBestRange_IsThePlanningValueWithItsRange()
    {
        var q = CoilQuality.Estimate(Coil, Frequency.FromMegahertz(7.1))!;

        Assert.Equal(170, q.Typical, 9);
        Assert.Equal((170 / 1.4, 170 * 1.4), (q.Low, q.High));
    }

    [Fact]
    public void Estimate_AnOctaveOutside_FallsBy30Percent() =>
        Assert.Equal(0.7 * 170, CoilQuality.Estimate(Coil, Frequency.FromMegahertz(20))!.Typical, 6);

    [Fact]
    public void Estimate_FewTurnsOfThinWire_FallsBy20Percent() =>
        Assert.Equal(0.8 * 170, CoilQuality.Estimate(Coil with { Turns = 10 }, Frequency.FromMegahertz(7))!.Typical, 6);

    [Fact]
    public void Estimate_FerriteRing_IsNotStated() =>
        Assert.Null(CoilQuality.Estimate(new(Cores.FindToroid("FT37-43")!, 10, Wire.Millimetre(0.4)), Frequency.FromMegahertz(7)));

    [Fact]
    public void CopperOnly_T50Winding_IsFarAboveWhatCoilsMeasure()
    {
        // 943 with the exact skin factor; the piecewise one is good to 0.6 %.
        Assert.Equal(1, CoilQuality.CopperOnly(Coil, Frequency.FromMegahertz(7.1)) / 943, 0.006);
        Assert.True(CoilQuality.CopperOnly(Coil, Frequency.FromMegahertz(7.1)) > CoilQuality.Estimate(Coil, Frequency.FromMegahertz(7.1))!.High);
    }

    [Fact]
    public void Combined_EqualLosses_HalveTheQ() => Assert.Equal(50, CoilQuality.Combined(100, 100), 12);

    [Fact]
    public void SelfResonance_ToroidCoil_MatchesTheWorkedExample()
    {
        var srf = SelfResonance.Of(Inductance.FromMicrohenry(5.336), Capacitance.FromPicofarad(1.5));

        Assert.Equal(56.26, srf.Megahertz, 0.005);
        Assert.Equal(5.426, SelfResonance.Apparent(Inductance.FromMicrohenry(5.34), Frequency.FromMegahertz(7.1), srf)!.Value.Microhenry, 0.0005);
    }

    [Fact]
    public void Apparent_AtAThirdOfSelfResonance_Is12AndAHalfPercentHigh()
    {
        var srf = Frequency.FromMegahertz(30);

        Assert.Equal(1.125, SelfResonance.Apparent(Inductance.FromMicrohenry(1), srf / 3, srf)!.Value.Microhenry, 9);
        Assert.Null(SelfResonance.Apparent(Inductance.FromMicrohenry(1), srf, srf));
        Assert.Null(SelfResonance.Impedance(Inductance.FromMicrohenry(1), srf, srf));
    }

    [Theory]
    [InlineData(10, 10, 0.463)]
    [InlineData(8, 10.5, 0.371)]
    [InlineData(20, 18, 0.932)]
    public void OfSolenoid_SingleLayer_MatchesTheFormula(double diameterMm, double lengthMm, double picofarad) =>
        Assert.Equal(picofarad, SelfResonance.OfSolenoid(Length.FromMillimetre(diameterMm), Length.FromMillimetre(lengthMm)).Picofarad, 0.0006);
}
