using ClubBench.Planning.Plans;
using ClubBench.Planning.Tests.KitAcceptance;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Plans;

public class PlannerTests
{
    [Fact]
    public void Plan_SameInputsTwice_GivesTheSamePlan() =>
        Assert.Equal(ContentHash.Of(KitA.Plan("20 m")), ContentHash.Of(KitA.Plan("20 m")));

    [Fact]
    public void Plan_Choice_ChangesTheStageAndOnlyTheCardsOfStagesThatMoved()
    {
        var (before, after) = (KitA.Plan("20 m"), KitA.Plan("20 m", new Choice("A4", "base-return:47")));

        var moved = before.Stages.Where(s => ContentHash.Of(s.Card) != ContentHash.Of(after.Stage(s.Stage).Card)).Select(s => s.Stage).ToList();

        Assert.Contains("A4", moved);
        Assert.DoesNotContain("A5", moved);
        Assert.DoesNotContain("A1", moved);
    }

    [Fact]
    public void Plan_EveryStage_HasACardWithItsChanges() =>
        Assert.All(KitA.Plan("40 m").Stages, s => Assert.Equal(s.Changes.Count(c => c.After is not null), s.Card.Fit.Sum(r => r.Designators.Count)));

    [Fact]
    public void Plan_EveryFinding_HasWordsOnEveryBand()
    {
        foreach (var band in new[] { "160 m", "80 m", "60 m", "40 m", "20 m", "17 m", "10 m", "6 m" })
        {
            var plan = KitA.Plan(band);
            var said = plan.Stages.SelectMany(s => s.WhyChanged.Concat(s.Findings).Select(f => Phrases.Say(f, s.Before.Kind)))
                .Concat(plan.Judgement.Reasons.Select(r => Phrases.Say(r)))
                .Concat(plan.Stages.SelectMany(s => s.Figures.Select(f => Phrases.NameOf(f, s.Before.Kind))));
            Assert.All(said, text => Assert.False(string.IsNullOrWhiteSpace(text)));
        }
    }

    [Fact]
    public void ThoroughSearch_LowPass_IsNoWorseThanTheQuickOneAndFreezesAsAChoice()
    {
        var plan = KitA.Plan("20 m");
        var found = ThoroughSearches.Run(plan.Inputs, "A5", null, TestContext.Current.CancellationToken);
        var frozen = KitA.Plan("20 m", ThoroughSearches.Freeze("A5", found[0], "coordinator"));

        Assert.True(found.Max(a => a.WorstMargin.Si) >= plan.Stage("A5").Alternatives.Max(a => a.WorstMargin.Si) - 0.5);
        Assert.Equal(found[0].After, frozen.Stage("A5").After);
    }

    [Fact]
    public void ThoroughSearch_Cancelled_Stops()
    {
        using var source = new CancellationTokenSource();
        source.Cancel();

        Assert.Throws<OperationCanceledException>(() => ThoroughSearches.Run(KitA.Plan("20 m").Inputs, "A5", null, source.Token));
    }
}
