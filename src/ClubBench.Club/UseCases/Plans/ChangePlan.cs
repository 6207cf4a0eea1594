using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Planning;
using ClubBench.Planning.Plans;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Somebody chose otherwise.</summary>
/// <param name="PlanId">The plan.</param>
/// <param name="SeenVersion">Version the person saw.</param>
/// <param name="Target">New target; null keeps it.</param>
/// <param name="Choices">All choices from now on; null keeps them.</param>
/// <param name="TakeNewestKit">Whether to plan the newest kit revision instead of the one planned so far.</param>
public sealed record ChangePlanInput(Guid PlanId, Guid SeenVersion, Target? Target = null, IReadOnlyList<Choice>? Choices = null, bool TakeNewestKit = false);

/// <summary>Plans again with other choices and stores a new revision; the old one stays as it was.</summary>
public sealed class ChangePlan(ClubStore store, PlanArchive archive) : Command<ChangePlanInput, PlanReference>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.PlanKits;

    /// <inheritdoc/>
    protected override async Task<Outcome<PlanReference>> Handle(Work work, ChangePlanInput input, CancellationToken cancellation)
    {
        if (await archive.OpenAsync(work.Db, input.PlanId, revision: null, cancellation) is not { } found) return NotFound("planId");
        var before = found.Plan.Inputs;
        var kit = (input.TakeNewestKit ? await work.Db.KitAsync(found.Row.KitId, revision: null, cancellation) : null) ?? before.Kit;
        var (target, choices) = (input.Target ?? before.Target, input.Choices ?? before.Choices);
        var messages = PlanRevisions.Check(target, choices, kit).ToList();
        if (messages.Count > 0) return Failure(messages);
        work.Expect(found.Row, input.SeenVersion);
        await work.StoreRevisionAsync(found.Row, Planner.Plan(await work.InputsAsync(kit, target, choices, cancellation)), cancellation);
        await work.Db.SaveChangesAsync(cancellation);
        return Success(new PlanReference(found.Row.Id, found.Row.NewestRevision, found.Row.Version));
    }
}
