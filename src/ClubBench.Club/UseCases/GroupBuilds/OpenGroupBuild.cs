using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.GroupBuilds;

/// <summary>Opens a group build's page.</summary>
public sealed record OpenGroupBuildInput(Guid GroupBuildId);

/// <summary>A plan of the group build's kit.</summary>
public sealed record GroupBuildPlan(Guid Id, string Name, string BandName, int Revision, int? IssuedRevision, int Boards);

/// <summary>A night of the group build.</summary>
public sealed record GroupBuildNight(Guid Id, string Title, DateOnly Date, NightState State);

/// <summary>Somebody who can be given a board.</summary>
public sealed record Candidate(Guid PersonId, string DisplayName, Role Role);

/// <summary>A group build.</summary>
public sealed record OpenedGroupBuild(
    Guid Id,
    string Name,
    Guid KitId,
    string KitName,
    IReadOnlyList<GroupBuildPlan> Plans,
    IReadOnlyList<BoardSummary> Boards,
    IReadOnlyList<GroupBuildNight> Nights,
    IReadOnlyList<Candidate> Candidates);

/// <summary>A group build with its plans, boards and nights.</summary>
public sealed class OpenGroupBuild(ClubStore store) : Query<OpenGroupBuildInput, OpenedGroupBuild>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.RunNights;

    /// <inheritdoc/>
    protected override async Task<Outcome<OpenedGroupBuild>> Handle(Work work, OpenGroupBuildInput input, CancellationToken cancellation)
    {
        var db = work.Db;
        if (await db.GroupBuilds.FirstOrDefaultAsync(g => g.Id == input.GroupBuildId, cancellation) is not { } build) return NotFound("groupBuildId");
        var kitName = await db.Kits.Where(k => k.Id == build.KitId).Select(k => k.Name).SingleAsync(cancellation);
        var plans = await db.Plans.Where(p => p.KitId == build.KitId).OrderBy(p => p.Name)
            .Select(p => new GroupBuildPlan(p.Id, p.Name, p.BandName, p.NewestRevision, p.IssuedRevision, db.Boards.Count(b => b.GroupBuildId == build.Id && b.PlanId == p.Id))).ToListAsync(cancellation);
        var nights = await db.Nights.Where(n => n.GroupBuildId == build.Id).OrderBy(n => n.Date).Select(n => new GroupBuildNight(n.Id, n.Title, n.Date, n.State)).ToListAsync(cancellation);
        var candidates = await (from person in db.People
                                join membership in db.Memberships on person.Id equals membership.PersonId
                                where membership.EndedUtc == null
                                orderby person.DisplayName
                                select new Candidate(person.Id, person.DisplayName, membership.Role)).ToListAsync(cancellation);
        return Success(new OpenedGroupBuild(build.Id, build.Name, build.KitId, kitName, plans, await BoardSummaries.OfAsync(db, b => b.GroupBuildId == build.Id, cancellation), nights, candidates));
    }
}
