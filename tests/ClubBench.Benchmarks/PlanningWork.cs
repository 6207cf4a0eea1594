using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Noise;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Benchmarks;

/// <summary>Plans and the band survey of the demonstration kit.</summary>
internal static class PlanningWork
{
    public static IEnumerable<Workload> All =>
    [
        Plan("plan-20-m", "20 m"),
        Plan("plan-40-m", "40 m"),
        new("band-survey", 500, () => BandSurvey.Of(DemoKits.QuernThirty, DemoKits.DrawerStock, LearntValues.None, ItuRegion.Region1, NoiseSite.Residential)),
    ];

    private static Workload Plan(string name, string band) => new(name, 100, () => Planner.Plan(InputsOn(band)));

    public static PlanInputs InputsOn(string band)
    {
        var kit = DemoKits.QuernThirty;
        var target = TargetDefaults.On(band, kit, ItuRegion.Region1) ?? throw new InvalidOperationException($"{band} has no telegraphy segment.");
        return new PlanInputs(kit, target, [], DemoKits.DrawerStock, LearntValues.None, SearchEffort.Quick, 1, Planner.CalculationVersion);
    }
}
