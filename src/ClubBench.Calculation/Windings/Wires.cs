using System.Globalization;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Windings;

/// <summary>All wire sizes of <c>wire.csv</c>. Immutable, thread safe.</summary>
public static class Wires
{
    // One step of the R20 series of preferred diameters either way; 0.50 to 0.56 mm is 12 % but for the last bit.
    private const double SubstitutionWindow = 0.12 + 1e-9;

    /// <summary>Every listed size, by system and size.</summary>
    public static IReadOnlyList<Wire> All { get; } = CsvTable.Read("wire", Row);

    /// <summary>Metric sizes, thin to thick.</summary>
    public static IReadOnlyList<Wire> Metric { get; } = [.. All.Where(w => w.System == WireSystem.Metric).OrderBy(w => w.Bare)];

    /// <summary>The listed wire of a gauge or metric size ("26", "0.400"), or null.</summary>
    public static Wire? Find(WireSystem system, string size) => All.FirstOrDefault(w => w.System == system && w.Size == size.Trim());

    /// <summary>The listed wire of an American or British gauge, or null. A bare gauge number without a system does not name a wire.</summary>
    public static Wire? Find(WireSystem system, int gauge) => Find(system, gauge.ToString(CultureInfo.InvariantCulture));

    /// <summary>The listed metric wire of this bare diameter in millimetre, or null.</summary>
    public static Wire? FindMetric(double bareMillimetre) => Metric.FirstOrDefault(w => Math.Abs(w.Bare.Millimetre - bareMillimetre) < 5e-4);

    /// <summary>
    /// The wire of the drawer nearest in bare diameter within 12 %, or null. Inductance stays; how many turns fit does not.
    /// Source: common practice (one step of the R20 series).
    /// </summary>
    public static Wire? Substitute(Wire wanted, IEnumerable<Wire> drawer) =>
        drawer.Where(w => Math.Abs((w.Bare / wanted.Bare) - 1) <= SubstitutionWindow).MinBy(w => Math.Abs(Math.Log(w.Bare / wanted.Bare)));

    private static Wire Row(CsvRow r) => new(SystemOf(r), r.Text("size"), Length.FromMillimetre(r.Number("bare_mm")), r.Source())
    {
        ListedGrade1 = Optional(r, "overall_grade1_mm"),
        ListedGrade2 = Optional(r, "overall_grade2_mm"),
    };

    private static WireSystem SystemOf(CsvRow r) => r.Text("system") switch
    {
        "metric" => WireSystem.Metric,
        "AWG" => WireSystem.Awg,
        "SWG" => WireSystem.Swg,
        var other => throw r.Fault("system", $"'{other}' is not a system of wire sizes"),
    };

    private static Length? Optional(CsvRow r, string column) =>
        r.OptionalNumber(column) is { } mm ? Length.FromMillimetre(mm) : null;
}
