using Bunit;
using ClubBench.Club.Entities;
using ClubBench.Planning.Plans;
using ClubBench.Web.Tests.Api;

namespace ClubBench.Web.Tests.Components.Pages.Plans;

/// <summary>What is not settled holds a plan back; each answer is given where the pages ask for it.</summary>
[Collection(ClubPageCollection.Name)]
public sealed class PlanIssueTests(DemoInterface demo) : PlanPageContext(demo)
{
    [Fact]
    public async Task Issue_WithOpenItems_IsHeldBackUntilEachIsAnswered()
    {
        var plan = await Demo.NewPlanAsync("20 m");
        Choose(plan, "A5", Keep);
        await ExpectHeldBackAsync(plan, OpenItemCodes.OutputFilter, OpenItemCodes.DeviceGain, OpenItemCodes.LimitConfirmation);

        Choose(plan, "A5", PlannersOwn);
        await ExpectHeldBackAsync(plan, OpenItemCodes.LimitConfirmation);

        ConfirmLimits(plan);
        var page = Page(plan);
        Assert.Null(IssueButton(page).GetAttribute("aria-disabled"));
        Assert.Empty(page.Find("#missing").TextContent);
        Assert.Contains("Nothing is open", page.Markup, StringComparison.Ordinal);
        IssueButton(page).Click();

        page.WaitForAssertion(() => Assert.Contains("Issued", page.Find("#missing").TextContent, StringComparison.Ordinal));
        Assert.Equal((PlanState.Issued, (int?)4), await StateAsync(plan));
    }

    [Fact]
    public async Task Issue_NothingOpen_CanBeDoneAtOnceAndNotTwice()
    {
        var plan = await Demo.NewPlanAsync("20 m");
        ConfirmLimits(plan);

        Issue(plan);

        Assert.Equal((PlanState.Issued, (int?)2), await StateAsync(plan));
        Assert.Equal("true", IssueButton(Page(plan)).GetAttribute("aria-disabled"));
    }

    [Fact]
    public async Task Issue_SettledPlanThatAChoiceOpensAgain_IsHeldBack()
    {
        var plan = await Demo.NewPlanAsync("20 m");
        ConfirmLimits(plan);
        Assert.Null(IssueButton(Page(plan)).GetAttribute("aria-disabled"));

        Choose(plan, "A5", Keep);

        await ExpectHeldBackAsync(plan, OpenItemCodes.OutputFilter, OpenItemCodes.DeviceGain);
    }

    /// <summary>The button says that it is held back and why, each item stands in the list, and pressing it issues nothing.</summary>
    private async Task ExpectHeldBackAsync(Guid plan, params string[] items)
    {
        var stored = await StoredAsync(plan);
        Assert.Equal(items.Order(StringComparer.Ordinal), stored.Plan.OpenItems.Select(i => i.Code).Order(StringComparer.Ordinal));
        var page = Page(plan);
        Assert.Equal("true", IssueButton(page).GetAttribute("aria-disabled"));
        var missing = page.Find("#missing").TextContent;
        Assert.StartsWith($"Open items: {items.Length}.", missing, StringComparison.Ordinal);
        Assert.All(stored.Plan.OpenItems, i => Assert.Contains(ClubBench.Planning.Text.Phrases.Say(i), missing, StringComparison.Ordinal));

        IssueButton(page).Click();

        Assert.Equal((PlanState.Draft, (int?)null), await StateAsync(plan));
    }
}
