using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Tests.Layout;

public class PageBreaksTests
{
    private static readonly RecordingSurface s_surface = new();

    [Fact]
    public void Of_EverythingFits_GivesOnePage() =>
        Assert.Single(PageBreaks.Of(s_surface, [Rows(3), Rows(3)], 5, 500, 700));

    [Fact]
    public void Of_TooMuch_StartsSecondPageAtTheSectionThatSaysSo()
    {
        var second = new Section("Before power", "", new Stack([Rows(10)]), startsPage: true);

        var pages = PageBreaks.Of(s_surface, [Rows(20), second], 5, 500, 600);

        Assert.Equal(2, pages.Count);
        Assert.Same(second, Assert.Single(pages[1].Blocks));
    }

    [Fact]
    public void Of_TableLongerThanAPage_CutsBetweenRowsAndLosesNone()
    {
        var pages = PageBreaks.Of(s_surface, [Rows(100)], 5, 500, 600);

        Assert.True(pages.Count > 2);
        Assert.Equal(100, pages.Sum(p => p.Blocks.OfType<Table>().Sum(t => t.Rows.Count)));
        Assert.All(pages, p => Assert.True(p.Height(s_surface, 500) <= 600));
    }

    [Fact]
    public void CutAt_RoomForTheCautionOnly_CutsNothingOff()
    {
        var caution = new CautionBox([new Run("Hot.", TextStyle.Strong)]);
        var section = new Section("Measure", "", new Stack([caution, Rows(10)]));
        var room = 30 + caution.Height(s_surface, 500);

        Assert.Null(section.CutAt(s_surface, 500, room));
        Assert.NotNull(section.CutAt(s_surface, 500, room + 40));
    }

    [Fact]
    public void Paragraph_NarrowColumn_WrapsAndKeepsUnbreakableSpaces()
    {
        new Paragraph("about 14.050\u00A0MHz or so", TextStyle.Body).Draw(Page(), new Area(0, 0, 70, 100));

        Assert.Contains(s_surface.Texts, t => t.Text.Trim() == "14.050\u00A0MHz");
    }

    private static RecordingSurface Page()
    {
        s_surface.BeginPage(PaperSize.A4, null);
        return s_surface;
    }

    private static Table Rows(int count) =>
        new([new Column("what", 1)], [.. Enumerable.Range(0, count).Select(i => new ICell[] { new TextCell($"row {i}", TextStyle.Key) })]);
}
