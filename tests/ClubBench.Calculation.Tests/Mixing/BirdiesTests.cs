using System.Globalization;
using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Mixing;

public class BirdiesTests
{
    public static TheoryData<ReferenceRow> Free => ReferenceTable.Theory("birdie-free");

    public static TheoryData<ReferenceRow> Followed => ReferenceTable.Theory("birdies-followed");

    public static TheoryData<ReferenceRow> BirdieRows => ReferenceTable.Theory("birdies");

    [Theory]
    [MemberData(nameof(Free))]
    public void Birdies_ReferenceRowWithoutAny_AreNone(ReferenceRow row)
    {
        var (scheme, band) = (Scheme(Enum.Parse<InjectionSide>(row["side"]), row.Number("if_mhz")), Band(row.Number("low_mhz"), row.Number("high_mhz")));
        var order = (int)row.Number("order");

        var found = row["kind"] == "signal" ? Birdies.WithSignal(scheme, band, order) : Birdies.Internal(scheme, band, Frequency.FromMegahertz(row.Number("beat_mhz")), order);

        Assert.DoesNotContain(found, b => b.IsInside);
    }

    [Theory]
    [Evidence(typeof(Birdies), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(BirdieRows))]
    public void Birdies_ReferenceRow_AreFound(ReferenceRow row)
    {
        var (scheme, band) = (Scheme(Enum.Parse<InjectionSide>(row["side"]), row.Number("if_mhz")), Band(row.Number("low_mhz"), row.Number("high_mhz")));

        var found = row["kind"] == "signal" ? Birdies.WithSignal(scheme, band) : Birdies.Internal(scheme, band, Frequency.FromMegahertz(row.Number("beat_mhz")));

        Assert.Contains(found, b => Math.Abs(b.Signal.Hertz - (row.Number("expected_mhz") * 1e6)) < row.Number("tolerance_hz")
            && (b.OscillatorOrder, b.OtherOrder, b.IsInside) == ((int)row.Number("oscillator_order"), (int)row.Number("other_order"), row["inside"] == "yes"));
    }

    [Theory]
    [Evidence(typeof(Birdies), EvidenceKind.IndependentRecomputation)]
    [MemberData(nameof(Followed))]
    public void WithSignal_ProductsFollowedAcrossTheBand_AreAllFoundAndNoOthers(ReferenceRow row)
    {
        var found = Find(Enum.Parse<InjectionSide>(row["side"]), row.Number("if_mhz"), row.Number("low_mhz"), row.Number("high_mhz")).Where(b => b.IsInside).ToList();
        var expected = row["expected"].Split(' ', StringSplitOptions.RemoveEmptyEntries).Select(Triple).ToList();

        Assert.Equal(expected.Count, found.Count);
        Assert.All(expected, e => Assert.Contains(found, b => Math.Abs(b.Signal.Hertz - e[0]) <= row.Number("tolerance_hz") && (b.OscillatorOrder, b.OtherOrder) == ((int)e[1], (int)e[2])));
    }

    [Fact]
    [Evidence(typeof(Birdies), EvidenceKind.Identity)]
    public void WithSignal_AnyScheme_CrossesWhereTheProductIsTheIntermediate() => Gen.Select(Gen.Double[3, 29], Gen.Double[0.455, 11], Gen.Int[2, 4]).Sample((low, mid, side) =>
    {
        var scheme = Scheme((InjectionSide)side, mid);
        return Birdies.WithSignal(scheme, Band(low, low + 0.3)).All(b => scheme.OscillatorFor(b.Signal) is not { } lo
            || new[] { 1, -1 }.Any(n => Math.Abs(Math.Abs((b.OscillatorOrder * lo.Hertz) + (n * b.OtherOrder * b.Signal.Hertz)) - (mid * 1e6)) < 1));
    });

    [Fact]
    public void WithSignal_KeptCrystalsOf80MetreSetOn40Metres_WhistlesAtTheEdge() =>
        Assert.Contains(Find(InjectionSide.LowSide, 5.9991, 7.0, 7.08), b => b.OscillatorOrder == 6 && b.OtherOrder == 0 && Math.Abs(b.Signal.Megahertz - 6.99895) < 1e-5);

    [Fact]
    public void WithSignal_DirectConversion_IsEmpty() =>
        Assert.Empty(Birdies.WithSignal(FrequencyScheme.DirectConversion, Band(7.0, 7.2)));

    private static double[] Triple(string text) => [.. text.Split(':').Select(t => double.Parse(t, CultureInfo.InvariantCulture))];

    private static IReadOnlyList<Birdie> Find(InjectionSide side, double mid, double low, double high) =>
        Birdies.WithSignal(Scheme(side, mid), Band(low, high));

    private static FrequencyScheme Scheme(InjectionSide side, double mid) => new(side, Frequency.FromMegahertz(mid));

    private static FrequencyRange Band(double low, double high) => FrequencyRange.FromMegahertz(low, high);
}
