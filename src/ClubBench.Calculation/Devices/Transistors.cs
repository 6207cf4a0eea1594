using System.Collections.Immutable;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Devices;

/// <summary>Transistor types from <c>Tables/transistors.csv</c>. Immutable, thread safe.</summary>
public static class Transistors
{
    private static readonly Dictionary<string, Transistor> ByType =
        CsvTable.Read("transistors", Row).ToDictionary(t => t.Type, StringComparer.OrdinalIgnoreCase);

    /// <summary>Every type, sorted.</summary>
    public static IReadOnlyList<Transistor> All { get; } = [.. ByType.Values.OrderBy(t => t.Type, StringComparer.Ordinal)];

    /// <summary>The type with this number, any case; a gain group behind a hyphen (BD139-16) falls back to the bare type. Null where unknown.</summary>
    public static Transistor? Find(string type)
    {
        var trimmed = type.Trim();
        if (ByType.TryGetValue(trimmed, out var found)) return found;
        var hyphen = trimmed.LastIndexOf('-');
        return hyphen > 0 ? ByType.GetValueOrDefault(trimmed[..hyphen]) : null;
    }

    private static Transistor Row(CsvRow r) => new(
        r.Text("type"),
        r.Text("kind") switch
        {
            "bipolar" => TransistorKind.Bipolar,
            "mosfet" => TransistorKind.Mosfet,
            "jfet" => TransistorKind.Jfet,
            var other => throw r.Fault("kind", $"'{other}' is not a kind of transistor"),
        },
        Polarity(r),
        Optional(r, "max_voltage_v", Voltage.FromVolt),
        Optional(r, "max_current_a", Current.FromAmpere),
        Optional(r, "max_power_w", Power.FromWatt),
        r.Text("max_power_condition"),
        Optional(r, "ft_min_mhz", Frequency.FromMegahertz),
        Optional(r, "ft_typ_mhz", Frequency.FromMegahertz),
        r.Text("ft_condition"),
        r.OptionalNumber("hfe_min"),
        r.OptionalNumber("hfe_max"),
        Capacitor(r, "c_out"),
        Capacitor(r, "c_feedback"),
        Capacitor(r, "c_in"),
        r.OptionalNumber("gate_charge_max_nc") * 1e-9,
        Optional(r, "rth_jc_k_per_w", ThermalResistance.FromKelvinPerWatt),
        Optional(r, "rth_ja_k_per_w", ThermalResistance.FromKelvinPerWatt),
        Optional(r, "tj_max_c", Temperature.FromCelsius),
        r.Text("package"),
        [.. r.Text("fields_from_memory").Split(' ', StringSplitOptions.RemoveEmptyEntries)],
        r.Source(),
        r.Text("note"));

    private static TransistorPolarity Polarity(CsvRow r) => r.Text("polarity") switch
    {
        "npn" => TransistorPolarity.Npn,
        "pnp" => TransistorPolarity.Pnp,
        "n_enhancement" => TransistorPolarity.NChannelEnhancement,
        "n_depletion" => TransistorPolarity.NChannelDepletion,
        var other => throw r.Fault("polarity", $"'{other}' is not a polarity"),
    };

    private static T? Optional<T>(CsvRow r, string column, Func<double, T> quantity)
        where T : struct => r.OptionalNumber(column) is { } value ? quantity(value) : null;

    private static SheetCapacitance? Capacitor(CsvRow r, string stem) =>
        r.OptionalNumber(stem + "_pf") is { } value ? new SheetCapacitance(Capacitance.FromPicofarad(value), r.Text(stem + "_kind")) : null;
}
