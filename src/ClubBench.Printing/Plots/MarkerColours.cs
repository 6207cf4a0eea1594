using OxyPlot;
using ClubBench.Printing.Drawings;
using ClubBench.Printing.Fonts;

namespace ClubBench.Printing.Plots;

/// <summary>The plotting library knows fixed colours only. It is given colours nobody would choose, which are then replaced by the page's variables.</summary>
internal static class MarkerColours
{
    public static OxyColor Ink { get; } = OxyColor.FromRgb(1, 2, 1);

    public static OxyColor Ink2 { get; } = OxyColor.FromRgb(1, 2, 2);

    public static OxyColor Old { get; } = OxyColor.FromRgb(1, 2, 3);

    public static OxyColor New { get; } = OxyColor.FromRgb(1, 2, 4);

    public static OxyColor Limit { get; } = OxyColor.FromRgb(1, 2, 5);

    public static OxyColor Wish { get; } = OxyColor.FromRgb(1, 2, 6);

    public static OxyColor Grid { get; } = OxyColor.FromRgb(1, 2, 7);

    public static OxyColor Line { get; } = OxyColor.FromRgb(1, 2, 8);

    public static OxyColor Sheet { get; } = OxyColor.FromRgb(1, 2, 9);

    private static readonly (OxyColor Marker, string Variable)[] s_variables =
    [
        (Ink, Colour.Ink), (Ink2, Colour.Ink2), (Old, Colour.Old), (New, Colour.Change), (Limit, Colour.Limit),
        (Wish, Colour.Wish), (Grid, Colour.Grid), (Line, Colour.Line), (Sheet, Colour.Sheet),
    ];

    /// <summary>The drawing with variables for colours, its typeface that of the whole drawing.</summary>
    public static string Replace(string svg) =>
        s_variables.Aggregate(svg.Replace($"font-family=\"{PlexSans.Family}\"", "", StringComparison.Ordinal), (s, v) => s.Replace(FormattableString.Invariant($"rgb({v.Marker.R},{v.Marker.G},{v.Marker.B})"), v.Variable, StringComparison.Ordinal));
}
