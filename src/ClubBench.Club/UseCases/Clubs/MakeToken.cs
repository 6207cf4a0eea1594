using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>A program shall use the programming interface.</summary>
public sealed record MakeTokenInput(string Name);

/// <summary>A token, shown this once.</summary>
public sealed record MadeToken(Guid Id, string Token);

/// <summary>Makes a bearer token that acts for whoever made it. Only its hash is kept.</summary>
public sealed class MakeToken(ClubStore store) : Command<MakeTokenInput, MadeToken>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.KeepClub;

    /// <inheritdoc/>
    protected override Task<Outcome<MadeToken>> Handle(Work work, MakeTokenInput input, CancellationToken cancellation)
    {
        if (string.IsNullOrWhiteSpace(input.Name)) return Task.FromResult(Failure("name", "field.needed"));
        var token = Secrets.NewToken();
        var row = new ApiToken { Name = input.Name.Trim(), TokenHash = Secrets.HashOf(token), PersonId = work.Actor.PersonId, MadeUtc = work.NowUtc };
        work.Db.ApiTokens.Add(row);
        work.Announce(EventKind.ClubChanged, row.Id);
        return Task.FromResult(Success(new MadeToken(row.Id, token)));
    }
}
