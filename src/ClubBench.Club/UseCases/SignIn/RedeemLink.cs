using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>Somebody follows a link.</summary>
/// <param name="Token">Token of the link.</param>
/// <param name="DisplayName">Name of somebody who joins; not needed where the link is for a person.</param>
public sealed record RedeemLinkInput(string Token, string? DisplayName = null);

/// <summary>Signs in by a link, or joins a night by one. Unknown, expired and used links get the same answer.</summary>
public sealed class RedeemLink(ClubStore store) : Command<RedeemLinkInput, Actor>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.ComeIn;

    /// <inheritdoc/>
    protected override async Task<Outcome<Actor>> Handle(Work work, RedeemLinkInput input, CancellationToken cancellation)
    {
        var hash = Secrets.HashOf(input.Token);
        var link = await work.Db.SignInLinks.IgnoreQueryFilters().FirstOrDefaultAsync(l => l.TokenHash == hash, cancellation);
        if (link is null || link.ExpiresUtc <= work.NowUtc || link.UsesLeft is <= 0) return Failure("token", "sign-in.link-void");
        work.Enter(link.ClubId);
        if (link.NightId is { } night && !await work.Db.Nights.AnyAsync(n => n.Id == night && n.State == NightState.Open, cancellation)) return Failure("token", "sign-in.link-void");
        var actor = await ActorAsync(work, link, input, cancellation);
        if (actor.Succeeded) link.UsesLeft--;
        return actor;
    }

    private static async Task<Outcome<Actor>> ActorAsync(Work work, SignInLink link, RedeemLinkInput input, CancellationToken cancellation)
    {
        if (link.PersonId is { } person)
            return await work.ActorOfAsync(person, link.NightId, cancellation) is { } known ? Success(known) : Failure("token", "sign-in.link-void");
        return link.NightId is { } night
            ? await Joining.ByNameAsync(work, night, input.DisplayName ?? "", cancellation)
            : Failure("token", "sign-in.link-void");
    }
}
