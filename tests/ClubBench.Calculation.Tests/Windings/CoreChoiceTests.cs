using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;

namespace ClubBench.Calculation.Tests.Windings;

public class CoreChoiceTests
{
    [Theory]
    [InlineData("T37-6", 10.12, TunedFit.Good)]
    [InlineData("T50-2", 7.03, TunedFit.Good)]
    [InlineData("T50-2", 14.06, TunedFit.OutsideBestRange)]
    [InlineData("T50-2", 50, TunedFit.Unsuitable)]
    [InlineData("FT37-43", 7.03, TunedFit.Unsuitable)]
    [InlineData("FT37-61", 7.03, TunedFit.Good)]
    public void Judge_CoreInATunedCircuit_FollowsItsRanges(string core, double mhz, TunedFit fit) =>
        Assert.Equal(fit, CoreChoice.Judge(Cores.Find(core)!, Frequency.FromMegahertz(mhz)));

    [Fact]
    public void MaterialQ_Mix43At7Megahertz_IsHopeless() =>
        Assert.Equal(340 / 270.0, CoreChoice.MaterialQ(Cores.Find("FT37-43")!, Frequency.FromMegahertz(7))!.Value, 1e-9);

    [Fact]
    public void Windings_TwentyMetreFilterCoil_OffersTheYellowRingWithFifteenTurns()
    {
        var offers = CoreChoice.Windings(Inductance.FromMicrohenry(0.675), Frequency.FromMegahertz(14.06), Wire.Millimetre(0.4));

        Assert.Contains(offers, w => w is { Core.Designation: "T37-6", Turns: 15 });
        Assert.DoesNotContain(offers, w => w.Core.Mix == "2");
        Assert.All(offers, w => Assert.True(w.Fits));
    }

    [Fact]
    public void Windings_HugeInductance_AreNone() =>
        Assert.Empty(CoreChoice.Windings(Inductance.FromHenry(1), Frequency.FromMegahertz(7), Wire.Millimetre(0.4)));

    [Fact]
    public void CutLengthToAdjust_OneTurnOnEachTail_IsTwoTurnsLonger()
    {
        var winding = new ToroidWinding(Cores.FindToroid("T37-6")!, 15, Wire.Millimetre(0.4));

        Assert.Equal(290, winding.CutLength.Millimetre, 6);
        Assert.Equal(310, winding.CutLengthToAdjust.Millimetre, 6);
    }
}
