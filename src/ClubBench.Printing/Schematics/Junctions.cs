using ClubBench.Planning.Drawings;

namespace ClubBench.Printing.Schematics;

/// <summary>Points where wires and terminals meet.</summary>
internal sealed class Junctions
{
    private readonly HashSet<(int X, int Y)> _new;

    public Junctions(Schematic schematic, IReadOnlyList<PlacedSymbol> symbols)
    {
        _new = [.. symbols.Where(s => s.IsNew).SelectMany(s => s.Terminals)];
        var ends = schematic.Wires.SelectMany(w => new[] { (w.X1, w.Y1), (w.X2, w.Y2) })
            .Concat(symbols.Where(s => s.Symbol.Kind != SymbolKind.Terminal).SelectMany(s => s.Terminals))
            .ToList();
        Dots = [.. ends.GroupBy(p => p).Where(g => g.Count() + (2 * schematic.Wires.Count(w => PassesThrough(w, g.Key))) >= 3).Select(g => g.Key)];
    }

    /// <summary>Points where three or more ends meet.</summary>
    public IReadOnlyList<(int X, int Y)> Dots { get; }

    /// <summary>Whether a changed part is connected at this point.</summary>
    public bool IsNew(int x, int y) => _new.Contains((x, y));

    /// <summary>Whether the point lies inside the wire, not at its ends.</summary>
    private static bool PassesThrough(Wire wire, (int X, int Y) p)
    {
        var across = ((wire.X2 - wire.X1) * (p.Y - wire.Y1)) - ((wire.Y2 - wire.Y1) * (p.X - wire.X1));
        var along = ((p.X - wire.X1) * (wire.X2 - wire.X1)) + ((p.Y - wire.Y1) * (wire.Y2 - wire.Y1));
        var length = ((wire.X2 - wire.X1) * (wire.X2 - wire.X1)) + ((wire.Y2 - wire.Y1) * (wire.Y2 - wire.Y1));
        return across == 0 && along > 0 && along < length;
    }
}
