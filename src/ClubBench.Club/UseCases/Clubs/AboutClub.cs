using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using ClubBench.Planning.Advising;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>Asks what everybody of the club may know of it.</summary>
public sealed record AboutClubInput;

/// <summary>What pages and paper need of the club.</summary>
/// <param name="Name">Its name.</param>
/// <param name="TimeZone">Zone its times are shown in.</param>
/// <param name="Instruments">Names of its instruments by sort.</param>
public sealed record ClubProfile(string Name, string TimeZone, IReadOnlyDictionary<InstrumentClass, IReadOnlyList<string>> Instruments);

/// <summary>Name, zone and instruments of the club.</summary>
public sealed class AboutClub(ClubStore store) : Query<AboutClubInput, ClubProfile>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<ClubProfile>> Handle(Work work, AboutClubInput input, CancellationToken cancellation)
    {
        var club = await work.Db.Clubs.SingleAsync(cancellation);
        var instruments = await work.Db.Instruments.OrderBy(i => i.Name).Select(i => new { i.Class, i.Name }).ToListAsync(cancellation);
        return Success(new ClubProfile(club.Name, club.TimeZone, instruments.GroupBy(i => i.Class).ToDictionary(g => g.Key, g => (IReadOnlyList<string>)[.. g.Select(i => i.Name)])));
    }
}
