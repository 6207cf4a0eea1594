using ClubBench.Planning.Drawings;
using ClubBench.Planning.Text;

namespace ClubBench.Printing.Plots;

/// <summary>The values of a plot as a table, for those who do not see it and those who want the figure.</summary>
/// <param name="Caption">Title of the plot.</param>
/// <param name="Headings">Heading of each column, the abscissa first.</param>
/// <param name="Rows">Written values; empty where a curve has no value.</param>
public sealed record PlotTable(string Caption, IReadOnlyList<string> Headings, IReadOnlyList<IReadOnlyList<string>> Rows)
{
    private const int RowsPerSpan = 24;

    /// <summary>The table: evenly spread abscissas and every marked one, in order.</summary>
    /// <param name="plot">The plot.</param>
    /// <param name="stageKind">Stage kind, for its words.</param>
    public static PlotTable Of(Plot plot, string? stageKind = null)
    {
        var frame = PlotFrame.Of(plot);
        var xs = Enumerable.Range(0, RowsPerSpan + 1)
            .Select(i => frame.ValueX(frame.Inner.X + (frame.Inner.Width * i / RowsPerSpan)))
            .Concat(plot.Marks.Select(m => m.X))
            .Order()
            .Distinct();
        var headings = new[] { Texts.Of("plot.abscissa") }.Concat(plot.Curves.Select(c => PlotWords.Of(c, stageKind)));
        return new PlotTable(Phrases.Say(plot.Code, stageKind), [.. headings], [.. xs.Select(x => Row(plot, x))]);
    }

    private static string[] Row(Plot plot, double x) =>
        [QuantityText.Format(plot.XKind, x, 4), .. plot.Curves.Select(c => ValueAt(c, x) is { } y ? QuantityText.Format(plot.YKind, y) : "")];

    /// <summary>Straight between the curve's points; nothing outside them.</summary>
    private static double? ValueAt(Curve curve, double x)
    {
        if (curve.X.Count == 0 || x < curve.X[0] * (1 - 1e-9) || x > curve.X[^1] * (1 + 1e-9)) return null;
        var next = Enumerable.Range(0, curve.X.Count).FirstOrDefault(i => curve.X[i] >= x, curve.X.Count - 1);
        if (next == 0) return curve.Y[0];
        var share = (x - curve.X[next - 1]) / (curve.X[next] - curve.X[next - 1]);
        return curve.Y[next - 1] + (Math.Min(1, share) * (curve.Y[next] - curve.Y[next - 1]));
    }
}
