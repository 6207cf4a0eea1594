using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Noise;

public class DynamicRangeByOtherWaysTests
{
    private const int Samples = 4096;

    [Theory]
    [Evidence(typeof(DynamicRange), EvidenceKind.IndependentRecomputation)]
    [InlineData(15, 500)]
    [InlineData(-5, 2500)]
    public void Intermodulation_TwoTonesThroughACubicCurveSampled_MakeAProductAtTheNoise(double interceptDbm, double bandwidthHz)
    {
        var range = DynamicRange.Of([new(Decibels.Zero, Decibels.FromDb(12), PowerLevel.FromDbm(interceptDbm))], bandwidthHz);
        var each = Amplitude((range.MinimumSignal + range.Intermodulation!.Value).Dbm);

        var product = Line(90, t => Cubic(each * (Math.Cos(100 * t) + Math.Cos(110 * t)), interceptDbm));

        Assert.Equal(range.MinimumSignal.Dbm, 20 * Math.Log10(product), 1e-3);
    }

    [Theory]
    [Evidence(typeof(DynamicRange), EvidenceKind.IndependentRecomputation)]
    [InlineData(15)]
    [InlineData(-5)]
    public void CompressionFromIntercept_OneToneThroughACubicCurveSampled_LosesOneDecibel(double interceptDbm)
    {
        var tone = Amplitude(DynamicRange.CompressionFromIntercept(PowerLevel.FromDbm(interceptDbm)).Dbm);

        Assert.Equal(-1, 20 * Math.Log10(Line(100, t => Cubic(tone * Math.Cos(100 * t), interceptDbm)) / tone), 1e-6);
    }

    [Fact]
    [Evidence(typeof(AntennaEfficiency), EvidenceKind.IndependentRecomputation)]
    public void AntennaLoss_PowerIntoAMatchedReceiver_LacksThatMuchOfWhatTheFieldOffers() => Gen.Select(Gen.Double[0.1, 70], Gen.Double[0.01, 100]).Sample((radiation, loss) =>
    {
        var volt = new NodalCircuit(2).Element(1, 0, radiation).Element(1, 2, loss).Element(2, 0, radiation + loss).Voltages(1, 1)[2].Magnitude;
        var (offered, received) = (radiation / 4, volt * volt / (radiation + loss));

        Assert.Equal(10 * Math.Log10(offered / received), AntennaEfficiency.Loss(Resistance.FromOhm(radiation), Resistance.FromOhm(loss)).Db, 1e-9);
    });

    [Fact]
    [Evidence(typeof(AntennaEfficiency), EvidenceKind.Identity)]
    public void AntennaLoss_TwoResistancesOneAfterTheOther_AddTheirLosses() => Gen.Select(Gen.Double[0.1, 70], Gen.Double[0, 100], Gen.Double[0, 100]).Sample((radiation, a, b) =>
    {
        static double Loss(double radiation, double loss) => AntennaEfficiency.Loss(Resistance.FromOhm(radiation), Resistance.FromOhm(loss)).Db;

        Assert.Equal(Loss(radiation, a + b), Loss(radiation, a) + Loss(radiation + a, b), 1e-9);
    });

    // Amplitudes are such that 0 dBm is 1; the lines of tone and product meet at the intercept.
    private static double Amplitude(double dbm) => Math.Pow(10, dbm / 20);

    private static double Cubic(double x, double interceptDbm) => x - (4.0 / 3 / Math.Pow(Amplitude(interceptDbm), 2) * x * x * x);

    private static double Line(int harmonic, Func<double, double> signal) => Math.Abs(
        Enumerable.Range(0, Samples).Select(i => 2 * Math.PI * i / Samples).Average(t => 2 * signal(t) * Math.Cos(harmonic * t)));
}
