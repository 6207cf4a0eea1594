using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Advising;

/// <summary>Figures every advice text may use.</summary>
internal static class ReadingFigures
{
    public static IReadOnlyList<Figure> Of(ExpectedReading expected, CorrectedReading reading) =>
    [
        new Figure("read", expected.Kind, reading.RawSi, From: Provenance.Measured),
        new Figure("value", expected.Kind, reading.Si, reading.ExpandedUncertaintySi, Provenance.Measured),
        Figure.Of("expected", expected.Kind, expected.Nominal),
        Figure.Of("low", expected.Kind, expected.LowSi),
        Figure.Of("high", expected.Kind, expected.HighSi),
        Figure.Of("off", QuantityKind.Ratio, expected.Nominal == 0 ? 0 : (reading.Si / expected.Nominal) - 1),
    ];
}
