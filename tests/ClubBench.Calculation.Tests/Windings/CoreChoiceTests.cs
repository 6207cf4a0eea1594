using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using CsCheck;

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
    [Evidence(typeof(CoreChoice), EvidenceKind.ClosedFormLimit)]
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
    [Evidence(typeof(CoreChoice), EvidenceKind.ClosedFormLimit)]
    public void Windings_HugeInductance_AreNone() =>
        Assert.Empty(CoreChoice.Windings(Inductance.FromHenry(1), Frequency.FromMegahertz(7), Wire.Millimetre(0.4)));

    [Fact]
    public void CutLengthToAdjust_OneTurnOnEachTail_IsTwoTurnsLonger()
    {
        var winding = new ToroidWinding(Cores.FindToroid("T37-6")!, 15, Wire.Millimetre(0.4));

        Assert.Equal(290, winding.CutLength.Millimetre, 6);
        Assert.Equal(310, winding.CutLengthToAdjust.Millimetre, 6);
    }

    [Fact]
    [Evidence(typeof(CoreChoice), EvidenceKind.IndependentRecomputation)]
    public void Windings_EveryRingAndTurnTried_OffersTheSame() =>
        Gen.Select(Gen.Double[0.2, 20], Gen.Double[1, 40]).Sample((uh, mhz) =>
        {
            var (f, wire) = (Frequency.FromMegahertz(mhz), Wire.Millimetre(0.4));
            var tried =
                from core in Cores.IronPowder
                where f >= core.BestRange.Low && f <= core.BestRange.High
                let turns = Enumerable.Range(1, 400).MinBy(n => Math.Abs((core.InductanceFactor.NanohenryPerTurnSquared * n * n / (1000 * uh)) - 1))
                where turns <= ToroidWinding.CapacityOf(core, wire)
                select (core.Designation, turns);
            return tried.ToHashSet().SetEquals(CoreChoice.Windings(Inductance.FromMicrohenry(uh), f, wire).Select(w => (w.Core.Designation, w.Turns)));
        });

    [Fact]
    [Evidence(typeof(CoreChoice), EvidenceKind.Identity)]
    public void Windings_Offers_ComeWithTheWellFilledRingsFirst()
    {
        var filled = CoreChoice.Windings(Inductance.FromMicrohenry(1.4), Frequency.FromMegahertz(7), Wire.Millimetre(0.4)).Select(w => w.Fill is >= 0.6 and <= 0.9).ToList();

        Assert.Contains(true, filled);
        Assert.Contains(false, filled);
        Assert.Equal(filled.OrderDescending(), filled);
    }

    [Fact]
    [Evidence(typeof(CoreChoice), EvidenceKind.Identity)]
    public void MaterialQ_EveryFerriteWithData_IsTheReactanceOverTheLossOfAnyWinding() =>
        Assert.All(Cores.Ferrite.Where(c => FerritePermeability.RangeOf(c.Mix) is not null), c =>
        {
            var (f, z) = (Frequency.FromMegahertz(7), new FerriteWinding(c, 6).Impedance(Frequency.FromMegahertz(7))!.Value);
            Assert.Equal(z.Imaginary / z.Real, CoreChoice.MaterialQ(c, f)!.Value, 9);
        });
}
