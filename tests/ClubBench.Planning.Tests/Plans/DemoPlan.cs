using ClubBench.Calculation.Bands;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Tests.Plans;

/// <summary>The demonstration kit moved to a band, with the stages whose kinds are registered.</summary>
internal static class DemoPlan
{
    private static readonly Lazy<Plan> Twenty = new(() => On("20 m"));
    private static readonly Lazy<Plan> Forty = new(() => On("40 m"));

    public static Plan TwentyMetres => Twenty.Value;

    public static Plan FortyMetres => Forty.Value;

    private static Plan On(string band)
    {
        using var file = DemoKits.OpenQuernThirty();
        var all = KitFile.ReadDocument(file).Value;
        var kit = all with { Stages = [.. all.Stages.Where(s => StageKindList.Find(s.Kind) is not null)] };
        var target = TargetDefaults.On(band, kit, ItuRegion.Region1)!;
        return Planner.Plan(new PlanInputs(kit, target, [], DemoKits.DrawerStock, LearntValues.None, SearchEffort.Quick, 1, Planner.CalculationVersion));
    }
}
