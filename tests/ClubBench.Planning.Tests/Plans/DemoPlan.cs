using ClubBench.Calculation.Bands;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Tests.Plans;

/// <summary>The demonstration kit moved to a band.</summary>
internal static class DemoPlan
{
    private static readonly Lazy<Plan> Twenty = new(() => On("20 m"));
    private static readonly Lazy<Plan> Forty = new(() => On("40 m"));

    public static Plan TwentyMetres => Twenty.Value;

    public static Plan FortyMetres => Forty.Value;

    private static Plan On(string band)
    {
        var kit = DemoKits.QuernThirty;
        var target = TargetDefaults.On(band, kit, ItuRegion.Region1)!;
        return Planner.Plan(new PlanInputs(kit, target, [], DemoKits.DrawerStock, LearntValues.None, SearchEffort.Quick, 1, Planner.CalculationVersion));
    }
}
