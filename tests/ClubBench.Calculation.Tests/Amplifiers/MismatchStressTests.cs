using System.Numerics;
using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Amplifiers;

public class MismatchStressTests
{
    private static readonly Resistance FiftyOhm = Resistance.FromOhm(50);

    [Theory]
    [Evidence(typeof(MismatchStress), EvidenceKind.ClosedFormLimit)]
    [InlineData(double.PositiveInfinity, 44.72)]
    [InlineData(3, 33.54)]
    [InlineData(1, 22.36)]
    public void FromForward_FiveWatt_MatchesWorkedFigures(double ratio, double volt) =>
        Assert.Equal(volt, MismatchStress.FromForward(Power.FromWatt(5), FiftyOhm, ratio).Voltage.Volt, 0.01);

    [Fact]
    public void FromDelivered_FiveWattAtThree_MatchesWorkedFigures()
    {
        var stress = MismatchStress.FromDelivered(Power.FromWatt(5), FiftyOhm, 3);

        Assert.Equal(38.73, stress.Voltage.Volt, 0.01);
        Assert.Equal(38.73 / 50, stress.Current.Ampere, 0.001);
    }

    [Fact]
    [Evidence(typeof(MismatchStress), EvidenceKind.Identity)]
    public void FromForward_SameDeliveredPower_Agrees()
    {
        var reflection = 0.5;
        var forward = Power.FromWatt(5 / (1 - (reflection * reflection)));

        Assert.Equal(MismatchStress.FromDelivered(Power.FromWatt(5), FiftyOhm, 3).Voltage.Volt, MismatchStress.FromForward(forward, FiftyOhm, 3).Voltage.Volt, 1e-9);
    }

    [Theory]
    [Evidence(typeof(MismatchStress), EvidenceKind.IndependentRecomputation)]
    [InlineData(1.5)]
    [InlineData(3)]
    [InlineData(12)]
    public void FromForward_WavesAddedAlongTheLine_PeakAgrees(double ratio)
    {
        var forward = Math.Sqrt(2 * 50 * 5.0);
        var reflection = (ratio - 1) / (ratio + 1);
        var peaks = Enumerable.Range(0, 3600).Select(k => Complex.Exp(new Complex(0, -k * Math.PI / 1800)) * reflection).ToList();

        var stress = MismatchStress.FromForward(Power.FromWatt(5), FiftyOhm, ratio);

        Assert.Equal(peaks.Max(p => (1 + p).Magnitude) * forward, stress.Voltage.Volt, 1e-9);
        Assert.Equal(peaks.Max(p => (1 - p).Magnitude) * forward / 50, stress.Current.Ampere, 1e-9);
    }
}
