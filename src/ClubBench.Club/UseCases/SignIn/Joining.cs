using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>Joining a night, with builder rights for that night.</summary>
internal static class Joining
{
    /// <summary>A code is good for one evening at most.</summary>
    public static readonly TimeSpan LongestNight = TimeSpan.FromHours(12);

    /// <summary>The open night with this code, or null; also enters its club.</summary>
    public static async Task<Night?> NightOfAsync(Work work, string code, CancellationToken cancellation)
    {
        var (meant, earliest) = (Secrets.Normalise(code), work.NowUtc - LongestNight);
        var night = await work.Db.Nights.IgnoreQueryFilters()
            .FirstOrDefaultAsync(n => n.JoinCode == meant && n.State == NightState.Open && n.OpenedUtc > earliest, cancellation);
        if (night is not null) work.Enter(night.ClubId);
        return night;
    }

    /// <summary>Joins by name: a builder of that name is the same person as before, with the same board; a new name is a new builder.</summary>
    public static async Task<Outcome<Actor>> ByNameAsync(Work work, Guid night, string displayName, CancellationToken cancellation)
    {
        var name = displayName.Trim();
        if (name.Length == 0) return Outcome<Actor>.Failure(FieldMessage.Error("displayName", "field.needed"));
        var members = await (from person in work.Db.People
                             join membership in work.Db.Memberships on person.Id equals membership.PersonId
                             where membership.EndedUtc == null
                             select new { person.Id, person.DisplayName, membership.Role }).ToListAsync(cancellation);
        var known = members.FirstOrDefault(m => string.Equals(m.DisplayName, name, StringComparison.OrdinalIgnoreCase));
        if (known is { Role: not Role.Builder }) return Outcome<Actor>.Failure(FieldMessage.Error("displayName", "join.name-taken", ("name", name)));
        return known is null ? await NewAsync(work, night, name, cancellation) : await KnownAsync(work, night, known.Id, cancellation);
    }

    /// <summary>Joins as a person the club knows.</summary>
    public static async Task<Outcome<Actor>> KnownAsync(Work work, Guid night, Guid personId, CancellationToken cancellation)
    {
        if (await work.ActorOfAsync(personId, night, cancellation) is not { Role: Role.Builder } actor) return Outcome<Actor>.Failure(FieldMessage.Error("boardTag", "join.not-a-builder"));
        await work.AttendAsync(night, personId, cancellation);
        return Outcome<Actor>.Success(actor);
    }

    private static async Task<Outcome<Actor>> NewAsync(Work work, Guid night, string name, CancellationToken cancellation)
    {
        var person = work.Admit(name, Role.Builder);
        await work.AttendAsync(night, person.Id, cancellation);
        return Outcome<Actor>.Success(new Actor(person.Id, work.Db.ClubId, Role.Builder, name, [], night));
    }
}
