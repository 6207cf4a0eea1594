using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning.Plans;

namespace ClubBench.Club.Tests.UseCases;

public sealed class SearchTests
{
    [Fact]
    public async Task StartSearch_UntilFound_GivesAlternativesThatFreezeInThePlan()
    {
        await using var club = await TestClub.FilledAsync();
        var plan = (await club.Run(club.Get<OpenPlan>(), club.Ids.Coordinator, new OpenPlanInput(club.Ids.PlanId))).Value;
        var stage = plan.Plan.Stages.First(s => s.Action == StageAction.Change).Stage;

        var started = (await club.Run(club.Get<StartSearch>(), club.Ids.Coordinator, new StartSearchInput(club.Ids.PlanId, stage))).Value;
        var ended = await EndOf(club, started.Id);
        var frozen = await club.Run(club.Get<ChangePlan>(), club.Ids.Coordinator, new ChangePlanInput(club.Ids.PlanId, plan.Version, Choices: [ThoroughSearches.Freeze(stage, ended.Found[0], "Ingrid")]));

        Assert.Equal(SearchState.Found, ended.State);
        Assert.True(frozen.Succeeded);
    }

    [Fact]
    public async Task CancelSearch_OfSomebodyElse_IsNotFound()
    {
        await using var club = await TestClub.FilledAsync();
        var started = (await club.Run(club.Get<StartSearch>(), club.Ids.Coordinator, new StartSearchInput(club.Ids.PlanId, "A5"))).Value;

        var other = await club.Run(club.Get<CancelSearch>(), club.Ids.Coordinator, new CancelSearchInput(Guid.NewGuid()));
        var own = await club.Run(club.Get<CancelSearch>(), club.Ids.Coordinator, new CancelSearchInput(started.Id));

        Assert.False(other.Succeeded);
        Assert.True(own.Succeeded);
        Assert.NotEqual(SearchState.Running, (await EndOf(club, started.Id)).State);
    }

    private static async Task<SearchStatus> EndOf(TestClub club, Guid id)
    {
        while (true)
        {
            var status = (await club.Run(club.Get<WatchSearch>(), club.Ids.Coordinator, new WatchSearchInput(id))).Value;
            if (status.State != SearchState.Running) return status;
            await Task.Delay(50, TestContext.Current.CancellationToken);
        }
    }
}
