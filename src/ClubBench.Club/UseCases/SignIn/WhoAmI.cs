using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>Asks for the actor as the club knows it now.</summary>
public sealed record WhoAmIInput;

/// <summary>The actor afresh: role, name and boards may have changed since the sign-in.</summary>
public sealed class WhoAmI(ClubStore store) : Query<WhoAmIInput, Actor>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<Actor>> Handle(Work work, WhoAmIInput input, CancellationToken cancellation)
    {
        var actor = await work.ActorOfAsync(work.Actor.PersonId, work.Actor.NightId, cancellation);
        return Success((actor ?? work.Actor) with { Role = work.Actor.Role });
    }
}
