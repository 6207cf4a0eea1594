using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Windings;

public class AdjustmentLimitsTests
{
    private static readonly Gen<(double Total, double Below, double Above)> Trimmers = Gen.Select(Gen.Double[20, 500], Gen.Double[0, 0.25], Gen.Double[0, 0.25]);

    [Fact]
    [Evidence(typeof(AdjustmentLimits), EvidenceKind.Identity)]
    public void TrimRange_ScaledOrTurnedRound_Stays() =>
        Gen.Select(Trimmers, Gen.Double[0.1, 10]).Sample((t, k) =>
        {
            var range = Range(t.Total, t.Below, t.Above);
            return Math.Abs(Range(k * t.Total, t.Below, t.Above) - range) < 1e-9 && Math.Abs(Range(t.Total, t.Above, t.Below) - range) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(AdjustmentLimits), EvidenceKind.RoundTrip)]
    public void TrimRange_CoilOffByIt_ResonatesInsideTheTrimmer() =>
        Trimmers.Sample(t =>
        {
            var (coil, total) = (Inductance.FromMicrohenry(5), Capacitance.FromPicofarad(t.Total));
            var f = TunedCircuit.ResonantFrequency(coil, total);
            var range = Range(t.Total, t.Below, t.Above);
            var (least, most) = (TunedCircuit.CapacitanceFor(coil * (1 + range), f) / total, TunedCircuit.CapacitanceFor(coil * (1 - range), f) / total);
            return least >= 1 - t.Below - 1e-9 && most <= 1 + t.Above + 1e-9;
        });

    [Fact]
    [Evidence(typeof(AdjustmentLimits), EvidenceKind.Identity)]
    public void For_MoreTurnsOnTheRing_NeverWidenTheLimits()
    {
        var limits = Enumerable.Range(8, 30).Select(turns => AdjustmentLimits.For(new(Cores.FindToroid("T50-2")!, turns, Wire.Millimetre(0.5)))).ToList();

        Assert.All(limits.Zip(limits.Skip(1)), pair => Assert.True(pair.Second.SpreadMaximum <= pair.First.SpreadMaximum && pair.Second.SqueezeMaximum <= pair.First.SqueezeMaximum));
        Assert.Equal((AdjustmentLimits.Usual, AdjustmentLimits.Crowded), (limits[0], limits[^1]));
    }

    private static double Range(double totalPicofarad, double below, double above) => AdjustmentLimits.TrimRange(
        Capacitance.FromPicofarad(totalPicofarad), Capacitance.FromPicofarad(totalPicofarad * (1 - below)), Capacitance.FromPicofarad(totalPicofarad * (1 + above)));
}
