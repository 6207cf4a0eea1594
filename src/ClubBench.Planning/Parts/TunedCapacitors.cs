using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Parts;

/// <summary>Capacitor values that may go into a tuned place: what lies in the drawer in low-loss grade, and what can be bought.</summary>
public static class TunedCapacitors
{
    /// <summary>Values with their stock rank: 0 in the drawer, 1 to be bought in E12, 2 in E24. Between 1 pF and 10 nF.</summary>
    /// <param name="shelf">Drawers.</param>
    /// <param name="forPairs">For pairs only E12 is offered beside the drawer: a pair of rare values helps nobody.</param>
    public static IReadOnlyList<(Capacitance Value, int StockRank)> Values(Shelf shelf, bool forPairs)
    {
        var stocked = shelf.Tuned(PartClass.Capacitor).Where(l => l.ValueSi is not null).Select(l => (Value: Capacitance.FromFarad(l.ValueSi!.Value), StockRank: 0));
        IEnumerable<(Capacitance Value, int StockRank)> bought = shelf.MayBuy
            ? [.. Series(ESeries.E12, 1), .. forPairs ? [] : Series(ESeries.E24, 2)]
            : [];
        return [.. stocked.Concat(bought).GroupBy(v => Math.Round(v.Value.Picofarad, 3)).Select(g => g.MinBy(v => v.StockRank)).OrderBy(v => v.Value)];
    }

    private static IEnumerable<(Capacitance Value, int StockRank)> Series(ESeries series, int rank) =>
        from decade in new[] { 0.1, 1, 10, 100 }
        from mantissa in PreferredValues.Mantissas(series)
        select (Capacitance.FromPicofarad(mantissa * decade), rank);
}
