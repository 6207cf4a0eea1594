using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Parts;

/// <summary>Whether the drawers hold the parts of one board.</summary>
public static class Stock
{
    /// <summary>True when every part that goes in is in the drawer, counting places that want the same part together.</summary>
    public static bool Covers(Shelf shelf, IReadOnlyList<PartChange> changes, StageDescription description) =>
        changes.Select(c => c.After).OfType<Part>()
            .SelectMany(p => PiecesOf(p, description.Role(p.Role)?.Class ?? PartClass.Other))
            .GroupBy(p => p)
            .All(g => shelf.Quantity(g.Key.Class, g.Key.Type, g.Key.ValueSi) >= g.Count());

    /// <summary>The things to take out of a drawer for one part.</summary>
    public static IEnumerable<(PartClass Class, string Type, double? ValueSi)> PiecesOf(Part part, PartClass @class) => @class switch
    {
        PartClass.Capacitor when part.Value(PartValue.Capacitance) is not null => CapacitorPart.Pieces(part).Select(c => (@class, part.Type, (double?)c.Farad)),
        PartClass.Trimmer or PartClass.VariableCapacitor => [(@class, part.Type, part.Value(PartValue.MaximumCapacitance))],
        PartClass.Resistor or PartClass.Potentiometer => [(@class, part.Type, part.Value(PartValue.Resistance))],
        PartClass.MouldedChoke => [(@class, part.Type, part.Value(PartValue.Inductance))],
        PartClass.Crystal => [(@class, part.Type, part.Value(PartValue.Frequency))],
        PartClass.Diode => [(@class, part.Type, part.Value(PartValue.Voltage))],
        PartClass.Hardware => [(@class, part.Type, part.Value(PartValue.RatedCurrent))],
        _ => [(@class, part.Type, null)],
    };
}
