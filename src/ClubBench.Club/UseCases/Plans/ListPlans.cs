using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Asks for plans.</summary>
/// <param name="KitId">Of one kit; null for all.</param>
public sealed record ListPlansInput(Guid? KitId = null);

/// <summary>A plan in a list, in its newest revision.</summary>
public sealed record PlanSummary(
    Guid Id,
    string Name,
    Guid KitId,
    string KitName,
    string BandName,
    int Revision,
    PlanState State,
    int? IssuedRevision,
    int OpenItems,
    Verdict Judgement,
    int Boards,
    DateTime ChangedUtc,
    Guid Version);

/// <summary>Plans, last changed first.</summary>
public sealed class ListPlans(ClubStore store) : Query<ListPlansInput, IReadOnlyList<PlanSummary>>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<IReadOnlyList<PlanSummary>>> Handle(Work work, ListPlansInput input, CancellationToken cancellation)
    {
        var db = work.Db;
        return Success(await (from plan in db.Plans
                              join kit in db.Kits on plan.KitId equals kit.Id
                              join revision in db.PlanRevisions on new { PlanId = plan.Id, Revision = plan.NewestRevision } equals new { revision.PlanId, revision.Revision }
                              where input.KitId == null || plan.KitId == input.KitId
                              orderby revision.AtUtc descending, plan.Name
                              select new PlanSummary(
                                  plan.Id, plan.Name, kit.Id, kit.Name, plan.BandName, plan.NewestRevision, revision.State, plan.IssuedRevision, revision.OpenItems, revision.Judgement,
                                  db.Boards.Count(b => b.PlanId == plan.Id), revision.AtUtc, plan.Version)).ToListAsync(cancellation));
    }
}
