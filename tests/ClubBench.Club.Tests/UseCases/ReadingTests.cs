using ClubBench.Club.Entities;
using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Readings;
using ClubBench.Planning.Advising;
using CsCheck;
using Microsoft.EntityFrameworkCore;
using Record = ClubBench.Club.UseCases.Readings.Record;

namespace ClubBench.Club.Tests.UseCases;

public sealed class ReadingTests
{
    [Fact]
    public async Task Record_OnTheOwnBoard_IsStoredWithAdviceAndEvent()
    {
        await using var club = await TestClub.FilledAsync();
        var coil = await club.CoilAsync();

        var recorded = await club.Run(club.Get<Record>(), club.Ids.Builders[0], Of(club, 0, coil, 1));

        Assert.True(recorded.Succeeded, string.Join("; ", recorded.Messages.Select(m => m.Code)));
        await using var db = club.Open();
        var row = await db.Readings.SingleAsync(TestContext.Current.CancellationToken);
        Assert.Equal((recorded.Value.Ordinal, coil.Point, coil.Nominal), (row.Ordinal, row.Point, row.ValueSi));
        Assert.Equal(row.Ordinal, (await db.AdviceGiven.SingleAsync(TestContext.Current.CancellationToken)).ReadingOrdinal);
        Assert.Equal(1, await db.Events.CountAsync(e => e.SubjectId == row.Id, TestContext.Current.CancellationToken));
        Assert.Equal(ReadingVerdict.Good, recorded.Value.Advice.Verdict);
    }

    [Fact]
    public async Task Write_OnAForeignBoard_IsRefusedAndStoresNothing()
    {
        await using var club = await TestClub.FilledAsync();
        var coil = await club.CoilAsync();
        var (builder, foreign) = (club.Ids.Builders[1], club.Ids.Boards[0]);

        var codes = new[]
        {
            (await club.Run(club.Get<Record>(), builder, Of(club, 0, coil, 1))).Messages,
            (await club.Run(club.Get<RecordFitted>(), builder, new RecordFittedInput(Guid.NewGuid(), foreign, "A5", "L4", 15))).Messages,
            (await club.Run(club.Get<MoveStage>(), builder, new MoveStageInput(foreign, "A5", StageProgress.Powered))).Messages,
            (await club.Run(club.Get<CallForHelp>(), builder, new CallForHelpInput(Guid.NewGuid(), foreign, "A5"))).Messages,
        };

        Assert.All(codes, c => Assert.Equal("refused.own-board-only", Assert.Single(c).Code));
        await using var db = club.Open();
        Assert.False(await db.Readings.AnyAsync(TestContext.Current.CancellationToken) || await db.Fitted.AnyAsync(TestContext.Current.CancellationToken) || await db.StageEvents.AnyAsync(TestContext.Current.CancellationToken));
    }

    [Fact]
    public async Task Record_FaultyInput_CollectsEveryFieldAndStoresNothing()
    {
        await using var club = await TestClub.FilledAsync();
        var coil = await club.CoilAsync();

        var faulty = new RecordInput(club.Ids.Boards[0], Guid.NewGuid(), coil.Point, "1.2.3", Instrument: "nobody's", Replaces: Guid.NewGuid());
        var outcome = await club.Run(club.Get<Record>(), club.Ids.Builders[0], faulty);

        Assert.Equal(["instrument", "replaces", "typedText"], outcome.Messages.Select(m => m.Path).Order(StringComparer.Ordinal));
        await using var db = club.Open();
        Assert.False(await db.Readings.AnyAsync(TestContext.Current.CancellationToken));
    }

    [Fact]
    public async Task Record_TypedTextOnly_IsReadInTheUnitOfThePoint()
    {
        await using var club = await TestClub.FilledAsync();
        var coil = await club.CoilAsync();

        var recorded = await club.Run(club.Get<Record>(), club.Ids.Builders[0], new RecordInput(club.Ids.Boards[0], Guid.NewGuid(), coil.Point, "0,736 uH", Instrument: TestClub.Meter));

        Assert.Equal(0.736e-6, recorded.Value.ValueSi, 12);
    }

