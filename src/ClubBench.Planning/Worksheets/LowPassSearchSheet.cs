using ClubBench.Calculation.Components;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using static ClubBench.Planning.Worksheets.WorksheetAnswer;

namespace ClubBench.Planning.Worksheets;

/// <summary>Real capacitors and whole turns for a seven-element low-pass; bounded, so that the page answers at once.</summary>
internal static class LowPassSearchSheet
{
    private const int Order = 7;
    private const double Window = 0.12;
    private const long MostCombinations = 20_000;

    public static Worksheet Sheet { get; } = new(
        "low-pass-search", "filters", SourceRef.Derived("every combination within 12 % of the exact values"),
        [
            new("edge", QuantityKind.Frequency, 15.5e6),
            FilterWorksheets.ReturnLoss with { DefaultSi = 26.38 },
            new("index", QuantityKind.InductanceFactor, 3.0e-9),
            new("lowest-frequency", QuantityKind.Frequency, 14.0e6),
            new("highest-frequency", QuantityKind.Frequency, 14.35e6),
            new("wanted-return-loss", QuantityKind.Decibels, 24, 0, 60),
            new("wanted-second", QuantityKind.Decibels, 40, 0, 200),
            new("wanted-third", QuantityKind.Decibels, 60, 0, 200),
            new("pairs-allowed", QuantityKind.Count, 0, 0, 1),
        ],
        v => v["highest-frequency"] < v["lowest-frequency"]
            ? Conflict("worksheet-conflict.upside-down", "lowest-frequency", "highest-frequency")
            : Answer(LowPassSearch.Run(Question(v, FilterWorksheets.Design(v, Order)))));

    private static LowPassSearchInput Question(WorksheetValues v, LowPassDesign exact) => new(
        exact,
        [.. exact.Capacitors.Select(c => LowPassCandidates.Capacitors(c, Values(c), Window, v.IsSet("pairs-allowed"), smallestShare: 0.05))],
        [.. exact.Coils.Select(l => LowPassCandidates.Coils(l, v.Index("index")))],
        new LowPassRequirement(new FrequencyRange(v.Hertz("lowest-frequency"), v.Hertz("highest-frequency")), v.Db("wanted-return-loss"), [new(2, v.Db("wanted-second")), new(3, v.Db("wanted-third"))]))
    {
        Keep = 50, Symmetric = true, MostCombinations = MostCombinations,
    };

    private static IEnumerable<(Capacitance Value, int StockRank)> Values(Capacitance around) =>
        PreferredValues.Between(around.Farad / 30, around.Farad * 1.2, ESeries.E24).Select(f => (Capacitance.FromFarad(f), 0));

    private static Outcome<WorksheetAnswer> Answer(LowPassSearchResult result)
    {
        if (result.Best.IsEmpty) return Conflict("worksheet-conflict.no-part-near", "edge", "index");
        var best = result.Best[0];
        return Judged(
            Phrases.CodeOf(result.Ending),
            [
                .. best.Design.Capacitors.Select(c => Figure.Of("shunt-capacitor", c)),
                .. best.Coils.Select(l => Figure.Of("coil-turns", QuantityKind.Count, l.Turns)),
                Figure.Of("return-loss", best.Figures.WorstReturnLoss),
                Figure.Of("second-harmonic", best.Figures.Harmonics[0].Attenuation),
                Figure.Of("third-harmonic", best.Figures.Harmonics[1].Attenuation),
                Figure.Of("smallest-margin", best.Figures.Margin),
                Figure.Of("combinations-tried", QuantityKind.Count, result.Tried),
            ]);
    }
}
