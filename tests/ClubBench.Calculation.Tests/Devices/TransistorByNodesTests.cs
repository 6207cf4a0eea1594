using System.Numerics;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Devices;

public class TransistorByNodesTests
{
    private const double SourceOhm = 50;
    private const double LoadOhm = 200;

    private static readonly Resistance Source = Resistance.FromOhm(SourceOhm);
    private static readonly Resistance Load = Resistance.FromOhm(LoadOhm);

    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("hybrid_pi_gain");

    [Theory]
    [Evidence(typeof(HybridPi), EvidenceKind.IndependentRecomputation)]
    [Evidence(typeof(AdmittanceTwoPort), EvidenceKind.IndependentRecomputation)]
    [MemberData(nameof(Rows))]
    public void TransducerGain_StageByItsNodes_Agrees(ReferenceRow row)
    {
        var (around, f) = (Around(row), Frequency.FromMegahertz(row.Number("frequency_mhz")));
        var stage = Stage(f, around);
        var volt = stage.Element(1, 0, SourceOhm).Voltages(1, 1);

        var y = HybridPiTests.Model().At(f, around);

        Assert.Equal(GainDb(volt[3]), y.TransducerGain(Source, Load).Db, 1e-9);
        Assert.Equal(row.Number("gain_db"), GainDb(volt[3]), row.Number("tolerance"));
        Assert.Equal(0, (Stage(f, around).ImpedanceAt(1) - y.InputImpedance(Load)).Magnitude, 1e-6);
    }

    [Theory]
    [Evidence(typeof(BaseShunt), EvidenceKind.IndependentRecomputation)]
    [InlineData(3.5, 30)]
    [InlineData(7, 28.05)]
    [InlineData(14, 22.23)]
    public void BaseShunt_StageWithItByNodes_HasTheWantedGain(double megahertz, double wantedDb)
    {
        var f = Frequency.FromMegahertz(megahertz);

        var shunt = BaseShunt.For(HybridPiTests.Model(), f, Source, Load, Decibels.FromDb(wantedDb)).Value;

        Assert.Equal(wantedDb, GainDb(Stage(f, new StageResistors(shunt)).Element(1, 0, SourceOhm).Voltages(1, 1)[3]), 1e-6);
    }

    [Fact]
    [Evidence(typeof(BaseShunt), EvidenceKind.Identity)]
    public void BaseShunt_MoreGainWanted_IsALargerResistor()
    {
        var shunts = Enumerable.Range(18, 10).Select(db =>
            BaseShunt.For(HybridPiTests.Model(), Frequency.FromMegahertz(14), Source, Load, Decibels.FromDb(db)).Value!.Value.Ohm).ToList();

        Assert.Equal(shunts.Order(), shunts);
        Assert.Equal(shunts.Distinct(), shunts);
    }

    // The terminals are 1 base and 3 collector; inside, 2 is the base behind its spreading resistance; the emitter is ground or 4.
    private static NodalCircuit Stage(Frequency f, StageResistors around)
    {
        var (w, gm) = (f.RadiansPerSecond, 0.020 / 0.025693);
        var emitterFarad = (gm / (2 * Math.PI * 300e6)) - 3.5e-12;
        var emitter = around.Emitter is null ? 0 : 4;
        var circuit = new NodalCircuit(Math.Max(3, emitter))
            .Element(1, 2, 20)
            .Element(2, emitter, 100 / gm).Element(2, emitter, NodalCircuit.Capacitor(w, emitterFarad))
            .Element(2, 3, NodalCircuit.Capacitor(w, 3.5e-12))
            .Element(3, emitter, 50e3).CurrentSource(3, emitter, 2, emitter, gm)
            .Element(3, 0, LoadOhm);
        if (around.Emitter is { } resistor) circuit.Element(4, 0, resistor.Ohm);
        if (around.BaseShunt is { } shunt) circuit.Element(1, 0, shunt.Ohm);
        if (around.Feedback is { } feedback) circuit.Element(1, 3, feedback.Ohm);
        return circuit;
    }

    // One ampere of a 50 ohm source has 50/4 watt to give.
    private static double GainDb(Complex outputVolt) => 10 * Math.Log10(Math.Pow(outputVolt.Magnitude, 2) / LoadOhm / (SourceOhm / 4));

    private static StageResistors Around(ReferenceRow row)
    {
        Resistance? Ohm(string column) => row.Has(column) ? Resistance.FromOhm(row.Number(column)) : null;
        return new StageResistors(Ohm("base_shunt_ohm"), Ohm("emitter_ohm"), Ohm("feedback_ohm"));
    }
}
