using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Builders shall build by the newest revision.</summary>
public sealed record IssuePlanInput(Guid PlanId, Guid SeenVersion);

/// <summary>Issues the newest revision of a plan. Refused while anything is open: a list of what is comes back.</summary>
public sealed class IssuePlan(ClubStore store, PlanArchive archive) : Command<IssuePlanInput, PlanReference>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.IssuePlans;

    /// <inheritdoc/>
    protected override async Task<Outcome<PlanReference>> Handle(Work work, IssuePlanInput input, CancellationToken cancellation)
    {
        if (await archive.OpenAsync(work.Db, input.PlanId, revision: null, cancellation) is not { } found) return NotFound("planId");
        if (found.Plan.OpenItems.Count > 0) return Failure(found.Plan.OpenItems.Select(i => FieldMessage.Error($"openItems.{i.Code}", "plan.open-item", ("item", i.Code), ("stage", i.Stage))));
        work.Expect(found.Row, input.SeenVersion);
        var revision = await work.Db.PlanRevisions.SingleAsync(r => r.PlanId == input.PlanId && r.Revision == found.Revision, cancellation);
        revision.State = PlanState.Issued;
        found.Row.IssuedRevision = found.Revision;
        work.Announce(EventKind.PlansChanged, found.Row.Id);
        await work.Db.SaveChangesAsync(cancellation);
        return Success(new PlanReference(found.Row.Id, found.Revision, found.Row.Version));
    }
}
