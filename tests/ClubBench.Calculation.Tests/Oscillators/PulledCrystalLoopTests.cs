using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using CsCheck;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class PulledCrystalLoopTests
{
    public static TheoryData<ReferenceRow> Points => ReferenceTable.Theory("pulled-crystal");

    public static TheoryData<ReferenceRow> Nodal => ReferenceTable.Theory("pulled-crystal-nodal");

    public static TheoryData<ReferenceRow> Ranges => ReferenceTable.Theory("pulled-crystal-range");

    public static TheoryData<ReferenceRow> KitARows => ReferenceTable.Theory("kit-a-oscillator");

    [Theory]
    [MemberData(nameof(Points))]
    public void PointAt_ReferenceRow_GivesFrequencySensitivityAndSlope(ReferenceRow row)
    {
        var point = Stray(Plain(7.03, 18, 4.5, row.Number("series_uh")), row).PointAt(Pf(row.Number("variable_pf")));

        Assert.Equal(row.Number("expected_hz"), point.Frequency.Hertz, 1.0);
        Within(0.005, row.Number("inductor_sensitivity"), point.Sensitivities.Inductor);
        Within(0.005, row.Number("slope_hz_per_pf"), point.Sensitivities.SlopeHertzPerPicofarad);
        if (row.Has("resonance_ratio")) Within(0.005, row.Number("resonance_ratio"), point.InductorResonanceRatio!.Value);
        else Assert.Null(point.InductorResonanceRatio);
    }

    [Theory]
    [Evidence(typeof(PulledCrystalLoop), EvidenceKind.IndependentRecomputation)]
    [MemberData(nameof(Nodal))]
    public void FrequencyAt_SameCircuitByNodalDeterminant_Agrees(ReferenceRow row)
    {
        var loop = Stray(Plain(row), row) with
        {
            OscillatorCapacitance = Pf(row.Number("oscillator_pf")), StrayAcrossVariable = Pf(row.Number("across_pf")),
        };

        Assert.Equal(row.Number("expected_hz"), loop.FrequencyAt(Pf(row.Number("variable_pf"))).Hertz, row.Number("tolerance_hz"));
    }

    [Theory]
    [MemberData(nameof(Ranges))]
    public void Range_ReferenceRow_GivesSpanPullAndState(ReferenceRow row)
    {
        var range = Plain(row).Range();

        Assert.Equal(row.Number("span_hz"), range.SpanHertz, row.Number("tolerance_hz"));
        if (!row.Has("state")) return;
        Assert.Equal(row.Number("lowest_pull_hz"), range.AtMaximum.PullHertz, row.Number("tolerance_hz"));
        Within(0.01, row.Number("inductor_sensitivity"), range.AtMaximum.Sensitivities.Inductor);
        Assert.Equal(row["state"], range.State.ToString());
    }

    [Theory]
    [MemberData(nameof(KitARows))]
    public void KitA_ReferenceRow_GivesTheKitsFigure(ReferenceRow row)
    {
        var loop = KitA(row.Number("marked_hz") * 1e-6, row.Number("cm_ff"), row.Number("c0_pf"), row.Number("series_uh")) with
        {
            CrystalCount = (int)row.Number("crystals"),
        };

        var figure = row["quantity"] switch
        {
            "frequency_hz" => loop.FrequencyAt(Pf(row.Number("variable_pf"))).Hertz,
            "span_hz" => loop.Range().SpanHertz,
            "offset_hz" => ReceiveOffset.At(
                loop, new OffsetPlace.AcrossEmitterCapacitor(KitAPair), Pf(row.Number("added_pf")), Pf(row.Number("variable_pf"))),
            var other => throw new InvalidOperationException(other),
        };

        Assert.Equal(row.Number("expected"), figure, row.Number("tolerance"));
    }

    [Fact]
    [Evidence(typeof(PulledCrystalLoop), EvidenceKind.ClosedFormLimit)]
    public void FrequencyAt_NoInductor_IsTheCrystalOnItsSeriesLoad()
    {
        var loop = Plain(7.03, 18, 4.5, 0);
        var load = Pf(10.0 * 100 / 110);

        Assert.Equal(loop.Crystal.LoadedFrequency(load).Hertz, loop.FrequencyAt(Pf(10)).Hertz, 1e-5);
    }

    [Fact]
    [Evidence(typeof(PulledCrystalLoop), EvidenceKind.Identity)]
    public void FrequencyAt_AnyUsableLoop_FallsAsTheCapacitorGrows() =>
        Gen.Select(Gen.Double[3.5, 21], Gen.Double[0, 1], Gen.Double[12, 80]).Sample((mhz, share, variablePf) =>
        {
            var loop = Plain(mhz, 20, 5, share * 60 * 49 / (mhz * mhz));
            Assert.True(loop.FrequencyAt(Pf(variablePf + 1)) < loop.FrequencyAt(Pf(variablePf)));
        });

    [Fact]
    [Evidence(typeof(PulledCrystalLoop), EvidenceKind.IndependentRecomputation)]
    public void Sensitivities_AnyElement_AreTheDifferenceQuotient()
    {
        var loop = Stray(Plain(7.03, 18, 4.5, 22), strays: (2, 1, 1.5, 2)) with { StrayAcrossVariable = Pf(3) };
        var at = loop.SensitivitiesAt(Pf(40));

        Assert.Equal(at.Inductor, Quotient(k => loop.WithInductance(loop.SeriesInductance * k), 40), 1e-7);
        Assert.Equal(at.Oscillator, Quotient(k => loop with { OscillatorCapacitance = loop.OscillatorCapacitance * k }, 40), 1e-7);
        Assert.Equal(
            at.SlopeHertzPerPicofarad,
            (loop.FrequencyAt(Pf(40.001)).Hertz - loop.FrequencyAt(Pf(39.999)).Hertz) / 0.002,
            Math.Abs(at.SlopeHertzPerPicofarad) * 1e-4);
    }

    [Fact]
    public void Range_20MetresWithTheOldCoil_IsStretchedAndSaysSo()
    {
        Assert.Equal(CrystalControlState.Stretched, KitA(14.06, 22, 4.8, 10).Range().State);
        Assert.Equal(CrystalControlState.CrystalControlled, KitA20.Range().State);
        Assert.Equal(CrystalControlState.CrystalControlled, KitA30.Range().State);
    }

    [Fact]
    public void Refusal_SoundLoop_IsNone() => Assert.Equal(LoopRefusal.None, KitA30.Refusal());

    [Fact]
    public void Refusal_CapacitorWithoutSwing_SaysSo() =>
        Assert.Equal(LoopRefusal.VariableHasNoSwing, (KitA30 with { VariableMaximum = Pf(12) }).Refusal());

    [Fact]
    public void Refusal_CoilAtItsOwnResonance_SaysSo() =>
        Assert.Equal(LoopRefusal.InductorAboveSelfResonance, (KitA30 with { InductorSelfCapacitance = Pf(25) }).Refusal());

    [Fact]
    public void Refusal_StrayAtTheJunctionInResonance_SaysSo() =>
        Assert.Equal(LoopRefusal.NodeStrayResonance, (KitA30 with { NodeStray = Pf(60) }).Refusal());

    [Fact]
    public void Refusal_CoilFarTooLarge_SaysSo() =>
        Assert.Equal(LoopRefusal.InductorFarTooLarge, Plain(7.03, 18, 4.5, 4000).Refusal());

    [Fact]
    public void FrequencyAt_RefusedLoop_Throws() =>
        Assert.Throws<InvalidOperationException>(() => Plain(7.03, 18, 4.5, 4000).FrequencyAt(Pf(50)));

    [Fact]
    public void State_GrowingCoil_OnlyGetsWorse()
    {
        var states = Enumerable.Range(1, 60)
            .Select(i => Plain(14.06, 24, 5.5, i))
            .Where(l => l.Refusal() == LoopRefusal.None)
            .Select(l => l.Range().State)
            .ToList();

        Assert.Equal(states.Order(), states);
        Assert.Equal(CrystalControlState.CrystalControlled, states[0]);
        Assert.Equal(CrystalControlState.InductorControlled, states[^1]);
    }

    private static double Quotient(Func<double, PulledCrystalLoop> scaled, double variablePf)
    {
        const double Step = 1e-4;
        var (up, down) = (scaled(1 + Step).FrequencyAt(Pf(variablePf)), scaled(1 - Step).FrequencyAt(Pf(variablePf)));
        return (up.Hertz - down.Hertz) / (2 * Step * scaled(1).FrequencyAt(Pf(variablePf)).Hertz);
    }

    private static PulledCrystalLoop Stray(PulledCrystalLoop loop, ReferenceRow row) => Stray(
        loop, ((int)row.Number("crystals"), row.Number("holder_pf"), row.Number("self_pf"), row.Number("node_pf")));

    private static PulledCrystalLoop Stray(PulledCrystalLoop loop, (int Crystals, double HolderPf, double SelfPf, double NodePf) strays) => loop with
    {
        CrystalCount = strays.Crystals,
        HolderCapacitance = Pf(strays.HolderPf),
        InductorSelfCapacitance = Pf(strays.SelfPf),
        NodeStray = Pf(strays.NodePf),
    };

    private static void Within(double share, double expected, double actual) =>
        Assert.Equal(expected, actual, Math.Abs(expected) * share);
}
