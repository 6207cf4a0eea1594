using ClubBench.Club.Access;
using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases.Clubs;
using ClubBench.Club.UseCases.Nights;
using ClubBench.Club.UseCases.SignIn;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.Tests.UseCases;

public sealed class SignInTests
{
    private const string Password = "correct horse battery";

    [Fact]
    public async Task FirstSetUp_TokenUsedTwice_FailsTheSecondTime()
    {
        await using var club = await TestClub.EmptyAsync();
        var token = await OfferAsync(club);

        var first = await SetUpAsync(club, token);
        var second = await SetUpAsync(club, token);

        Assert.True(first.Succeeded);
        Assert.Equal("set-up.token-void", Assert.Single(second.Messages).Code);
        Assert.Null((await club.Run(club.Get<OfferSetUp>(), Actor.Host, new OfferSetUpInput())).Value.Token);
    }

    [Fact]
    public async Task FirstSetUp_TwiceAtOnce_MakesOneClub()
    {
        await using var club = await TestClub.EmptyAsync();
        var token = await OfferAsync(club);

        var both = await Task.WhenAll(SetUpAsync(club, token), SetUpAsync(club, token));

        Assert.Single(both, b => b.Succeeded);
    }

    [Fact]
    public async Task FirstSetUp_AfterItsHour_Fails()
    {
        await using var club = await TestClub.EmptyAsync();
        var token = await OfferAsync(club);
        club.Clock.Advance(TimeSpan.FromMinutes(61));

        Assert.Equal("set-up.token-void", Assert.Single((await SetUpAsync(club, token)).Messages).Code);
    }

    [Fact]
    public async Task FirstSetUp_FaultyFields_NamesThemAllAndKeepsTheToken()
    {
        await using var club = await TestClub.EmptyAsync();
        var token = await OfferAsync(club);

        var faulty = await club.Run(club.Get<FirstSetUp>(), Actor.Visitor, new FirstSetUpInput(token, "", " ", "short", "Nowhere"));

        Assert.Equal(["clubName", "displayName", "password", "timeZone"], faulty.Messages.Select(m => m.Path).Order(StringComparer.Ordinal));
        Assert.True((await SetUpAsync(club, token)).Succeeded);
    }

    [Fact]
    public async Task SignInByPassword_RightAndWrong_TellNothingApart()
    {
        await using var club = await TestClub.EmptyAsync();
        await SetUpAsync(club, await OfferAsync(club));

        Assert.Equal(Role.Coordinator, (await club.Run(club.Get<SignInByPassword>(), Actor.Visitor, new SignInByPasswordInput("Ingrid", Password))).Value.Role);
        var wrongPassword = await club.Run(club.Get<SignInByPassword>(), Actor.Visitor, new SignInByPasswordInput("Ingrid", "something else here"));
        var wrongName = await club.Run(club.Get<SignInByPassword>(), Actor.Visitor, new SignInByPasswordInput("Nobody", Password));
        Assert.Equal(Assert.Single(wrongPassword.Messages).Code, Assert.Single(wrongName.Messages).Code);
    }

    [Fact]
    public async Task JoinByCode_AKnownBuilder_IsTheSamePersonWithTheSameBoard()
    {
        await using var club = await TestClub.FilledAsync();

        var joined = (await club.Run(club.Get<JoinByCode>(), Actor.Visitor, new JoinByCodeInput(club.Ids.JoinCode.ToLowerInvariant(), "builder 2"))).Value;
        var rejoined = (await club.Run(club.Get<RejoinBoard>(), Actor.Visitor, new RejoinBoardInput(club.Ids.JoinCode, "q02"))).Value;

        Assert.Equal(club.Ids.Builders[1].PersonId, joined.PersonId);
        Assert.Equal(["Q02"], joined.BoardTags);
        Assert.Equal((joined.PersonId, joined.NightId), (rejoined.PersonId, rejoined.NightId));
    }

