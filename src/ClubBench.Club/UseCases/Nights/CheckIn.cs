using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.SignIn;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Nights;

/// <summary>Somebody came.</summary>
public sealed record CheckInInput(Guid NightId, Guid PersonId);

/// <summary>Notes that a person is there tonight. A second time changes nothing.</summary>
public sealed class CheckIn(ClubStore store) : Command<CheckInInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.RunNights;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, CheckInInput input, CancellationToken cancellation)
    {
        if (!await work.Db.Nights.AnyAsync(n => n.Id == input.NightId && n.State == NightState.Open, cancellation)) return Failure("nightId", "night.not-open");
        if (!await work.Db.People.AnyAsync(p => p.Id == input.PersonId, cancellation)) return NotFound("personId");
        await work.AttendAsync(input.NightId, input.PersonId, cancellation);
        return Success(default);
    }
}
