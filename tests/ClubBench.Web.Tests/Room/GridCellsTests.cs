using ClubBench.Club.Entities;
using ClubBench.Club.UseCases.Room;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Plans;
using ClubBench.Web.Components.Pages.Room;

namespace ClubBench.Web.Tests.Room;

public sealed class GridCellsTests
{
    [Fact]
    public void Of_BoardUnderWay_GivesTheWordToTheFirstStageNotSigned()
    {
        var cells = GridCells.Of([Cell("A1", StageProgress.Signed), Cell("A2", StageProgress.Measured), Cell("A3"), Cell("A4"), Cell("A5"), Cell("A6")]);

        var live = Assert.Single(cells, c => c.IsLive);
        Assert.Equal(("A2", "measured", 4), (live.Stage, live.Look.Glyph, live.Columns));
        Assert.Equal(6, cells.Sum(c => c.Columns));
    }

    [Fact]
    public void Of_HeldStage_StandsBeforeAStageThatMerelyGoesOn()
    {
        var cells = GridCells.Of([Cell("A1", StageProgress.BeingBuilt), Cell("A2"), Cell("A3", StageProgress.Powered, StageHold.Mentor), Cell("A4"), Cell("A5"), Cell("A6")]);

        var live = Assert.Single(cells, c => c.IsLive);
        Assert.Equal("A3", live.Stage);
        Assert.True(live.Look.IsFramed);
    }

    [Fact]
    public void Of_LastStage_BeginsFurtherLeftAndNamesItself()
    {
        var cells = GridCells.Of([Cell("A1", StageProgress.Signed), Cell("A2", StageProgress.Signed), Cell("A3", StageProgress.Signed), Cell("A4", StageProgress.Signed), Cell("A5", StageProgress.BeingBuilt)]);

        var live = Assert.Single(cells, c => c.IsLive);
        Assert.True(live.IsShifted);
        Assert.Equal(5, cells.Sum(c => c.Columns));
    }

    [Fact]
    public void Of_ReadingOutsideItsWindow_IsFramedUnlessTheStageIsSigned()
    {
        var open = GridCells.Of([Cell("A1", StageProgress.BeingBuilt, verdict: ReadingVerdict.Out)]);
        var signed = GridCells.Of([Cell("A1", StageProgress.Signed, verdict: ReadingVerdict.Out)]);

        Assert.Equal("outside", open[0].Look.Glyph);
        Assert.Equal("signed", signed[0].Look.Glyph);
    }

    private static RoomCell Cell(string stage, StageProgress progress = StageProgress.NotStarted, StageHold hold = StageHold.None, ReadingVerdict? verdict = null) =>
        new(stage, StageAction.Change, progress, hold, verdict);
}
