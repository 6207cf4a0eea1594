using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Tests.Plans;

public class PlanDifferenceTests
{
    private static readonly Plan Before = DemoPlan.TwentyMetres;

    [Fact]
    public void Between_TheSamePlanTwice_IsEmpty()
    {
        var difference = PlanDifference.Between(Before, Before, "A5");

        Assert.Empty(difference.Stages);
        Assert.Empty(difference.Settled);
        Assert.Empty(difference.Opened);
    }

    [Fact]
    public void Between_AnotherChoice_LeavesTheChosenStageOut()
    {
        var after = With(new Choice("A5", Choice.Keep, Reason: "try"));

        Assert.DoesNotContain("A5", PlanDifference.Between(Before, after, "A5").Stages);
        Assert.Contains("A5", PlanDifference.Between(Before, after, "A1").Stages);
    }

    [Fact]
    public void Between_TurnedRound_SwapsOpenedAndSettled()
    {
        var after = With(new Choice("A5", Choice.Keep, Reason: "try"));
        var (there, back) = (PlanDifference.Between(Before, after, "A5"), PlanDifference.Between(after, Before, "A5"));

        Assert.NotEmpty(there.Opened);
        Assert.Equal(there.Opened, back.Settled);
        Assert.Equal(there.Settled, back.Opened);
    }

    private static Plan With(Choice choice) => Planner.Plan(Before.Inputs with { Choices = [choice] });
}
