using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>Asks for the token of the first start.</summary>
public sealed record OfferSetUpInput;

/// <summary>The token of the first start.</summary>
/// <param name="Token">The token; null once there is a club.</param>
/// <param name="ExpiresUtc">Until when it is good.</param>
public sealed record SetUpOffer(string? Token, DateTime ExpiresUtc);

/// <summary>Makes the one-time token of the first start, as long as there is no club. An earlier unused token is void.</summary>
public sealed class OfferSetUp(ClubStore store) : Command<OfferSetUpInput, SetUpOffer>(store)
{
    private static readonly TimeSpan Life = TimeSpan.FromMinutes(60);

    /// <inheritdoc/>
    public override Right Required => Right.HostClub;

    /// <inheritdoc/>
    protected override async Task<Outcome<SetUpOffer>> Handle(Work work, OfferSetUpInput input, CancellationToken cancellation)
    {
        if (await work.Db.Clubs.IgnoreQueryFilters().AnyAsync(cancellation)) return Success(new SetUpOffer(null, work.NowUtc));
        work.Db.SetUpTokens.RemoveRange(await work.Db.SetUpTokens.ToListAsync(cancellation));
        var token = Secrets.NewToken();
        work.Db.SetUpTokens.Add(new SetUpToken { TokenHash = Secrets.HashOf(token), ExpiresUtc = work.NowUtc + Life });
        return Success(new SetUpOffer(token, work.NowUtc + Life));
    }
}
