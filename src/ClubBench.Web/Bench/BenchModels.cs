using System.Globalization;
using ClubBench.Club.Access;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using ClubBench.Web.State;
using ClubBench.Web.Texts;
using Microsoft.Extensions.Localization;

namespace ClubBench.Web.Bench;

/// <summary>Opens boards for the builder's page.</summary>
public sealed class BenchModels(ListBoards list, OpenBoard open, ClubTimes times, IStringLocalizer<NightTexts> texts)
{
    private readonly BenchWords _words = new(texts);

    public BenchWords Words => _words;

    /// <summary>The board with this number, the asker's own first; null when there is none.</summary>
    public async Task<BoardSummary?> FindAsync(Actor actor, string tag, CancellationToken cancellation)
    {
        var boards = await list.Run(actor, new ListBoardsInput(), cancellation);
        return !boards.Succeeded ? null : boards.Value
            .Where(b => string.Equals(b.Tag, tag, StringComparison.OrdinalIgnoreCase))
            .OrderByDescending(b => b.BuilderId == actor.PersonId).FirstOrDefault();
    }

    /// <summary>The board whole, or null when there is none with this number.</summary>
    public async Task<OpenedBoard?> OpenAsync(Actor actor, string tag, CancellationToken cancellation)
    {
        if (await FindAsync(actor, tag, cancellation) is not { } board) return null;
        await times.LoadAsync(actor, cancellation);
        var opened = await open.Run(actor, new OpenBoardInput(board.Id), cancellation);
        return opened.Succeeded ? opened.Value : null;
    }

    public BenchModel Model(OpenedBoard board, string token)
    {
        var stages = board.Stages.Select(StageScreens.Of).ToList();
        var points = stages.SelectMany(s => s.Stage.Expected.Select(e => BenchPoint.Of(e, _words.Point(s, e), board.Instruments)));
        return new BenchModel(board, CallWords(board), token, StartOf(stages), stages, [.. points], [.. stages.SelectMany(Shown)], _words, texts);
    }

    /// <summary>The call that waits, in words; empty when none does.</summary>
    public string CallWords(OpenedBoard board) =>
        board.Stages.FirstOrDefault(s => s.Call is not null) is not { Call: { } call } stage ? ""
            : call.IsAnswered ? texts["bench.coming", stage.Key]
            : texts["bench.called", stage.Key, TimeOf(call.CalledUtc)];

    /// <summary>The stage at hand: the first one that nobody has signed.</summary>
    private static string StartOf(IEnumerable<StageScreens> stages) =>
        stages.FirstOrDefault(s => s.Progress is not (Club.Entities.StageProgress.Signed or Club.Entities.StageProgress.NotStarted))?.Steps[0].Id ?? "all";

    /// <summary>The standing readings of a stage, oldest first.</summary>
    public IEnumerable<ShownReading> Shown(StageScreens stage) =>
        from reading in stage.Stage.Readings
        where !reading.IsReplaced
        let expected = stage.Stage.Expected.FirstOrDefault(e => e.Point == reading.Point)
        let advice = _words.Advice(reading.Advice, stage.Kind)
        select new ShownReading(
            stage.Key,
            reading.Point,
            expected is null ? reading.Point : _words.Point(stage, expected),
            QuantityText.Format(new Figure("value", reading.Kind, reading.ValueSi, From: Provenance.Measured)) + (reading.Instrument is { } meter ? $", {meter}" : ""),
            advice.Heading,
            advice);

    private string TimeOf(DateTime utc) => times.Of(utc).ToString("HH:mm", CultureInfo.CurrentCulture);
}
