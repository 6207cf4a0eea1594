using ClubBench.Calculation.Choosing;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Choosing;

public class LowPassEdgeTests
{
    [Theory]
    [InlineData(3.5, 4.0, 1.75)]
    [InlineData(10.1, 10.1, 2.0)]
    [Evidence(typeof(LowPassEdge), EvidenceKind.ClosedFormLimit)]
    public void HarmonicGap_Band_IsTheRoomForTheFilter(double low, double high, double gap) =>
        Assert.Equal(gap, LowPassEdge.HarmonicGap(FrequencyRange.FromMegahertz(low, high)), 1e-12);

    [Theory]
    [InlineData(0.01, 0.01, 1.05)]
    [InlineData(0.05, 0.05, 1.0526316)]
    [InlineData(0.10, 0.10, 1.1111111)]
    [Evidence(typeof(LowPassEdge), EvidenceKind.ClosedFormLimit)]
    public void For_WorstParts_LeavesTheBandBelowTheEdge(double coil, double capacitor, double factor)
    {
        var band = FrequencyRange.FromMegahertz(7.0, 7.3);

        var edge = LowPassEdge.For(band, coil, capacitor);

        Assert.Equal(7.3 * factor, edge.Megahertz, 1e-6);
        Assert.True(edge * (1 - LowPassEdge.WorstPull(coil, capacitor)) >= band.High * 0.999999);
    }

    [Theory]
    [InlineData(0.05, 0.05)]
    [InlineData(0.10, 0.02)]
    [Evidence(typeof(LowPassEdge), EvidenceKind.IndependentRecomputation)]
    public void WorstPull_AllPartsTooLarge_IsWhatTheLadderDoes(double coil, double capacitor)
    {
        var large = new Ladder(F7.ToLadder().Elements.Select(e => e.Scaled(1 + coil, 1 + capacitor)));
        var start = Frequency.FromMegahertz(1);

        var moved = (large.CutOff3dB(start, FiftyOhm, FiftyOhm)!.Value / F7.ToLadder().CutOff3dB(start, FiftyOhm, FiftyOhm)!.Value) - 1;

        Assert.Equal(-LowPassEdge.WorstPull(coil, capacitor), moved, 0.005);
    }

    [Fact]
    [Evidence(typeof(LowPassEdge), EvidenceKind.RoundTrip)]
    public void FromHalfPower_CatalogueCutOff_LosesHalfThePowerThere()
    {
        var prototype = LowPassPrototype.Chebyshev(5, PassBandRipple.FromRipple(Decibels.FromDb(0.1)));
        var quoted = Frequency.FromMegahertz(9);

        var design = prototype.Denormalise(LowPassEdge.FromHalfPower(quoted, prototype), FiftyOhm);

        Assert.Equal(Ladder.HalfPower.Db, design.ToLadder().Loss(quoted, FiftyOhm, FiftyOhm).Db, 1e-9);
    }
}
