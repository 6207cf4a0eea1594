using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>Somebody shall come in by a link.</summary>
/// <param name="PersonId">Whom it signs in; null lets builders join by name, for a night.</param>
/// <param name="NightId">Night it is good for; needed where no person is named.</param>
/// <param name="Hours">How long it is good, 1 to 12.</param>
/// <param name="MostUses">How often; null for any number until it expires.</param>
public sealed record MakeSignInLinkInput(Guid? PersonId, Guid? NightId = null, int Hours = 12, int? MostUses = 1);

/// <summary>Token of a link, shown this once.</summary>
public sealed record MadeLink(string Token, DateTime ExpiresUtc);

/// <summary>Makes a sign-in or join link. Only the hash of its token is kept.</summary>
public sealed class MakeSignInLink(ClubStore store) : Command<MakeSignInLinkInput, MadeLink>(store)
{
    private const int MostHours = 12;

    /// <inheritdoc/>
    public override Right Required => Right.KeepClub;

    /// <inheritdoc/>
    protected override async Task<Outcome<MadeLink>> Handle(Work work, MakeSignInLinkInput input, CancellationToken cancellation)
    {
        if (input.Hours is < 1 or > MostHours) return Failure("hours", "link.hours-range");
        if (input.PersonId is null && input.NightId is null) return Failure("nightId", "field.needed");
        if (input.NightId is { } night && !await work.Db.Nights.AnyAsync(n => n.Id == night, cancellation)) return NotFound("nightId");
        if (input.PersonId is { } person && !await work.Db.People.AnyAsync(p => p.Id == person, cancellation)) return NotFound("personId");
        var (token, expires) = (Secrets.NewToken(), work.NowUtc.AddHours(input.Hours));
        work.Db.SignInLinks.Add(new SignInLink
        {
            TokenHash = Secrets.HashOf(token),
            PersonId = input.PersonId,
            NightId = input.NightId,
            ExpiresUtc = expires,
            UsesLeft = input.MostUses,
        });
        return Success(new MadeLink(token, expires));
    }
}
