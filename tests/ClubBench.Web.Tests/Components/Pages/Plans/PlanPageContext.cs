using AngleSharp.Dom;
using Bunit;
using ClubBench.Club.Entities;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Web.Components.Pages.Plans;
using ClubBench.Web.Tests.Api;
using Microsoft.AspNetCore.Components;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Web.Tests.Components.Pages.Plans;

/// <summary>Works a plan through its pages: choose, confirm the limits, issue.</summary>
public abstract class PlanPageContext(DemoInterface demo) : ClubPageContext(demo)
{
    /// <summary>Places in the list of choices.</summary>
    protected const int Keep = 0;

    protected const int PlannersOwn = 1;

    protected const int Another = 2;

    protected IRenderedComponent<PlanPage> Page(Guid plan, string stage = "A5")
    {
        Services.GetRequiredService<NavigationManager>().NavigateTo($"/plans/{plan}?stage={stage}");
        var page = Render<PlanPage>(p => p.Add(x => x.Id, plan));
        page.WaitForElement("#missing");
        return page;
    }

    protected static IElement IssueButton(IRenderedComponent<PlanPage> page) => page.FindAll("button").Single(b => b.TextContent == "Issue the plan");

    protected void Choose(Guid plan, string stage, int place)
    {
        var page = Page(plan, stage);
        page.FindAll("fieldset input[type=radio]")[place].Change(true);
        page.WaitForElement("div.moved");
    }

    protected void ConfirmLimits(Guid plan)
    {
        var target = Target(plan);
        target.Find("label.tick input").Change(true);
        Save(target, plan);
    }

    protected void Issue(Guid plan)
    {
        var page = Page(plan);
        IssueButton(page).Click();
        page.WaitForAssertion(() => Assert.Contains("Issued", page.Find("#missing").TextContent, StringComparison.Ordinal));
    }

    protected IRenderedComponent<TargetPage> Target(Guid plan)
    {
        var target = Render<TargetPage>(p => p.Add(t => t.Id, plan));
        target.WaitForElement("form");
        return target;
    }

    /// <summary>Saves a target and waits until the page leads on to the plan.</summary>
    protected void Save(IRenderedComponent<TargetPage> target, Guid plan)
    {
        var navigation = Services.GetRequiredService<NavigationManager>();
        navigation.NavigateTo($"/plans/{plan}/target");
        target.Find("form").Submit();
        target.WaitForAssertion(() => Assert.Equal($"plans/{plan}", navigation.ToBaseRelativePath(navigation.Uri)));
    }

    protected async Task<(PlanState State, int? IssuedRevision)> StateAsync(Guid plan) =>
        await StoredAsync(plan) is var stored ? (stored.State, stored.IssuedRevision) : default;

    protected async Task<OpenedPlan> StoredAsync(Guid plan) =>
        (await Services.GetRequiredService<OpenPlan>().Run(Demo.Coordinator, new OpenPlanInput(plan), Xunit.TestContext.Current.CancellationToken)).Value;
}
