using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Windings;

/// <summary>An unloaded Q with the range it may have. Compute loss and bandwidth with all three. Immutable.</summary>
/// <param name="Typical">Planning value.</param>
/// <param name="Spread">The real value lies between typical divided by and multiplied by this; 1 for a measured one.</param>
/// <param name="Source">Where the planning value comes from.</param>
public sealed record CoilQ(double Typical, double Spread, SourceRef Source)
{
    /// <summary>Lower end of the range.</summary>
    public double Low => Typical / Spread;

    /// <summary>Upper end of the range.</summary>
    public double High => Typical * Spread;
}

/// <summary>
/// Unloaded Q of coils. The copper resistance of the straight wire is no guide: proximity and core loss take most of it, so the estimate is a
/// planning value by size with an honest range, to be replaced by a measured one.
/// </summary>
public static class CoilQuality
{
    private const double EstimateSpread = 1.4;
    private const double PerOctaveOutside = 0.7;
    private const double PoorWinding = 0.8;
    private const double PoorShare = 0.4;

    private static readonly Dictionary<string, (double Q, SourceRef Source)> BySize =
        CsvTable.Read("toroid-q", r => (Size: r.Text("size"), Q: r.Number("unloaded_q"), Source: r.Source()))
            .ToDictionary(r => r.Size, r => (r.Q, r.Source), StringComparer.Ordinal);

    /// <summary>
    /// Estimate for an iron-powder winding: value of its size, 0.7 for each octave outside the best range of the mix, 0.8 where it fills less than
    /// 40 % of the ring or the wire is thinner than 40 % of the thickest that fits. Null for a core without a listed value.
    /// Valid: within a factor of 1.4 either way. Source: table toroid-q, from memory; the reductions are common practice.
    /// </summary>
    public static CoilQ? Estimate(ToroidWinding winding, Frequency frequency)
    {
        if (!BySize.TryGetValue(winding.Core.Designation.Split('-')[0], out var size)) return null;
        var outside = Math.Pow(PerOctaveOutside, OctavesOutside(winding.Core.BestRange, frequency));
        return new(size.Q * outside * (IsPoorlyWound(winding) ? PoorWinding : 1), EstimateSpread, size.Source);
    }

    /// <summary>Q that the copper alone would give: w L/R of the isolated wire, without slack and tails. An upper bound. Source: iec-60287-1-1.</summary>
    public static double CopperOnly(ToroidWinding winding, Frequency frequency) =>
        frequency.RadiansPerSecond * winding.Inductance.Henry
        / Copper.AlternatingCurrent(winding.Turns * winding.LengthPerTurn, winding.Wire.Bare, frequency).Ohm;

    /// <summary>Both losses together: 1/Q = 1/Q1 + 1/Q2.</summary>
    public static double Combined(double first, double second) =>
        1 / ((1 / Guard.Positive(first, nameof(first))) + (1 / Guard.Positive(second, nameof(second))));

    private static double OctavesOutside(FrequencyRange best, Frequency f) =>
        f < best.Low ? Math.Log2(best.Low / f) : f > best.High ? Math.Log2(f / best.High) : 0;

    private static bool IsPoorlyWound(ToroidWinding winding) =>
        winding.Fill is null or < PoorShare
        || (ToroidWinding.LargestWire(winding.Core, winding.Turns) is { } largest && winding.Wire.Bare < PoorShare * largest.Bare);
}
