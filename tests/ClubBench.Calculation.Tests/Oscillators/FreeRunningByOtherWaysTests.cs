using System.Numerics;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using CsCheck;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class FreeRunningByOtherWaysTests
{
    private static readonly FeedbackPair Pair = new(Pf(820), Pf(1500));

    [Fact]
    [Evidence(typeof(FreeRunning), EvidenceKind.IndependentRecomputation)]
    public void Seiler_CapacitorsByTheirNodes_AreThatCapacitance()
    {
        const double w = 2 * Math.PI * 7e6;
        Complex C(double pf) => NodalCircuit.Capacitor(w, pf * 1e-12);

        // Node 1 is the hot end of the coil, 2 the control electrode, 3 the emitter.
        var ohm = new NodalCircuit(3).Element(1, 0, C(40)).Element(1, 2, C(100)).Element(2, 3, C(820)).Element(3, 0, C(1500)).ImpedanceAt(1);

        Assert.Equal(-1 / (w * ohm.Imaginary), FreeRunning.Seiler(Pf(40), Pair, Pf(100)).Farad, 1e-20);
    }

    [Fact]
    [Evidence(typeof(FreeRunning), EvidenceKind.IndependentRecomputation)]
    public void ShiftHertz_TankResonanceTakenTwice_IsTheDifference()
    {
        double Hertz(double pf) => TunedCircuit.ResonantFrequency(Inductance.FromMicrohenry(3.3), Pf(pf)).Hertz;

        Assert.Equal((Hertz(150.001) - Hertz(149.999)) / 0.002 * 0.01, FreeRunning.ShiftHertz(Frequency.FromHertz(Hertz(150)), 0.01, Pf(150)), 1e-3);
    }

    [Fact]
    [Evidence(typeof(FreeRunning), EvidenceKind.Identity)]
    public void Tanks_WithTheirExtraPartLeftOut_AreTheSimplerOnes() => Gen.Select(Gen.Double[100, 2000], Gen.Double[100, 2000], Gen.Double[10, 200]).Sample((c1, c2, series) =>
    {
        var pair = new FeedbackPair(Pf(c1), Pf(c2));
        Assert.Equal(FreeRunning.Clapp(pair, Pf(series)), FreeRunning.Seiler(default, pair, Pf(series)));
        Assert.Equal(FreeRunning.Colpitts(default, pair).Picofarad, FreeRunning.Clapp(pair, Capacitance.FromMicrofarad(1e6)).Picofarad, 1e-6);
        Assert.Equal(FreeRunning.Clapp(pair, Pf(series)).Farad, FreeRunning.Clapp(new FeedbackPair(Pf(c2), Pf(c1)), Pf(series)).Farad, 1e-20);
    });

    [Fact]
    [Evidence(typeof(Bandspread), EvidenceKind.Identity)]
    public void Bandspread_RangeOnAnotherFrequency_KeepsTheCapacitorAndScalesTheCoil() => Gen.Double[0.3, 4].Sample(scale =>
    {
        var (one, other) = (Spread(1), Spread(scale));
        Assert.Equal(one.Fixed.Picofarad, other.Fixed.Picofarad, 1e-6);
        Assert.Equal(1 / (scale * scale), other.Coil.Henry / one.Coil.Henry, 1e-9);

        static Bandspread Spread(double k) => Bandspread.For(FrequencyRange.FromMegahertz(3.5 * k, 3.58 * k), Pf(12), Pf(55))!;
    });

    [Fact]
    [Evidence(typeof(Bandspread), EvidenceKind.ClosedFormLimit)]
    public void BandspreadBehind_EqualOrHugeSeriesCapacitor_HalvesOrKeepsTheSwing()
    {
        Assert.Equal(30, Bandspread.Behind(Pf(60), Pf(10), Pf(60)).Maximum.Picofarad, 1e-9);
        Assert.Equal(60, Bandspread.Behind(Capacitance.FromMicrofarad(1000), Pf(10), Pf(60)).Maximum.Picofarad, 1e-4);
    }

    [Fact]
    [Evidence(typeof(TemperatureBudget), EvidenceKind.IndependentRecomputation)]
    public void PpmPerKelvin_TankResonanceAKelvinApart_IsTheDifference()
    {
        double Hertz(double kelvin) => TunedCircuit.ResonantFrequency(
            Inductance.FromMicrohenry(5 * (1 + (95e-6 * kelvin))), Pf((300 * (1 + (30e-6 * kelvin))) + (50 * (1 - (750e-6 * kelvin))))).Hertz;

        var ppm = (Hertz(0.5) - Hertz(-0.5)) / Hertz(0) * 1e6;

        Assert.Equal(ppm, TemperatureBudget.PpmPerKelvin(95, [new(Pf(300), 30), new(Pf(50), -750)]), 1e-4);
    }

    [Fact]
    [Evidence(typeof(TemperatureBudget), EvidenceKind.Identity)]
    public void HighestFrequency_HalfTheResidualOrTheRise_IsTwice() => Gen.Select(Gen.Double[0.5, 30], Gen.Double[1, 30]).Sample((ppm, kelvin) =>
    {
        double Highest(double residual, double rise) => TemperatureBudget.HighestFrequency(100, residual, TemperatureRise.FromKelvin(rise)).Hertz;
        Assert.Equal(2, Highest(ppm / 2, kelvin) / Highest(ppm, kelvin), 1e-9);
        Assert.Equal(2, Highest(-ppm, kelvin / 2) / Highest(ppm, kelvin), 1e-9);
        Assert.Equal(100, Highest(ppm, kelvin) * ppm * 1e-6 * kelvin, 1e-9);
    });

    [Fact]
    [Evidence(typeof(FeedbackPair), EvidenceKind.IndependentRecomputation)]
    public void NegativeResistance_SustainingCircuitByItsNodes_IsItsRealPart()
    {
        const double w = 2 * Math.PI * 7.03e6, gm = 0.02;

        // Node 1 is the base, 2 the emitter; the collector current flows into the emitter.
        var ohm = new NodalCircuit(2)
            .Element(1, 2, NodalCircuit.Capacitor(w, 820e-12)).Element(2, 0, NodalCircuit.Capacitor(w, 1500e-12)).CurrentSource(0, 2, 1, 2, gm)
            .ImpedanceAt(1);

        Assert.Equal(-ohm.Real, Pair.NegativeResistance(gm, Frequency.FromMegahertz(7.03)).Ohm, 1e-9);
        Assert.Equal(-1 / (w * ohm.Imaginary), Pair.OscillatorCapacitance.Farad, 1e-20);
    }
}
