using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using CsCheck;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class OscillatorPartsByTrialTests
{
    private static readonly Gen<double[]> Residuals = Gen.Double[-30, 30].Array[4, 12].SelectMany(r => Gen.Double[-400, 400].Select(wild => (double[])[.. r, wild]));

    [Fact]
    [Evidence(typeof(CapacitorTemperature), EvidenceKind.Identity)]
    public void Compensating_TwiceTheCoil_NeedsTwiceTheShare() => Gen.Double[5, 70].Sample(ppm =>
    {
        var once = CapacitorTemperature.Compensating(ppm, 0);
        Assert.All(CapacitorTemperature.Compensating(2 * ppm, 0), t => Assert.Equal(2 * once.Single(o => o.Type == t.Type).Share, t.Share, 1e-9));
    });

    [Fact]
    [Evidence(typeof(FittedCrystal), EvidenceKind.IndependentRecomputation)]
    public void SuspectReadings_DeviationsSortedByHand_AreThoseBeyondFourOfThem() => Residuals.Sample(residuals =>
    {
        var middle = Middle(residuals);
        var limit = Math.Max(20, 4 * 1.4826 * Middle([.. residuals.Select(r => Math.Abs(r - middle))]));

        // 1.4826 is rounded: what lies that near the limit may be told either way.
        if (residuals.Any(r => Math.Abs(Math.Abs(r) - limit) < 1e-3 * limit)) return;
        Assert.Equal(Enumerable.Range(0, residuals.Length).Where(i => Math.Abs(residuals[i]) > limit), Fitted(residuals).SuspectReadings());
    });

    [Fact]
    [Evidence(typeof(FittedCrystal), EvidenceKind.Identity)]
    public void SuspectReadings_EverySignTurned_AreTheSamePlaces() => Residuals.Sample(residuals =>
        Assert.Equal(Fitted(residuals).SuspectReadings(), Fitted([.. residuals.Select(r => -r)]).SuspectReadings()));

    [Theory]
    [Evidence(typeof(SpanRemedies), EvidenceKind.IndependentRecomputation)]
    [InlineData(14_000)]
    [InlineData(15_000)]
    public void SmallerMinimum_EveryTwentiethOfAPicofaradTriedOut_IsTheFirstThatKeepsControl(double spanHz)
    {
        var loop = Plain(7.03, 18, 4.5, 0) with { HolderCapacitance = Pf(1) };
        bool Controls(double pf)
        {
            var answer = PulledCrystalDesign.ForSpan(loop with { VariableMinimum = Pf(pf) }, spanHz);
            return answer.Shortfall != SpanShortfall.InductorTakesOver && answer.Range.State == CrystalControlState.CrystalControlled;
        }

        var first = Enumerable.Range(0, 180).Select(i => loop.VariableMinimum.Picofarad - (0.05 * i)).First(Controls);

        var remedy = SpanRemedies.Of(loop, spanHz).Single(r => r.Kind == SpanRemedyKind.SmallerMinimum);
        Assert.InRange(remedy.Loop.VariableMinimum.Picofarad, first - 0.03, first + 0.05);
    }

    private static FittedCrystal Fitted(double[] residuals) => new(null, 0, 0, residuals, null, MeasurementRefusal.None);

    private static double Middle(double[] values)
    {
        var sorted = values.Order().ToList();
        return 0.5 * (sorted[(sorted.Count - 1) / 2] + sorted[sorted.Count / 2]);
    }
}
