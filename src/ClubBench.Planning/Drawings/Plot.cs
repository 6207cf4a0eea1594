using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Drawings;

/// <summary>How a curve is drawn.</summary>
public enum CurveStyle
{
    /// <summary>Kept parts: dotted.</summary>
    Old,

    /// <summary>Planned parts: thick.</summary>
    New,

    /// <summary>Measured points.</summary>
    Measured,
}

/// <summary>One curve, in SI units on both axes.</summary>
/// <param name="LabelCode">Text code of its word ("plot.old").</param>
/// <param name="Style">How it is drawn.</param>
/// <param name="X">Abscissa values, rising.</param>
/// <param name="Y">Ordinate values, one per abscissa.</param>
public sealed record Curve(string LabelCode, CurveStyle Style, IReadOnlyList<double> X, IReadOnlyList<double> Y);

/// <summary>A limit over a span of the abscissa; the forbidden side is hatched.</summary>
/// <param name="LabelCode">Text code.</param>
/// <param name="FromX">Start.</param>
/// <param name="ToX">End.</param>
/// <param name="Y">Level.</param>
/// <param name="ForbiddenAbove">Whether the forbidden side lies above the line.</param>
/// <param name="IsWish">A wish rather than the limit: drawn lighter.</param>
public sealed record LimitLine(string LabelCode, double FromX, double ToX, double Y, bool ForbiddenAbove, bool IsWish = false);

/// <summary>A marked point with its figure.</summary>
/// <param name="X">Abscissa.</param>
/// <param name="Y">Ordinate.</param>
/// <param name="LabelCode">Text code; the figure's value is {value}, its place {at}.</param>
public sealed record PlotMark(double X, double Y, string LabelCode);

/// <summary>A plot as data: Printing draws it, pages show it as a table too.</summary>
/// <param name="Code">Text code of its title ("plot.response").</param>
/// <param name="XKind">Abscissa quantity.</param>
/// <param name="XIsLogarithmic">Logarithmic abscissa.</param>
/// <param name="YKind">Ordinate quantity.</param>
/// <param name="YLow">Lower end of the ordinate.</param>
/// <param name="YHigh">Upper end.</param>
/// <param name="Curves">Curves.</param>
/// <param name="Limits">Limits.</param>
/// <param name="Marks">Marked points.</param>
public sealed record Plot(
    string Code,
    QuantityKind XKind,
    bool XIsLogarithmic,
    QuantityKind YKind,
    double YLow,
    double YHigh,
    IReadOnlyList<Curve> Curves,
    IReadOnlyList<LimitLine> Limits,
    IReadOnlyList<PlotMark> Marks);
