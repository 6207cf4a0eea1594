namespace ClubBench.Planning.Plans;

/// <summary>What a choice moved besides the stage it was made for.</summary>
/// <param name="Stages">Keys of the other stages whose action or parts differ, kit order.</param>
/// <param name="Settled">Open items that went away.</param>
/// <param name="Opened">Open items that came.</param>
public sealed record PlanDifference(IReadOnlyList<string> Stages, IReadOnlyList<OpenItem> Settled, IReadOnlyList<OpenItem> Opened)
{
    /// <summary>Compares two plans of one kit. Parts count by place, type and value; figures that move a little do not.</summary>
    /// <param name="before">The plan before the choice.</param>
    /// <param name="after">The plan after it.</param>
    /// <param name="chosen">Stage the choice was made for; it is left out.</param>
    public static PlanDifference Between(Plan before, Plan after, string chosen) => new(
        [.. after.Stages.Where(s => s.Stage != chosen && Differs(before.Stages.FirstOrDefault(b => b.Stage == s.Stage), s)).Select(s => s.Stage)],
        [.. Without(before.OpenItems, after.OpenItems)],
        [.. Without(after.OpenItems, before.OpenItems)]);

    private static bool Differs(StagePlan? before, StagePlan after) =>
        before is null || before.Action != after.Action || PartChanges.Between(before.After, after.After).Count > 0;

    private static IEnumerable<OpenItem> Without(IReadOnlyList<OpenItem> items, IReadOnlyList<OpenItem> others) =>
        items.Where(i => others.All(o => (o.Code, o.Stage) != (i.Code, i.Stage)));
}
