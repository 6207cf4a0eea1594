using Bunit;
using ClubBench.Calculation.Bands;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Web.Components.Pages.Plans;

namespace ClubBench.Web.Tests.Components.Pages.Plans;

public sealed class PlanWorkingTests : PageContext
{
    private static readonly Lazy<Plan> Twenty = new(() => Planner.Plan(new PlanInputs(
        DemoKits.QuernThirty, TargetDefaults.On("20 m", DemoKits.QuernThirty, ItuRegion.Region1)!, [], DemoKits.DrawerStock, LearntValues.None, SearchEffort.Quick, 1, Planner.CalculationVersion)));

    public static TheoryData<string> Stages => [.. Twenty.Value.Stages.Where(s => s.Figures.Any(f => f.Working is not null)).Select(s => s.Stage)];

    [Theory]
    [MemberData(nameof(Stages))]
    public void Figures_OfAPlansStage_AllOpenTheirWorking(string stage)
    {
        var sheet = Render<PlanSheet>(p => p.Add(s => s.Plan, Twenty.Value).Add(s => s.AddressOf, s => "?stage=" + s).Add(s => s.Stage, stage));
        var count = sheet.FindAll("button.figure-button").Count;

        Assert.True(count >= Twenty.Value.Stage(stage).Figures.Count(f => f.Working is not null));
        for (var i = 0; i < count; i++)
        {
            sheet.FindAll("button.figure-button")[i].Click();
            Assert.NotEmpty(sheet.Find("section.working dd").TextContent);
        }
    }
}
