using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Elliptic;

public class EllipticDesignTests
{
    private static readonly Resistance Line = Resistance.FromOhm(50);
    private static readonly EllipticTask Forty = new(5, PassBandRipple.FromReflection(0.1), Frequency.FromMegahertz(8), Line);

    [Theory]
    [InlineData(5)]
    [InlineData(7)]
    [Evidence(typeof(EllipticDesign), EvidenceKind.RoundTrip)]
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

    [Theory]
    [InlineData(3)]
    [InlineData(5)]
    [InlineData(7)]
    [Evidence(typeof(EllipticDesign), EvidenceKind.IndependentRecomputation)]
    public void Of_OrderByNodalEquations_HasItsRippleAndItsLeastLoss(int order)
    {
        var task = Forty with { Order = order };
        var ladder = EllipticDesign.Of(task, 40).Filter!.ToLadder();
        var stopBand = 8 / Math.Sin(40 * Math.PI / 180);

        Assert.Equal(Forty.Ripple.Ripple.Db, Enumerable.Range(1, 800).Max(i => Loss(i * 0.01)), 1e-4);
        Assert.Equal(EllipticApproximation.Of(order, Forty.Ripple, 40).StopBandLoss.Db, Enumerable.Range(0, 20_000).Min(i => Loss(stopBand + (i * 0.005))), 1e-4);

        double Loss(double mhz) => -20 * Math.Log10(NodalEquations.Transmission(ladder, Frequency.FromMegahertz(mhz), Line, Line, 1e15, 1e15).Magnitude);
    }

    [Fact]
    [Evidence(typeof(EllipticDesign), EvidenceKind.Identity)]
    public void Of_EdgeAndResistanceScaled_ScalesEveryPart() => Gen.Select(Ellipses.Order, Gen.Double[5, 50], Gen.Double[0.2, 3], Gen.Double[0.2, 3]).Sample((order, angle, k, m) =>
    {
        var task = Forty with { Order = order };

        var (first, scaled) = (Arms(task), Arms(task with { Edge = k * task.Edge, Resistance = m * task.Resistance }));

        Assert.All(first.Zip(scaled), x =>
        {
            if (x.First.Inductance is { } l) Assert.Equal(m / k, x.Second.Inductance!.Value / l, 1e-9);
            if (x.First.Capacitance is { } c) Assert.Equal(1 / (m * k), x.Second.Capacitance!.Value / c, 1e-9);
        });

        IEnumerable<LadderElement> Arms(EllipticTask t) => EllipticDesign.Of(t, angle).Filter!.ToLadder().Elements;
    });

    [Fact]
    public void Of_AngleWithANegativePart_TellsTheReachThatHasNone()
    {
        var design = EllipticDesign.Of(Forty, 75);

        Assert.Equal(EllipticRefusal.NegativePart, design.Refusal);
        Assert.NotNull(EllipticDesign.WithLowestNotchAt(Forty, design.NotchReach!.Value.Low * 1.0001).Filter);
    }
}
