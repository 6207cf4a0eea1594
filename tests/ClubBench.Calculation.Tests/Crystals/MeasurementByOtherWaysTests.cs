using System.Numerics;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Crystals;

public class MeasurementByOtherWaysTests
{
    private const double EndsOhm = 12.5;

    [Fact]
    [Evidence(typeof(MotionalMeasurement), EvidenceKind.IndependentRecomputation)]
    public void TwoLoads_StaticCapacitanceByHalving_GivesTheSameCrystal()
    {
        const double series = 8_998_500, first = 9_002_475, second = 8_999_993;
        double Motional(double staticPf) => ((first / series * (first / series)) - 1) * (staticPf + 15);
        var (low, high) = (0.1, 50.0);
        for (var i = 0; i < 100; i++)
        {
            var middle = 0.5 * (low + high);
            if (series * Math.Sqrt(1 + (Motional(middle) / (middle + 47))) < second) low = middle;
            else high = middle;
        }

        var crystal = MotionalMeasurement.FromTwoLoads(Frequency.FromHertz(series), Reading(15, first), Reading(47, second)).Crystal!;

        Assert.Equal(low, crystal.StaticCapacitance.Picofarad, 1e-5);
        Assert.Equal(Motional(low) * 1e3, crystal.MotionalCapacitance.Farad * 1e15, 1e-5);
    }

    [Fact]
    [Evidence(typeof(MotionalMeasurement), EvidenceKind.Identity)]
    public void ThreeLoads_InAnyOrder_GiveTheSameCrystal()
    {
        LoadedReading[] r = [Reading(15, 9_002_482.8), Reading(33, 9_000_555.9), Reading(100, 8_999_234.0)];

        var inOrder = MotionalMeasurement.FromThreeLoads(r[0], r[1], r[2]);

        Assert.Equal(inOrder, MotionalMeasurement.FromThreeLoads(r[2], r[0], r[1]));
        Assert.Equal(inOrder, MotionalMeasurement.FromThreeLoads(r[1], r[2], r[0]));
    }

    [Fact]
    [Evidence(typeof(TransmissionMeasurement), EvidenceKind.IndependentRecomputation)]
    public void Transmission_SweptCircuitByItsNodes_GivesItsMotionalArm()
    {
        const double ohm = 11, henry = 12e-3, farad = 26e-15;
        var peak = 1 / (2 * Math.PI * Math.Sqrt(henry * farad));
        double Output(double hertz) => Through(ohm + NodalCircuit.Coil(2 * Math.PI * hertz, henry) + NodalCircuit.Capacitor(2 * Math.PI * hertz, farad));
        double Edge(int side) => HalfPower(x => Output(peak + (side * x)), Output(peak) / Math.Sqrt(2));
        var loss = Decibels.FromAmplitudeRatio(Through(1e-9) / Output(peak));
        var ends = Resistance.FromOhm(EndsOhm);

        var swept = new TransmissionMeasurement(Frequency.FromHertz(peak), Edge(1) + Edge(-1), loss, ends, ends);

        Assert.Equal(ohm, swept.MotionalResistance.Ohm, 1e-3);
        Assert.Equal(henry, swept.MotionalInductance.Henry, henry * 1e-4);
        Assert.Equal(farad, swept.MotionalCapacitance.Farad, farad * 1e-4);
    }

    [Fact]
    [Evidence(typeof(TransmissionMeasurement), EvidenceKind.ClosedFormLimit)]
    public void Transmission_LossOfNoneOrHalfTheVoltage_IsNoResistanceOrThatOfTheEnds()
    {
        Assert.Equal(0, Swept(0, 1).MotionalResistance.Ohm, 1e-12);
        Assert.Equal(2 * EndsOhm, Swept(20 * Math.Log10(2), 1).MotionalResistance.Ohm, 1e-9);
    }

    [Fact]
    [Evidence(typeof(TransmissionMeasurement), EvidenceKind.Identity)]
    public void Transmission_EndsScaled_ScaleTheImpedanceOfTheArm() => Gen.Select(Gen.Double[0.1, 10], Gen.Double[0.2, 5]).Sample((lossDb, scale) =>
    {
        var (one, scaled) = (Swept(lossDb, 1), Swept(lossDb, scale));
        Assert.Equal(scale, scaled.MotionalResistance / one.MotionalResistance, 1e-9);
        Assert.Equal(scale, scaled.MotionalInductance.Henry / one.MotionalInductance.Henry, 1e-9);
        Assert.Equal(1 / scale, scaled.MotionalCapacitance / one.MotionalCapacitance, 1e-9);
    });

    // Node 1 behind the source's resistance, node 2 at the load.
    private static double Through(Complex arm) =>
        new NodalCircuit(2).Element(1, 0, EndsOhm).Element(1, 2, arm).Element(2, 0, EndsOhm).Voltages(1, 1 / EndsOhm)[2].Magnitude;

    private static double HalfPower(Func<double, double> falling, double wanted)
    {
        var (low, high) = (0.0, 5000.0);
        for (var i = 0; i < 60; i++)
        {
            var middle = 0.5 * (low + high);
            if (falling(middle) > wanted) low = middle;
            else high = middle;
        }
        return low;
    }

    private static TransmissionMeasurement Swept(double lossDb, double scale) => new(
        Frequency.FromMegahertz(9), 480, Decibels.FromDb(lossDb), Resistance.FromOhm(EndsOhm * scale), Resistance.FromOhm(EndsOhm * scale));

    private static LoadedReading Reading(double pf, double hertz) => new(Capacitance.FromPicofarad(pf), Frequency.FromHertz(hertz));
}
