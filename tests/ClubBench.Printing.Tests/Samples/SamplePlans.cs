using ClubBench.Calculation.Bands;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Printing.Tests.Samples;

/// <summary>The demonstration kit on another band, planned as a club would.</summary>
public static class SamplePlans
{
    public static Plan QuernOn(string band)
    {
        var kit = DemoKits.QuernThirty;
        var target = TargetDefaults.On(band, kit, ItuRegion.Region1)!;
        return Planner.Plan(new PlanInputs(kit, target, [], DemoKits.DrawerStock, LearntValues.None, SearchEffort.Quick, 1, Planner.CalculationVersion));
    }
}
