using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Crystals;

public class TypicalCrystalsTests
{
    private static readonly Capacitance Load = Capacitance.FromPicofarad(30);

    public static TheoryData<double> Frequencies => [1.9, 2.6, 3.6, 5.35, 7.1, 10.12, 14.2, 18.1, 21.2, 28.5];

    [Fact]
    [Evidence(typeof(TypicalCrystal), EvidenceKind.RoundTrip)]
    public void Marked_EveryRow_ComesBackAtItsLoad() => Assert.All(TypicalCrystals.All, c =>
        Assert.Equal(7.03e6, c.Marked(Frequency.FromMegahertz(7.03), Load).LoadedFrequency(Load).Hertz, 1e-6));

    [Fact]
    [Evidence(typeof(TypicalCrystal), EvidenceKind.ClosedFormLimit)]
    public void Marked_ForAHugeLoad_IsItsSeriesResonance() => Assert.All(TypicalCrystals.All, c =>
        Assert.Equal(7.03e6, c.Marked(Frequency.FromMegahertz(7.03), Capacitance.FromMicrofarad(1000)).SeriesResonance.Hertz, 1e-3));

    [Fact]
    [Evidence(typeof(TypicalCrystal), EvidenceKind.Identity)]
    public void Marked_OnAnotherFrequency_KeepsTheElementsAndThePull() => Assert.All(TypicalCrystals.All, c =>
    {
        var (low, high) = (c.Marked(Frequency.FromMegahertz(7), Load), c.Marked(Frequency.FromMegahertz(21), Load));
        Assert.Equal(3, high.SeriesResonance / low.SeriesResonance, 1e-12);
        Assert.Equal((low.MotionalCapacitance, low.StaticCapacitance, low.MotionalResistance), (high.MotionalCapacitance, high.StaticCapacitance, high.MotionalResistance));
        Assert.Equal((c.MotionalCapacitance.Usual, c.Overtone), (high.MotionalCapacitance, high.Overtone));
    });

    [Fact]
    [Evidence(typeof(TypicalCrystals), EvidenceKind.ClosedFormLimit)]
    public void Nearest_FrequencyOfARow_IsThatRow() =>
        Assert.All(TypicalCrystals.All, c => Assert.Equal(c, TypicalCrystals.Nearest(c.Frequency, c.Holder, c.Overtone)));

    [Theory]
    [Evidence(typeof(TypicalCrystals), EvidenceKind.IndependentRecomputation)]
    [MemberData(nameof(Frequencies))]
    public void Nearest_OneRowAfterAnother_NoneIsCloserByRatio(double mhz)
    {
        double Ratio(TypicalCrystal c) => Math.Max(c.Frequency.Megahertz / mhz, mhz / c.Frequency.Megahertz);
        var best = TypicalCrystals.All.Where(c => c is { Holder: "HC-49/U", Overtone: 1 }).Aggregate((a, b) => Ratio(b) < Ratio(a) ? b : a);

        Assert.Equal(best, TypicalCrystals.Nearest(Frequency.FromMegahertz(mhz)));
    }

    [Fact]
    [Evidence(typeof(TypicalCrystals), EvidenceKind.Identity)]
    public void Nearest_RisingFrequency_NeverStepsBack() => Gen.Select(Gen.Double[1.8, 30], Gen.Double[1.8, 30]).Sample((a, b) =>
        Assert.True(Row(Math.Min(a, b)).Frequency <= Row(Math.Max(a, b)).Frequency));

    private static TypicalCrystal Row(double mhz) => TypicalCrystals.Nearest(Frequency.FromMegahertz(mhz))!;
}