    [Fact]
    public async Task Record_AnySequenceOfResends_KeepsTheFirstBodyOfEachId()
    {
        await using var club = await TestClub.FilledAsync();
        var coil = await club.CoilAsync();
        var sends = Gen.Select(Gen.Int[0, 3], Gen.Int[0, 2]).Array[1, 12];

        await Check.SampleAsync(sends, async sequence => await ReplaysAsync(club, coil, sequence), iter: 25, threads: 1);
    }

    [Fact]
    public async Task Record_ManyWritersAtOnce_StoresEveryReading()
    {
        await using var club = await TestClub.FilledAsync();
        var coil = await club.CoilAsync();

        var writers = Enumerable.Range(0, 20).Select(w => Task.Run(async () =>
        {
            for (var i = 0; i < 5; i++)
                Assert.True((await club.Run(club.Get<Record>(), club.Ids.Coordinator, Of(club, w % TestClub.Boards, coil, 1))).Succeeded);
        }));
        await Task.WhenAll(writers);

        await using var db = club.Open();
        Assert.Equal(100, await db.Readings.CountAsync(TestContext.Current.CancellationToken));
        Assert.Equal(100, await db.AdviceGiven.CountAsync(TestContext.Current.CancellationToken));
    }

    [Fact]
    public async Task RecordMany_OneFaultyAmongThem_StoresTheOthersInOrder()
    {
        await using var club = await TestClub.FilledAsync();
        var coil = await club.CoilAsync();

        var faulty = Of(club, 0, coil, 1) with { Point = "A5.nothing" };
        var items = (await club.Run(club.Get<RecordMany>(), club.Ids.Builders[0], new RecordManyInput([Of(club, 0, coil, 1), faulty, Of(club, 0, coil, 1.01)]))).Value;

        Assert.Equal([true, false, true], items.Select(i => i.Recorded is not null));
        Assert.True(items[0].Recorded!.Ordinal < items[2].Recorded!.Ordinal);
    }

    [Fact]
    public async Task Fitted_SameIdOtherBody_IsAnErrorAndTheFirstStands()
    {
        await using var club = await TestClub.FilledAsync();
        var first = new RecordFittedInput(Guid.NewGuid(), club.Ids.Boards[0], "A5", "L4", 15);

        Assert.True((await club.Run(club.Get<RecordFitted>(), club.Ids.Builders[0], first)).Succeeded);
        Assert.True((await club.Run(club.Get<RecordFitted>(), club.Ids.Builders[0], first)).Succeeded);
        var changed = await club.Run(club.Get<RecordFitted>(), club.Ids.Builders[0], first with { Turns = 14 });

        Assert.Equal("journal.id-used", Assert.Single(changed.Messages).Code);
        await using var db = club.Open();
        Assert.Equal(15, (await db.Fitted.SingleAsync(TestContext.Current.CancellationToken)).Turns);
    }

    internal static RecordInput Of(TestClub club, int board, ExpectedReading coil, double ratio) =>
        new(club.Ids.Boards[board], Guid.NewGuid(), coil.Point, "typed", coil.Nominal * ratio, TestClub.Meter);

    private static async Task ReplaysAsync(TestClub club, ExpectedReading coil, (int Id, int Body)[] sequence)
    {
        var ids = Enumerable.Range(0, 4).Select(_ => Guid.NewGuid()).ToArray();
        var first = new Dictionary<int, (int Body, long Ordinal)>();
        foreach (var (id, body) in sequence)
        {
            var outcome = await club.Run(club.Get<Record>(), club.Ids.Builders[0], Of(club, 0, coil, 1 + (0.001 * body)) with { Id = ids[id] });
            if (!first.TryGetValue(id, out var known)) first[id] = (body, outcome.Value.Ordinal);
            else if (known.Body == body) Assert.Equal((known.Ordinal, true), (outcome.Value.Ordinal, outcome.Value.IsResend));
            else Assert.Equal("journal.id-used", Assert.Single(outcome.Messages).Code);
        }

        await using var db = club.Open();
        var stored = await db.Readings.Where(r => ids.Contains(r.Id)).ToListAsync();
        Assert.Equal(first.Values.Select(f => f.Ordinal).Order(), stored.Select(r => r.Ordinal).Order());
        Assert.All(first, f => Assert.Equal(coil.Nominal * (1 + (0.001 * f.Value.Body)), stored.Single(r => r.Id == ids[f.Key]).ValueSi));
    }
}
