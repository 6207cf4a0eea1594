using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Planning;
using ClubBench.Planning.Plans;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Asks what a choice would do.</summary>
/// <param name="KitId">The kit.</param>
/// <param name="KitRevision">Revision; null for the newest.</param>
/// <param name="Target">Where it would go.</param>
/// <param name="Choices">What would be chosen.</param>
public sealed record PreviewPlanInput(Guid KitId, Target Target, IReadOnlyList<Choice> Choices, int? KitRevision = null);

/// <summary>Computes a plan and stores nothing.</summary>
public sealed class PreviewPlan(ClubStore store) : Query<PreviewPlanInput, Plan>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<Plan>> Handle(Work work, PreviewPlanInput input, CancellationToken cancellation)
    {
        if (await work.Db.KitAsync(input.KitId, input.KitRevision, cancellation) is not { } kit) return NotFound("kitId");
        var messages = PlanRevisions.Check(input.Target, input.Choices, kit).ToList();
        return messages.Count > 0 ? Failure(messages) : Success(Planner.Plan(await work.InputsAsync(kit, input.Target, input.Choices, cancellation)));
    }
}
