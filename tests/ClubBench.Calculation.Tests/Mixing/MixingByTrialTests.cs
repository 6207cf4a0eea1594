using ClubBench.Calculation.Measuring;
using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Mixing;

public class MixingByTrialTests
{
    private static readonly Resistance FiftyOhm = Resistance.FromOhm(50);

    [Theory]
    [Evidence(typeof(Birdies), EvidenceKind.IndependentRecomputation)]
    [InlineData(InjectionSide.SumToIntermediate, 9, 3.5, 3.8)]
    [InlineData(InjectionSide.HighSide, 4.7, 14.0, 14.35)]
    [InlineData(InjectionSide.LowSide, 10.7, 21.0, 21.45)]
    [InlineData(InjectionSide.LowSide, 5.9991, 7.0, 7.08)]
    public void WithSignal_DialTurnedFromEndToEnd_CrossesTheIntermediateThere(InjectionSide side, double mid, double low, double high)
    {
        var scheme = new FrequencyScheme(side, Frequency.FromMegahertz(mid));
        var (from, to) = (low * (1 - Birdies.Margin) * 1e6, high * (1 + Birdies.Margin) * 1e6);
        double Oscillator(double hertz) => scheme.OscillatorFor(Frequency.FromHertz(hertz))!.Value.Hertz;
        var crossings = new HashSet<(double Hertz, int M, int N)>();
        for (var m = 0; m <= 7; m++)
            for (var n = m - 7; n <= 7 - m; n++)
                foreach (var target in new[] { mid * 1e6, -mid * 1e6 })
                {
                    var (atLow, atHigh) = ((m * Oscillator(from)) + (n * from) - target, (m * Oscillator(to)) + (n * to) - target);
                    if (Math.Abs(atHigh - atLow) > 1 && atLow <= 0 != atHigh <= 0)
                        crossings.Add((Math.Round(from + ((to - from) * atLow / (atLow - atHigh))), m, Math.Abs(n)));
                }

        var found = Birdies.WithSignal(scheme, FrequencyRange.FromMegahertz(low, high));

        Assert.NotEmpty(crossings);
        Assert.Equal(crossings.Order(), found.Select(b => (Math.Round(b.Signal.Hertz), b.OscillatorOrder, b.OtherOrder)).Order());
    }

    [Theory]
    [Evidence(typeof(Birdies), EvidenceKind.Identity)]
    [InlineData(0.25)]
    [InlineData(2)]
    public void Birdies_AllFrequenciesScaled_ScaleAlong(double scale)
    {
        var (found, scaled) = (Found(1), Found(scale));

        Assert.Equal(found.Select(b => (b.OscillatorOrder, b.OtherOrder, b.IsInside)), scaled.Select(b => (b.OscillatorOrder, b.OtherOrder, b.IsInside)));
        Assert.All(found.Zip(scaled), b => Assert.Equal(scale, b.Second.Signal / b.First.Signal, 1e-12));

        static IReadOnlyList<Birdie> Found(double k) => Birdies.Internal(
            new FrequencyScheme(InjectionSide.HighSide, Frequency.FromMegahertz(4.7 * k)), FrequencyRange.FromMegahertz(14 * k, 14.35 * k), Frequency.FromMegahertz(4.6985 * k));
    }

    [Theory]
    [Evidence(typeof(SpuriousResponses), EvidenceKind.IndependentRecomputation)]
    [InlineData(5.06, 9)]
    [InlineData(23.06, 9)]
    [InlineData(11.9452, 4.9152)]
    public void SpuriousResponses_EverySignOfEveryProductTriedOut_AreAllAndNoOthers(double oscillatorMhz, double intermediateMhz)
    {
        int[] signs = [-1, 1];
        var tried = (from m in Enumerable.Range(0, 7) from n in Enumerable.Range(1, 7) where m + n <= 7
                     from a in signs from b in signs
                     let mhz = ((a * intermediateMhz) - (b * m * oscillatorMhz)) / n
                     where mhz is >= 0.1 and <= 200
                     select (Math.Round(mhz * 1e6), m, n)).Distinct().Order();

        var found = SpuriousResponses.Of(Frequency.FromMegahertz(oscillatorMhz), Frequency.FromMegahertz(intermediateMhz));

        Assert.Equal(tried, found.Select(r => (Math.Round(r.Frequency.Hertz), r.OscillatorOrder, r.SignalOrder)).Order());
        Assert.Equal(found.Select(r => r.Rank.Db).Order(), found.Select(r => r.Rank.Db));
    }

