using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>A token shall no longer work.</summary>
public sealed record RevokeTokenInput(Guid TokenId);

/// <summary>Revokes a bearer token at once. A second time changes nothing.</summary>
public sealed class RevokeToken(ClubStore store) : Command<RevokeTokenInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.KeepClub;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, RevokeTokenInput input, CancellationToken cancellation)
    {
        if (await work.Db.ApiTokens.FirstOrDefaultAsync(t => t.Id == input.TokenId, cancellation) is not { } token) return NotFound("tokenId");
        token.RevokedUtc ??= work.NowUtc;
        work.Announce(EventKind.ClubChanged, token.Id);
        return Success(default);
    }
}
