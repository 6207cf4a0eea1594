using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Tests.KitAcceptance;

/// <summary>A sound kit stays silent; a planted fault is named. False alarms cost a hall as much as misses.</summary>
public class FalseAlarms
{
    [Fact]
    public void BackCheck_UntouchedKit_RaisesNoChangeAndNoRethink()
    {
        var findings = BackCheck.Of(KitA.Kit, LearntValues.None).Stages.SelectMany(s => s.Findings);

        Assert.DoesNotContain(findings, f => f.AtLeast >= StageAction.Change);
        Assert.DoesNotContain(findings, f => f.Severity == Severity.Fault);
    }

    [Fact]
    public void BackCheck_UntouchedKit_NoStageDiffersFromItsPapers() =>
        Assert.DoesNotContain(BackCheck.Of(KitA.Kit, LearntValues.None).Stages, s => s.Verdict == CheckVerdict.Differs);

    [Fact]
    public void Survey_OwnBand_KeepsEveryStage()
    {
        var own = BandSurvey.Of(KitA.Kit, DemoKits.DrawerStock, LearntValues.None, Calculation.Bands.ItuRegion.Region1, Calculation.Noise.NoiseSite.Residential).Columns.Single(c => c.IsOwnBand);

        Assert.All(own.Cells, c => Assert.True(c.Action <= StageAction.Check, $"{c.Stage} {c.Action}"));
        Assert.All(own.Cells, c => Assert.Equal(0, c.Changes));
    }

    [Theory]
    [InlineData("A1", "L1", PartValue.Inductance, 2.2)]
    [InlineData("A1", "C5", PartValue.Capacitance, 3.3)]
    [InlineData("A3", "C11", PartValue.Capacitance, 1.5)]
    [InlineData("A4", "L3", PartValue.Turns, 0.3)]
    [InlineData("A5", "C16", PartValue.Capacitance, 1.8)]
    [InlineData("A5", "L5", PartValue.Turns, 1.5)]
    [InlineData("A7", "C19", PartValue.Capacitance, 2.2)]
    [InlineData("A6", "L7", PartValue.Inductance, 0.47)]
    public void BackCheck_PlantedMisprint_NamesThatStageAndNoOther(string stage, string part, string value, double factor)
    {
        var kit = KitA.Changed(KitA.Kit, stage, $"{part}.{value}", factor);

        var alarmed = BackCheck.Of(kit, LearntValues.None).Stages.Where(s => s.Findings.Any(f => f.AtLeast >= StageAction.Change)).Select(s => s.Stage);

        Assert.Equal([stage], alarmed);
    }
}
