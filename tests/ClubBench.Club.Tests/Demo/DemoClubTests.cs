using ClubBench.Club.Access;
using ClubBench.Club.Demo;
using ClubBench.Club.Entities;
using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Clubs;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Club.UseCases.Room;
using ClubBench.Club.UseCases.SignIn;

namespace ClubBench.Club.Tests.Demo;

public sealed class DemoClubTests
{
    [Fact]
    public async Task Open_OnAnEmptyDatabase_FillsTheClubAndItsNight()
    {
        await using var club = await TestClub.EmptyAsync();

        var entrances = await club.Get<DemoClub>().OpenAsync(TestContext.Current.CancellationToken);
        var coordinator = await RedeemAsync(club, entrances.CoordinatorToken);
        var builder = await RedeemAsync(club, entrances.BuilderToken);
        var room = (await club.Run(club.Get<OpenRoom>(), coordinator, new OpenRoomInput(entrances.NightId))).Value;
        var order = await club.Run(club.Get<PartsOrderOf>(), coordinator, new PartsOrderOfInput((await club.Run(club.Get<ListBoards>(), coordinator, new ListBoardsInput())).Value[0].GroupBuildId));

        Assert.Equal((Role.Coordinator, Role.Builder), (coordinator.Role, builder.Role));
        Assert.Equal(["Q07"], builder.BoardTags);
        Assert.Equal(12, room.Boards.Count);
        Assert.All(room.Boards, b => Assert.Equal(12, b.Cells.Count));
        Assert.Equal("Q04", Assert.Single(room.Help).Tag);
        Assert.Equal(6, room.Boards.Count(b => b.Cells.Any(c => c.LastVerdict is not null)));
        Assert.NotEmpty(order.Value.Lines);
        var plans = (await club.Run(club.Get<ListPlans>(), coordinator, new ListPlansInput())).Value;
        Assert.Equal([("20 m", PlanState.Issued), ("40 m", PlanState.Draft)], plans.OrderBy(p => p.BandName, StringComparer.Ordinal).Select(p => (p.BandName, p.State)));
    }

    [Fact]
    public async Task Open_ASecondTime_AddsNothingButWaysIn()
    {
        await using var club = await TestClub.EmptyAsync();
        var first = await club.Get<DemoClub>().OpenAsync(TestContext.Current.CancellationToken);
        var before = await StateAsync(club, first);

        var second = await club.Get<DemoClub>().OpenAsync(TestContext.Current.CancellationToken);

        Assert.Equal(before, await StateAsync(club, second));
        Assert.Equal((first.ClubId, first.NightId), (second.ClubId, second.NightId));
        Assert.Equal("sign-in.token-void", Assert.Single((await club.Run(club.Get<FindByToken>(), Actor.Visitor, new FindByTokenInput(first.ApiToken))).Messages).Code);
        Assert.True((await club.Run(club.Get<FindByToken>(), Actor.Visitor, new FindByTokenInput(second.ApiToken))).Succeeded);
    }

    private static async Task<Actor> RedeemAsync(TestClub club, string token) => (await club.Run(club.Get<RedeemLink>(), Actor.Visitor, new RedeemLinkInput(token))).Value;

    private static async Task<(int People, int Lots, int Plans, int Boards)> StateAsync(TestClub club, DemoEntrances entrances)
    {
        var coordinator = await RedeemAsync(club, entrances.CoordinatorToken);
        var page = (await club.Run(club.Get<OpenClub>(), coordinator, new OpenClubInput())).Value;
        var plans = (await club.Run(club.Get<ListPlans>(), coordinator, new ListPlansInput())).Value;
        return (page.People.Count, page.Stock.Count, plans.Count, plans.Sum(p => p.Boards));
    }
}
