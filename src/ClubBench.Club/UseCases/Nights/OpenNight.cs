using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Nights;

/// <summary>Opens a night's page.</summary>
public sealed record OpenNightInput(Guid NightId);

/// <summary>Somebody who came.</summary>
public sealed record PresentPerson(Guid Id, string DisplayName, Role Role, DateTime CameUtc);

/// <summary>A night.</summary>
/// <param name="JoinCode">Code to be spoken; null unless the night is open, and for builders.</param>
/// <param name="Boards">Every board of the group build: the closing list.</param>
public sealed record OpenedNight(
    Guid Id,
    Guid GroupBuildId,
    string GroupBuildName,
    string Title,
    DateOnly Date,
    string Goals,
    NightState State,
    DateTime? OpenedUtc,
    DateTime? ClosedUtc,
    string? JoinCode,
    IReadOnlyList<PresentPerson> Present,
    IReadOnlyList<BoardSummary> Boards,
    Guid Version);

/// <summary>A night with who came and where each board stands.</summary>
public sealed class OpenNight(ClubStore store) : Query<OpenNightInput, OpenedNight>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<OpenedNight>> Handle(Work work, OpenNightInput input, CancellationToken cancellation)
    {
        var db = work.Db;
        if (await db.Nights.FirstOrDefaultAsync(n => n.Id == input.NightId, cancellation) is not { } night) return NotFound("nightId");
        var build = await db.GroupBuilds.SingleAsync(g => g.Id == night.GroupBuildId, cancellation);
        var present = await (from attendance in db.Attendances
                             join person in db.People on attendance.PersonId equals person.Id
                             join membership in db.Memberships on person.Id equals membership.PersonId
                             where attendance.NightId == night.Id
                             orderby attendance.CameUtc, person.DisplayName
                             select new PresentPerson(person.Id, person.DisplayName, membership.Role, attendance.CameUtc)).ToListAsync(cancellation);
        var boards = await BoardSummaries.OfAsync(db, b => b.GroupBuildId == build.Id, cancellation);
        return Success(new OpenedNight(
            night.Id, build.Id, build.Name, night.Title, night.Date, night.Goals, night.State, night.OpenedUtc, night.ClosedUtc,
            work.Actor.Role > Role.Builder ? night.JoinCode : null, present, boards, night.Version));
    }
}
