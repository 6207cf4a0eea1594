using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Crystals;

public class CrystalBatchTests
{
    private static readonly CrystalBatch Drawer = Batch(8998120, 8998310, 8998355, 8998402, 8998390, 8998650, 8998371, 8998010);

    [Fact]
    [Evidence(typeof(CrystalBatch), EvidenceKind.ClosedFormLimit)]
    public void Match_FourOfEight_TakesTheTightestWindow()
    {
        var set = Drawer.Match(4)!;

        Assert.Equal([2, 6, 4, 3], set.Indices);
        Assert.Equal(47, set.SpreadHertz, 1e-6);
    }

    [Fact]
    public void Match_MoreThanThereAre_HasNoSolution() => Assert.Null(Drawer.Match(9));

    [Fact]
    public void MatchAll_Pairs_UseEveryCrystalOnce()
    {
        var sets = Drawer.MatchAll(2);

        Assert.Equal(Enumerable.Range(0, 8), sets.SelectMany(s => s.Indices).Order());
        Assert.Equal(12, sets[0].SpreadHertz, 1e-6);
        Assert.Equal(sets.Min(s => s.SpreadHertz), sets[0].SpreadHertz);
    }

    [Fact]
    [Evidence(typeof(CrystalBatch), EvidenceKind.ClosedFormLimit)]
    public void Statistics_KnownBatch_AreThoseByHand()
    {
        var batch = Batch(100, 102, 104, 106);

        Assert.Equal(103, batch.MeanHertz, 1e-12);
        Assert.Equal(Math.Sqrt(20.0 / 3), batch.StandardDeviationHertz, 1e-12);
    }

    [Fact]
    [Evidence(typeof(CrystalBatch), EvidenceKind.ClosedFormLimit)]
    public void Outliers_OneFarAway_IsNamedAndAnEvenBatchNamesNone()
    {
        Assert.Equal([3], Batch(9000000, 9000010, 9000020, 9002000, 9000015).Outliers());
        Assert.Empty(Batch(9000000, 9000010, 9000020, 9000030, 9000015).Outliers());
    }

    [Fact]
    public void TypicalCrystals_EveryRow_IsOrderedAndNamesASource() => Assert.All(TypicalCrystals.All, c =>
    {
        Assert.True(c.MotionalCapacitance.Low < c.MotionalCapacitance.Usual && c.MotionalCapacitance.Usual < c.MotionalCapacitance.High);
        Assert.True(c.StaticCapacitance.Low < c.StaticCapacitance.Usual && c.MotionalResistance.Low < c.MotionalResistance.High);
        Assert.NotNull(ClubBench.Calculation.Tables.Sources.Find(c.Source.SourceId));
        Assert.Empty(c.Marked(c.Frequency, Capacitance.FromPicofarad(30)).Issues());
    });

    [Fact]
    public void TypicalCrystals_Nearest_TakesTheFrequencyByRatio()
    {
        Assert.Equal(14.06, TypicalCrystals.Nearest(Frequency.FromMegahertz(14.2))!.Frequency.Megahertz, 9);
        Assert.Equal(3, TypicalCrystals.Nearest(Frequency.FromMegahertz(28), overtone: 3)!.Overtone);
        Assert.Null(TypicalCrystals.Nearest(Frequency.FromMegahertz(14), "HC-18"));
    }

    [Fact]
    [Evidence(typeof(CrystalDrive), EvidenceKind.ClosedFormLimit)]
    public void Drive_OneMilliampereRmsIn26Ohm_StaysBelowTheLimit()
    {
        var drive = CrystalDrive.Of(Current.FromMilliampere(1), Resistance.FromOhm(26.45));

        Assert.Equal(0.02645, drive.Milliwatt, 1e-9);
        Assert.True(drive < CrystalDrive.UsualLimit);
    }

    [Fact]
    [Evidence(typeof(CrystalBatch), EvidenceKind.IndependentRecomputation)]
    public void Match_AgainstEveryChoiceOfThree_IsTheTightest() => Gen.Int[0, 500].Array[3, 9].Sample(offsets =>
    {
        var tightest = (from i in offsets.Index() from j in offsets.Index() from k in offsets.Index() where i.Index < j.Index && j.Index < k.Index
                        select Math.Max(i.Item, Math.Max(j.Item, k.Item)) - Math.Min(i.Item, Math.Min(j.Item, k.Item))).Min();
        Assert.Equal(tightest, Batch([.. offsets.Select(o => 9e6 + o)]).Match(3)!.SpreadHertz, 1e-6);
    });

    [Fact]
    [Evidence(typeof(CrystalBatch), EvidenceKind.Identity)]
    public void Statistics_BatchMovedAsAWhole_KeepDeviationOutliersAndSets() => Gen.Int[0, 500].Array[3, 9].Sample(offsets =>
    {
        var (here, there) = (Batch([.. offsets.Select(o => 9e6 + o)]), Batch([.. offsets.Select(o => 9.5e6 + o)]));
        Assert.Equal(here.StandardDeviationHertz, there.StandardDeviationHertz, 1e-6);
        Assert.Equal(here.MeanHertz + 5e5, there.MeanHertz, 1e-6);
        Assert.Equal(here.Outliers(), there.Outliers());
        Assert.Equal(here.MatchAll(2).Select(s => s.SpreadHertz), there.MatchAll(2).Select(s => s.SpreadHertz));
    });

    [Fact]
    [Evidence(typeof(CrystalDrive), EvidenceKind.IndependentRecomputation)]
    public void Drive_SineSampledOverACycle_IsItsMeanPower()
    {
        var milliwatt = Enumerable.Range(0, 1000).Average(k => Math.Pow(2 * Math.Sin(2 * Math.PI * k / 1000), 2) * 40 * 1e-3);

        Assert.Equal(milliwatt, CrystalDrive.Of(Current.FromMilliampere(Math.Sqrt(2)), Resistance.FromOhm(40)).Milliwatt, 1e-12);
    }

    [Fact]
    [Evidence(typeof(CrystalDrive), EvidenceKind.Identity)]
    public void Drive_TwiceTheCurrentInHalfTheResistance_IsTwice() => Gen.Select(Gen.Double[0.1, 5], Gen.Double[5, 200]).Sample((milliampere, ohm) =>
        Assert.Equal(
            2 * CrystalDrive.Of(Current.FromMilliampere(milliampere), Resistance.FromOhm(ohm)).Watt,
            CrystalDrive.Of(Current.FromMilliampere(2 * milliampere), Resistance.FromOhm(ohm / 2)).Watt,
            1e-12));

    private static CrystalBatch Batch(params double[] hertz) => new([.. hertz.Select(Frequency.FromHertz)]);
}
