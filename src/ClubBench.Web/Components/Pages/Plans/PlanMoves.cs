using ClubBench.Planning.Plans;

namespace ClubBench.Web.Components.Pages.Plans;

/// <summary>What a choice moved besides the stage it was made for.</summary>
/// <param name="Stages">Other stages whose action or parts differ.</param>
/// <param name="Settled">Open items that went away.</param>
/// <param name="Opened">Open items that came.</param>
public sealed record PlanMoves(IReadOnlyList<string> Stages, IReadOnlyList<OpenItem> Settled, IReadOnlyList<OpenItem> Opened)
{
    /// <summary>Compares the plan before and after a choice for one stage.</summary>
    public static PlanMoves Between(Plan before, Plan after, string chosen) => new(
        [.. after.Stages.Where(s => s.Stage != chosen && Differs(before.Stages.FirstOrDefault(b => b.Stage == s.Stage), s)).Select(s => s.Stage)],
        [.. Without(before.OpenItems, after.OpenItems)],
        [.. Without(after.OpenItems, before.OpenItems)]);

    private static bool Differs(StagePlan? before, StagePlan after) =>
        before is null || before.Action != after.Action || before.AlternativeId != after.AlternativeId || before.Changes.Count != after.Changes.Count;

    private static IEnumerable<OpenItem> Without(IReadOnlyList<OpenItem> items, IReadOnlyList<OpenItem> others) =>
        items.Where(i => others.All(o => (o.Code, o.Stage) != (i.Code, i.Stage)));
}
