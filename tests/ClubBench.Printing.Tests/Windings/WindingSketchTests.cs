using ClubBench.Printing.Tests.Samples;
using ClubBench.Printing.Windings;

namespace ClubBench.Printing.Tests.Windings;

public class WindingSketchTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(4)]
    [InlineData(15)]
    [InlineData(16)]
    [InlineData(60)]
    public void Of_Turns_DrawsExactlySoManyPasses(int turns) =>
        Assert.Equal(turns, WindingSketch.Of(turns, "T37-6", "yellow").Svg.Split("class=\"pass\"").Length - 1);

    [Fact]
    public void Of_PaintedCore_ShowsAndNamesItsPaint()
    {
        var yellow = WindingSketch.Of(15, "T37-6", "yellow");

        Assert.Contains("painted yellow with 15 passes", yellow.Description, StringComparison.Ordinal);
        Assert.NotEqual(yellow.Svg, WindingSketch.Of(15, "T37-6", "red").Svg);
    }

    [Fact]
    public void Of_BareCore_SaysNothingOfPaint() =>
        Assert.DoesNotContain("painted", WindingSketch.Of(10, "FT37-43", "").Description, StringComparison.Ordinal);

    [Fact]
    public void Of_Colours_AreAllVariables() => Assert.Empty(FixedColours.In(WindingSketch.Of(15, "T37-6", "yellow").Svg));

    [Fact]
    public void Of_NoTurns_Throws() => Assert.Throws<ArgumentOutOfRangeException>(() => WindingSketch.Of(0, "T37-6", "yellow"));
}
