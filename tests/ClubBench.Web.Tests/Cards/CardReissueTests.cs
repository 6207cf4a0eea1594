using ClubBench.Club.UseCases.Plans;
using ClubBench.Web.Tests.Api;
using ClubBench.Web.Tests.Components;
using ClubBench.Web.Tests.Components.Pages.Plans;

namespace ClubBench.Web.Tests.Cards;

/// <summary>What the code on a printed card says while its plan is issued, changed and issued again.</summary>
[Collection(ClubPageCollection.Name)]
public sealed class CardReissueTests(DemoInterface demo) : PlanPageContext(demo)
{
    private const string Current = "This card is current.";

    [Fact]
    public async Task Code_OfAnIssuedPlan_LeadsToCurrentOnEveryCard()
    {
        var plan = await IssuedPlanAsync();

        var cards = (await StoredAsync(plan)).Cards;

        Assert.Equal(12, cards.Count);
        foreach (var card in cards) Assert.Contains(Current, await BehindAsync(card), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Code_PlanChangedButNotIssued_StaysCurrentAndTheDraftSaysItIsNot()
    {
        var plan = await IssuedPlanAsync();
        var printed = Card(await StoredAsync(plan), "A5");

        Choose(plan, "A5", Another);

        var draft = Card(await StoredAsync(plan), "A5");
        Assert.Equal(printed.Number + 1, draft.Number);
        Assert.Contains(Current, await BehindAsync(printed), StringComparison.Ordinal);
        Assert.Contains("not issued yet", await BehindAsync(draft), StringComparison.Ordinal);
        Assert.DoesNotContain(Current, await BehindAsync(draft), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Code_PlanIssuedAgain_LeadsToReplacedWhereTheCardChangedAndNowhereElse()
    {
        var plan = await IssuedPlanAsync();
        var printed = (await StoredAsync(plan)).Cards;
        Choose(plan, "A5", Another);

        Issue(plan);

        var now = (await StoredAsync(plan)).Cards;
        var changed = now.Where(n => printed.All(p => p.Id != n.Id)).Select(n => n.Stage).ToList();
        Assert.Contains("A5", changed);
        Assert.Contains(printed, p => !changed.Contains(p.Stage));
        foreach (var card in printed)
        {
            var page = await BehindAsync(card);
            if (changed.Contains(card.Stage))
            {
                Assert.Contains($"Replaced by card {card.Number + 1}.", page, StringComparison.Ordinal);
                Assert.Contains($"Ask a mentor for card {card.Number + 1} ", page, StringComparison.Ordinal);
                Assert.DoesNotContain(Current, page, StringComparison.Ordinal);
            }
            else
            {
                Assert.Contains(Current, page, StringComparison.Ordinal);
            }
        }

        foreach (var card in now) Assert.Contains(Current, await BehindAsync(card), StringComparison.Ordinal);
    }

    private async Task<Guid> IssuedPlanAsync()
    {
        var plan = await Demo.NewPlanAsync("20 m");
        ConfirmLimits(plan);
        Issue(plan);
        return plan;
    }

    private static CardSummary Card(OpenedPlan plan, string stage) => plan.Cards.Single(c => c.Stage == stage);

    /// <summary>The page a stranger with a phone is led to.</summary>
    private Task<string> BehindAsync(CardSummary card) => Demo.Stranger.GetStringAsync($"/c/{card.Id}", Xunit.TestContext.Current.CancellationToken);
}
