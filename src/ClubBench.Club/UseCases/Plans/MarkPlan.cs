using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>The newest revision was tried on one board, or shall no longer be built by.</summary>
/// <param name="PlanId">The plan.</param>
/// <param name="SeenVersion">Version the person saw.</param>
/// <param name="State">Tried or withdrawn; issuing is its own step, see <see cref="IssuePlan"/>.</param>
public sealed record MarkPlanInput(Guid PlanId, Guid SeenVersion, PlanState State);

/// <summary>Marks the newest revision of a plan as tried on one board or withdrawn.</summary>
public sealed class MarkPlan(ClubStore store) : Command<MarkPlanInput, PlanReference>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.IssuePlans;

    /// <inheritdoc/>
    protected override async Task<Outcome<PlanReference>> Handle(Work work, MarkPlanInput input, CancellationToken cancellation)
    {
        if (input.State is not (PlanState.Tried or PlanState.Withdrawn)) return Failure("state", "plan.state-not-markable");
        if (await work.Db.Plans.FirstOrDefaultAsync(p => p.Id == input.PlanId, cancellation) is not { } row) return NotFound("planId");
        var revision = await work.Db.PlanRevisions.SingleAsync(r => r.PlanId == row.Id && r.Revision == row.NewestRevision, cancellation);
        if (input.State is PlanState.Tried && revision.State is not PlanState.Draft) return Failure("state", "plan.not-a-draft");
        work.Expect(row, input.SeenVersion);
        revision.State = input.State;
        if (input.State is PlanState.Withdrawn && row.IssuedRevision == row.NewestRevision) row.IssuedRevision = null;
        work.Db.Entry(row).State = EntityState.Modified;
        work.Announce(EventKind.PlansChanged, row.Id);
        await work.Db.SaveChangesAsync(cancellation);
        return Success(new PlanReference(row.Id, row.NewestRevision, row.Version));
    }
}
