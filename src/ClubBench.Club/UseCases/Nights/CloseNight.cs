using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Nights;

/// <summary>The evening is over.</summary>
public sealed record CloseNightInput(Guid NightId, Guid? SeenVersion = null);

/// <summary>Closes a night: its code and everything joined by it end at once. Calls that wait are closed with it.</summary>
public sealed class CloseNight(ClubStore store) : Command<CloseNightInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.RunNights;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, CloseNightInput input, CancellationToken cancellation)
    {
        if (await work.Db.Nights.FirstOrDefaultAsync(n => n.Id == input.NightId, cancellation) is not { } night) return NotFound("nightId");
        if (night.State is not NightState.Open) return Failure("nightId", "night.not-open");
        work.Expect(night, input.SeenVersion);
        (night.State, night.ClosedUtc, night.JoinCode) = (NightState.Closed, work.NowUtc, null);
        var boards = work.Db.Boards.Where(b => b.GroupBuildId == night.GroupBuildId).Select(b => b.Id);
        foreach (var call in await work.Db.HelpCalls.Where(c => c.DoneUtc == null && boards.Contains(c.BoardId)).ToListAsync(cancellation)) call.DoneUtc = work.NowUtc;
        work.Announce(EventKind.NightChanged, night.Id);
        return Success(default);
    }
}
