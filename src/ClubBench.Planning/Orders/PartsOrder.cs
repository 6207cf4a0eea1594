using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Orders;

/// <summary>One line of an order: everything of one sort, value and rating.</summary>
/// <param name="Class">Sort of part.</param>
/// <param name="Type">Dielectric, core, device or holder; <see cref="PartsOrder.Wire"/> for wire.</param>
/// <param name="ValueSi">Main value in SI (variable capacitors: the highest; wire: bare diameter); null for cores and devices.</param>
/// <param name="LowestSi">Lowest value of a variable part; null for fixed ones.</param>
/// <param name="RatedVoltageV">Voltage it must stand; null where none is asked.</param>
/// <param name="Needed">Pieces for all boards (wire: metre).</param>
/// <param name="Spare">Spare pieces (wire: metre).</param>
/// <param name="InStock">Taken from the drawers, never more than needed and spare.</param>
/// <param name="ToBuy">What remains to be bought, never negative.</param>
public sealed record OrderLine(PartClass Class, string Type, double? ValueSi, double? LowestSi, double? RatedVoltageV, double Needed, double Spare, double InStock, double ToBuy);

/// <summary>All parts for all boards: merged, with spares, minus stock.</summary>
/// <param name="Lines">Lines by class, type, value and rating.</param>
public sealed record PartsOrder(IReadOnlyList<OrderLine> Lines)
{
    /// <summary>Type of a line of winding wire; its value is the bare diameter, its quantity metre.</summary>
    public const string Wire = "wire";

    /// <summary>The order of a group build. Windings count as core and wire, parallel pairs as their two capacitors.</summary>
    /// <param name="plans">Plans with the number of boards of each, zero or more.</param>
    /// <param name="shelf">The drawers.</param>
    /// <param name="changesOnly">Only the parts a plan changes, for boards that are built already.</param>
    public static PartsOrder Of(IEnumerable<(Plan Plan, int Boards)> plans, Shelf shelf, bool changesOnly = false)
    {
        var pieces = plans.SelectMany(p => OrderPieces.Of(p.Plan, changesOnly).Select(piece => piece.Times(p.Boards))).Where(p => p.Quantity > 0).ToList();
        var drawers = new Drawers(shelf);
        return new PartsOrder([.. pieces.GroupBy(p => p.Key)
            .OrderBy(g => g.Key.Class == PartClass.Other).ThenBy(g => g.Key.Class).ThenBy(g => g.Key.Type, StringComparer.Ordinal).ThenBy(g => g.Key.ValueSi).ThenBy(g => g.Key.LowestSi).ThenBy(g => g.Key.RatedVoltageV)
            .Select(g => Line(g.Key, [.. g], drawers))]);
    }

    private static OrderLine Line(OrderKey key, IReadOnlyList<OrderPiece> pieces, Drawers drawers)
    {
        var needed = pieces.Sum(p => p.Quantity);
        var spare = Spares.Of(key, needed, pieces);
        var taken = drawers.Take(key, needed + spare);
        return new OrderLine(key.Class, key.Type, key.ValueSi, key.LowestSi, key.RatedVoltageV, needed, spare, taken, needed + spare - taken);
    }

    /// <summary>What is left in the drawers while lines take from them: lines that differ only in rating or lowest value share a drawer.</summary>
    private sealed class Drawers(Shelf shelf)
    {
        private readonly Dictionary<(PartClass Class, string Type, double? ValueSi), double> _taken = [];

        public double Take(OrderKey key, double wanted)
        {
            var drawer = (key.Class, key.Type, key.ValueSi);
            var before = _taken.GetValueOrDefault(drawer);
            var taken = Math.Clamp(shelf.Quantity(key.Class, key.Type, key.ValueSi) - before, 0, wanted);
            _taken[drawer] = before + taken;
            return taken;
        }
    }
}

/// <summary>What makes two pieces the same to order.</summary>
internal readonly record struct OrderKey(PartClass Class, string Type, double? ValueSi, double? LowestSi = null, double? RatedVoltageV = null)
{
    public bool IsWire => Type == PartsOrder.Wire;
}

/// <summary>Pieces of one sort for one board, or for several.</summary>
/// <param name="Key">What it is.</param>
/// <param name="Quantity">How many (wire: metre).</param>
/// <param name="PerBoard">How many one board takes.</param>
/// <param name="IsFinal">Whether it works in a stage that gets hot.</param>
internal sealed record OrderPiece(OrderKey Key, double Quantity, double PerBoard, bool IsFinal)
{
    public OrderPiece Times(int boards) => this with { Quantity = Quantity * boards };
}

/// <summary>Takes a plan apart into pieces to order.</summary>
internal static class OrderPieces
{
    public static IEnumerable<OrderPiece> Of(Plan plan, bool changesOnly)
    {
        var hot = plan.Budgets.Where(b => b.Id == "heat").SelectMany(b => b.Lines).Select(l => l.Stage).ToHashSet(StringComparer.Ordinal);
        return plan.Stages
            .SelectMany(s => (changesOnly ? s.Changes.Select(c => c.After).OfType<Part>() : s.After.Parts).SelectMany(p => PiecesOf(p, s.After.Kind)).Select(k => (k.Key, k.Quantity, IsFinal: hot.Contains(s.Stage))))
            .GroupBy(p => (p.Key, p.IsFinal))
            .Select(g => new OrderPiece(g.Key.Key, g.Sum(p => p.Quantity), g.Sum(p => p.Quantity), g.Key.IsFinal));
    }

    private static IEnumerable<(OrderKey Key, double Quantity)> PiecesOf(Part part, string kind)
    {
        var @class = StageKindList.Find(kind)?.Description.Role(part.Role)?.Class ?? PartClass.Other;
        var (lowest, rating) = (SameValue(part.Value(PartValue.MinimumCapacitance)), part.Value(PartValue.RatedVoltage));
        foreach (var (c, type, value) in Stock.PiecesOf(part, @class)) yield return (new OrderKey(c, type, SameValue(value), lowest, rating), 1);
        if (WindingPart.Of(part, LearntValues.None) is { } winding) yield return (new OrderKey(PartClass.Winding, PartsOrder.Wire, winding.Wire.Bare.Metre), WireOf(winding).Metre);
    }

    // The same value may have been computed in two ways; six digits are more than any part is marked with.
    private static double? SameValue(double? si) => si is { } value ? NumberStyle.Significant(value, 6) : null;

    private static Length WireOf(WindingPart winding)
    {
        var main = winding.Winding.CutLength;
        return winding.LinkTurns is { } link ? main + (winding.Winding with { Turns = link }).CutLength : main;
    }
}

/// <summary>How many spares a bag of parts gets. Source: common practice of club builds; at least one of each.</summary>
internal static class Spares
{
    public static double Of(OrderKey key, double needed, IReadOnlyList<OrderPiece> pieces) =>
        key.IsWire ? 0.20 * needed
        : key.Class == PartClass.Crystal ? pieces.Max(p => p.PerBoard)
        : Math.Max(1, Math.Ceiling((Share(key.Class, pieces.Any(p => p.IsFinal)) * needed) - 1e-9));

    private static double Share(PartClass @class, bool isFinal) => @class switch
    {
        PartClass.Transistor => isFinal ? 0.15 : 0.20,
        _ => 0.10,
    };
}
