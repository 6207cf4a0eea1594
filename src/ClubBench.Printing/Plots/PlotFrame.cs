using ClubBench.Planning.Drawings;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Plots;

/// <summary>Where a plot's values stand in the drawing. The margins are fixed, so places of labels are known before drawing.</summary>
internal sealed record PlotFrame(double XLow, double XHigh, bool XIsLogarithmic, double YLow, double YHigh, float Width, float Height)
{
    public const float UsualWidth = 560;
    public const float UsualHeight = 330;
    public const float Left = 46;
    public const float Right = 14;
    private const float LeastRoomyHeight = 200;

    /// <summary>Whether it is so low that the unit of the abscissa shares a line with its numbers.</summary>
    public bool IsLow => Height < LeastRoomyHeight;

    public float Top => IsLow ? 18 : 26;

    public float Bottom => IsLow ? 24 : 40;

    /// <summary>Area inside the axes.</summary>
    public Area Inner => new(Left, Top, Width - Left - Right, Height - Top - Bottom);

    public static PlotFrame Of(Plot plot, float width = UsualWidth, float height = UsualHeight)
    {
        var x = plot.Curves.SelectMany(c => c.X).Concat(plot.Marks.Select(m => m.X)).Concat(plot.Limits.SelectMany(l => new[] { l.FromX, l.ToX })).ToList();
        if (x.Count == 0) throw new ArgumentException("A plot needs a curve.", nameof(plot));
        return new PlotFrame(x.Min(), x.Max(), plot.XIsLogarithmic, plot.YLow, plot.YHigh, width, height);
    }

    public float PixelX(double x) => Inner.X + (Inner.Width * (float)((Scale(x) - Scale(XLow)) / (Scale(XHigh) - Scale(XLow))));

    public float PixelY(double y) => Inner.Bottom - (Inner.Height * (float)((y - YLow) / (YHigh - YLow)));

    public double ValueX(float pixel)
    {
        var s = Scale(XLow) + ((pixel - Inner.X) / Inner.Width * (Scale(XHigh) - Scale(XLow)));
        return XIsLogarithmic ? Math.Pow(10, s) : s;
    }

    public double ValueY(float pixel) => YLow + ((Inner.Bottom - pixel) / Inner.Height * (YHigh - YLow));

    private double Scale(double x) => XIsLogarithmic ? Math.Log10(x) : x;
}
