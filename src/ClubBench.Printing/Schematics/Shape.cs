using ClubBench.Printing.Layout;

namespace ClubBench.Printing.Schematics;

/// <summary>The lines of one symbol, lying across, its first terminal at the origin; 16 units to the grid.</summary>
/// <param name="Lines">Path drawn with the line width.</param>
/// <param name="Heavy">Path drawn heavier: plates, core bars, transistor bars.</param>
/// <param name="Solid">Filled path: arrow heads.</param>
/// <param name="Body">What the symbol covers, leads left out.</param>
/// <param name="Terminals">Terminals in grid units, the first one at the origin.</param>
internal sealed record Shape(string Lines, string Heavy, string Solid, Area Body, params IReadOnlyList<(int X, int Y)> Terminals);
