using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases.Boards;

namespace ClubBench.Club.Tests.Changes;

public sealed class ChangeFeedTests
{
    [Fact]
    public async Task Subscribe_ChangesWhileListening_ComeInOrderWithoutGaps()
    {
        await using var club = await TestClub.FilledAsync();
        var since = await NewestAsync(club);
        var watching = CollectAsync(club, since, 3);

        for (var i = 0; i < 3; i++) await MoveAsync(club, i);
        var seen = await watching;

        Assert.Equal(club.Ids.Boards.Take(3), seen.Select(e => e.BoardId!.Value));
        Assert.Equal(seen.Select(e => e.Ordinal).Order(), seen.Select(e => e.Ordinal));
        Assert.All(seen, e => Assert.Equal(EventKind.StageMoved, e.Kind));
    }

    [Fact]
    public async Task Subscribe_AfterAGap_CatchesUpFromTheOrdinal()
    {
        await using var club = await TestClub.FilledAsync();
        var since = await NewestAsync(club);
        for (var i = 0; i < 4; i++) await MoveAsync(club, i);

        var seen = await CollectAsync(club, since, 4);
        var rest = await CollectAsync(club, seen[1].Ordinal, 2);

        Assert.Equal(seen.Skip(2), rest);
    }

    [Fact]
    public async Task Wake_OneWatcherFailsAndOneNeverReads_OthersAndTheWriterGoOn()
    {
        await using var club = await TestClub.FilledAsync();
        var since = await NewestAsync(club);
        await using var stuck = club.Get<IChangeFeed>().SubscribeAsync(club.Ids.Coordinator.ClubId, since, TestContext.Current.CancellationToken).GetAsyncEnumerator(TestContext.Current.CancellationToken);
        var stuckStep = stuck.MoveNextAsync();
        var failing = FailAsync(club, since);
        var sound = CollectAsync(club, since, 5);

        for (var i = 0; i < 5; i++) await MoveAsync(club, i);

        await Assert.ThrowsAsync<InvalidOperationException>(() => failing);
        Assert.Equal(5, (await sound).Count);
        Assert.True(await stuckStep);
    }

    [Fact]
    public async Task Subscribe_ChangesOfAnotherClub_AreNotSeen()
    {
        await using var club = await TestClub.FilledAsync();

        Assert.Equal(0, await club.Get<IChangeFeed>().NewestOrdinalAsync(Guid.NewGuid(), TestContext.Current.CancellationToken));
    }

    private static Task<long> NewestAsync(TestClub club) => club.Get<IChangeFeed>().NewestOrdinalAsync(club.Ids.Coordinator.ClubId, TestContext.Current.CancellationToken);

    private static async Task MoveAsync(TestClub club, int board) =>
        Assert.True((await club.Run(club.Get<MoveStage>(), club.Ids.Mentor, new MoveStageInput(club.Ids.Boards[board], "A5", StageProgress.BeingBuilt))).Succeeded);

    private static async Task<List<ClubEvent>> CollectAsync(TestClub club, long since, int count)
    {
        var seen = new List<ClubEvent>();
        await foreach (var batch in club.Get<IChangeFeed>().SubscribeAsync(club.Ids.Coordinator.ClubId, since, TestContext.Current.CancellationToken))
        {
            seen.AddRange(batch);
            if (seen.Count >= count) break;
        }

        return seen;
    }

    private static async Task FailAsync(TestClub club, long since)
    {
        await foreach (var batch in club.Get<IChangeFeed>().SubscribeAsync(club.Ids.Coordinator.ClubId, since, TestContext.Current.CancellationToken))
            throw new InvalidOperationException($"A page that breaks on {batch.Count} changes.");
    }
}
