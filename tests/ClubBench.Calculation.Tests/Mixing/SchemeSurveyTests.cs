using System.Globalization;
using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Mixing;

public class SchemeSurveyTests
{
    [Fact]
    public void Survey_20MetresWith9Megahertz_IsCleanOnBothSidesAndHasNoSum()
    {
        var rows = Survey(14.0, 14.35, 9, 8.9985);

        Assert.Equal([SchemeVerdict.Clean, SchemeVerdict.Clean, SchemeVerdict.Refused], rows.Select(r => r.Verdict));
        Assert.Equal(5.0, rows.Single(r => r.Scheme.Side == InjectionSide.LowSide).Oscillator!.Value.Low.Megahertz, 1e-9);
        Assert.Equal((InjectionSide.SumToIntermediate, SchemeVerdict.Refused), (rows[^1].Scheme.Side, rows[^1].Verdict));
        Assert.Null(rows[^1].Image);
    }

    [Theory]
    [Evidence(typeof(SchemeSurvey), EvidenceKind.ClosedFormLimit)]
    [InlineData(21.0, 21.45, 10.7, InjectionSide.LowSide, SchemeVerdict.Refused)]
    [InlineData(18.068, 18.168, 9, InjectionSide.LowSide, SchemeVerdict.Blemished)]
    [InlineData(3.5, 3.8, 9, InjectionSide.SumToIntermediate, SchemeVerdict.Blemished)]
    [InlineData(7.0, 7.2, 9, InjectionSide.LowSide, SchemeVerdict.Refused)]
    public void Survey_KnownFault_IsJudged(double low, double high, double mid, InjectionSide side, SchemeVerdict verdict) =>
        Assert.Equal(verdict, Survey(low, high, mid, null).Single(r => r.Scheme.Side == side).Verdict);

    [Fact]
    public void Survey_BeatOscillatorWhistles_CountOnlyWhereItIsTold()
    {
        var (silent, told) = (High(Survey(14.0, 14.35, 4.7, null)), High(Survey(14.0, 14.35, 4.7, 4.6985)));

        Assert.Empty(silent.Whistles);
        Assert.Contains(told.Whistles, b => (b.OscillatorOrder, b.OtherOrder) == (0, 3));

        static SchemeRow High(IReadOnlyList<SchemeRow> rows) => rows.Single(r => r.Scheme.Side == InjectionSide.HighSide);
    }

    [Fact]
    [Evidence(typeof(StockProducts), EvidenceKind.ClosedFormLimit)]
    public void StockProducts_20Metres_AreTheMultiplesSumsAndDifferencesThatLandThere()
    {
        var found = StockProducts.In(FrequencyRange.FromMegahertz(14.0, 14.35), PremixTests.Megahertz("3.58 4 7.03 10 18"), 4);

        Assert.Equal(
            ["4 + 10", "18 - 4", "2 x 7.03", "4 x 3.58"],
            found.Where(p => p.Order <= 2 || p.Second is null).OrderBy(p => p.Order).ThenBy(p => p.Second is null).ThenBy(p => p.First).Select(Text));
        Assert.All(found, p => Assert.Equal((p.FirstMultiple * p.First.Hertz) + (p.SecondMultiple * (p.Second?.Hertz ?? 0)), p.Product.Hertz, 1e-6));
        Assert.All(found, p => Assert.InRange(p.Order, 1, 4));
    }

    [Fact]
    public void StockProducts_NothingLandsThere_AreNone() =>
        Assert.Empty(StockProducts.In(FrequencyRange.FromMegahertz(14.0, 14.35), PremixTests.Megahertz("9"), 7));

    private static string Text(StockProduct p) => p.Second is { } b
        ? string.Create(CultureInfo.InvariantCulture, $"{p.First.Megahertz:0.##} {(p.SecondMultiple > 0 ? "+" : "-")} {b.Megahertz:0.##}")
        : string.Create(CultureInfo.InvariantCulture, $"{p.FirstMultiple} x {p.First.Megahertz:0.##}");

    private static IReadOnlyList<SchemeRow> Survey(double low, double high, double mid, double? beat) =>
        SchemeSurvey.Of(FrequencyRange.FromMegahertz(low, high), Frequency.FromMegahertz(mid), beat is { } b ? Frequency.FromMegahertz(b) : null);
}
