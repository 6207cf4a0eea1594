using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;

namespace ClubBench.Printing.Tests.Samples;

/// <summary>A response plot of the shape a low-pass gives; the curves are a plain formula, not a design.</summary>
public static class SamplePlots
{
    private const double FloorDb = -80;

    public static Plot Response { get; } = new(
        "plot.response", QuantityKind.Frequency, true, QuantityKind.Decibels, FloorDb, 5,
        [CurveOf("plot.old", CurveStyle.Old, 13.5e6), CurveOf("plot.new", CurveStyle.New, 18.5e6)],
        [new LimitLine("plot.limit", 28.1e6, 63e6, -31, true), new LimitLine("plot.wish", 28.1e6, 63e6, -41, true, IsWish: true)],
        [new PlotMark(14.05e6, Gain(14.05e6, 18.5e6), "plot.at-carrier"), new PlotMark(28.1e6, Gain(28.1e6, 18.5e6), "plot.at-second-harmonic")]);

    public static double Gain(double hertz, double cutOffHz) => -10 * Math.Log10(1 + Math.Pow(hertz / cutOffHz, 22));

    private static Curve CurveOf(string label, CurveStyle style, double cutOffHz)
    {
        var x = Enumerable.Range(0, 161).Select(i => 4e6 * Math.Pow(16, i / 160.0)).Where(f => Gain(f, cutOffHz) >= FloorDb).ToList();
        return new Curve(label, style, x, [.. x.Select(f => Gain(f, cutOffHz))]);
    }
}
