using ClubBench.Calculation.Components;
using ClubBench.Calculation.Tables;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Worksheets;

/// <summary>One value out of one or two standard parts.</summary>
internal static class PartPairSheets
{
    // Beyond a ratio of a hundred the second part does less than the tolerance of the first.
    private const double MostRatio = 100;

    /// <summary>Two capacitors: side by side they add, in a row they combine harmonically.</summary>
    public static Worksheet Capacitors { get; } = Sheet(
        "capacitor-pair", new("wanted-capacitance", QuantityKind.Capacitance, 360e-12), new("capacitors-in-series", QuantityKind.Count, 0, 0, 1), members: 12, PairKind.Harmonic);

    /// <summary>Two resistors: in a row they add, side by side they combine harmonically.</summary>
    public static Worksheet Resistors { get; } = Sheet(
        "resistor-pair", new("wanted", QuantityKind.Resistance, 523), new("resistors-in-series", QuantityKind.Count, 1, 0, 1), members: 24, PairKind.Sum);

    private static Worksheet Sheet(string id, WorksheetInput wanted, WorksheetInput inSeries, int members, PairKind lawInSeries) => new(
        id, "parts", SourceRef.CommonPractice("every pair of the series tried"),
        [wanted, inSeries, new("members-per-decade", QuantityKind.Count, members, 3, 24), new("part-tolerance", QuantityKind.Ratio, 0.05, 0, 0.5)],
        v =>
        {
            if (SeriesOf(v.Whole("members-per-decade")) is not { } series) return WorksheetAnswer.Conflict("worksheet-conflict.no-such-series", "members-per-decade");
            var law = v.IsSet(inSeries.Name) ? lawInSeries : lawInSeries == PairKind.Sum ? PairKind.Harmonic : PairKind.Sum;
            var best = PartPairs.For(v[wanted.Name], new(Parts(v[wanted.Name], law, series), law), count: 1)[0];
            return WorksheetAnswer.Of([.. Figures(best, wanted.Kind, v["part-tolerance"])]);
        });

    private static ESeries? SeriesOf(int members) =>
        Enum.GetValues<ESeries>().Cast<ESeries?>().FirstOrDefault(s => PreferredValues.Mantissas(s!.Value).Count == members);

    private static IReadOnlyList<double> Parts(double wanted, PairKind law, ESeries series) => law == PairKind.Sum
        ? PreferredValues.Between(wanted / MostRatio, wanted * 1.2, series)
        : PreferredValues.Between(wanted / 1.2, wanted * MostRatio, series);

    private static IEnumerable<Figure> Figures(PartPair pair, QuantityKind kind, double partTolerance)
    {
        yield return Figure.Of("first-part", kind, pair.Larger);
        if (pair.Smaller is { } smaller) yield return Figure.Of("second-part", kind, smaller);
        yield return Figure.Of("pair-value", kind, pair.Value);
        yield return Figure.Of("error", QuantityKind.Ratio, pair.Error);
        yield return Figure.Of("pair-tolerance", QuantityKind.Ratio, pair.Tolerance(partTolerance, partTolerance).WorstCase);
    }
}
