using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Elliptic;

public class EllipticDesignTests
{
    private static readonly Resistance Line = Resistance.FromOhm(50);
    private static readonly EllipticTask Forty = new(5, PassBandRipple.FromReflection(0.1), Frequency.FromMegahertz(8), Line);

    [Theory]
    [InlineData(5)]
    [InlineData(7)]
    public void WithLowestNotchAt_SecondHarmonic_BlocksIt(int order)
    {
        var second = Frequency.FromMegahertz(14.3);

        var design = EllipticDesign.WithLowestNotchAt(Forty with { Order = order }, second);

        Assert.Equal(EllipticRefusal.None, design.Refusal);
        Assert.Equal(second.Hertz, design.Filter!.Notches[0].Hertz, 1);
        Assert.InRange(design.Filter.ToLadder(150, 1000).Loss(second, Line, Line).Db, 60, 100);
    }

    [Fact]
    public void WithLowestNotchAt_FrequencyBelowTheEdge_TellsTheReach()
    {
        var design = EllipticDesign.WithLowestNotchAt(Forty, Frequency.FromMegahertz(7.5));

        Assert.Equal(EllipticRefusal.NotchOutOfReach, design.Refusal);
        Assert.Null(design.Filter);
        Assert.Equal(EllipticRefusal.None, EllipticDesign.WithLowestNotchAt(Forty, design.NotchReach!.Value.Low * 1.001).Refusal);
        Assert.Equal(EllipticRefusal.NotchOutOfReach, EllipticDesign.WithLowestNotchAt(Forty, design.NotchReach!.Value.High * 1.001).Refusal);
    }

    [Fact]
    public void Of_AngleThatLeavesNoTrapCapacitor_IsTooSmallAndShowsIt()
    {
        var design = EllipticDesign.Of(Forty with { Edge = Frequency.FromMegahertz(30) }, 5);

        Assert.Equal(EllipticRefusal.PartTooSmall, design.Refusal);
        Assert.InRange(design.Filter!.SmallestCapacitor.Picofarad, 0, 1);
        Assert.Equal(EllipticRefusal.None, EllipticDesign.Of(Forty, 35).Refusal);
    }

    [Theory]
    [InlineData(5, 57, 0.01)]
    [InlineData(7, 70, 0.01)]
    [InlineData(5, 67, 0.0436)]
    [InlineData(3, 80, 0.0001)]
    public void GreatestAngleDegrees_SmallRipple_EndsWhereAPartWouldBeNegative(int order, double degrees, double rippleDb)
    {
        var ripple = PassBandRipple.FromRipple(Decibels.FromDb(rippleDb));

        var greatest = NotchPlacement.GreatestAngleDegrees(order, ripple);

        Assert.InRange(greatest, degrees, degrees + 1);
        Assert.Equal(greatest < 80 ? EllipticRefusal.NegativePart : EllipticRefusal.None, EllipticSynthesis.Of(EllipticApproximation.Of(order, ripple, Math.Min(80, greatest + 0.01))).Refusal);
        Assert.Equal(EllipticRefusal.None, EllipticSynthesis.Of(EllipticApproximation.Of(order, ripple, greatest - 0.01)).Refusal);
    }

    [Fact]
    public void Of_AngleWithANegativePart_TellsTheReachThatHasNone()
    {
        var design = EllipticDesign.Of(Forty, 75);

        Assert.Equal(EllipticRefusal.NegativePart, design.Refusal);
        Assert.NotNull(EllipticDesign.WithLowestNotchAt(Forty, design.NotchReach!.Value.Low * 1.0001).Filter);
    }
}
