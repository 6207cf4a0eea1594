using System.Numerics;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Broadband;

public class ChokeJudgementTests
{
    private static readonly FerriteWinding Choke = new(Cores.Find("FT37-43")!, 10);

    [Fact]
    public void ChokeJudgement_CollectorChoke_HasTwentyTimesTheLoad()
    {
        var judgement = ChokeJudgement.Of(Choke.Impedance(Frequency.FromMegahertz(10.1))!.Value, Resistance.FromOhm(50));

        Assert.Equal(20, judgement.ImpedanceRatio, 0.5);
        Assert.Equal(Verdict.Leave, judgement.Verdict);
        Assert.Equal(Verdict.Check, ChokeJudgement.Of(new(0, 300), Resistance.FromOhm(50)).Verdict);
        Assert.Equal(Verdict.Change, ChokeJudgement.Of(new(0, 200), Resistance.FromOhm(50)).Verdict);
    }

    [Theory]
    [InlineData(500, Verdict.Leave)]
    [InlineData(499, Verdict.Check)]
    [InlineData(250, Verdict.Check)]
    [InlineData(249, Verdict.Change)]
    [Evidence(typeof(ChokeJudgement), EvidenceKind.ClosedFormLimit)]
    public void Of_TenAndFiveTimesTheNode_AreTheLimits(double ohm, Verdict verdict) =>
        Assert.Equal((verdict, ohm / 50), (ChokeJudgement.Of(ohm, Resistance.FromOhm(50)).Verdict, ChokeJudgement.Of(ohm, Resistance.FromOhm(50)).ImpedanceRatio));

    [Fact]
    [Evidence(typeof(ChokeJudgement), EvidenceKind.Identity)]
    public void Of_TurnedPhaseAndScaledCircuit_IsTheSame() =>
        Gen.Select(Gen.Double[10, 5000], Gen.Double[-1.5, 1.5], Gen.Double[1, 1000], Gen.Double[0.1, 10]).Sample((ohm, phase, node, k) =>
        {
            var plain = ChokeJudgement.Of(ohm, Resistance.FromOhm(node));
            var turned = ChokeJudgement.Of(Complex.FromPolarCoordinates(k * ohm, phase), Resistance.FromOhm(k * node));
            return Math.Abs((turned.ImpedanceRatio / plain.ImpedanceRatio) - 1) < 1e-12;
        });

    [Fact]
    [Evidence(typeof(ChokeJudgement), EvidenceKind.RoundTrip)]
    public void Of_FewestTurnsDesignedForTenTimes_IsLeftAndOneTurnLessIsNot() =>
        Gen.Select(Gen.Double[1, 30], Gen.Double[20, 500]).Sample((mhz, node) =>
        {
            var (f, r) = (Frequency.FromMegahertz(mhz), Resistance.FromOhm(node));
            var fewest = (int)Math.Ceiling(Math.Sqrt(10 * node / Complex.Abs((Choke with { Turns = 1 }).Impedance(f)!.Value)));
            bool IsLeft(int turns) => ChokeJudgement.Of((Choke with { Turns = turns }).Impedance(f)!.Value, r).Verdict == Verdict.Leave;
            return IsLeft(fewest) && (fewest == 1 || !IsLeft(fewest - 1));
        });
}
