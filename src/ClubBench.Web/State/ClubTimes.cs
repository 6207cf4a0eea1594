using ClubBench.Club.Access;
using ClubBench.Club.UseCases.Clubs;

namespace ClubBench.Web.State;

/// <summary>Stored times are UTC; people see them as the clock on the club's wall shows them.</summary>
public sealed class ClubTimes(AboutClub about, TimeProvider clock)
{
    private TimeZoneInfo? _zone;

    /// <summary>Now, on the club's wall.</summary>
    public DateTime Now => Of(clock.GetUtcNow().UtcDateTime);

    /// <summary>Looks up the club's zone, once. A visitor belongs to no club and sees UTC.</summary>
    public async Task LoadAsync(Actor actor, CancellationToken cancellation = default)
    {
        if (_zone is not null) return;
        var club = await about.Run(actor, new AboutClubInput(), cancellation);
        if (club.Succeeded && TimeZoneInfo.TryFindSystemTimeZoneById(club.Value.TimeZone, out var zone)) _zone = zone;
    }

    /// <summary>A stored time in the club's zone.</summary>
    public DateTime Of(DateTime utc) => TimeZoneInfo.ConvertTimeFromUtc(DateTime.SpecifyKind(utc, DateTimeKind.Utc), _zone ?? TimeZoneInfo.Utc);
}
