using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Plans;

/// <summary>One line of the club's drawers.</summary>
/// <param name="Class">Sort of part.</param>
/// <param name="Type">Dielectric, core, device or holder.</param>
/// <param name="ValueSi">Main value in SI (capacitance, inductance, marked frequency, wire diameter); null for cores and devices.</param>
/// <param name="Quantity">Pieces (metre for wire).</param>
/// <param name="Lot">Name of the lot, empty for none.</param>
/// <param name="MayBeTuned">Whether it may go into a tuned place (NP0, mica, film; never bypass grade).</param>
/// <param name="MeasuredSi">What was measured or learnt of the lot, by the names of part values (motional capacitance of crystals, limits of trimmers); null for nothing.</param>
public sealed record StockLine(
    PartClass Class,
    string Type,
    double? ValueSi,
    double Quantity,
    string Lot = "",
    bool MayBeTuned = true,
    IReadOnlyDictionary<string, double>? MeasuredSi = null);

/// <summary>What the club has, and whether it may buy the rest.</summary>
/// <param name="Lines">The drawers.</param>
/// <param name="MayBuy">Whether parts of the usual series may be bought when the drawers lack them.</param>
public sealed record Shelf(IReadOnlyList<StockLine> Lines, bool MayBuy = true)
{
    /// <summary>Empty drawers, everything usual can be bought.</summary>
    public static Shelf EverythingCanBeBought { get; } = new([]);

    /// <summary>Pieces in the drawers of a class, type and value (value equal within 0.1 %).</summary>
    public double Quantity(PartClass @class, string type, double? valueSi) =>
        Lines.Where(l => l.Class == @class && string.Equals(l.Type, type, StringComparison.OrdinalIgnoreCase) && SameValue(l.ValueSi, valueSi)).Sum(l => l.Quantity);

    /// <summary>Tuned-grade lines of a class, with stock.</summary>
    public IEnumerable<StockLine> Tuned(PartClass @class) => Lines.Where(l => l.Class == @class && l.MayBeTuned && l.Quantity > 0);

    private static bool SameValue(double? a, double? b) =>
        (a, b) switch { (null, null) => true, ({ } x, { } y) => Math.Abs(x - y) <= 1e-3 * Math.Abs(y), _ => false };
}
