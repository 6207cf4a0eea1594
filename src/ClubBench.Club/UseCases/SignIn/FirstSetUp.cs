using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>The first coordinator sets up the club.</summary>
public sealed record FirstSetUpInput(string Token, string ClubName, string DisplayName, string Password, string TimeZone = "Etc/UTC");

/// <summary>Founds the club with its first coordinator. The token works once, within its hour, and only while there is no club.</summary>
public sealed class FirstSetUp(ClubStore store) : Command<FirstSetUpInput, Actor>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.ComeIn;

    /// <inheritdoc/>
    protected override async Task<Outcome<Actor>> Handle(Work work, FirstSetUpInput input, CancellationToken cancellation)
    {
        var hash = Secrets.HashOf(input.Token);
        var token = await work.Db.SetUpTokens.FirstOrDefaultAsync(t => t.TokenHash == hash, cancellation);
        if (token is not { UsedUtc: null } || token.ExpiresUtc <= work.NowUtc || await work.Db.Clubs.IgnoreQueryFilters().AnyAsync(cancellation))
            return Failure("token", "set-up.token-void");
        var messages = Check(input).ToList();
        if (messages.Count > 0) return Failure(messages);
        token.UsedUtc = work.NowUtc;
        return Success(Found(work, input));
    }

    private static Actor Found(Work work, FirstSetUpInput input)
    {
        var clubId = Guid.NewGuid();
        work.Enter(clubId);
        work.Db.Clubs.Add(new RadioClub { Id = clubId, ClubId = clubId, Name = input.ClubName.Trim(), TimeZone = input.TimeZone, FoundedUtc = work.NowUtc });
        var person = work.Admit(input.DisplayName, Role.Coordinator);
        person.PasswordHash = Passwords.HashOf(person, input.Password);
        return new Actor(person.Id, clubId, Role.Coordinator, person.DisplayName, []);
    }

    private static IEnumerable<FieldMessage> Check(FirstSetUpInput input)
    {
        if (string.IsNullOrWhiteSpace(input.ClubName)) yield return FieldMessage.Error("clubName", "field.needed");
        if (string.IsNullOrWhiteSpace(input.DisplayName)) yield return FieldMessage.Error("displayName", "field.needed");
        if (input.Password.Length < Passwords.LeastLength)
            yield return FieldMessage.Error("password", "password.too-short", ("least", Passwords.LeastLength.ToString(System.Globalization.CultureInfo.InvariantCulture)));
        if (!TimeZoneInfo.TryFindSystemTimeZoneById(input.TimeZone, out _)) yield return FieldMessage.Error("timeZone", "field.time-zone-unknown", ("value", input.TimeZone));
    }
}
