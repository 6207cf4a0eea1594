using System.Xml.Linq;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Printing.Layout;
using ClubBench.Printing.Plots;
using ClubBench.Printing.Tests.Samples;

namespace ClubBench.Printing.Tests.Plots;

public class PlotDrawingTests
{
    private static readonly string s_svg = PlotDrawing.Of(SamplePlots.Response).Svg;

    [Fact]
    public void Of_Plot_HasRoleTitleAndDescriptionWithItsFigures()
    {
        var svg = XDocument.Parse(s_svg).Root!;

        Assert.Equal("img", svg.Attribute("role")!.Value);
        Assert.NotEmpty(svg.Elements().Single(e => e.Name.LocalName == "title").Value);
        Assert.Contains("28.100", svg.Elements().Single(e => e.Name.LocalName == "desc").Value, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_Plot_KeepsNoFixedColour()
    {
        Assert.Empty(FixedColours.In(s_svg));
        Assert.NotEmpty(FixedColours.In("<path stroke=\"rgb(1,2,3)\"/>"));
        Assert.NotEmpty(FixedColours.In("<path stroke=\"#010203\"/>"));
    }

    [Fact]
    public void Of_OldCurve_IsDottedAndNewThick()
    {
        Assert.Contains(Lines(), l => l.Contains("--old", StringComparison.Ordinal) && l.Contains("dasharray", StringComparison.Ordinal));
        Assert.Contains(Lines(), l => l.Contains("--change", StringComparison.Ordinal) && l.Contains("stroke-width:2.8", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Of_Limit_IsHatchedOnTheForbiddenSide(bool above)
    {
        var plot = SamplePlots.Response with { Limits = [new LimitLine("plot.limit", 28.1e6, 63e6, -31, above)] };
        var frame = PlotFrame.Of(plot);

        var strokes = PlotHatch.Of(plot.Limits[0], frame).Skip(1).ToList();

        Assert.True(strokes.Count > 5);
        Assert.All(strokes, s => Assert.Equal(above, s.Points.Max(p => p.Y) > -31 + 0.01));
        Assert.All(strokes, s => Assert.Equal(above, s.Points.Min(p => p.Y) > -31 - 0.01));
    }

    [Fact]
    public void Of_Wish_IsNotHatched() =>
        Assert.Single(PlotHatch.Of(new LimitLine("plot.wish", 28.1e6, 63e6, -41, true, IsWish: true), PlotFrame.Of(SamplePlots.Response)));

    [Fact]
    public void Frame_Pixels_LeadBackToTheirValues()
    {
        var frame = PlotFrame.Of(SamplePlots.Response);

        Assert.Equal(14.05e6, frame.ValueX(frame.PixelX(14.05e6)), 1e3);
        Assert.Equal(-40, frame.ValueY(frame.PixelY(-40)), 0.01);
        Assert.Equal(frame.PixelX(20e6) - frame.PixelX(10e6), frame.PixelX(40e6) - frame.PixelX(20e6), 0.01);
    }

    [Fact]
    public void Of_Words_StandAtTheCurvesAndDoNotHideEachOther()
    {
        var labels = new PlotLabels(SamplePlots.Response, PlotFrame.Of(SamplePlots.Response), null).Texts;

        Assert.Equal(6, labels.Count);
        foreach (var a in labels)
            foreach (var b in labels.Where(l => l != a))
                Assert.False(Math.Abs(a.Middle - b.Middle) < 12 && a.X < b.X && a.X + Width(a) > b.X + 1, $"{a.Text} over {b.Text}");
    }

    [Theory]
    [InlineData("20 m", PlotFrame.UsualWidth, PlotFrame.UsualHeight)]
    [InlineData("40 m", PlotFrame.UsualWidth, PlotFrame.UsualHeight)]
    [InlineData("20 m", 250, 128)]
    [InlineData("40 m", 250, 128)]
    public void Of_PlotsOfAPlan_WordsStandClearOfCurvesLimitsAndEachOther(string band, float width, float height)
    {
        foreach (var (plot, kind) in SamplePlans.QuernOn(band).Stages.SelectMany(s => PlotsOf(s, width)))
        {
            var frame = PlotFrame.Of(plot, width, height);
            var words = new PlotLabels(plot, frame, kind).Texts.Select(t => (t.Text, Area: new Area(t.X, t.Middle - 5, Width(t), 10))).ToList();
            var lines = plot.Curves.SelectMany(c => Along(c, frame).Select(p => (Of: c.LabelCode, Point: p)))
                .Concat(plot.Limits.SelectMany(l => Enumerable.Range(0, 101).Select(i => (Of: l.LabelCode, Point: (X: frame.PixelX(l.FromX) + (i / 100f * (frame.PixelX(l.ToX) - frame.PixelX(l.FromX))), Y: frame.PixelY(l.Y))))));

            var covered = lines.SelectMany(l => words.Where(w => Holds(w.Area, l.Point)).Select(w => $"{w.Text} on {l.Of}")).Distinct();

            Assert.Equal([], covered);
            Assert.All(words, w => Assert.InRange(w.Area.Right, 0, width));
        }
    }

    [Fact]
    public void Of_NarrowSpan_TellsItsTicksApart()
    {
        var x = new[] { 10e-12, 20e-12, 40e-12 };
        var plot = new Plot("plot.dial", QuantityKind.Capacitance, true, QuantityKind.Frequency, 14.03e6, 14.07e6, [new Curve("plot.kept", CurveStyle.New, x, [14.065e6, 14.05e6, 14.035e6])], [], []);

        var ticks = XDocument.Parse(PlotDrawing.Of(plot).Svg).Descendants().Where(e => e.Name.LocalName == "text" && e.Value.StartsWith("14", StringComparison.Ordinal)).Select(e => e.Value).ToList();

        Assert.True(ticks.Count >= 3);
        Assert.Equal(ticks.Count, ticks.Distinct(StringComparer.Ordinal).Count());
    }

    [Fact]
    public void Of_EveryPlotOfAPlan_IsDrawnWithWords()
    {
        var plots = SamplePlans.QuernOn("20 m").Stages.SelectMany(s => s.Plots.Select(p => (Plot: p, s.Card.Kind))).ToList();

        Assert.NotEmpty(plots);
        Assert.All(plots, p => Assert.Empty(FixedColours.In(PlotDrawing.Of(p.Plot, p.Kind).Svg)));
        Assert.All(plots, p => Assert.NotEmpty(PlotTable.Of(p.Plot, p.Kind).Rows));
    }

    [Fact]
    public void Of_NoCurve_Throws() =>
        Assert.Throws<ArgumentException>(() => PlotDrawing.Of(SamplePlots.Response with { Curves = [], Limits = [], Marks = [] }));

    /// <summary>In full size the plan's own plots, in a small one what the card shows.</summary>
    private static IEnumerable<(Plot Plot, string Kind)> PlotsOf(StagePlan stage, float width) =>
        width >= PlotFrame.UsualWidth ? stage.Plots.Select(p => (p, stage.Card.Kind)) : stage.Card.Response is { } response ? [(response, stage.Card.Kind)] : [];

    private static IEnumerable<(float X, float Y)> Along(Curve curve, PlotFrame frame)
    {
        for (var i = 1; i < curve.X.Count; i++)
            for (var part = 0f; part < 1; part += 0.1f)
                yield return (Between(frame.PixelX(curve.X[i - 1]), frame.PixelX(curve.X[i]), part), Between(frame.PixelY(curve.Y[i - 1]), frame.PixelY(curve.Y[i]), part));
    }

    private static float Between(float a, float b, float part) => a + ((b - a) * part);

    private static bool Holds(Area area, (float X, float Y) p) => p.X > area.X && p.X < area.Right && p.Y > area.Y && p.Y < area.Bottom;

    private static float Width(PlotText text) => Printing.Fonts.PlexSans.Measure(text.Text, PlotLabels.Size, text.Weight);

    private static IEnumerable<string> Lines() => s_svg.Split('\n').Where(l => l.Contains("<polyline", StringComparison.Ordinal));
}
