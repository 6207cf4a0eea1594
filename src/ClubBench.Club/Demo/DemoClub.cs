using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases;
using ClubBench.Club.UseCases.Clubs;
using ClubBench.Club.UseCases.SignIn;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace ClubBench.Club.Demo;

/// <summary>How to come into the demonstration: tokens of sign-in links and of the programming interface.</summary>
public sealed record DemoEntrances(Guid ClubId, Guid NightId, string CoordinatorToken, string MentorToken, string BuilderToken, string ApiToken, string JoinCode);

/// <summary>Fills an empty database with the invented club, through the same use cases as everybody. On a filled one it only makes new entrances.</summary>
public sealed class DemoClub(IServiceProvider services, ClubStore store)
{
    private const string TokenName = "demonstration";

    /// <summary>Makes sure that the club is there and gives fresh ways in. Throws where the database holds another club.</summary>
    public async Task<DemoEntrances> OpenAsync(CancellationToken cancellation = default)
    {
        var offer = await RunAsync<OfferSetUp, OfferSetUpInput, SetUpOffer>(Actor.Host, new OfferSetUpInput(), cancellation);
        if (offer.Token is { } token) await FoundAsync(token, cancellation);
        return await EntrancesAsync(cancellation);
    }

    /// <summary>Date of the night: today.</summary>
    internal DateOnly Today => DateOnly.FromDateTime(store.NowUtc);

    /// <summary>Runs a use case that cannot fail here.</summary>
    internal async Task<TResult> RunAsync<TUseCase, TInput, TResult>(Actor actor, TInput input, CancellationToken cancellation)
        where TUseCase : UseCase<TInput, TResult>
        where TResult : notnull => (await services.GetRequiredService<TUseCase>().Run(actor, input, cancellation)).Value;

    private async Task FoundAsync(string token, CancellationToken cancellation)
    {
        var coordinator = await RunAsync<FirstSetUp, FirstSetUpInput, Actor>(
            Actor.Visitor, new FirstSetUpInput(token, DemoTables.Club, DemoTables.Coordinator, Secrets.NewToken(), "Europe/London"), cancellation);
        await new DemoSeason(this, coordinator).PlayAsync(cancellation);
    }

    private async Task<DemoEntrances> EntrancesAsync(CancellationToken cancellation)
    {
        await using var db = store.Open(Guid.Empty);
        var club = await db.Clubs.IgnoreQueryFilters().FirstOrDefaultAsync(c => c.Name == DemoTables.Club, cancellation)
            ?? throw new InvalidOperationException("This database holds another club; the demonstration needs one of its own.");
        db.ClubId = club.Id;
        var people = await db.People.ToDictionaryAsync(p => p.DisplayName, p => p.Id, StringComparer.Ordinal, cancellation);
        var night = await db.Nights.OrderBy(n => n.Date).FirstAsync(n => n.State == NightState.Open, cancellation);
        var coordinator = new Actor(people[DemoTables.Coordinator], club.Id, Role.Coordinator, DemoTables.Coordinator, []);
        foreach (var old in await db.ApiTokens.Where(t => t.Name == TokenName && t.RevokedUtc == null).Select(t => t.Id).ToListAsync(cancellation))
            await RunAsync<RevokeToken, RevokeTokenInput, Done>(coordinator, new RevokeTokenInput(old), cancellation);
        var api = await RunAsync<MakeToken, MakeTokenInput, MadeToken>(coordinator, new MakeTokenInput(TokenName), cancellation);
        return new DemoEntrances(
            club.Id,
            night.Id,
            await LinkAsync(coordinator, people[DemoTables.Coordinator], cancellation),
            await LinkAsync(coordinator, people[DemoTables.Mentors[0]], cancellation),
            await LinkAsync(coordinator, people[DemoTables.TwentyMetres[^1].Builder], cancellation),
            api.Token,
            night.JoinCode ?? "");
    }

    private async Task<string> LinkAsync(Actor coordinator, Guid person, CancellationToken cancellation) =>
        (await RunAsync<MakeSignInLink, MakeSignInLinkInput, MadeLink>(coordinator, new MakeSignInLinkInput(person, MostUses: null), cancellation)).Token;
}
