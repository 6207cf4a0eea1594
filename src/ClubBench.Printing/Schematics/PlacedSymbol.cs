using ClubBench.Planning.Drawings;
using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Schematics;

/// <summary>A symbol with its shape, in drawing units.</summary>
internal sealed record PlacedSymbol(Symbol Symbol)
{
    /// <summary>Drawing units of one grid step.</summary>
    public const float Grid = 16;

    public Shape Shape { get; } = SymbolShapes.Of(Symbol.Kind);

    public bool IsUpright => Symbol.Orientation != Orientation.Across && !SymbolShapes.KeepsUpright(Symbol.Kind);

    private bool RisesUp => IsUpright && Symbol.Orientation == Orientation.Up;

    public bool IsNew => Symbol.Marking is Marking.Changed or Marking.Added;

    public float X => Symbol.X * Grid;

    public float Y => Symbol.Y * Grid;

    /// <summary>A standing symbol is mirrored on the diagonal; one that rises is turned.</summary>
    public string Transform => RisesUp ? SvgNumber($"matrix(0 -1 1 0 {X} {Y})") : IsUpright ? SvgNumber($"matrix(0 1 1 0 {X} {Y})") : SvgNumber($"translate({X} {Y})");

    public Area Body => RisesUp
        ? new Area(X + Shape.Body.Y, Y - Shape.Body.Right, Shape.Body.Height, Shape.Body.Width)
        : IsUpright
        ? new Area(X + Shape.Body.Y, Y + Shape.Body.X, Shape.Body.Height, Shape.Body.Width)
        : new Area(X + Shape.Body.X, Y + Shape.Body.Y, Shape.Body.Width, Shape.Body.Height);

    /// <summary>What it covers from terminal to terminal, leads included: a thin strip for two terminals, the body for others.</summary>
    public Area Leads => Shape.Terminals.Count != 2 ? Body
        : IsUpright ? new Area(X - 1, RisesUp ? Y - (4 * Grid) : Y, 2, 4 * Grid)
        : new Area(X, Y - 1, 4 * Grid, 2);

    public IEnumerable<(int X, int Y)> Terminals =>
        Shape.Terminals.Select(t => RisesUp ? (Symbol.X + t.Y, Symbol.Y - t.X) : IsUpright ? (Symbol.X + t.Y, Symbol.Y + t.X) : (Symbol.X + t.X, Symbol.Y + t.Y));

    private static string SvgNumber(FormattableString text) => Drawings.SvgDocument.Invariant(text);
}
