using System.Numerics;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Switching;
using CsCheck;

namespace ClubBench.Calculation.Tests.Switching;

public class SeriesTunedTapTests
{
    private static readonly Gen<SeriesTunedTap> Taps = Gen.Select(
        Gen.Double[1, 20], Gen.Double[20, 200], Gen.Double[2, 30], Gen.Double[25, 100], Gen.Double[25, 500],
        (uh, q, mhz, line, receiver) => new SeriesTunedTap(Inductance.FromMicrohenry(uh), q, Frequency.FromMegahertz(mhz), Resistance.FromOhm(line), Resistance.FromOhm(receiver)));

    [Fact]
    [Evidence(typeof(SeriesTunedTap), EvidenceKind.IndependentRecomputation)]
    public void LossAndReturnLoss_AnyTap_AreThoseOfTheChainMatrix() =>
        Taps.Sample(t =>
        {
            var ladder = new Ladder([LadderElement.SeriesInductor(t.Coil, t.UnloadedQ), LadderElement.SeriesCapacitor(t.Capacitor)]);
            var added = ladder.Loss(t.Frequency, t.Line, t.Receiver) - TwoPort.Through.Loss(t.Line, t.Receiver);
            var grounded = TwoPort.Shunt(1 / new Complex(0, t.Reactance.Ohm)).ReturnLoss(t.Line, t.Line);
            return Math.Abs((t.Loss - added).Db) < 1e-6 && Math.Abs((t.TransmitReturnLoss - grounded).Db) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(SeriesTunedTap), EvidenceKind.IndependentRecomputation)]
    public void BandwidthHertz_EdgesOfTheSeriesCircuit_LieThatFarApart() =>
        Taps.Sample(t =>
        {
            // Half the power passes where the reactance left over equals all resistance of the loop: two roots of a square equation each.
            var ohm = t.Line.Ohm + t.Receiver.Ohm + (t.Reactance.Ohm / t.UnloadedQ);
            var (b, root) = (ohm / t.Coil.Henry, 4 / (t.Coil.Henry * t.Capacitor.Farad));
            var (low, high) = ((-b + Math.Sqrt((b * b) + root)) / 2, (b + Math.Sqrt((b * b) + root)) / 2);
            return Math.Abs((t.BandwidthHertz * 2 * Math.PI / (high - low)) - 1) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(SeriesTunedTap), EvidenceKind.ClosedFormLimit)]
    public void Tap_LosslessCoilOfTheLineReactance_LosesNothingAndDrawsTheLineCurrent()
    {
        var (f, line) = (Frequency.FromMegahertz(7), Resistance.FromOhm(50));
        var tap = new SeriesTunedTap(Inductance.FromHenry(50 / f.RadiansPerSecond), 1e12, f, line, line);

        Assert.Equal(0, tap.Loss.Db, 1e-9);
        Assert.Equal(1 / (f.RadiansPerSecond * 50), tap.Capacitor.Farad, 1e-18);
        Assert.Equal(Math.Sqrt(2 * 4 / 50.0), tap.DiodeCurrent(Power.FromWatt(4)).Ampere, 1e-9);
        Assert.Equal(10 * Math.Log10(5), tap.TransmitReturnLoss.Db, 1e-9);
    }
}
