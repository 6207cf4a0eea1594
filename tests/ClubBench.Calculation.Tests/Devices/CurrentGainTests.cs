using System.Numerics;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Devices;

public class CurrentGainTests
{
    [Theory]
    [InlineData(100, 300, 7, 39.392)]
    [InlineData(100, 300, 14, 20.953)]
    [InlineData(100, 300, 28, 10.653)]
    [InlineData(50, 150, 28, 5.327)]
    public void At_Frequency_MatchesWorkedFigures(double gain, double transitionMegahertz, double megahertz, double expected) =>
        Assert.Equal(expected, Gain(gain, transitionMegahertz).At(Frequency.FromMegahertz(megahertz)), 1e-3);

    [Theory]
    [InlineData(3.5, 4.36)]
    [InlineData(14, -5.48)]
    [InlineData(28, -11.36)]
    public void Change_From7MHz_MatchesWorkedFigures(double megahertz, double db) =>
        Assert.Equal(db, Gain(50, 150).Change(Frequency.FromMegahertz(7), Frequency.FromMegahertz(megahertz)).Db, 0.005);

    [Fact]
    [Evidence(typeof(CurrentGain), EvidenceKind.ClosedFormLimit)]
    public void At_LowAndHighEnds_AreTheLimits()
    {
        Assert.Equal(100, Gain(100, 300).At(Frequency.FromHertz(1)), 1e-6);
        Assert.Equal(3, Gain(100, 300).At(Frequency.FromMegahertz(100)), 0.002);
    }

    [Theory]
    [Evidence(typeof(CurrentGain), EvidenceKind.ClosedFormLimit)]
    [InlineData(140, FrequencySuitability.Comfortable)]
    [InlineData(139, FrequencySuitability.LessGain)]
    [InlineData(69, FrequencySuitability.LowGainFinalOnly)]
    [InlineData(41, FrequencySuitability.Unsuitable)]
    public void Suitability_RatioSteps_AreJudged(double transitionMegahertz, FrequencySuitability expected) =>
        Assert.Equal(expected, CurrentGain.Suitability(Frequency.FromMegahertz(transitionMegahertz), Frequency.FromMegahertz(14)));

    [Fact]
    public void Suitability_NothingStated_IsUnknown() =>
        Assert.Equal(FrequencySuitability.Unknown, CurrentGain.Suitability(null, Frequency.FromMegahertz(14)));

    [Fact]
    [Evidence(typeof(CurrentGain), EvidenceKind.IndependentRecomputation)]
    public void At_ShortedOutputOfTheHybridPi_IsItsRatioOfCurrents() => Gen.Double[0.1, 60].Sample(mhz =>
    {
        var (model, f) = (HybridPiTests.Model(), Frequency.FromMegahertz(mhz));
        var y = model.At(f);

        // The feedback capacitance lets a little of the base current through to the collector.
        var throughFeedback = (1 - new Complex(0, f.RadiansPerSecond * model.Feedback.Farad / model.TransconductanceSiemens)).Magnitude;
        Assert.Equal((y.Y21 / y.Y11).Magnitude / throughFeedback, model.Gain.At(f), 1e-6);
    });

    [Fact]
    [Evidence(typeof(CurrentGain), EvidenceKind.Identity)]
    public void Change_ByWayOfAThirdFrequency_IsTheSame() => Gen.Select(Gen.Double[1, 50], Gen.Double[1, 50], Gen.Double[1, 50]).Sample((a, b, c) =>
    {
        double Change(double from, double to) => Gain(80, 250).Change(Frequency.FromMegahertz(from), Frequency.FromMegahertz(to)).Db;
        Assert.Equal(Change(a, c), Change(a, b) + Change(b, c), 1e-9);
        Assert.Equal(a < c, Change(a, c) < 0);
    });

    private static CurrentGain Gain(double gain, double transitionMegahertz) => new(gain, Frequency.FromMegahertz(transitionMegahertz));
}
