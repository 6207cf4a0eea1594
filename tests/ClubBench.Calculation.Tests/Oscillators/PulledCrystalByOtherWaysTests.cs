using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using CsCheck;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class PulledCrystalByOtherWaysTests
{
    private static readonly PulledCrystalLoop FortyMetres = Plain(7.03, 18, 4.5, 22);

    [Fact]
    [Evidence(typeof(OscillatorDrift), EvidenceKind.IndependentRecomputation)]
    public void Drift_EveryPartWarmedAndTheLoopSolvedAgain_IsTheDifference()
    {
        var warm = FortyMetres with
        {
            SeriesInductance = FortyMetres.SeriesInductance * (1 + 950e-6),
            OscillatorCapacitance = FortyMetres.OscillatorCapacitance * (1 - 300e-6),
            Crystal = FortyMetres.Crystal with { SeriesResonance = FortyMetres.Crystal.SeriesResonance * (1 - 3e-6) },
        };
        var solvedHertz = warm.FrequencyAt(Pf(40 * (1 + 1000e-6))).Hertz - FortyMetres.FrequencyAt(Pf(40)).Hertz;

        var drift = OscillatorDrift.Hertz(FortyMetres.PointAt(Pf(40)), new(95, 100, -30, -0.3), TemperatureRise.FromKelvin(10));

        Assert.Equal(solvedHertz, drift, Math.Abs(solvedHertz) * 2e-3);
    }

    [Fact]
    [Evidence(typeof(OscillatorDrift), EvidenceKind.ClosedFormLimit)]
    public void Drift_OnlyTheCrystalMoves_IsThatOfTheCrystal()
    {
        var point = FortyMetres.PointAt(Pf(40));

        Assert.Equal(-3, OscillatorDrift.Ppm(point, new(0, 0, 0, -0.3), TemperatureRise.FromKelvin(10)), 1e-12);
        Assert.Equal(0, OscillatorDrift.Ppm(point, new(95, 100, 30, -0.3), TemperatureRise.FromKelvin(0)), 1e-12);
    }

    [Fact]
    [Evidence(typeof(OscillatorDrift), EvidenceKind.Identity)]
    public void Drift_TwiceTheRiseDownwards_IsTwiceTheDriftBack() => Gen.Select(Gen.Double[-500, 500], Gen.Double[-500, 500], Gen.Double[0.1, 20]).Sample((coil, capacitor, kelvin) =>
    {
        double Hertz(double rise) => OscillatorDrift.Hertz(FortyMetres.PointAt(Pf(60)), new(coil, capacitor, 0, -0.3), TemperatureRise.FromKelvin(rise));
        Assert.Equal(-2 * Hertz(kelvin), Hertz(-2 * kelvin), 1e-6);
    });

    [Fact]
    [Evidence(typeof(OscillatorStartUp), EvidenceKind.IndependentRecomputation)]
    public void LossAt_LoopOpenedAndMeasuredByItsNodes_IsTheResistanceThere()
    {
        var point = FortyMetres.PointAt(Pf(10));
        var (w, crystal) = (point.Frequency.RadiansPerSecond, FortyMetres.Crystal);
        var motional = crystal.MotionalResistance.Ohm + NodalCircuit.Coil(w, crystal.MotionalInductance.Henry) + NodalCircuit.Capacitor(w, crystal.MotionalCapacitance.Farad);

        // From the oscillator terminal: crystal, coil of Q 150, variable capacitor to ground, and the oscillator's capacitance closing the loop.
        var loop = new NodalCircuit(4)
            .Element(1, 2, motional).Element(1, 2, NodalCircuit.Capacitor(w, 4.5e-12))
            .Element(2, 3, NodalCircuit.Coil(w, 22e-6) + (w * 22e-6 / 150))
            .Element(3, 4, NodalCircuit.Capacitor(w, 10e-12)).Element(4, 0, NodalCircuit.Capacitor(w, 100e-12))
            .ImpedanceAt(1);

        Assert.Equal(loop.Real, OscillatorStartUp.LossAt(FortyMetres, point, 150).Ohm, 0.02);
        Assert.Equal(0, loop.Imaginary, 0.5);
    }

    [Fact]
    [Evidence(typeof(OscillatorStartUp), EvidenceKind.Identity)]
    public void At_TwiceTheTransconductance_IsTwiceTheMarginOverTheSameLoss() => Gen.Select(Gen.Double[0.005, 0.05], Gen.Double[20, 300], Gen.Double[10, 100]).Sample((gm, q, pf) =>
    {
        var (one, two) = (OscillatorStartUp.At(FortyMetres, Pf(pf), q, KitAPair, gm), OscillatorStartUp.At(FortyMetres, Pf(pf), q, KitAPair, 2 * gm));
        Assert.Equal(2 * one.Margin, two.Margin, 1e-9);
        Assert.Equal(one.LoopResistance, two.LoopResistance);
    });

    [Fact]
    [Evidence(typeof(PulledCrystalDesign), EvidenceKind.Identity)]
    public void Scaled_CrystalAndCoilOnAnotherFrequency_KeepTheDialInPercent() => Gen.Select(Gen.Double[0.5, 3], Gen.Double[1, 40]).Sample((scale, microhenry) =>
    {
        var from = Plain(7.03, 18, 4.5, microhenry);
        var to = Plain(7.03 * scale, 18, 4.5, PulledCrystalDesign.Scaled(from.SeriesInductance, Frequency.FromMegahertz(7.03), Frequency.FromMegahertz(7.03 * scale)).Microhenry);
        Assert.Equal(from.Range().SpanHertz * scale, to.Range().SpanHertz, 1e-3);
        Assert.Equal(from.Range().State, to.Range().State);
    });

    [Fact]
    [Evidence(typeof(CrystalOrder), EvidenceKind.ClosedFormLimit)]
    public void ForTop_NoTolerance_GuaranteesTheNominalDial()
    {
        var order = Order(0);

        Assert.Equal(order.Nominal.SpanHertz, order.GuaranteedSpanHertz, 1e-9);
        Assert.Equal(order.Nominal.Frequencies, order.WorstReach);
    }

    [Fact]
    [Evidence(typeof(CrystalOrder), EvidenceKind.Identity)]
    public void ForTop_MoreTolerance_GuaranteesLessAndReachesFurtherByTheSame() => Gen.Double[1, 100].Sample(ppm =>
    {
        var (exact, loose) = (Order(0), Order(ppm));
        Assert.Equal(exact.Crystal, loose.Crystal);
        Assert.Equal(exact.GuaranteedSpanHertz - loose.GuaranteedSpanHertz, loose.WorstReach.WidthHertz - exact.GuaranteedSpanHertz, 1e-6);
        Assert.Equal(ppm * 1e-6 * (7.035e6 + exact.GuaranteedLow.Hertz), exact.GuaranteedSpanHertz - loose.GuaranteedSpanHertz, 1e-3);
    });

    [Fact]
    [Evidence(typeof(ReceiveOffset), EvidenceKind.Identity)]
    public void At_LargerCapacitor_ShiftsFurtherAcrossAndLessInSeries() => Gen.Select(Gen.Double[5, 100], Gen.Double[5, 300], Gen.Double[1, 100]).Sample((variable, added, more) =>
    {
        double At(OffsetPlace place, double pf) => ReceiveOffset.At(FortyMetres, place, Pf(pf), Pf(variable));
        Assert.True(At(new OffsetPlace.AcrossVariable(), added + more) < At(new OffsetPlace.AcrossVariable(), added));
        Assert.True(At(new OffsetPlace.AcrossVariable(), added) < 0);
        Assert.True(At(new OffsetPlace.InSeries(), added + more) < At(new OffsetPlace.InSeries(), added));
        Assert.True(At(new OffsetPlace.InSeries(), added + more) > 0);
    });

    [Fact]
    [Evidence(typeof(ReceiveOffset), EvidenceKind.ClosedFormLimit)]
    public void At_VerySmallCapacitorAcross_IsSlopeTimesCapacitance() => Assert.Equal(
        FortyMetres.SensitivitiesAt(Pf(40)).SlopeHertzPerPicofarad * 0.01,
        ReceiveOffset.At(FortyMetres, new OffsetPlace.AcrossVariable(), Pf(0.01), Pf(40)),
        1e-3);

    private static CrystalOrder Order(double ppm) => CrystalOrder.ForTop(Frequency.FromHertz(7_035_000), FortyMetres, Pf(30), ppm)!;
}
