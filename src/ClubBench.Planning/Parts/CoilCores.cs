using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Parts;

/// <summary>Cores worth trying for a coil in a tuned place: its own, those in the drawer, and the usual sizes of a mix that suits the band.</summary>
public static class CoilCores
{
    /// <summary>Sizes that fit boards of this power (common practice).</summary>
    private static readonly string[] UsualSizes = ["T37", "T50", "T68"];

    /// <summary>Mixes kept in most clubs' drawers (common practice).</summary>
    private static readonly string[] UsualMixes = ["2", "6"];

    /// <summary>Cores for a band, the part's own core first where it suits; at most <paramref name="most"/>.</summary>
    public static IReadOnlyList<ToroidCore> For(Part part, FrequencyRange band, Shelf shelf, int most = 3)
    {
        var suited = Cores.IronPowder.Where(c => c.BestRange.Contains(band.Middle)).ToList();
        var usual = suited.Where(c => UsualSizes.Any(s => c.Designation.StartsWith(s + "-", StringComparison.Ordinal)) && UsualMixes.Contains(c.Mix, StringComparer.Ordinal));
        var stocked = suited.Where(c => shelf.Quantity(PartClass.Winding, c.Designation, null) > 0);
        var own = suited.Where(c => c.Designation == part.Type);
        var smallest = SizeOf(part.Type);
        return [.. own.Concat(stocked).Concat(shelf.MayBuy ? usual : []).Where(c => Math.Abs(Size(c) - smallest) <= 14).DistinctBy(c => c.Designation).Take(most)];
    }

    private static double SizeOf(string designation) => Cores.FindToroid(designation) is { } core ? Size(core) : 50;

    /// <summary>Outer diameter in hundredths of an inch, the number in the designation.</summary>
    private static double Size(ToroidCore core) => core.OuterDiameter.Millimetre / 0.254;
}
