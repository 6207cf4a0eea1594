using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tests.Devices;
using CsCheck;

namespace ClubBench.Calculation.Tests.Amplifiers;

public class FeedbackStageTests
{
    private static readonly Resistance Source = Resistance.FromOhm(50);

    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("feedback_stage");

    [Theory]
    [Evidence(typeof(FeedbackStage), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Rows))]
    public void TryCreate_EmitterAndLoad_MatchesTheRow(ReferenceRow row)
    {
        Assert.True(FeedbackStage.TryCreate(Resistance.FromOhm(row.Number("emitter_ohm")), Source, Resistance.FromOhm(row.Number("load_ohm")), out var stage));

        var relative = row.Number("tolerance");
        Assert.Equal(row.Number("feedback_ohm"), stage!.Feedback.Ohm, row.Number("feedback_ohm") * relative);
        Assert.Equal(row.Number("gain_db"), stage.Gain.Db, 1e-3);
        Assert.Equal(row.Number("output_ohm"), stage.OutputResistance.Ohm, row.Number("output_ohm") * relative);
    }

    [Theory]
    [InlineData(50, 250, 7, 11.61)]
    [InlineData(50, 250, 14, 11.44)]
    [InlineData(50, 250, 28, 10.81)]
    [InlineData(200, 850, 7, 17.58)]
    [InlineData(200, 850, 14, 17.19)]
    [InlineData(200, 850, 28, 15.91)]
    public void Gain_RealTransistor_StaysBelowTheIdealOne(double load, double feedback, double megahertz, double db)
    {
        var model = HybridPiTests.Model();
        var unbypassed = Resistance.FromOhm(10 - (1 / model.TransconductanceSiemens));

        var y = model.At(Frequency.FromMegahertz(megahertz), new StageResistors(null, unbypassed, Resistance.FromOhm(feedback)));

        Assert.Equal(db, y.TransducerGain(Source, Resistance.FromOhm(load)).Db, 0.02);
    }

    [Fact]
    [Evidence(typeof(FeedbackStage), EvidenceKind.ClosedFormLimit)]
    public void TryCreate_EqualEnds_IsTheGeometricMean()
    {
        Assert.True(FeedbackStage.TryCreate(Resistance.FromOhm(10), Source, Source, out var stage));

        Assert.Equal(50 * 50, stage!.Feedback.Ohm * stage.Emitter.Ohm, 1e-9);
        Assert.Equal(20 * Math.Log10((50.0 / 10) - 1), stage.Gain.Db, 1e-9);
    }

    [Fact]
    public void TryCreate_EmitterResistorTooLarge_IsRefused() =>
        Assert.False(FeedbackStage.TryCreate(Resistance.FromOhm(60), Source, Resistance.FromOhm(50), out _));

    [Theory]
    [Evidence(typeof(FeedbackStage), EvidenceKind.IndependentRecomputation)]
    [InlineData(10, 50, 50)]
    [InlineData(7.3, 50, 200)]
    [InlineData(15, 75, 150)]
    public void TryCreate_IdealTransistorByItsNodes_Agrees(double emitter, double source, double load)
    {
        Assert.True(FeedbackStage.TryCreate(Resistance.FromOhm(emitter), Resistance.FromOhm(source), Resistance.FromOhm(load), out var stage));

        // Node 1 is the base, node 2 the collector; the emitter current passes through the transistor whole.
        NodalCircuit Transistor() => new NodalCircuit(2).Element(1, 2, stage!.Feedback.Ohm).CurrentSource(2, 0, 1, 0, 1 / emitter);
        var loaded = Transistor().Element(2, 0, load);
        var volt = loaded.Voltages(1, 1);

        Assert.Equal(source, loaded.ImpedanceAt(1).Real, 1e-9);
        Assert.Equal((volt[2] / volt[1]).Real, stage!.VoltageGain, 1e-9);
        Assert.Equal(Transistor().Element(1, 0, source).ImpedanceAt(2).Real, stage.OutputResistance.Ohm, 1e-9);
    }

    [Fact]
    [Evidence(typeof(FeedbackStage), EvidenceKind.Identity)]
    public void TryCreate_AllResistancesScaled_KeepsTheGain() =>
        Gen.Select(Gen.Double[3, 20], Gen.Double[50, 300], Gen.Double[0.2, 5]).Sample((emitter, load, scale) =>
        {
            Assert.True(FeedbackStage.TryCreate(Resistance.FromOhm(emitter), Source, Resistance.FromOhm(load), out var one));
            Assert.True(FeedbackStage.TryCreate(Resistance.FromOhm(emitter * scale), Source * scale, Resistance.FromOhm(load * scale), out var scaled));

            Assert.Equal(one!.Gain.Db, scaled!.Gain.Db, 1e-9);
            Assert.Equal(one.Feedback.Ohm * scale, scaled.Feedback.Ohm, 1e-9 * scaled.Feedback.Ohm);
            Assert.Equal(one.OutputResistance.Ohm * scale, scaled.OutputResistance.Ohm, 1e-9 * scaled.OutputResistance.Ohm);
        });
}
