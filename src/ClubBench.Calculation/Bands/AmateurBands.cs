using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Bands;

/// <summary>
/// Amateur bands from 160 m to 6 m with their segments and centres of activity, from <c>Tables/amateur-bands.csv</c>. Immutable, thread safe.
/// No row is a permission: show that the national table and the licence come first. Source: itu-rr-article5 and the IARU plans, row by row.
/// </summary>
public static class AmateurBands
{
    /// <summary>Every row, in table order: band, region, use, lower edge.</summary>
    public static IReadOnlyList<BandSegment> All { get; } = CsvTable.Read("amateur-bands", Row);

    /// <summary>Band names from the longest wave to the shortest.</summary>
    public static IReadOnlyList<string> Names { get; } = [.. All.Select(s => s.Band).Distinct(StringComparer.Ordinal)];

    /// <summary>Rows of a band in a region; empty for an unknown band.</summary>
    public static IEnumerable<BandSegment> Segments(string band, ItuRegion region) => All.Where(s => s.Band == band && s.Region == region);

    /// <summary>The band in a region as one allocation (primary and secondary parts, without national extras), or null for an unknown band.</summary>
    public static BandAllocation? Allocation(string band, ItuRegion region)
    {
        var parts = Segments(band, region).Where(s => s.Use is BandUse.Primary or BandUse.Secondary).OrderBy(s => s.Range.Low).ToList();
        return parts.Count == 0 ? null : new BandAllocation(band, region, new FrequencyRange(parts[0].Range.Low, parts.Max(p => p.Range.High)), parts);
    }

    /// <summary>The band whose allocation in the region holds a frequency, or null.</summary>
    public static BandAllocation? Containing(Frequency frequency, ItuRegion region) =>
        Names.Select(n => Allocation(n, region)).FirstOrDefault(a => a is not null && a.Parts.Any(p => p.Range.Contains(frequency)));

    /// <summary>Telegraphy segment of a band in a region, or null where the table has none. Common practice, not law in most countries.</summary>
    public static BandSegment? CwSegment(string band, ItuRegion region) => Segments(band, region).FirstOrDefault(s => s.Use == BandUse.CwSegment);

    /// <summary>Low-power telegraphy centres of a band in a region, lowest first; empty where there are none.</summary>
    public static IReadOnlyList<BandSegment> QrpCwCentres(string band, ItuRegion region) =>
        [.. Segments(band, region).Where(s => s.Use == BandUse.QrpCwCentre).OrderBy(s => s.Range.Low)];

    /// <summary>Low-power telephony centre of a band in a region, or null.</summary>
    public static BandSegment? QrpSsbCentre(string band, ItuRegion region) =>
        Segments(band, region).FirstOrDefault(s => s.Use == BandUse.QrpSsbCentre);

    private static BandSegment Row(CsvRow r) => new(
        r.Text("band"),
        r.Number("region") switch { 1 => ItuRegion.Region1, 2 => ItuRegion.Region2, 3 => ItuRegion.Region3, _ => throw r.Fault("region", "a region is 1, 2 or 3") },
        Use(r),
        new FrequencyRange(Frequency.FromHertz(r.Number("lower_hz")), Frequency.FromHertz(r.Number("upper_hz"))),
        r.Source(),
        r.Text("note"));

    private static BandUse Use(CsvRow r) => r.Text("use") switch
    {
        "primary" => BandUse.Primary,
        "secondary" => BandUse.Secondary,
        "national" => BandUse.National,
        "cw_segment" => BandUse.CwSegment,
        "qrp_cw_centre" => BandUse.QrpCwCentre,
        "qrp_ssb_centre" => BandUse.QrpSsbCentre,
        "cw_calling" => BandUse.CwCalling,
        var other => throw r.Fault("use", $"'{other}' is not a use"),
    };
}
