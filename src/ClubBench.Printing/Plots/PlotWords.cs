using ClubBench.Planning.Drawings;
using ClubBench.Planning.Text;

namespace ClubBench.Printing.Plots;

/// <summary>Words of a plot: at its marks, its limits, and the sentence for those who do not see it.</summary>
internal static class PlotWords
{
    /// <summary>Word and value at a mark.</summary>
    public static string Of(Plot plot, PlotMark mark, string? stageKind) =>
        Texts.Say("plot.mark", Phrases.Say(mark.LabelCode, stageKind), QuantityText.Format(plot.YKind, mark.Y));

    /// <summary>Word and value at a limit.</summary>
    public static string Of(Plot plot, LimitLine limit, string? stageKind) =>
        Texts.Say("plot.mark", Phrases.Say(limit.LabelCode, stageKind), QuantityText.Format(plot.YKind, limit.Y));

    /// <summary>Word at a curve.</summary>
    public static string Of(Curve curve, string? stageKind) => Phrases.Say(curve.LabelCode, stageKind);

    /// <summary>One sentence with the curves and the marked figures.</summary>
    public static string Describe(Plot plot, string? stageKind)
    {
        var curves = string.Join(", ", plot.Curves.Select(c => Of(c, stageKind)));
        var figures = plot.Marks.Select(m => WithPlace(plot, m, stageKind)).Concat(plot.Limits.Select(l => Of(plot, l, stageKind))).ToList();
        return figures.Count == 0 ? Texts.Say("plot.curves", curves) : Texts.Say("plot.curves-and-figures", curves, string.Join("; ", figures));
    }

    private static string WithPlace(Plot plot, PlotMark mark, string? stageKind) => Texts.Say(
        "plot.mark-at", Phrases.Say(mark.LabelCode, stageKind), QuantityText.Format(plot.YKind, mark.Y), QuantityText.Format(plot.XKind, mark.X));
}
