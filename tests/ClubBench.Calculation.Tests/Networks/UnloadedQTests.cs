using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using CsCheck;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Networks;

public class UnloadedQTests
{
    [Theory]
    [InlineData(0, 14, 150)]
    [InlineData(0.5, 14, 212.132)]
    [InlineData(0.5, 1.75, 75)]
    [InlineData(1, 14, 300)]
    [InlineData(1, 140, 600)]
    [Evidence(typeof(UnloadedQ), EvidenceKind.ClosedFormLimit)]
    public void Of_Exponent_GrowsUpToThePeakAndStays(double exponent, double megahertz, double q) => Assert.Equal(
        q,
        new UnloadedQ(150, Frequency.FromMegahertz(7), exponent, Frequency.FromMegahertz(28)).Of(Frequency.FromMegahertz(megahertz)),
        1e-3);

    [Fact]
    [Evidence(typeof(UnloadedQ), EvidenceKind.ClosedFormLimit)]
    public void Of_ExponentOne_IsASeriesResistanceThatDoesNotChange()
    {
        var model = new UnloadedQ(150, Frequency.FromMegahertz(7), 1, Frequency.FromMegahertz(100));
        foreach (var f in FrequencyRange.FromMegahertz(1, 100).Points(20))
            Assert.Equal(2 * Math.PI * 7e6 / 150, 2 * Math.PI * f.Hertz / model.Of(f), 1e-3);
    }

    [Fact]
    [Evidence(typeof(UnloadedQ), EvidenceKind.Identity)]
    public void Of_StatedAtAnotherFrequency_IsTheSameLaw() =>
        Gen.Select(Gen.Double[20, 400], Gen.Double[0, 1], Gen.Double[1, 30], Gen.Double[1, 100]).Sample((q, exponent, other, mhz) =>
        {
            var peak = Frequency.FromMegahertz(30);
            var stated = new UnloadedQ(q, Frequency.FromMegahertz(7), exponent, peak);
            var again = new UnloadedQ(stated.Of(Frequency.FromMegahertz(other)), Frequency.FromMegahertz(other), exponent, peak);
            return Math.Abs((again.Of(Frequency.FromMegahertz(mhz)) / stated.Of(Frequency.FromMegahertz(mhz))) - 1) < 1e-12;
        });

    [Fact]
    [Evidence(typeof(UnloadedQ), EvidenceKind.RoundTrip)]
    public void Of_TwoFrequenciesBelowThePeak_GiveTheExponentBack() =>
        Gen.Select(Gen.Double[0, 1], Gen.Double[1, 10], Gen.Double[11, 30]).Sample((exponent, low, high) =>
        {
            var law = new UnloadedQ(150, Frequency.FromMegahertz(7), exponent, Frequency.FromMegahertz(30));
            var slope = Math.Log(law.Of(Frequency.FromMegahertz(high)) / law.Of(Frequency.FromMegahertz(low))) / Math.Log(high / low);
            return Math.Abs(slope - exponent) < 1e-10;
        });

    [Fact]
    public void Of_StopBand_HardlyDependsOnTheExponent()
    {
        var (level, rising) = (Model(0), Model(0.5));
        foreach (var f in FrequencyRange.FromMegahertz(14, 30).Points(20))
            Assert.Equal(Loss(level, f), Loss(rising, f), 0.05);

        UnloadedQ Model(double exponent) => new(150, Frequency.FromMegahertz(7), exponent, Frequency.FromMegahertz(15));
        double Loss(UnloadedQ q, Frequency f) => F7.ToLadder().WithQ(q.Of(f), 1000).Loss(f, FiftyOhm, FiftyOhm).Db;
    }

    [Theory]
    [InlineData(0, 0.5)]
    [InlineData(150, 1.5)]
    [InlineData(150, double.NaN)]
    public void Of_OutsideItsRange_Throws(double q, double exponent) => Assert.Throws<ArgumentOutOfRangeException>(() =>
        new UnloadedQ(q, Frequency.FromMegahertz(7), exponent, Frequency.FromMegahertz(28)).Of(Frequency.FromMegahertz(7)));
}
