using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Emissions;

/// <summary>Reads <c>Tables/emission-limits.csv</c>: one row per rule, rows of one set together.</summary>
internal static class EmissionLimitTable
{
    public static IEnumerable<EmissionLimitSet> Read() =>
        CsvTable.Read("emission-limits", r => (Set: Head(r), Rule: Rule(r)))
            .GroupBy(x => x.Set)
            .Select(g => g.Key with { Rules = [.. g.Select(x => x.Rule)] });

    private static EmissionLimitSet Head(CsvRow r) =>
        new(r.Text("set_id"), r.Text("name"), r.Text("authority"), r.Text("document"), r.Text("edition"), []);

    private static EmissionLimitRule Rule(CsvRow r) => new(
        Frequency.FromMegahertz(r.Number("carrier_min_mhz")),
        Frequency.FromMegahertz(r.Number("carrier_max_mhz")),
        Power.FromWatt(r.Number("power_min_w")),
        r.OptionalNumber("power_max_w") is { } watt ? Power.FromWatt(watt) : null,
        Ratio(r, "attenuation_min_db"),
        Level(r, "emission_max_dbm"),
        Ratio(r, "attenuation_cap_db"),
        Level(r, "emission_floor_dbm"),
        r.Text("power_kind") switch
        {
            "mean" => LimitPower.Mean,
            "peak_envelope" => LimitPower.PeakEnvelope,
            var other => throw r.Fault("power_kind", $"'{other}' is not a kind of power"),
        },
        r.Source());

    private static Decibels? Ratio(CsvRow r, string column) => r.OptionalNumber(column) is { } db ? Decibels.FromDb(db) : null;

    private static PowerLevel? Level(CsvRow r, string column) => r.OptionalNumber(column) is { } dbm ? PowerLevel.FromDbm(dbm) : null;
}
