using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Opens a plan's page.</summary>
/// <param name="PlanId">The plan.</param>
/// <param name="Revision">Revision; null for the newest.</param>
public sealed record OpenPlanInput(Guid PlanId, int? Revision = null);

/// <summary>One revision in a plan's history.</summary>
public sealed record PlanRevisionEntry(int Revision, PlanState State, int OpenItems, DateTime AtUtc, string By);

/// <summary>A plan in one revision.</summary>
public sealed record OpenedPlan(
    Guid Id,
    string Name,
    Guid KitId,
    int Revision,
    int NewestRevision,
    int? IssuedRevision,
    PlanState State,
    Plan Plan,
    IReadOnlyList<CardSummary> Cards,
    IReadOnlyList<PlanRevisionEntry> Revisions,
    int Boards,
    Guid Version);

/// <summary>A plan with everything that was computed, as it was stored.</summary>
public sealed class OpenPlan(ClubStore store, PlanArchive archive) : Query<OpenPlanInput, OpenedPlan>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<OpenedPlan>> Handle(Work work, OpenPlanInput input, CancellationToken cancellation)
    {
        var db = work.Db;
        if (await archive.OpenAsync(db, input.PlanId, input.Revision, cancellation) is not { } found) return NotFound("planId");
        var revisions = await (from revision in db.PlanRevisions
                               join person in db.People on revision.By equals person.Id into people
                               from person in people.DefaultIfEmpty()
                               where revision.PlanId == input.PlanId
                               orderby revision.Revision descending
                               select new PlanRevisionEntry(revision.Revision, revision.State, revision.OpenItems, revision.AtUtc, person == null ? "" : person.DisplayName)).ToListAsync(cancellation);
        return Success(new OpenedPlan(
            found.Row.Id,
            found.Row.Name,
            found.Row.KitId,
            found.Revision,
            found.Row.NewestRevision,
            found.Row.IssuedRevision,
            revisions.Single(r => r.Revision == found.Revision).State,
            found.Plan,
            await db.CardSummariesAsync(found, cancellation),
            revisions,
            await db.Boards.CountAsync(b => b.PlanId == input.PlanId, cancellation),
            found.Row.Version));
    }
}