    [Fact]
    public async Task JoinByCode_NameOfAMentor_IsNotLetInAsOne()
    {
        await using var club = await TestClub.FilledAsync();

        var outcome = await club.Run(club.Get<JoinByCode>(), Actor.Visitor, new JoinByCodeInput(club.Ids.JoinCode, "Tomas"));

        Assert.Equal("join.name-taken", Assert.Single(outcome.Messages).Code);
    }

    [Fact]
    public async Task JoinByCode_TooManyWrongTries_ChangesTheCode()
    {
        await using var club = await TestClub.FilledAsync();
        for (var i = 0; i < FailureWindow.Most - 1; i++) await club.Run(club.Get<JoinByCode>(), Actor.Visitor, new JoinByCodeInput("WRONG" + i, "Guess"));
        Assert.Equal(club.Ids.JoinCode, await CodeAsync(club));

        var last = await club.Run(club.Get<RejoinBoard>(), Actor.Visitor, new RejoinBoardInput("WRONG", "Q01"));

        Assert.Equal("join.code-unknown", Assert.Single(last.Messages).Code);
        Assert.NotEqual(club.Ids.JoinCode, await CodeAsync(club));
        Assert.Equal("join.code-unknown", Assert.Single((await club.Run(club.Get<JoinByCode>(), Actor.Visitor, new JoinByCodeInput(club.Ids.JoinCode, "Late"))).Messages).Code);
    }

    [Fact]
    public async Task RedeemLink_OnceOnly_FailsTheSecondTimeAndAfterItExpired()
    {
        await using var club = await TestClub.FilledAsync();
        var once = await LinkAsync(club, mostUses: 1);
        var late = await LinkAsync(club, mostUses: null);

        Assert.Equal(club.Ids.Mentor.PersonId, (await club.Run(club.Get<RedeemLink>(), Actor.Visitor, new RedeemLinkInput(once))).Value.PersonId);
        Assert.Equal("sign-in.link-void", Assert.Single((await club.Run(club.Get<RedeemLink>(), Actor.Visitor, new RedeemLinkInput(once))).Messages).Code);
        club.Clock.Advance(TimeSpan.FromHours(13));
        Assert.Equal("sign-in.link-void", Assert.Single((await club.Run(club.Get<RedeemLink>(), Actor.Visitor, new RedeemLinkInput(late))).Messages).Code);
    }

    [Fact]
    public async Task FindByToken_UntilRevoked_ActsForItsMaker()
    {
        await using var club = await TestClub.FilledAsync();
        var made = (await club.Run(club.Get<MakeToken>(), club.Ids.Coordinator, new MakeTokenInput("logger"))).Value;

        Assert.Equal(club.Ids.Coordinator.PersonId, (await club.Run(club.Get<FindByToken>(), Actor.Visitor, new FindByTokenInput(made.Token))).Value.PersonId);
        await club.Run(club.Get<RevokeToken>(), club.Ids.Coordinator, new RevokeTokenInput(made.Id));
        Assert.Equal("sign-in.token-void", Assert.Single((await club.Run(club.Get<FindByToken>(), Actor.Visitor, new FindByTokenInput(made.Token))).Messages).Code);
        await using var db = club.Open();
        Assert.NotEqual(made.Token, (await db.ApiTokens.SingleAsync(TestContext.Current.CancellationToken)).TokenHash);
    }

    private static async Task<string> OfferAsync(TestClub club) => (await club.Run(club.Get<OfferSetUp>(), Actor.Host, new OfferSetUpInput())).Value.Token!;

    private static Task<ClubBench.Planning.Outcome<Actor>> SetUpAsync(TestClub club, string token) =>
        club.Run(club.Get<FirstSetUp>(), Actor.Visitor, new FirstSetUpInput(token, "Club", "Ingrid", Password));

    private static async Task<string?> CodeAsync(TestClub club) => (await club.Run(club.Get<OpenNight>(), club.Ids.Coordinator, new OpenNightInput(club.Ids.NightId))).Value.JoinCode;

    private static async Task<string> LinkAsync(TestClub club, int? mostUses) =>
        (await club.Run(club.Get<MakeSignInLink>(), club.Ids.Coordinator, new MakeSignInLinkInput(club.Ids.Mentor.PersonId, MostUses: mostUses))).Value.Token;
}
