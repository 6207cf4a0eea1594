using Bunit;
using ClubBench.Web.Tests.Api;

namespace ClubBench.Web.Tests.Components.Pages.Plans;

[Collection(ClubPageCollection.Name)]
public sealed class TargetPageTests(DemoInterface demo) : PlanPageContext(demo)
{
    [Theory]
    [InlineData("reference", "14.05,2")]
    [InlineData("reference", "14.2")]
    [InlineData("low", "0")]
    [InlineData("power", "-1")]
    public async Task Save_WrongNumber_IsToldAtTheFieldAndMakesNoRevision(string field, string typed)
    {
        var plan = await Demo.NewPlanAsync("20 m");
        var target = Target(plan);

        target.Find($"#{field}").Input(typed);
        target.Find("form").Submit();

        target.WaitForElement($"#{field}-note .error-text");
        Assert.Single(target.FindAll("input[aria-invalid=true]"));
        Assert.Equal(1, (await StoredAsync(plan)).NewestRevision);
    }

    [Fact]
    public async Task Save_AsShown_MovesThePlanNowhereElse()
    {
        var plan = await Demo.NewPlanAsync("20 m");
        var before = (await StoredAsync(plan)).Plan.Inputs.Target;

        Save(Target(plan), plan);

        var after = await StoredAsync(plan);
        Assert.Equal((2, before), (after.NewestRevision, after.Plan.Inputs.Target));
    }

    [Fact]
    public async Task Save_DecimalComma_MovesThePlanThere()
    {
        var plan = await Demo.NewPlanAsync("20 m");
        var target = Target(plan);

        target.Find("#reference").Input("14,0585");
        Save(target, plan);

        Assert.Equal(14_058_500, (await StoredAsync(plan)).Plan.Inputs.Target.Reference.Hertz);
    }
}
