using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
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
    public void Of_Exponent_GrowsUpToThePeakAndStays(double exponent, double megahertz, double q) => Assert.Equal(
        q,
        new UnloadedQ(150, Frequency.FromMegahertz(7), exponent, Frequency.FromMegahertz(28)).Of(Frequency.FromMegahertz(megahertz)),
        1e-3);

    [Fact]
    public void Of_ExponentOne_IsASeriesResistanceThatDoesNotChange()
    {
        var model = new UnloadedQ(150, Frequency.FromMegahertz(7), 1, Frequency.FromMegahertz(100));
        foreach (var f in FrequencyRange.FromMegahertz(1, 100).Points(20))
            Assert.Equal(2 * Math.PI * 7e6 / 150, 2 * Math.PI * f.Hertz / model.Of(f), 1e-3);
    }

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
