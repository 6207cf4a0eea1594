using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Broadband;

/// <summary>Relative permeability of a lossy core, mu' - j mu''. Both zero or above. Immutable.</summary>
/// <param name="Inductive">Part that stores: mu'.</param>
/// <param name="Lossy">Part that heats: mu''.</param>
public readonly record struct ComplexPermeability(double Inductive, double Lossy)
{
    /// <summary>Q of the bare material, mu'/mu'': the most a winding can reach; null for a lossless material.</summary>
    public double? Quality => Lossy > 0 ? Inductive / Lossy : null;
}

/// <summary>
/// Complex permeability of ferrite mixes over frequency. Points read off curves may be off by 30 %, so a verdict must survive that much.
/// Method: straight lines between points in log-log. Valid: inside the table only; there is no extrapolation.
/// Source: table ferrite-permeability. Immutable, thread safe.
/// </summary>
public static class FerritePermeability
{
    /// <summary>Relative uncertainty of points read off curves.</summary>
    public const double Uncertainty = 0.30;

    private static readonly ILookup<string, (double Mhz, ComplexPermeability Mu)> ByMix =
        CsvTable.Read("ferrite-permeability", r => (
                Mix: r.Text("mix"), Mhz: r.Number("frequency_mhz"), Mu: new ComplexPermeability(r.Number("mu_real"), r.Number("mu_imaginary"))))
            .ToLookup(r => r.Mix, r => (r.Mhz, r.Mu), StringComparer.Ordinal);

    /// <summary>Frequencies the table covers for a mix; null for a mix without data.</summary>
    public static FrequencyRange? RangeOf(string mix) =>
        ByMix.Contains(mix) ? FrequencyRange.FromMegahertz(ByMix[mix].First().Mhz, ByMix[mix].Last().Mhz) : null;

    /// <summary>Permeability of a mix at a frequency; null for a mix without data or a frequency outside its table.</summary>
    public static ComplexPermeability? At(string mix, Frequency frequency)
    {
        if (RangeOf(mix) is not { } range || !range.Contains(frequency)) return null;
        var points = ByMix[mix].ToArray();
        var upper = Math.Max(1, Array.FindIndex(points, p => p.Mhz >= frequency.Megahertz));
        var (below, above) = (points[upper - 1], points[upper]);
        var share = Math.Log(frequency.Megahertz / below.Mhz) / Math.Log(above.Mhz / below.Mhz);
        return new(
            below.Mu.Inductive * Math.Pow(above.Mu.Inductive / below.Mu.Inductive, share),
            below.Mu.Lossy * Math.Pow(above.Mu.Lossy / below.Mu.Lossy, share));
    }
}
