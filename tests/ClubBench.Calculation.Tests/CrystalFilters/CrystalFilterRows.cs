using System.Globalization;
using ClubBench.Calculation.CrystalFilters;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.CrystalFilters;

/// <summary>Crystal filters that reference rows describe.</summary>
internal static class CrystalFilterRows
{
    public static CrystalFilterPrototype Prototype(ReferenceRow row) => row["shape"] switch
    {
        "equal" => CrystalFilterPrototype.EqualCapacitor((int)row.Number("crystals")),
        "butterworth" => CrystalFilterPrototype.Butterworth((int)row.Number("crystals")),
        _ => CrystalFilterPrototype.Chebyshev((int)row.Number("crystals"), PassBandRipple.FromRipple(Decibels.FromDb(row.Number("ripple_db")))),
    };

    public static CrystalFilterTask Task(ReferenceRow row) => new(Prototype(row), Crystal(row), Frequency.FromHertz(row.Number("width_hz")));

    public static CrystalFilterDesign Design(ReferenceRow row) =>
        row.Has("corrected") && row["corrected"] == "yes" ? CrystalFilterDesign.Corrected(Task(row)) : CrystalFilterDesign.Of(Task(row));

    public static CrystalFilter Built(ReferenceRow row)
    {
        var filter = Design(row).Filter!;
        return row.Has("off_hz") ? filter.WithResonances([.. Numbers(row["off_hz"]).Select(off => Frequency.FromHertz(row.Number("fs_hz") + off))]) : filter;
    }

    public static CrystalParameters Crystal(ReferenceRow row) => new(
        Frequency.FromHertz(row.Number("fs_hz")),
        Capacitance.FromFarad(row.Number("cm_ff") * 1e-15),
        Capacitance.FromPicofarad(row.Number("c0_pf")),
        Resistance.FromOhm(row.Number("rm_ohm")));

    public static double[] Numbers(string text) => [.. text.Split(' ').Select(t => double.Parse(t, CultureInfo.InvariantCulture))];
}
