using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Oscillators;

/// <summary>Temperature coefficient of a type of capacitor, in ppm per kelvin with its spread.</summary>
/// <param name="Type">Code or material.</param>
/// <param name="PpmPerKelvin">Coefficient; all three alike where the spread is not stated.</param>
/// <param name="Source">Where the row comes from.</param>
public sealed record CapacitorTemperature(string Type, Spread<double> PpmPerKelvin, SourceRef Source)
{
    /// <summary>Every row of <c>Tables/capacitor-temperature.csv</c>.</summary>
    public static IReadOnlyList<CapacitorTemperature> All { get; } = CsvTable.Read("capacitor-temperature", r => new CapacitorTemperature(
        r.Text("type"), new(r.Number("low_ppm_per_k"), r.Number("usual_ppm_per_k"), r.Number("high_ppm_per_k")), r.Source()));

    /// <summary>The types that can compensate a coil and the remaining capacitors (ppm/K each), with the share of the total capacitance each needs, the largest share first.</summary>
    public static IReadOnlyList<(CapacitorTemperature Type, double Share)> Compensating(double coilPpmPerKelvin, double remainingPpmPerKelvin) =>
    [
        .. All.Select(t => (Type: t, Share: TemperatureBudget.CompensatingShare(coilPpmPerKelvin, remainingPpmPerKelvin, t.PpmPerKelvin.Usual)))
            .Where(x => x.Share is > 0).Select(x => (x.Type, x.Share!.Value)).OrderByDescending(x => x.Value),
    ];
}
