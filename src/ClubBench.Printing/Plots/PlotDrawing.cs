using ClubBench.Planning.Drawings;
using ClubBench.Planning.Text;
using ClubBench.Printing.Drawings;
using ClubBench.Printing.Layout;
using OxyPlot;

namespace ClubBench.Printing.Plots;

/// <summary>Draws a plot: old dotted, new thick, limit hatched on the forbidden side, words at the curves instead of a legend.</summary>
public static class PlotDrawing
{
    /// <summary>The drawing.</summary>
    /// <param name="plot">What to draw; curves need at least two points.</param>
    /// <param name="stageKind">Stage kind, for its words; null where they are shared.</param>
    public static Drawing Of(Plot plot, string? stageKind = null) => Of(plot, PlotFrame.Of(plot), stageKind);

    /// <summary>The drawing in a frame of another size; its words keep theirs.</summary>
    internal static Drawing Of(Plot plot, PlotFrame frame, string? stageKind)
    {
        var labels = new PlotLabels(plot, frame, stageKind);
        var model = PlotModelBuilder.Build(plot, frame);
        var exporter = new SvgExporter { Width = frame.Width, Height = frame.Height, IsDocument = false, TextMeasurer = new PlexTextMeasurer() };
        var svg = new SvgDocument();
        svg.Raw(MarkerColours.Replace(InsideOf(exporter.ExportToString(model))));
        foreach (var text in labels.Texts) svg.Text(text.Text, text.X, text.Middle + (PlotLabels.Size * 0.35f), PlotLabels.Size, text.Weight, text.Colour);
        DrawUnits(svg, plot, frame);
        return svg.Finish(new Area(0, 0, frame.Width, frame.Height), Phrases.Say(plot.Code, stageKind), PlotWords.Describe(plot, stageKind));
    }

    private static void DrawUnits(SvgDocument svg, Plot plot, PlotFrame frame)
    {
        svg.Text(PlotModelBuilder.UnitOf(plot.YKind, plot.YHigh), PlotFrame.Left - 8, frame.Top - (frame.IsLow ? 6 : 10), PlotModelBuilder.AxisTextSize, FontWeight.Regular, Colour.Ink2, TextSide.End);
        svg.Text(PlotModelBuilder.UnitOf(plot.XKind, frame.XHigh), frame.Inner.Right, frame.Height - 6, PlotModelBuilder.AxisTextSize, FontWeight.Regular, Colour.Ink2, TextSide.End);
    }

    /// <summary>The shapes without the exporter's own frame, which has no name and fixed colours.</summary>
    private static string InsideOf(string svg)
    {
        var start = svg.IndexOf('>', svg.IndexOf("<svg", StringComparison.Ordinal)) + 1;
        return svg[start..svg.LastIndexOf("</svg>", StringComparison.Ordinal)].Trim();
    }
}
