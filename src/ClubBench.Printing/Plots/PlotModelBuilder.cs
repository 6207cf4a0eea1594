using System.Globalization;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using ClubBench.Printing.Fonts;
using ClubBench.Printing.Layout;
using OxyPlot;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace ClubBench.Printing.Plots;

/// <summary>Turns a plot into the plotting library's model.</summary>
internal static class PlotModelBuilder
{
    public const float AxisTextSize = 12;

    private const float RoomForUnit = 38;

    /// <summary>Enough to tell the ticks of a narrow span apart; idle zeros go.</summary>
    private const int TickDigits = 7;

    public static PlotModel Build(Plot plot, PlotFrame frame)
    {
        var model = new PlotModel
        {
            DefaultFont = PlexSans.Family,
            DefaultFontSize = AxisTextSize,
            PlotMargins = new OxyThickness(PlotFrame.Left, frame.Top, PlotFrame.Right, frame.Bottom),
            Padding = new OxyThickness(0),
            PlotAreaBorderColor = MarkerColours.Line,
            PlotAreaBorderThickness = new OxyThickness(1, 0, 0, 1),
            TextColor = MarkerColours.Ink2,
            Background = OxyColors.Transparent,
        };
        model.Axes.Add(XAxis(plot, frame));
        model.Axes.Add(YAxis(plot));
        foreach (var series in plot.Limits.SelectMany(l => PlotHatch.Of(l, frame))) model.Series.Add(series);
        foreach (var curve in plot.Curves) model.Series.Add(CurveOf(curve));
        if (plot.Marks.Count > 0) model.Series.Add(MarksOf(plot));
        return model;
    }

    private static Axis XAxis(Plot plot, PlotFrame frame)
    {
        Axis axis = plot.XIsLogarithmic ? new LogarithmicAxis { PowerPadding = false } : new LinearAxis();
        axis.Position = AxisPosition.Bottom;
        axis.LabelFormatter = x => (plot.XIsLogarithmic && !IsLabelled(x)) || IsUnderTheUnit(x, frame) ? "" : Number(plot.XKind, x, frame.XHigh);
        Style(axis);
        axis.Minimum = frame.XLow;
        axis.Maximum = frame.XHigh;
        return axis;
    }

    private static LinearAxis YAxis(Plot plot)
    {
        var axis = new LinearAxis { Position = AxisPosition.Left, Minimum = plot.YLow, Maximum = plot.YHigh, LabelFormatter = y => Number(plot.YKind, y, plot.YHigh) };
        Style(axis);
        return axis;
    }

    private static void Style(Axis axis)
    {
        axis.MajorGridlineStyle = LineStyle.Solid;
        axis.MajorGridlineColor = MarkerColours.Grid;
        axis.MinorGridlineStyle = axis is LogarithmicAxis ? LineStyle.Solid : LineStyle.None;
        axis.MinorGridlineColor = MarkerColours.Grid;
        axis.MajorGridlineThickness = 1;
        axis.MinorGridlineThickness = 0.7;
        axis.TicklineColor = MarkerColours.Line;
        axis.MinorTicklineColor = OxyColors.Transparent;
        axis.TextColor = MarkerColours.Ink2;
        axis.AxislineColor = MarkerColours.Line;
    }

    private static LineSeries CurveOf(Curve curve)
    {
        var isMeasured = curve.Style == CurveStyle.Measured;
        var series = new LineSeries
        {
            Color = curve.Style == CurveStyle.Old ? MarkerColours.Old : MarkerColours.New,
            StrokeThickness = curve.Style == CurveStyle.New ? 2.8 : 2,
            LineStyle = isMeasured ? LineStyle.None : LineStyle.Solid,
            Dashes = curve.Style == CurveStyle.Old ? [1.2, 2.4] : null,
            MarkerType = isMeasured ? MarkerType.Cross : MarkerType.None,
            MarkerSize = 4,
            MarkerStroke = MarkerColours.Ink,
            MarkerStrokeThickness = 1.6,
        };
        for (var i = 0; i < curve.X.Count; i++) series.Points.Add(new DataPoint(curve.X[i], curve.Y[i]));
        return series;
    }

    private static ScatterSeries MarksOf(Plot plot)
    {
        var series = new ScatterSeries { MarkerType = MarkerType.Circle, MarkerSize = 4.5, MarkerFill = MarkerColours.Sheet, MarkerStroke = MarkerColours.Ink, MarkerStrokeThickness = 1.8 };
        foreach (var mark in plot.Marks) series.Points.Add(new ScatterPoint(mark.X, mark.Y));
        return series;
    }

    /// <summary>Where the unit stands beside the numbers, those under it give way.</summary>
    private static bool IsUnderTheUnit(double x, PlotFrame frame) => frame.IsLow && frame.PixelX(x) > frame.Inner.Right - RoomForUnit;

    /// <summary>A few numbers of each decade are enough to read a logarithmic axis.</summary>
    private static bool IsLabelled(double x)
    {
        var mantissa = x / Math.Pow(10, Math.Floor(Math.Log10(x) + 1e-9));
        return new[] { 1.0, 2, 3, 5, 7 }.Any(m => Math.Abs(mantissa - m) < 1e-6);
    }

    /// <summary>The number at a tick: a round one, so its idle zeros go.</summary>
    private static string Number(QuantityKind kind, double value, double largest)
    {
        if (Math.Abs(value) < 1e-9 * Math.Abs(largest)) return "0";
        var text = QuantityText.Split(kind, value, TickDigits).Number;
        var mark = CultureInfo.CurrentCulture.NumberFormat.NumberDecimalSeparator;
        return text.Contains(mark, StringComparison.Ordinal) ? text.TrimEnd('0').TrimEnd(mark[^1]) : text;
    }

    /// <summary>Unit of an axis, by its largest value.</summary>
    public static string UnitOf(QuantityKind kind, double value) => QuantityText.Split(kind, value, 3).Unit;
}
