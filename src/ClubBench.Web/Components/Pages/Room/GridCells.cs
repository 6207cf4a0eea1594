using ClubBench.Club.Entities;
using ClubBench.Club.UseCases.Room;
using ClubBench.Planning.Advising;
using ClubBench.Web.Bench;

namespace ClubBench.Web.Components.Pages.Room;

/// <summary>A cell of the grid: a sign, and for the live stage the word. A live cell covers several columns.</summary>
/// <param name="Stage">Stage key.</param>
/// <param name="Look">Sign, word and frame.</param>
/// <param name="IsLive">Whether this is where the board is now.</param>
/// <param name="Columns">Columns covered.</param>
/// <param name="IsShifted">Whether it begins left of its own column, because there is no room at the right end.</param>
public sealed record GridCell(string Stage, StageLook Look, bool IsLive, int Columns, bool IsShifted);

/// <summary>Puts the cells of a board in order: small ticks behind, dots ahead, a word only where the board is now.</summary>
public static class GridCells
{
    /// <summary>Columns a word needs.</summary>
    private const int WordColumns = 4;

    public static IReadOnlyList<GridCell> Of(IReadOnlyList<RoomCell> stages)
    {
        var live = LiveOf(stages);
        var cells = stages.Select((s, i) => new GridCell(s.Stage, LookOf(s), i == live, 1, false)).ToList();
        if (live < 0) return cells;
        var width = Math.Min(WordColumns, stages.Count);
        var start = Math.Min(live, stages.Count - width);
        return [.. cells[..start], cells[live] with { Columns = width, IsShifted = start != live }, .. cells[(start + width)..]];
    }

    private static StageLook LookOf(RoomCell cell) => StageLook.Of(cell.Progress, cell.Hold, cell.LastVerdict is ReadingVerdict.Out or ReadingVerdict.Stop);

    /// <summary>The stage that needs somebody, else the first one begun and not signed; -1 when nothing is under way.</summary>
    private static int LiveOf(IReadOnlyList<RoomCell> stages)
    {
        var framed = IndexOf(stages, s => LookOf(s).IsFramed);
        return framed >= 0 ? framed : IndexOf(stages, s => s.Progress is not (StageProgress.NotStarted or StageProgress.Signed));
    }

    private static int IndexOf(IReadOnlyList<RoomCell> stages, Func<RoomCell, bool> wanted)
    {
        for (var i = 0; i < stages.Count; i++)
            if (wanted(stages[i])) return i;
        return -1;
    }
}
