using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using CsCheck;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class OscillatorChoiceTests
{
    [Fact]
    [Evidence(typeof(OscillatorChoice), EvidenceKind.Identity)]
    public void For_WiderRangeAroundTheSameMiddle_IsNeverASimplerKind() => Gen.Select(Gen.Double[3.5, 23], Gen.Double[0.01, 5], Gen.Double[0, 3]).Sample((mhz, percent, wider) =>
        Assert.True(OscillatorChoice.For(Around(mhz, percent)) <= OscillatorChoice.For(Around(mhz, percent + wider))));

    [Fact]
    [Evidence(typeof(OscillatorChoice), EvidenceKind.ClosedFormLimit)]
    public void Coverage_OneSpotAndAnOctave_AreNoneAndTwoThirds()
    {
        Assert.Equal(0, OscillatorChoice.Coverage(FrequencyRange.At(Frequency.FromMegahertz(7))));
        Assert.Equal(2.0 / 3, OscillatorChoice.Coverage(FrequencyRange.FromMegahertz(7, 14)), 1e-12);
        Assert.Equal(OscillatorKind.OneCrystal, OscillatorChoice.For(FrequencyRange.At(Frequency.FromMegahertz(7))));
    }

    [Theory]
    [Evidence(typeof(OscillatorChoice), EvidenceKind.IndependentRecomputation)]
    [InlineData(3.56, 12, 3.5)]
    [InlineData(7.03, 18, 4.5)]
    [InlineData(10.116, 21, 5)]
    [InlineData(14.06, 24, 5.5)]
    [InlineData(21.06, 24, 5.5)]
    public void For_WidestRangeLeftToCrystals_IsJustWithinTheirReachWithTheLargestSafeCoil(double mhz, double cmFf, double c0Pf)
    {
        foreach (var (crystals, kind) in new[] { (1, OscillatorKind.OneCrystal), (2, OscillatorKind.TwoCrystals) })
        {
            var loop = Plain(mhz, cmFf, c0Pf, 0) with { HolderCapacitance = Pf(1), CrystalCount = crystals };
            var reachedPercent = loop.WithInductance(PulledCrystalDesign.LargestSafe(loop)).Range().SpanHertz / (mhz * 1e4);

            // One limit serves all bands from 7 MHz on, so the better bands leave up to an eighth unused.
            Assert.InRange(WidestPercent(mhz, kind), 0.86 * reachedPercent, reachedPercent);
        }
    }

    private static double WidestPercent(double mhz, OscillatorKind kind)
    {
        var (low, high) = (0.0, 5.0);
        for (var i = 0; i < 40; i++)
        {
            var middle = 0.5 * (low + high);
            if (OscillatorChoice.For(Around(mhz, middle)) <= kind) low = middle;
            else high = middle;
        }
        return low;
    }

    private static FrequencyRange Around(double mhz, double percent) => FrequencyRange.FromMegahertz(mhz * (1 - (percent / 200)), mhz * (1 + (percent / 200)));
}
