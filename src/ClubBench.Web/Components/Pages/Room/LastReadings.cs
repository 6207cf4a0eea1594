using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;

namespace ClubBench.Web.Components.Pages.Room;

/// <summary>A reading as the room names it: board tag, no name of a person.</summary>
public sealed record LastReading(long Ordinal, string Tag, string Point, string Value, string Verdict);

/// <summary>The newest readings, found from the changes of the club.</summary>
public sealed class LastReadings(OpenBoard open)
{
    /// <summary>How many the room shows.</summary>
    private const int Most = 4;

    public IReadOnlyList<LastReading> Lines { get; private set; } = [];

    /// <summary>Reads the boards again that changed and keeps the newest readings of all.</summary>
    public async Task TakeAsync(Actor actor, IReadOnlyList<ClubEvent> changes, CancellationToken cancellation)
    {
        var found = new List<LastReading>(Lines);
        foreach (var board in changes.Where(c => c.Kind == EventKind.ReadingTaken).TakeLast(Most).Select(c => c.BoardId).OfType<Guid>().Distinct())
            if (await open.Run(actor, new OpenBoardInput(board), cancellation) is { Succeeded: true } opened) found.AddRange(LinesOf(opened.Value));
        Lines = [.. found.DistinctBy(l => l.Ordinal).OrderByDescending(l => l.Ordinal).Take(Most)];
    }

    private static IEnumerable<LastReading> LinesOf(OpenedBoard board) =>
        from stage in board.Stages
        from reading in stage.Readings
        select new LastReading(
            reading.Ordinal,
            board.Tag,
            PointOf(reading.Point, stage.Kind),
            QuantityText.Format(new Figure("value", reading.Kind, reading.ValueSi, From: Provenance.Measured)),
            Phrases.Word(reading.Advice.Verdict));

    private static string PointOf(string point, string kind)
    {
        var parts = point.Split('.');
        return parts.Length > 2 ? parts[1] : $"{parts[0]} {Phrases.Say($"point.{parts[^1]}", kind)}";
    }
}
