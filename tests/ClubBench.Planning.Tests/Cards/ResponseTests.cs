using ClubBench.Planning.Plans;
using ClubBench.Planning.Tests.Plans;

namespace ClubBench.Planning.Tests.Cards;

public class ResponseTests
{
    [Fact]
    public void Card_LowPass_CarriesThePlansCurvesAndLimit()
    {
        var stage = DemoPlan.TwentyMetres.Stage("A5");
        var (plan, card) = (stage.Plots.Single(), stage.Card.Response!);

        Assert.Equal(plan.Curves, card.Curves);
        Assert.Equal(plan.Limits.Where(l => !l.IsWish), card.Limits);
        Assert.Single(card.Limits);
        Assert.Empty(card.Marks);
    }

    [Fact]
    public void Card_OtherStages_CarryNone() =>
        Assert.All(DemoPlan.TwentyMetres.Stages.Where(s => s.Stage != "A5"), s => Assert.Null(s.Card.Response));

    [Fact]
    public void Card_ChoiceForAnotherStage_LeavesTheLowPassCardAsItWas()
    {
        var plan = DemoPlan.TwentyMetres;
        var other = plan.Stage("A4").Alternatives[0];

        var changed = Planner.Plan(plan.Inputs with { Choices = [new Choice("A4", other.Id)] });

        Assert.NotEqual(ContentHash.Of(plan.Stage("A4").Card), ContentHash.Of(changed.Stage("A4").Card));
        Assert.Equal(ContentHash.Of(plan.Stage("A5").Card), ContentHash.Of(changed.Stage("A5").Card));
    }
}
