using System.Numerics;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using CsCheck;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class OvertoneOscillatorTests
{
    private const double Gm = 0.020;
    private static readonly Frequency Ten = Frequency.FromMegahertz(28.06);
    private static readonly FeedbackPair Pair = new(Pf(47), Pf(68));

    [Theory]
    [Evidence(typeof(OvertoneOscillator), EvidenceKind.RoundTrip)]
    [InlineData(3)]
    [InlineData(5)]
    public void For_Overtone_RunsThereAndOnNoLowerMode(int overtone)
    {
        var oscillator = OvertoneOscillator.For(Pair, Ten, overtone);

        Assert.NotNull(oscillator.NegativeResistance(Gm, Ten));
        for (var mode = 1; mode < overtone; mode += 2) Assert.Null(oscillator.NegativeResistance(Gm, Ten * ((double)mode / overtone)));
        Assert.Equal(Ten.Hertz * Math.Sqrt((overtone - 2.0) / overtone), oscillator.TrapResonance.Hertz, 1);
    }

    [Fact]
    public void UntunedPair_OnTheFundamental_IsNineTimesAsEager() => Assert.Equal(
        9, Pair.NegativeResistance(Gm, Ten / 3) / Pair.NegativeResistance(Gm, Ten), 1e-9);

    [Fact]
    [Evidence(typeof(OvertoneOscillator), EvidenceKind.ClosedFormLimit)]
    public void NegativeResistance_FarAboveTheTrap_IsThatOfThePair() => Assert.Equal(
        1,
        OvertoneOscillator.For(Pair, Ten, 3).NegativeResistance(Gm, Ten * 100)!.Value / Pair.NegativeResistance(Gm, Ten * 100),
        1e-4);

    [Fact]
    [Evidence(typeof(OvertoneOscillator), EvidenceKind.IndependentRecomputation)]
    public void NegativeResistance_AnyFrequency_IsTheRealPartOfTheInputImpedance() => Gen.Double[0.2, 5].Sample(ratio =>
    {
        var oscillator = OvertoneOscillator.For(Pair, Ten, 3);
        var f = Ten * ratio;
        var w = f.RadiansPerSecond;

        // Current 1 A into the control electrode: it flows through C1, which drives gm v into the emitter branch.
        var first = 1 / new Complex(0, w * 47e-12);
        var second = 1 / new Complex(0, (w * 68e-12) - (1 / (w * oscillator.AcrossEmitter.Henry)));
        var real = (first + second + (Gm * first * second)).Real;

        return real < 0
            ? Math.Abs((oscillator.NegativeResistance(Gm, f)!.Value.Ohm / -real) - 1) < 1e-6
            : oscillator.NegativeResistance(Gm, f) is null;
    });

    [Theory]
    [InlineData(1)]
    [InlineData(4)]
    public void For_NoOddOvertone_Throws(int overtone) => Assert.Throws<ArgumentOutOfRangeException>(() => OvertoneOscillator.For(Pair, Ten, overtone));
}
