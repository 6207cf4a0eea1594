using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;

namespace ClubBench.Printing.Plots;

/// <summary>Words of a plot: at its marks, its limits, and the sentence for those who do not see it.</summary>
internal static class PlotWords
{
    /// <summary>Word and value at a mark. Words may name {value} and {at} themselves; those that do not get the value after a colon.</summary>
    public static string Of(Plot plot, PlotMark mark, string? stageKind) => WithValue(plot, mark.LabelCode, mark.X, mark.Y, stageKind);

    /// <summary>Word and value of a limit, as of a mark.</summary>
    public static string Of(Plot plot, LimitLine limit, string? stageKind) => WithValue(plot, limit.LabelCode, limit.FromX, limit.Y, stageKind);

    /// <summary>Word at a limit. Its value stands at the axis and in the description; with it the word would lie on the curves.</summary>
    public static string Short(LimitLine limit, string? stageKind) => Phrases.Say(limit.LabelCode, stageKind);

    /// <summary>Word at a curve.</summary>
    public static string Of(Curve curve, string? stageKind) => Phrases.Say(curve.LabelCode, stageKind);

    /// <summary>One sentence with the curves and the marked figures.</summary>
    public static string Describe(Plot plot, string? stageKind)
    {
        var curves = string.Join(", ", plot.Curves.Select(c => Of(c, stageKind)));
        var figures = plot.Marks.Select(m => WithPlace(plot, m, stageKind)).Concat(plot.Limits.Select(l => Of(plot, l, stageKind))).ToList();
        return figures.Count == 0 ? Texts.Say("plot.curves", curves) : Texts.Say("plot.curves-and-figures", curves, string.Join("; ", figures));
    }

    private static string WithPlace(Plot plot, PlotMark mark, string? stageKind) =>
        Texts.Say("plot.mark-at", Of(plot, mark, stageKind), QuantityText.Format(plot.XKind, mark.X));

    private static string WithValue(Plot plot, string code, double x, double y, string? stageKind)
    {
        var said = Phrases.Say(code, [Figure.Of("value", plot.YKind, y), Figure.Of("at", plot.XKind, x)], stageKind);
        return said.Any(char.IsAsciiDigit) ? said : Texts.Say("plot.mark", said, QuantityText.Format(plot.YKind, y));
    }
}
