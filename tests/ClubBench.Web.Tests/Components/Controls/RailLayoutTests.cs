using ClubBench.Planning.Kits;
using ClubBench.Web.Components.Controls.Rails;

namespace ClubBench.Web.Tests.Components.Controls;

public sealed class RailLayoutTests
{
    private static readonly string[] Transceiver = ["A1", "A2", "A3", "A4", "A5", "A6", "A7", "A8", "A9", "A10", "A11", "A12"];

    private static SignalPath Path(params string[] stages) => new([.. stages.Select(s => new PathStep(s, "in", "out"))]);

    private static RailLayout DirectConversion() => RailLayout.Of(
        new SignalPaths(Path("A5", "A6", "A7", "A8", "A9", "A10"), Path("A1", "A2", "A3", "A4", "A5"), [new OscillatorBranch("A8", "lo", Path("A1", "A2"))]),
        Transceiver);

    private static RailBlock Block(RailLayout layout, string stage) => layout.Blocks.Single(b => b.Stage == stage);

    [Fact]
    public void Of_StagesOfBothPaths_StandOnTheSharedRow()
    {
        var shared = DirectConversion().Blocks.Where(b => b is { Row: RailRow.Shared, IsAside: false }).Select(b => b.Stage);

        Assert.Equal(["A1", "A2", "A5"], shared);
    }

    [Fact]
    public void Of_EveryPath_RunsToTheRightTowardsTheAntenna()
    {
        var layout = DirectConversion();

        Assert.All(layout.Links.Where(l => l.Signal != RailSignal.Oscillator), l => Assert.True(l.From.Column < l.To.Column));
        Assert.Equal(layout.Columns - 1, Block(layout, "A5").Column);
        Assert.Equal("A10", layout.Phones!.Stage);
    }

    [Fact]
    public void Of_TwoStages_NeverShareACell()
    {
        var layout = DirectConversion();

        Assert.Equal(layout.Blocks.Count, layout.Blocks.Select(b => (b.Row, b.Column)).Distinct().Count());
    }

    [Fact]
    public void Of_StageOnNoPath_StandsAside()
    {
        Assert.Equal(["A11", "A12"], DirectConversion().Blocks.Where(b => b.IsAside).Select(b => b.Stage));
    }

    [Fact]
    public void Of_Oscillator_IsLinkedToItsMixerOnce()
    {
        var drive = Assert.Single(DirectConversion().Links, l => l.Signal == RailSignal.Oscillator);

        Assert.Equal(("A2", "A8"), (drive.From.Stage, drive.To.Stage));
    }

    [Fact]
    public void Of_OscillatorOfItsOwn_StandsBeforeItsMixer()
    {
        var layout = RailLayout.Of(
            new SignalPaths(Path("F", "M", "I", "D", "N"), Path(), [new OscillatorBranch("M", "lo", Path("V", "B"))]),
            ["F", "M", "I", "D", "N", "V", "B"]);

        Assert.True(Block(layout, "V").Column < Block(layout, "B").Column);
        Assert.True(Block(layout, "B").Column <= Block(layout, "M").Column);
        Assert.True(Block(layout, "V").OnReceive);
    }

    [Fact]
    public void Of_PathsThatCrossStagesInOppositeOrder_StillPlacesEveryStage()
    {
        var layout = RailLayout.Of(new SignalPaths(Path("X", "Y"), Path("X", "Y"), []), ["X", "Y"]);

        Assert.Equal(2, layout.Blocks.Select(b => (b.Row, b.Column)).Distinct().Count());
    }

    [Fact]
    public void Of_KitWithoutConnections_ShowsItsStagesAside()
    {
        var layout = RailLayout.Of(new SignalPaths(Path(), Path(), []), ["A1", "A2"]);

        Assert.All(layout.Blocks, b => Assert.True(b.IsAside));
        Assert.Empty(layout.Links);
        Assert.Null(layout.Phones);
    }
}
