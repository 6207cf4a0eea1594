using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Filters;

public class LadderYieldTests
{
    public static TheoryData<ReferenceRow> Yields => ReferenceTable.Theory("low_pass_yield");

    [Theory]
    [MemberData(nameof(Yields))]
    [Evidence(typeof(LadderYield), EvidenceKind.IndependentRecomputation)]
    public void Of_IndependentParts_MatchesNodalAnalysis(ReferenceRow row)
    {
        var result = LadderYield.Of(Question(new(row.Number("capacitor_scatter"), 0, row.Number("coil_scatter"))));

        Assert.Equal(row.Number("share"), result.Passed.Share, row.Number("tolerance"));
    }

    [Fact]
    public void Of_SameSeed_TellsTheSameNumber()
    {
        var question = Question(new(0.05, 0.05, 0.02)) with { Trials = 1000 };

        Assert.Equal(LadderYield.Of(question).Passed, LadderYield.Of(question).Passed);
        Assert.NotEqual(LadderYield.Of(question).Passed, LadderYield.Of(question with { Seed = 2 }).Passed);
    }

    [Fact]
    [Evidence(typeof(LadderYield), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(LowPassFigures), EvidenceKind.IndependentRecomputation)]
    public void Of_NoScatter_IsTheAnalysedFilter()
    {
        var question = Question(new(0, 0, 0)) with { Trials = 100 };
        var figures = LowPassFigures.Of(F7, question.Requirement, 150, 1000);

        var result = LadderYield.Of(question);

        Assert.Equal(1, result.Passed.Share);
        Assert.Equal(figures.Margin.Db, result.Margin.Db, 1e-9);
        Assert.Equal(figures.WorstReturnLoss.Db, result.ReturnLoss.Db, 1e-9);
        Assert.Equal(figures.Harmonics.Select(h => Math.Round(h.Attenuation.Db, 9)), result.Harmonics.Select(h => Math.Round(h.Attenuation.Db, 9)));
    }

    [Fact]
    [Evidence(typeof(LadderYield), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(LowPassFigures), EvidenceKind.IndependentRecomputation)]
    public void Of_UnequalEnds_IsTheAnalysedFilter()
    {
        var unequal = new LowPassDesign(F7.Form, F7.Capacitors, F7.Coils, FiftyOhm, Resistance.FromOhm(80));
        var question = Question(new(0, 0, 0)) with { Design = unequal, Trials = 100, PassPoints = 5 };

        var result = LadderYield.Of(question);

        Assert.Equal(LowPassFigures.Of(unequal, question.Requirement, 150, 1000, 5).Margin.Db, result.Margin.Db, 1e-9);
    }

    [Fact]
    [Evidence(typeof(LadderYield), EvidenceKind.Identity)]
    public void Of_OneBatchInsteadOfIndependentCoils_WidensTheScatter()
    {
        var requirement = Question(new(0, 0, 0)).Requirement with { ReturnLoss = Decibels.FromDb(10) };

        var batch = LadderYield.Of(Question(new(0, 0.08, 0)) with { Requirement = requirement });
        var single = LadderYield.Of(Question(new(0, 0, 0.08)) with { Requirement = requirement });

        Assert.True(batch.Harmonics[0].Attenuation < single.Harmonics[0].Attenuation);
    }

    [Fact]
    [Evidence(typeof(LadderYield), EvidenceKind.Identity)]
    public void Of_TwoBatchesOfOneCoilEach_IsTheIndependentCase()
    {
        var two = LadderYield.Of(Question(new(0.05, 0.05, 0)) with { CoreBatches = [0, 1] });

        Assert.Equal(0.904, two.Passed.Share, 0.015);
    }

    [Fact]
    public void Of_Interval_HoldsTheShare()
    {
        var passed = LadderYield.Of(Question(new(0.05, 0.05, 0.02))).Passed;
        var (low, high) = passed.Interval();

        Assert.True(low < passed.Share && passed.Share < high);
        Assert.True(high - low < 0.02);
    }

    private static LadderYieldInput Question(PartScatter scatter) => new(
        F7,
        new(FrequencyRange.FromMegahertz(7.0, 7.3), Decibels.FromDb(17), [new(2, Decibels.FromDb(23)), new(3, Decibels.FromDb(43))]),
        scatter,
        20261201,
        150,
        1000)
    {
        Trials = 6000,
    };
}
