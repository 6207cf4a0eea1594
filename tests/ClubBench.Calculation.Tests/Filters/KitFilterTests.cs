using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Filters;

/// <summary>The seven-element filter of the demonstration kit on its own band, kept on others, and converted. Coil Q 150, capacitor Q 1000.</summary>
public class KitFilterTests
{
    [Theory]
    [InlineData("30", 10.10, 0.20, 42, 13.50, 39.7, 20.26)]
    [InlineData("20", 14.05, 0.22, 26.5, 18.5, 41.0, 28.10)]
    public void Filter_OnItsBand_MatchesTheKitSheet(string filter, double megahertz, double lossDb, double returnLossDb, double cutOffMegahertz, double secondDb, double secondMegahertz)
    {
        var ladder = Ladder(filter);

        Assert.Equal(lossDb, Loss(ladder, megahertz), 0.006);
        Assert.Equal(returnLossDb, ladder.ReturnLoss(Frequency.FromMegahertz(megahertz), FiftyOhm, FiftyOhm).Db, 0.6);
        Assert.Equal(cutOffMegahertz, ladder.CutOff3dB(Frequency.FromMegahertz(megahertz), FiftyOhm, FiftyOhm)!.Value.Megahertz, 0.05);
        Assert.Equal(secondDb, Loss(ladder, secondMegahertz), 0.1);
    }

    [Fact]
    public void Filter_ThirdHarmonicOf30m_Is68dBDown() => Assert.Equal(68.4, Loss(Ladder("30"), 30.39), 0.05);

    [Fact]
    public void Filter_40mConverted_MatchesTheKitSheet()
    {
        var ladder = Ladder("40");

        Assert.Equal(38.9, Loss(ladder, 14.06), 0.05);
        Assert.True(ladder.ReturnLoss(Frequency.FromMegahertz(7.025), FiftyOhm, FiftyOhm).Db >= 33);
        Assert.Equal(9.47, ladder.CutOff3dB(Frequency.FromMegahertz(7), FiftyOhm, FiftyOhm)!.Value.Megahertz, 0.01);
    }

    [Fact]
    public void Filter_30mKeptOn40m_LetsTheSecondHarmonicPass() => Assert.Equal(6.7, Loss(Ladder("30"), 14.06), 0.05);

    [Fact]
    public void Filter_30mKeptOn20m_ReflectsMostOfThePower()
    {
        Assert.Equal(6.7, Loss(Ladder("30"), 14.06), 0.05);
        Assert.Equal(1.5, Ladder("30").ReturnLoss(Frequency.FromMegahertz(14.06), FiftyOhm, FiftyOhm).Db, 0.05);
    }

    [Theory]
    [InlineData(+1, 15.0, 45.6)]
    [InlineData(-1, 19.7, 35.8)]
    public void Filter_20mWithTurnsMissingOrTooMany_MatchesTheKitSheet(int turns, double returnLossDb, double secondDb)
    {
        var design = Seven20 with { Coils = [.. new[] { 15, 16, 15 }.Select(n => InductanceFactor.FromNanohenryPerTurnSquared(3).Of(n + turns))] };
        var ladder = design.ToLadder(150, 1000);

        Assert.Equal(returnLossDb, ladder.ReturnLoss(Frequency.FromMegahertz(14.05), FiftyOhm, FiftyOhm).Db, 0.3);
        Assert.Equal(secondDb, Loss(ladder, 28.1), 0.15);
    }

    [Fact]
    public void Filter_20mOnTheWrongCores_HardlyShowsAsLostPower()
    {
        var design = Seven20 with { Coils = [.. new[] { 15, 16, 15 }.Select(n => InductanceFactor.FromNanohenryPerTurnSquared(4.0).Of(n))] };
        var ladder = design.ToLadder(150, 1000);

        Assert.Equal(0.4, Loss(ladder, 14.05), 0.05);
        Assert.Equal(15.9, ladder.CutOff3dB(Frequency.FromMegahertz(14.05), FiftyOhm, FiftyOhm)!.Value.Megahertz, 0.05);
        Assert.Equal(15.9, ladder.ReturnLoss(Frequency.FromMegahertz(14.05), FiftyOhm, FiftyOhm).Db, 0.3);
    }

    private static Ladder Ladder(string filter) => (filter switch { "30" => Seven30, "20" => Seven20, _ => Seven40 }).ToLadder(150, 1000);

    private static double Loss(Ladder ladder, double megahertz) => ladder.Loss(Frequency.FromMegahertz(megahertz), FiftyOhm, FiftyOhm).Db;
}
