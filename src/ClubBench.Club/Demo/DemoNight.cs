using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.UseCases;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Readings;
using ClubBench.Planning.Figures;

namespace ClubBench.Club.Demo;

/// <summary>What has happened so far on the demonstration's first night.</summary>
internal sealed class DemoNight(DemoClub demo, Actor coordinator, Dictionary<string, Guid> people, Dictionary<string, Guid> boards)
{
    /// <summary>Stages in bring-up order: the first boards are further than the last ones, one waits for a mentor, all but the last have read their filter coils.</summary>
    public async Task PlayAsync(CancellationToken cancellation)
    {
        for (var i = 0; i < DemoTables.TwentyMetres.Count; i++)
        {
            var board = await OpenAsync(DemoTables.TwentyMetres[i], cancellation);
            await ProgressAsync(board, DemoTables.TwentyMetres.Count - i, cancellation);
            await ReadAsync(board, DemoTables.TwentyMetres[i], cancellation);
        }

        await CallAsync(DemoTables.TwentyMetres[3], cancellation);
    }

    private Task<OpenedBoard> OpenAsync(DemoBoard board, CancellationToken cancellation) =>
        demo.RunAsync<OpenBoard, OpenBoardInput, OpenedBoard>(coordinator, new OpenBoardInput(boards[board.Tag]), cancellation);

    private async Task ProgressAsync(OpenedBoard board, int steps, CancellationToken cancellation)
    {
        var mentor = new Actor(people[DemoTables.Mentors[0]], coordinator.ClubId, Role.Mentor, DemoTables.Mentors[0], []);
        foreach (var (stage, i) in board.Stages.Take(3).Select((s, i) => (s, i)).Where(s => s.i < steps - 1))
            if (i < steps - 3) await demo.RunAsync<SignOff, SignOffInput, Done>(mentor, new SignOffInput(board.Id, stage.Key), cancellation);
            else await demo.RunAsync<MoveStage, MoveStageInput, Done>(coordinator, new MoveStageInput(board.Id, stage.Key, i == steps - 2 ? StageProgress.BeingBuilt : StageProgress.Powered), cancellation);
    }

    private async Task ReadAsync(OpenedBoard board, DemoBoard row, CancellationToken cancellation)
    {
        var builder = BuilderOf(row);
        foreach (var (coil, typed) in new[] { ("L4", row.L4), ("L5", row.L5), ("L6", row.L6) }.Where(r => r.Item2 is not null))
        {
            var expected = board.Stages.SelectMany(s => s.Expected).First(e => e.Winding?.Designator == coil && e.Kind == QuantityKind.Inductance);
            await demo.RunAsync<Record, RecordInput, RecordedReading>(
                builder, new RecordInput(board.Id, Guid.NewGuid(), expected.Point, $"{typed} uH", Instrument: DemoTables.Meter), cancellation);
        }
    }

    private async Task CallAsync(DemoBoard row, CancellationToken cancellation)
    {
        var stage = (await OpenAsync(row, cancellation)).Stages.First(s => s.Progress is StageProgress.BeingBuilt or StageProgress.Powered);
        await demo.RunAsync<CallForHelp, CallForHelpInput, Guid>(BuilderOf(row), new CallForHelpInput(Guid.NewGuid(), boards[row.Tag], stage.Key, "No signal after the choke"), cancellation);
    }

    private Actor BuilderOf(DemoBoard row) => new(people[row.Builder], coordinator.ClubId, Role.Builder, row.Builder, [row.Tag]);
}
