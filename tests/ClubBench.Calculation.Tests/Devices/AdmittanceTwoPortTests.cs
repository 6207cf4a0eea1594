using System.Numerics;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Devices;

public class AdmittanceTwoPortTests
{
    private static readonly Gen<double> Ohms = Gen.Double[5, 500];

    [Fact]
    [Evidence(typeof(AdmittanceTwoPort), EvidenceKind.ClosedFormLimit)]
    public void TransducerGain_SingleSeriesResistor_IsTheVoltageDivider() => Gen.Select(Ohms, Ohms, Ohms).Sample((ohm, source, load) =>
    {
        var y = Passive(1 / ohm, 0, 0);
        Assert.Equal(10 * Math.Log10(4 * source * load / Math.Pow(source + ohm + load, 2)), y.TransducerGain(Resistance.FromOhm(source), Resistance.FromOhm(load)).Db, 1e-9);
        Assert.Equal(ohm + load, y.InputImpedance(Resistance.FromOhm(load)).Real, 1e-9 * (ohm + load));
    });

    [Fact]
    [Evidence(typeof(AdmittanceTwoPort), EvidenceKind.Identity)]
    public void TransducerGain_PassiveNetworkTurnedRound_IsTheSameAndNoGain() =>
        Gen.Select(Ohms, Ohms, Ohms, Gen.Double[-0.1, 0.1], Gen.Double[-0.1, 0.1]).Sample((ohm, source, load, left, right) =>
        {
            var y = Passive(new Complex(1 / ohm, left), new Complex(0.001, right), new Complex(0.002, left));
            var turned = new AdmittanceTwoPort(y.Y22, y.Y12, y.Y21, y.Y11);
            var forward = y.TransducerGain(Resistance.FromOhm(source), Resistance.FromOhm(load)).Db;
            Assert.Equal(forward, turned.TransducerGain(Resistance.FromOhm(load), Resistance.FromOhm(source)).Db, 1e-9);
            Assert.True(forward <= 0);
            Assert.Equal(0, y.MaximumStableGain.Db, 1e-9);
        });

    [Fact]
    [Evidence(typeof(AdmittanceTwoPort), EvidenceKind.IndependentRecomputation)]
    public void StabilityFactor_EveryPassiveLoadTriedOut_TellsWhetherOneMakesTheInputNegative()
    {
        foreach (var megahertz in new[] { 2, 3.5, 5, 7, 9, 10.12, 12, 14, 20, 28 })
        {
            var y = HybridPiTests.Model().At(Frequency.FromMegahertz(megahertz));
            var loads = from conductance in Steps(1e-7, 1) from susceptance in Steps(1e-6, 1) from sign in new[] { -1, 1 } select new Complex(conductance, sign * susceptance);

            var leastInput = loads.Min(load => (y.Y11 - (y.Y12 * y.Y21 / (y.Y22 + load))).Real);

            Assert.Equal(leastInput > 0, y.IsUnconditionallyStable);
        }
    }

    [Fact]
    [Evidence(typeof(HybridPi), EvidenceKind.Identity)]
    public void At_ResistorsAtTheTerminals_AddTheirConductances()
    {
        var f = Frequency.FromMegahertz(14);
        var (bare, around) = (HybridPiTests.Model().At(f), HybridPiTests.Model().At(f, new StageResistors(Resistance.FromOhm(100), null, Resistance.FromOhm(500))));

        Near(bare.Y11 + 0.01 + 0.002, around.Y11);
        Near(bare.Y12 - 0.002, around.Y12);
        Near(bare.Y21 - 0.002, around.Y21);
        Near(bare.Y22 + 0.002, around.Y22);
    }

    private static void Near(Complex expected, Complex actual) => Assert.Equal(0, (expected - actual).Magnitude, 1e-12);

    // A pi of three admittances in siemens.
    private static AdmittanceTwoPort Passive(Complex across, Complex input, Complex output) => new(across + input, -across, -across, across + output);

    private static IEnumerable<double> Steps(double low, double high) => Enumerable.Range(0, 121).Select(k => low * Math.Pow(high / low, k / 120.0));
}
