using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>How somebody who was let in becomes an actor.</summary>
internal static class Arrivals
{
    /// <summary>The actor of a person with an active membership, or null.</summary>
    public static async Task<Actor?> ActorOfAsync(this Work work, Guid personId, Guid? nightId, CancellationToken cancellation)
    {
        var found = await (from person in work.Db.People
                           join membership in work.Db.Memberships on person.Id equals membership.PersonId
                           where person.Id == personId && membership.EndedUtc == null
                           select new { person.DisplayName, membership.Role }).FirstOrDefaultAsync(cancellation);
        if (found is null) return null;
        var tags = await work.Db.Boards.Where(b => b.BuilderId == personId).OrderBy(b => b.Tag).Select(b => b.Tag).ToListAsync(cancellation);
        return new Actor(personId, work.Db.ClubId, found.Role, found.DisplayName, tags, nightId);
    }

    /// <summary>Adds a person with a role.</summary>
    public static Person Admit(this Work work, string displayName, Role role, bool isJunior = false)
    {
        var person = new Person { DisplayName = displayName.Trim(), IsJunior = isJunior };
        work.Db.People.Add(person);
        work.Db.Memberships.Add(new Membership { PersonId = person.Id, Role = role, SinceUtc = work.NowUtc });
        work.Announce(EventKind.ClubChanged, person.Id);
        return person;
    }

    /// <summary>Notes that a person is there tonight; a second time changes nothing.</summary>
    public static async Task AttendAsync(this Work work, Guid nightId, Guid personId, CancellationToken cancellation)
    {
        if (await work.Db.Attendances.AnyAsync(a => a.NightId == nightId && a.PersonId == personId, cancellation)) return;
        work.Db.Attendances.Add(new Attendance { NightId = nightId, PersonId = personId, CameUtc = work.NowUtc });
        work.Announce(EventKind.NightChanged, nightId);
    }
}
