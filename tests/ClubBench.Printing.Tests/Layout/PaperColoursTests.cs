using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Tests.Layout;

public class PaperColoursTests
{
    [Theory]
    [InlineData("fill=\"var(--ink,#17212A)\"", "fill=\"#000000\"")]
    [InlineData("fill=\"var(--change,#00578A)\"", "fill=\"#000000\"")]
    [InlineData("fill=\"var(--paint,#EBCB3C)\"", "fill=\"#FFFFFF\"")]
    [InlineData("fill=\"var(--old)\"", "fill=\"#555555\"")]
    [InlineData("fill=\"none\"", "fill=\"none\"")]
    public void Apply_Variable_BecomesAGreyThatCopies(string drawing, string expected) =>
        Assert.Equal(expected, PaperColours.Apply(drawing));
}
