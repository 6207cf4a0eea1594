using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Windings;

/// <summary>All cores of <c>iron-powder-cores.csv</c> and <c>ferrite-cores.csv</c>. Immutable, thread safe.</summary>
public static class Cores
{
    /// <summary>Iron-powder rings, sorted by designation.</summary>
    public static IReadOnlyList<IronPowderCore> IronPowder { get; } = CsvTable.Read("iron-powder-cores", IronPowderRow);

    /// <summary>Ferrite rings and blocks, sorted by designation.</summary>
    public static IReadOnlyList<Core> Ferrite { get; } = CsvTable.Read("ferrite-cores", FerriteRow);

    /// <summary>Every ring, iron powder first.</summary>
    public static IReadOnlyList<ToroidCore> Toroids { get; } = [.. IronPowder, .. Ferrite.OfType<ToroidCore>()];

    private static readonly Dictionary<string, Core> ByDesignation =
        IronPowder.Concat(Ferrite).ToDictionary(c => c.Designation, StringComparer.OrdinalIgnoreCase);

    /// <summary>The core with this designation in any case, blanks ignored; null where the lists have none.</summary>
    public static Core? Find(string designation) =>
        ByDesignation.GetValueOrDefault(designation.Replace(" ", "", StringComparison.Ordinal));

    /// <summary>The ring with this designation, or null.</summary>
    public static ToroidCore? FindToroid(string designation) => Find(designation) as ToroidCore;

    private static IronPowderCore IronPowderRow(CsvRow r) => new()
    {
        Designation = r.Text("designation"),
        Mix = r.Text("mix"),
        Colour = r.Text("colour"),
        InitialPermeability = r.Number("initial_permeability"),
        OuterDiameter = Millimetre(r, "outer_diameter_mm"),
        InnerDiameter = Millimetre(r, "inner_diameter_mm"),
        Height = Millimetre(r, "height_mm"),
        EffectiveArea = Area.FromSquareCentimetre(r.Number("area_cm2")),
        PathLength = Length.FromCentimetre(r.Number("path_cm")),
        InductanceFactor = Index(r),
        InductanceFactorTolerance = r.Number("al_tolerance_percent") / 100,
        BestRange = Range(r, "best_low_mhz", "best_high_mhz"),
        UsableRange = Range(r, "best_low_mhz", "usable_high_mhz"),
        TemperatureCoefficientPpmPerKelvin = r.Number("temperature_coefficient_ppm_per_k"),
        Source = r.Source(),
        Note = r.Text("note"),
    };

    private static Core FerriteRow(CsvRow r) => r.Text("shape") switch
    {
        "toroid" => FerriteToroidRow(r),
        "binocular" => BinocularRow(r),
        var other => throw r.Fault("shape", $"'{other}' is not a shape"),
    };

    private static FerriteCore FerriteToroidRow(CsvRow r) => new()
    {
        Designation = r.Text("designation"),
        Mix = r.Text("mix"),
        InitialPermeability = r.Number("initial_permeability"),
        OuterDiameter = Millimetre(r, "outer_diameter_or_width_mm"),
        InnerDiameter = Millimetre(r, "inner_or_hole_diameter_mm"),
        Height = Millimetre(r, "length_mm"),
        EffectiveArea = Area.FromSquareCentimetre(r.Number("area_cm2")),
        PathLength = Length.FromCentimetre(r.Number("path_cm")),
        InductanceFactor = Index(r),
        InductanceFactorTolerance = r.Number("al_tolerance_percent") / 100,
        OtherListInductanceFactor = OtherIndex(r),
        BestRange = Range(r, "tuned_low_mhz", "tuned_high_mhz"),
        UsableRange = Range(r, "wideband_low_mhz", "wideband_high_mhz"),
        MakerPart = r.Text("maker_part"),
        Source = r.Source(),
        Note = r.Text("note"),
    };

    private static BinocularCore BinocularRow(CsvRow r) => new()
    {
        Designation = r.Text("designation"),
        Mix = r.Text("mix"),
        InitialPermeability = r.Number("initial_permeability"),
        Width = Millimetre(r, "outer_diameter_or_width_mm"),
        HoleDiameter = Millimetre(r, "inner_or_hole_diameter_mm"),
        HoleLength = Millimetre(r, "length_mm"),
        Height = Millimetre(r, "binocular_height_mm"),
        InductanceFactor = Index(r),
        InductanceFactorTolerance = r.Number("al_tolerance_percent") / 100,
        OtherListInductanceFactor = OtherIndex(r),
        BestRange = Range(r, "tuned_low_mhz", "tuned_high_mhz"),
        UsableRange = Range(r, "wideband_low_mhz", "wideband_high_mhz"),
        Source = r.Source(),
        Note = r.Text("note"),
    };

    private static Length Millimetre(CsvRow r, string column) => Length.FromMillimetre(r.Number(column));

    private static FrequencyRange Range(CsvRow r, string low, string high) => FrequencyRange.FromMegahertz(r.Number(low), r.Number(high));

    private static InductanceFactor Index(CsvRow r) => InductanceFactor.FromNanohenryPerTurnSquared(r.Number("al_nh_per_turn2"));

    private static InductanceFactor? OtherIndex(CsvRow r) =>
        r.OptionalNumber("al_other_list_nh_per_turn2") is { } nh ? InductanceFactor.FromNanohenryPerTurnSquared(nh) : null;
}
