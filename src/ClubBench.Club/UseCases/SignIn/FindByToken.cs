using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>A call of the programming interface.</summary>
public sealed record FindByTokenInput(string Token);

/// <summary>Whose bearer token this is. A revoked token and one never made get the same answer.</summary>
public sealed class FindByToken(ClubStore store) : Query<FindByTokenInput, Actor>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.ComeIn;

    /// <inheritdoc/>
    protected override async Task<Outcome<Actor>> Handle(Work work, FindByTokenInput input, CancellationToken cancellation)
    {
        var hash = Secrets.HashOf(input.Token);
        var token = await work.Db.ApiTokens.IgnoreQueryFilters().FirstOrDefaultAsync(t => t.TokenHash == hash && t.RevokedUtc == null, cancellation);
        if (token is null) return Failure("token", "sign-in.token-void");
        work.Enter(token.ClubId);
        return await work.ActorOfAsync(token.PersonId, nightId: null, cancellation) is { } actor ? Success(actor) : Failure("token", "sign-in.token-void");
    }
}
