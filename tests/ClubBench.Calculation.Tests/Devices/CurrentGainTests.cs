using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Devices;

public class CurrentGainTests
{
    [Theory]
    [InlineData(100, 300, 7, 39.392)]
    [InlineData(100, 300, 14, 20.953)]
    [InlineData(100, 300, 28, 10.653)]
    [InlineData(50, 150, 28, 5.327)]
    public void At_Frequency_MatchesPublishedFigures(double gain, double transitionMegahertz, double megahertz, double expected) =>
        Assert.Equal(expected, Gain(gain, transitionMegahertz).At(Frequency.FromMegahertz(megahertz)), 1e-3);

    [Theory]
    [InlineData(3.5, 4.36)]
    [InlineData(14, -5.48)]
    [InlineData(28, -11.36)]
    public void Change_From7MHz_MatchesPublishedFigures(double megahertz, double db) =>
        Assert.Equal(db, Gain(50, 150).Change(Frequency.FromMegahertz(7), Frequency.FromMegahertz(megahertz)).Db, 0.005);

    [Fact]
    public void At_LowAndHighEnds_AreTheLimits()
    {
        Assert.Equal(100, Gain(100, 300).At(Frequency.FromHertz(1)), 1e-6);
        Assert.Equal(3, Gain(100, 300).At(Frequency.FromMegahertz(100)), 0.002);
    }

    [Theory]
    [InlineData(140, FrequencySuitability.Comfortable)]
    [InlineData(139, FrequencySuitability.LessGain)]
    [InlineData(69, FrequencySuitability.LowGainFinalOnly)]
    [InlineData(41, FrequencySuitability.Unsuitable)]
    public void Suitability_RatioSteps_AreJudged(double transitionMegahertz, FrequencySuitability expected) =>
        Assert.Equal(expected, CurrentGain.Suitability(Frequency.FromMegahertz(transitionMegahertz), Frequency.FromMegahertz(14)));

    [Fact]
    public void Suitability_NothingStated_IsUnknown() =>
        Assert.Equal(FrequencySuitability.Unknown, CurrentGain.Suitability(null, Frequency.FromMegahertz(14)));

    private static CurrentGain Gain(double gain, double transitionMegahertz) => new(gain, Frequency.FromMegahertz(transitionMegahertz));
}