    [Fact]
    [Evidence(typeof(OscillatorLevel), EvidenceKind.IndependentRecomputation)]
    public void FromPeakToPeak_PowerOfTheMeasuredVoltage_Agrees() => Gen.Double[0.01, 10].Sample(volt =>
        Assert.Equal(RfVoltage.FromPeakToPeak(Voltage.FromVolt(volt), FiftyOhm).ToLevel().Dbm, OscillatorLevel.FromPeakToPeak(Voltage.FromVolt(volt), FiftyOhm).Dbm, 1e-9));

    [Fact]
    [Evidence(typeof(OscillatorLevel), EvidenceKind.Identity)]
    public void FromPeakToPeak_TwiceTheVoltage_IsSixDecibelsMore() => Gen.Double[0.01, 10].Sample(volt =>
        Assert.Equal(
            20 * Math.Log10(2),
            (OscillatorLevel.FromPeakToPeak(Voltage.FromVolt(2 * volt), FiftyOhm) - OscillatorLevel.FromPeakToPeak(Voltage.FromVolt(volt), FiftyOhm)).Db,
            1e-9));

    [Theory]
    [Evidence(typeof(Sidebands), EvidenceKind.IndependentRecomputation)]
    [InlineData(1, 1)]
    [InlineData(1.05, 3)]
    [InlineData(0.9, -7)]
    public void PhasingSuppression_TwoModulatedCarriersAdded_LeaveThatMuch(double ratio, double degrees)
    {
        double Signal(double t) => (Math.Cos(10 * t) * Math.Cos(100 * t)) + (ratio * Math.Sin((10 * t) + (degrees * Math.PI / 180)) * Math.Sin(100 * t));
        double Line(int harmonic) => Cycle().Select(t => Signal(t) * System.Numerics.Complex.FromPolarCoordinates(1, -harmonic * t)).Aggregate((a, b) => a + b).Magnitude;

        Assert.Equal(20 * Math.Log10(Line(90) / Line(110)), Sidebands.PhasingSuppression(ratio, degrees)!.Value.Db, 1e-6);
    }

    [Fact]
    [Evidence(typeof(Sidebands), EvidenceKind.IndependentRecomputation)]
    public void DoubleSideband_OneToneSampled_HasHalfThePeakAsItsMean()
    {
        double Volt(double t) => 20 * Math.Cos(10 * t) * Math.Cos(1000 * t);

        Assert.Equal(Cycle().Average(t => Math.Pow(Volt(t), 2)) / 50, Sidebands.DoubleSidebandMean(Power.FromWatt(20 * 20 / 2.0 / 50)).Watt, 1e-9);
    }

    [Fact]
    [Evidence(typeof(Sidebands), EvidenceKind.Identity)]
    public void PhasingSuppression_EitherPathTheStrongerAndEitherWayTheError_IsTheSame() => Gen.Select(Gen.Double[0.8, 1.25], Gen.Double[0.1, 20]).Sample((ratio, degrees) =>
    {
        var suppression = Sidebands.PhasingSuppression(ratio, degrees)!.Value.Db;
        Assert.Equal(suppression, Sidebands.PhasingSuppression(1 / ratio, degrees)!.Value.Db, 1e-6);
        Assert.Equal(suppression, Sidebands.PhasingSuppression(ratio, -degrees)!.Value.Db, 1e-9);
    });

    private static IEnumerable<double> Cycle() => Enumerable.Range(0, 10_000).Select(k => 2 * Math.PI * k / 10_000);
}
