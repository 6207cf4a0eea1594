using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class SpanRemediesTests
{
    private static readonly PulledCrystalLoop Forty = Plain(7.03, 18, 4.5, 0) with { HolderCapacitance = Pf(1) };

    [Fact]
    [Evidence(typeof(SpanRemedies), EvidenceKind.ClosedFormLimit)]
    public void Of_SpanWithinWhatIsSafe_AreNone() => Assert.Empty(SpanRemedies.Of(Forty, 12_900));

    [Fact]
    public void Of_SpanLittleBeyond_OffersEveryChangeInOrder() => Assert.Equal(
        [SpanRemedyKind.AnotherCrystal, SpanRemedyKind.SmallerMinimum],
        SpanRemedies.Of(Forty, 14_000).Select(r => r.Kind));

    [Fact]
    [Evidence(typeof(SpanRemedies), EvidenceKind.RoundTrip)]
    public void Of_AnyRemedyApplied_GivesTheSpanWithTheCrystalInControl() => Assert.All(SpanRemedies.Of(Forty, 14_000), r =>
    {
        var range = r.Loop.Range();
        Assert.Equal(14_000, range.SpanHertz, 1);
        Assert.Equal(CrystalControlState.CrystalControlled, range.State);
    });

    [Theory]
    [InlineData(16_100, true)]
    [InlineData(16_300, false)]
    public void Of_SecondCrystal_ReachesTheSpanOfTheTableAndNoMore(double spanHz, bool helps) =>
        Assert.Equal(helps, SpanRemedies.Of(Forty, spanHz).Any(r => r.Kind == SpanRemedyKind.AnotherCrystal));

    [Fact]
    public void Of_SmallerMinimum_IsTheLargestThatDoes()
    {
        var loop = SpanRemedies.Of(Forty, 14_000).Single(r => r.Kind == SpanRemedyKind.SmallerMinimum).Loop;

        var slightlyMore = PulledCrystalDesign.ForSpan(Forty with { VariableMinimum = loop.VariableMinimum * 1.01 }, 14_000);

        Assert.InRange(loop.VariableMinimum.Picofarad, 5, 10);
        Assert.NotEqual(CrystalControlState.CrystalControlled, slightlyMore.Range.State);
    }

    [Fact]
    public void LargestSafe_SmallerFeedbackCapacitors_NarrowTheSafeSpanAndThatOfAGivenCoil()
    {
        var (usual, small) = (Forty with { OscillatorCapacitance = Pf(100) }, Forty with { OscillatorCapacitance = Pf(50) });
        var coil = Inductance.FromMicrohenry(22);

        Assert.True(small.WithInductance(coil).Range().SpanHertz < usual.WithInductance(coil).Range().SpanHertz);
        Assert.True(Safe(small) < Safe(usual));

        static double Safe(PulledCrystalLoop loop) => loop.WithInductance(PulledCrystalDesign.LargestSafe(loop)).Range().SpanHertz;
    }

    [Fact]
    public void Of_SpanFarBeyondTheCrystal_AreNone() => Assert.Empty(SpanRemedies.Of(Forty, 200_000));
}
