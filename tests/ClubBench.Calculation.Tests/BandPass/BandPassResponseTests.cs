using ClubBench.Calculation.BandPass;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using CsCheck;

namespace ClubBench.Calculation.Tests.BandPass;

public class BandPassResponseTests
{
    private static readonly Frequency Center = Frequency.FromMegahertz(7.1);

    [Fact]
    [Evidence(typeof(BandPassResponse), EvidenceKind.ClosedFormLimit)]
    public void Of_SingleCircuit_IsTheCentreOverItsLoadedQ() =>
        Gen.Double[5, 60].Sample(q =>
        {
            var response = BandPassResponse.Of(f => TunedCircuit.Rejection(f, Center, q), Center, Center / q)!;
            return Math.Abs((response.Band.WidthHertz * q / Center.Hertz) - 1) < 1e-3
                && Math.Abs((response.Peak / Center) - 1) < 1e-5
                && Math.Abs((response.Center / Center) - 1) < 1e-6;
        });

    [Fact]
    [Evidence(typeof(BandPassResponse), EvidenceKind.Identity)]
    public void Of_LossEverywhere_ChangesThePeakAndNotTheBand()
    {
        var plain = BandPassResponse.Of(f => TunedCircuit.Rejection(f, Center, 20), Center, Center / 20)!;
        var lossy = BandPassResponse.Of(f => TunedCircuit.Rejection(f, Center, 20) + Decibels.FromDb(4), Center, Center / 20)!;

        Assert.Equal(4, (lossy.PeakLoss - plain.PeakLoss).Db, 1e-9);
        Assert.Equal(plain.Band.Low.Hertz, lossy.Band.Low.Hertz, 1.0);
        Assert.Equal(plain.Band.High.Hertz, lossy.Band.High.Hertz, 1.0);
    }

    [Fact]
    [Evidence(typeof(BandPassResponse), EvidenceKind.IndependentRecomputation)]
    public void Of_ThreeResonators_IsWhatAFineScanFinds()
    {
        var filter = TopCoupledDesign.Of(new(CouplingPrototype.Butterworth(3), Center, Frequency.FromKilohertz(300), Inductance.FromMicrohenry(2), 200)).Filter!;
        var scan = FrequencyRange.FromMegahertz(6.6, 7.6).Points(20_001).Select(f => (Hertz: f.Hertz, Loss: filter.Loss(f).Db)).ToList();
        var peak = scan.Min(p => p.Loss);
        var passing = scan.Where(p => p.Loss <= peak + 3.0103).ToList();

        var response = BandPassResponse.Of(filter.Loss, Center, Frequency.FromKilohertz(300))!;

        Assert.Equal(peak, response.PeakLoss.Db, 1e-4);
        Assert.Equal(passing[0].Hertz, response.Band.Low.Hertz, 60.0);
        Assert.Equal(passing[^1].Hertz, response.Band.High.Hertz, 60.0);
    }

    [Fact]
    public void Of_NoPassBandInReach_IsNone() => Assert.Null(BandPassResponse.Of(f => Decibels.FromDb(f.Megahertz), Frequency.FromMegahertz(7), Frequency.FromKilohertz(300)));
}
