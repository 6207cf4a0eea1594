using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Parts;

/// <summary>A part read as a fixed capacitor, alone or two in parallel.</summary>
public static class CapacitorPart
{
    /// <summary>Capacitance of the place.</summary>
    public static Capacitance Total(Part part) => Capacitance.FromFarad(part.Need(PartValue.Capacitance) + (part.Value(PartValue.ParallelCapacitance) ?? 0));

    /// <summary>The same place holding other capacitors; the second is null for a single part.</summary>
    public static Part Holding(Part part, Capacitance first, Capacitance? second = null) =>
        part.With((PartValue.Capacitance, first.Farad), (PartValue.ParallelCapacitance, second?.Farad));

    /// <summary>Values of the pieces, larger first.</summary>
    public static IReadOnlyList<Capacitance> Pieces(Part part) =>
        part.Value(PartValue.ParallelCapacitance) is { } second
            ? [Capacitance.FromFarad(part.Need(PartValue.Capacitance)), Capacitance.FromFarad(second)]
            : [Capacitance.FromFarad(part.Need(PartValue.Capacitance))];
}
