using ClubBench.Planning.Drawings;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Plots;

/// <summary>Where a plot's values stand in the drawing. The margins are fixed, so places of labels are known before drawing.</summary>
internal sealed record PlotFrame(double XLow, double XHigh, bool XIsLogarithmic, double YLow, double YHigh)
{
    public const int Width = 560;
    public const int Height = 330;
    public const float Left = 46;
    public const float Right = 14;
    public const float Top = 26;
    public const float Bottom = 40;

    /// <summary>Area inside the axes.</summary>
    public static Area Inner => new(Left, Top, Width - Left - Right, Height - Top - Bottom);

    public static PlotFrame Of(Plot plot)
    {
        var x = plot.Curves.SelectMany(c => c.X).Concat(plot.Marks.Select(m => m.X)).Concat(plot.Limits.SelectMany(l => new[] { l.FromX, l.ToX })).ToList();
        if (x.Count == 0) throw new ArgumentException("A plot needs a curve.", nameof(plot));
        return new PlotFrame(x.Min(), x.Max(), plot.XIsLogarithmic, plot.YLow, plot.YHigh);
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
