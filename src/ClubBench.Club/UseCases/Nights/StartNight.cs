using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Nights;

/// <summary>The doors open.</summary>
public sealed record StartNightInput(Guid NightId, Guid? SeenVersion = null);

/// <summary>Code to be spoken in the room.</summary>
public sealed record StartedNight(string JoinCode);

/// <summary>Opens a planned night and makes its code.</summary>
public sealed class StartNight(ClubStore store) : Command<StartNightInput, StartedNight>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.RunNights;

    /// <inheritdoc/>
    protected override async Task<Outcome<StartedNight>> Handle(Work work, StartNightInput input, CancellationToken cancellation)
    {
        if (await work.Db.Nights.FirstOrDefaultAsync(n => n.Id == input.NightId, cancellation) is not { } night) return NotFound("nightId");
        if (night.State is not NightState.Planned) return Failure("nightId", "night.not-planned");
        work.Expect(night, input.SeenVersion);
        var code = Secrets.NewSpokenCode();
        (night.State, night.OpenedUtc, night.JoinCode) = (NightState.Open, work.NowUtc, code);
        work.Announce(EventKind.NightChanged, night.Id);
        return Success(new StartedNight(code));
    }
}
