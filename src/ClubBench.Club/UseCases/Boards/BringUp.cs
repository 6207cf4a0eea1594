using ClubBench.Planning.Plans;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>The order in which stages are brought up.</summary>
internal static class BringUp
{
    /// <summary>The stages of a plan by the kit's bring-up order; stages it does not list come last, in kit order.</summary>
    public static IReadOnlyList<StagePlan> Order(Plan plan)
    {
        var place = plan.Inputs.Kit.BringUp.Select((key, i) => (key, i)).GroupBy(p => p.key, StringComparer.Ordinal).ToDictionary(g => g.Key, g => g.First().i, StringComparer.Ordinal);
        return [.. plan.Stages.OrderBy(s => place.GetValueOrDefault(s.Stage, int.MaxValue))];
    }
}
