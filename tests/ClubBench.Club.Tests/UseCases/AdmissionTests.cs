using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Clubs;
using ClubBench.Club.UseCases.Kits;
using ClubBench.Club.UseCases.Nights;
using ClubBench.Club.UseCases.SignIn;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.Tests.UseCases;

public sealed class AdmissionTests
{
    [Fact]
    public async Task Run_AfterTheMembershipEnded_IsRefusedAtOnce()
    {
        await using var club = await TestClub.FilledAsync();
        var builder = club.Ids.Builders[0];

        Assert.True((await club.Run(club.Get<ListKits>(), builder, new ListKitsInput())).Succeeded);
        await club.Run(club.Get<EndMembership>(), club.Ids.Coordinator, new EndMembershipInput(builder.PersonId));
        var after = await club.Run(club.Get<ListKits>(), builder, new ListKitsInput());

        Assert.Equal("refused.membership", Assert.Single(after.Messages).Code);
    }

    [Fact]
    public async Task Run_JoinedForANightThatIsOver_IsRefusedAtOnce()
    {
        await using var club = await TestClub.FilledAsync();
        var joined = (await club.Run(club.Get<JoinByCode>(), Actor.Visitor, new JoinByCodeInput(club.Ids.JoinCode, "Seun"))).Value;

        Assert.True((await club.Run(club.Get<ListKits>(), joined, new ListKitsInput())).Succeeded);
        await club.Run(club.Get<CloseNight>(), club.Ids.Coordinator, new CloseNightInput(club.Ids.NightId));
        var after = await club.Run(club.Get<ListKits>(), joined, new ListKitsInput());

        Assert.Equal("refused.night-over", Assert.Single(after.Messages).Code);
    }

    [Fact]
    public async Task Run_WithAnotherClubsId_IsRefused()
    {
        await using var club = await TestClub.FilledAsync();
        var stranger = club.Ids.Coordinator with { ClubId = Guid.NewGuid() };

        var outcome = await club.Run(club.Get<ListKits>(), stranger, new ListKitsInput());

        Assert.Equal("refused.membership", Assert.Single(outcome.Messages).Code);
    }

    [Fact]
    public async Task Run_RecordsOfAnotherClub_AreNotFound()
    {
        await using var club = await TestClub.FilledAsync();
        var other = await OtherClubAsync(club);

        Assert.Equal("not-found", Assert.Single((await club.Run(club.Get<OpenBoard>(), other, new OpenBoardInput(club.Ids.Boards[0]))).Messages).Code);
        Assert.Equal("not-found", Assert.Single((await club.Run(club.Get<MoveStage>(), other, new MoveStageInput(club.Ids.Boards[0], "A5", StageProgress.Powered))).Messages).Code);
        Assert.Equal("not-found", Assert.Single((await club.Run(club.Get<CloseNight>(), other, new CloseNightInput(club.Ids.NightId))).Messages).Code);
        Assert.Equal("not-found", Assert.Single((await club.Run(club.Get<OpenKit>(), other, new OpenKitInput(club.Ids.KitId))).Messages).Code);
        Assert.Empty((await club.Run(club.Get<ListBoards>(), other, new ListBoardsInput())).Value);
    }

    [Fact]
    public async Task EndMembership_OfTheLastCoordinator_IsRefused()
    {
        await using var club = await TestClub.FilledAsync();

        var outcome = await club.Run(club.Get<EndMembership>(), club.Ids.Coordinator, new EndMembershipInput(club.Ids.Coordinator.PersonId));

        Assert.Equal("club.last-coordinator", Assert.Single(outcome.Messages).Code);
    }

    private static async Task<Actor> OtherClubAsync(TestClub club)
    {
        var id = Guid.NewGuid();
        await using var db = club.Open(id);
        var person = new Person { DisplayName = "Other" };
        db.AddRange(new RadioClub { Id = id, Name = "Other club" }, person, new Membership { PersonId = person.Id, Role = Role.Coordinator });
        await db.SaveChangesAsync(TestContext.Current.CancellationToken);
        return new Actor(person.Id, id, Role.Coordinator, "Other", []);
    }
}
