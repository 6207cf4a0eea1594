using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;
using CsCheck;
using MathNet.Numerics;
using Complex = System.Numerics.Complex;

namespace ClubBench.Calculation.Tests.Mixing;

public class MixersByOtherWaysTests
{
    private static readonly Resistance FiftyOhm = Resistance.FromOhm(50);

    [Fact]
    [Evidence(typeof(FirstOrderDiplexer), EvidenceKind.IndependentRecomputation)]
    public void FirstOrder_PartsOffTheirValues_HaveTheImpedanceOfTheCircuit() => Gen.Select(Gen.Double[0.3, 3], Gen.Double[0.3, 3], Gen.Double[0.01, 100]).Sample((coil, capacitor, ratio) =>
    {
        var sound = FirstOrderDiplexer.For(Frequency.FromMegahertz(0.1), FiftyOhm);
        var off = sound with { Coil = sound.Coil * coil, Capacitor = sound.Capacitor * capacitor };
        var f = Frequency.FromMegahertz(0.1 * ratio);

        var seen = new NodalCircuit(3)
            .Element(1, 2, NodalCircuit.Coil(f.RadiansPerSecond, off.Coil.Henry)).Element(2, 0, 50)
            .Element(1, 3, NodalCircuit.Capacitor(f.RadiansPerSecond, off.Capacitor.Farad)).Element(3, 0, 50).ImpedanceAt(1);

        Assert.Equal(0, (seen - off.Impedance(f)).Magnitude, 1e-6);
    });

    [Fact]
    [Evidence(typeof(BandPassDiplexer), EvidenceKind.IndependentRecomputation)]
    public void BandPass_PartsOffTheirValues_HaveTheImpedanceOfTheCircuit() => Gen.Select(Gen.Double[0.3, 3], Gen.Double[0.3, 3], Gen.Double[0.1, 10]).Sample((series, shunt, ratio) =>
    {
        var sound = BandPassDiplexer.For(Frequency.FromMegahertz(9), 3, FiftyOhm);
        var off = sound with { SeriesCoil = sound.SeriesCoil * series, ShuntCapacitor = sound.ShuntCapacitor * shunt };
        var f = Frequency.FromMegahertz(9 * ratio);
        var w = f.RadiansPerSecond;

        var seen = new NodalCircuit(4)
            .Element(1, 4, NodalCircuit.Coil(w, off.SeriesCoil.Henry)).Element(4, 2, NodalCircuit.Capacitor(w, off.SeriesCapacitor.Farad)).Element(2, 0, 50)
            .Element(1, 3, NodalCircuit.Coil(w, off.ShuntCoil.Henry)).Element(1, 3, NodalCircuit.Capacitor(w, off.ShuntCapacitor.Farad)).Element(3, 0, 50).ImpedanceAt(1);

        Assert.Equal(0, (seen - off.Impedance(f)).Magnitude, 1e-6);
    });

    [Fact]
    [Evidence(typeof(FrequencyMultiplier), EvidenceKind.Identity)]
    public void Neighbour_TankMovedFromOneMultipleToTheOther_FavoursEachAlike() => Gen.Select(Gen.Int[2, 5], Gen.Int[2, 5], Gen.Double[40, 140], Gen.Double[1, 60]).Sample((n, k, degrees, q) =>
    {
        if (n == k) return;
        var angle = ConductionAngle.FromDegrees(degrees);
        if ((new FrequencyMultiplier(n, angle, q).Neighbour(k), new FrequencyMultiplier(k, angle, q).Neighbour(n)) is not ({ } there, { } back)) return;

        // What the current favours drops out, what the tank takes counts twice.
        var tank = 10 * Math.Log10(1 + Math.Pow(q * ((n * n) - (k * k)) / (n * k), 2));
        Assert.Equal(-2 * tank, there.Db + back.Db, 1e-9);
    });

    [Fact]
    [Evidence(typeof(MixerFigures), EvidenceKind.IndependentRecomputation)]
    public void IdealSwitchingLoss_SineTimesSampledSquareWave_LosesThatMuch()
    {
        const int Samples = 100_000;
        var line = Enumerable.Range(0, Samples).Select(i => 2 * Math.PI * (i + 0.5) / Samples).Average(t => 2 * Math.Cos(t) * Math.Cos(11 * t) * Math.Sign(Math.Cos(10 * t)));

        Assert.Equal(-20 * Math.Log10(line), MixerFigures.IdealSwitchingLoss.Db, 1e-3);
    }

    [Fact]
    [Evidence(typeof(MixerFigures), EvidenceKind.ClosedFormLimit)]
    public void PassiveNoiseFigure_NoLoss_IsHalfADecibel() => Assert.Equal(0.5, MixerFigures.PassiveNoiseFigure(Decibels.Zero).Db, 1e-12);

    [Fact]
    [Evidence(typeof(RingMixerLoss), EvidenceKind.IndependentRecomputation)]
    public void RingLoss_AnyDrive_LiesOnTheLinesThroughTheTable()
    {
        var rows = ReferenceTable.Read("ring-mixer-loss").ToList();
        var lines = Interpolate.Linear(rows.Select(r => r.Number("drive_dbm")), rows.Select(r => r.Number("expected_db")));

        Gen.Double[-2, 10].Sample(dbm => Assert.Equal(lines.Interpolate(dbm), RingMixerLoss.At(PowerLevel.FromDbm(dbm))!.Value.Db, 1e-9));
    }

    [Theory]
    [Evidence(typeof(SuppressionReading), EvidenceKind.IndependentRecomputation)]
    [InlineData(SuppressionSignal.SingleSidebandOneTone, new[] { 7 })]
    [InlineData(SuppressionSignal.SingleSidebandTwoTone, new[] { 7, 19 })]
    [InlineData(SuppressionSignal.DoubleSideband, new[] { -7, 7 })]
    public void BelowPeakEnvelope_EnvelopeOfItsLinesSampled_RisesAsFarAboveOneLine(SuppressionSignal signal, int[] lines)
    {
        var peak = Enumerable.Range(0, 10_000).Max(i => lines.Aggregate(Complex.Zero, (sum, n) => sum + Complex.FromPolarCoordinates(1, 2 * Math.PI * n * i / 10_000)).Magnitude);

        Assert.Equal(20 * Math.Log10(peak), SuppressionReading.BelowPeakEnvelope(Decibels.Zero, signal).Db, 1e-6);
    }
}
