using ClubBench.Planning.Drawings;
using OxyPlot;
using OxyPlot.Series;

namespace ClubBench.Printing.Plots;

/// <summary>A limit: its line, and strokes on the side where nothing may be.</summary>
internal static class PlotHatch
{
    /// <summary>How far the strokes reach, in pixels.</summary>
    public const float Depth = 9;

    private const float Step = 8;

    public static IEnumerable<LineSeries> Of(LimitLine limit, PlotFrame frame)
    {
        var colour = limit.IsWish ? MarkerColours.Wish : MarkerColours.Limit;
        yield return Line(colour, limit.IsWish ? 1.2 : 2, limit.IsWish ? LineStyle.Dash : LineStyle.Solid, frame, frame.PixelX(limit.FromX), frame.PixelY(limit.Y), frame.PixelX(limit.ToX), frame.PixelY(limit.Y));
        if (limit.IsWish) yield break;
        var rise = limit.ForbiddenAbove ? -Depth : Depth;
        for (var x = frame.PixelX(limit.FromX); x + Step <= frame.PixelX(limit.ToX); x += Step)
            yield return Line(colour, 1, LineStyle.Solid, frame, x, frame.PixelY(limit.Y), x + Step, frame.PixelY(limit.Y) + rise);
    }

    private static LineSeries Line(OxyColor colour, double width, LineStyle style, PlotFrame frame, float x1, float y1, float x2, float y2)
    {
        var series = new LineSeries { Color = colour, StrokeThickness = width, LineStyle = style };
        series.Points.Add(new DataPoint(frame.ValueX(x1), frame.ValueY(y1)));
        series.Points.Add(new DataPoint(frame.ValueX(x2), frame.ValueY(y2)));
        return series;
    }
}
