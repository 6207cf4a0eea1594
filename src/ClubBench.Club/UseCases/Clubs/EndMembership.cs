using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>A person leaves the club.</summary>
public sealed record EndMembershipInput(Guid PersonId);

/// <summary>Ends a membership. It counts at once, also for whoever is signed in; boards and readings stay. The last coordinator cannot go.</summary>
public sealed class EndMembership(ClubStore store) : Command<EndMembershipInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.KeepClub;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, EndMembershipInput input, CancellationToken cancellation)
    {
        var active = work.Db.Memberships.Where(m => m.EndedUtc == null);
        if (await active.FirstOrDefaultAsync(m => m.PersonId == input.PersonId, cancellation) is not { } membership) return NotFound("personId");
        if (membership.Role is Role.Coordinator && await active.CountAsync(m => m.Role == Role.Coordinator, cancellation) == 1) return Failure("personId", "club.last-coordinator");
        membership.EndedUtc = work.NowUtc;
        work.Announce(EventKind.ClubChanged, input.PersonId);
        return Success(default);
    }
}
