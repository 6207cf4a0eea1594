using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.StageKinds;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>Opens the club's own page.</summary>
public sealed record OpenClubInput;

/// <summary>A person of the club.</summary>
public sealed record ClubPerson(Guid Id, string DisplayName, Role Role, bool IsJunior, bool HasLeft, IReadOnlyList<string> BoardTags);

/// <summary>An instrument of the club.</summary>
public sealed record InstrumentEntry(Guid Id, string Name, InstrumentClass Class, double UncertaintyRelative, double UncertaintySi, double OffsetSi, QuantityKind OffsetKind, string Post, Guid Version);

/// <summary>A lot in the drawers.</summary>
public sealed record StockEntry(Guid Id, PartClass Class, string Type, double? ValueSi, double QuantityPieces, string Lot, bool MayBeTuned, string Place, Guid Version);

/// <summary>A token of the programming interface; the token itself is shown once, when it is made.</summary>
public sealed record TokenEntry(Guid Id, string Name, DateTime MadeUtc, DateTime? RevokedUtc);

/// <summary>The club as its keeper sees it.</summary>
public sealed record OpenedClub(
    string Name,
    string TimeZone,
    IReadOnlyList<ClubPerson> People,
    IReadOnlyList<InstrumentEntry> Instruments,
    IReadOnlyList<StockEntry> Stock,
    IReadOnlyList<TokenEntry> Tokens);

/// <summary>People, instruments, drawers and tokens of the club.</summary>
public sealed class OpenClub(ClubStore store) : Query<OpenClubInput, OpenedClub>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.KeepClub;

    /// <inheritdoc/>
    protected override async Task<Outcome<OpenedClub>> Handle(Work work, OpenClubInput input, CancellationToken cancellation)
    {
        var db = work.Db;
        var club = await db.Clubs.SingleAsync(cancellation);
        var instruments = await db.Instruments.OrderBy(i => i.Name)
            .Select(i => new InstrumentEntry(i.Id, i.Name, i.Class, i.UncertaintyRelative, i.UncertaintySi, i.OffsetSi, i.OffsetKind, i.Post, i.Version)).ToListAsync(cancellation);
        var stock = await db.StockLots.OrderBy(l => l.Class).ThenBy(l => l.Type).ThenBy(l => l.ValueSi)
            .Select(l => new StockEntry(l.Id, l.Class, l.Type, l.ValueSi, l.QuantityPieces, l.Lot, l.MayBeTuned, l.Place, l.Version)).ToListAsync(cancellation);
        var tokens = await db.ApiTokens.OrderBy(t => t.MadeUtc).Select(t => new TokenEntry(t.Id, t.Name, t.MadeUtc, t.RevokedUtc)).ToListAsync(cancellation);
        return Success(new OpenedClub(club.Name, club.TimeZone, await PeopleAsync(db, cancellation), instruments, stock, tokens));
    }

    private static async Task<IReadOnlyList<ClubPerson>> PeopleAsync(ClubContext db, CancellationToken cancellation)
    {
        var tags = (await db.Boards.Where(b => b.BuilderId != null).OrderBy(b => b.Tag).Select(b => new { b.BuilderId, b.Tag }).ToListAsync(cancellation)).ToLookup(b => b.BuilderId!.Value, b => b.Tag);
        var people = await (from person in db.People
                            join membership in db.Memberships on person.Id equals membership.PersonId
                            orderby person.DisplayName
                            select new { person.Id, person.DisplayName, person.IsJunior, membership.Role, membership.EndedUtc }).ToListAsync(cancellation);
        return [.. people.Select(p => new ClubPerson(p.Id, p.DisplayName, p.Role, p.IsJunior, p.EndedUtc is not null, [.. tags[p.Id]]))];
    }
}
