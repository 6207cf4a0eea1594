using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Kits;

/// <summary>What a number measures, told by the unit at the end of its property name.</summary>
internal static class UnitSuffix
{
    // Longer endings first: a name ending in PeakToPeakV also ends in V.
    private static readonly (string Ending, QuantityKind Kind)[] Endings =
    [
        ("HPerTurn2", QuantityKind.InductanceFactor),
        ("PeakToPeakV", QuantityKind.PeakToPeakVoltage),
        ("Relative", QuantityKind.Ratio),
        ("TimeS", QuantityKind.Duration),
        ("urns", QuantityKind.Count),
        ("Dbm", QuantityKind.PowerLevel),
        ("Ohm", QuantityKind.Resistance),
        ("Db", QuantityKind.Decibels),
        ("Hz", QuantityKind.Frequency),
        ("F", QuantityKind.Capacitance),
        ("H", QuantityKind.Inductance),
        ("V", QuantityKind.Voltage),
        ("A", QuantityKind.Current),
        ("W", QuantityKind.Power),
        ("M", QuantityKind.Length),
        ("Q", QuantityKind.Number),
    ];

    /// <summary>The kind, or null where the ending is none that people write with a unit; then only a bare number will do.</summary>
    public static QuantityKind? KindOf(string name) =>
        Endings.Where(e => name.EndsWith(e.Ending, StringComparison.Ordinal)).Select(e => (QuantityKind?)e.Kind).FirstOrDefault();
}
