using System.Globalization;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Crystals;

public class MotionalMeasurementTests
{
    private static readonly CrystalParameters NineMegahertz =
        new(Frequency.FromHertz(8_998_500), Capacitance.FromFarad(17e-15), Pf(4.2), default);

    public static TheoryData<ReferenceRow> Counted => ReferenceTable.Theory("motional-measurement");

    public static TheoryData<ReferenceRow> Ruled => ReferenceTable.Theory("motional-rule");

    public static TheoryData<ReferenceRow> Swept => ReferenceTable.Theory("transmission-measurement");

    [Theory]
    [Evidence(typeof(MotionalMeasurement), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Counted))]
    public void Measurement_ReferenceRow_GivesTheCrystal(ReferenceRow row)
    {
        var crystal = Measure(row).Crystal!;

        Assert.Equal(row.Number("expected_cm_ff"), crystal.MotionalCapacitance.Farad * 1e15, row.Number("tolerance_cm_ff"));
        if (row.Has("expected_fs_hz")) Assert.Equal(row.Number("expected_fs_hz"), crystal.SeriesResonance.Hertz, row.Number("tolerance_fs_hz"));
        if (row.Has("expected_c0_pf")) Assert.Equal(row.Number("expected_c0_pf"), crystal.StaticCapacitance.Picofarad, row.Number("tolerance_c0_pf"));
    }

    [Theory]
    [Evidence(typeof(TransmissionMeasurement), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Swept))]
    public void Transmission_ReferenceRow_GivesTheMotionalArm(ReferenceRow row)
    {
        var ends = Resistance.FromOhm(row.Number("ends_ohm"));
        var swept = new TransmissionMeasurement(
            Frequency.FromHertz(row.Number("peak_hz")), row.Number("width_hz"), Decibels.FromDb(row.Number("loss_db")), ends, ends);

        Share(row.Number("expected_rm_ohm"), swept.MotionalResistance.Ohm);
        Share(row.Number("expected_lm_mh"), swept.MotionalInductance.Henry * 1e3);
        Share(row.Number("expected_cm_ff"), swept.MotionalCapacitance.Farad * 1e15);
        Share(row.Number("expected_q"), swept.WithStatic(Pf(4)).UnloadedQ!.Value);
    }

    [Fact]
    [Evidence(typeof(MotionalMeasurement), EvidenceKind.RoundTrip)]
    public void ThreeLoads_ReadingsOfAnyCrystal_GiveThatCrystalBack() =>
        Gen.Select(Gen.Double[3.5, 21], Gen.Double[10, 28], Gen.Double[3, 7]).Sample((mhz, cmFf, c0Pf) =>
        {
            var crystal = new CrystalParameters(Frequency.FromMegahertz(mhz), Capacitance.FromFarad(cmFf * 1e-15), Pf(c0Pf), default);
            var found = MotionalMeasurement.FromThreeLoads(Read(crystal, 15), Read(crystal, 100), Read(crystal, 33)).Crystal!;
            Assert.Equal(cmFf, found.MotionalCapacitance.Farad * 1e15, cmFf * 1e-4);
            Assert.Equal(c0Pf, found.StaticCapacitance.Picofarad, 1e-3);
            Assert.Equal(mhz * 1e6, found.SeriesResonance.Hertz, 0.05);
        });

    [Fact]
    [Evidence(typeof(MotionalMeasurement), EvidenceKind.RoundTrip)]
    public void OscillatorShift_ReadingsOfACrystal_GiveThatCrystalBack()
    {
        var (oscillator, series) = (Pf(235), Pf(33));
        var both = Pf(235.0 * 33 / 268);

        var found = MotionalMeasurement.FromOscillatorShift(
            NineMegahertz.LoadedFrequency(oscillator), NineMegahertz.LoadedFrequency(both), series, oscillator, Pf(4.2)).Crystal!;

        Assert.Equal(17, found.MotionalCapacitance.Farad * 1e15, 1e-3);
        Assert.Equal(8_998_500, found.SeriesResonance.Hertz, 1e-2);
    }

    [Fact]
    public void TwoLoads_ReadingBelowSeriesResonance_IsRefused() =>
        Assert.Equal(
            MeasurementRefusal.NotFalling,
            MotionalMeasurement.FromTwoLoads(NineMegahertz.SeriesResonance, new(Pf(15), Frequency.FromHertz(8_998_400)), Read(NineMegahertz, 47)).Refusal);

    [Fact]
    public void ThreeLoads_StraightLine_IsRefused() =>
        Assert.Equal(
            MeasurementRefusal.NotFlattening,
            MotionalMeasurement.FromThreeLoads(
                new(Pf(15), Frequency.FromHertz(9_002_000)), new(Pf(33), Frequency.FromHertz(9_001_500)), new(Pf(51), Frequency.FromHertz(9_000_900))).Refusal);

    [Fact]
    public void OscillatorShift_FrequencyThatDoesNotRise_IsRefused() =>
        Assert.Equal(
            MeasurementRefusal.NotRising,
            MotionalMeasurement.FromOscillatorShift(Frequency.FromMegahertz(9), Frequency.FromMegahertz(9), Pf(33), Pf(235), Pf(4)).Refusal);

    [Fact]
    public void OscillatorShift_ShiftNoCrystalHas_IsRefused() =>
        Assert.Equal(
            MeasurementRefusal.NoSuchCrystal,
            MotionalMeasurement.FromOscillatorShift(Frequency.FromMegahertz(9), Frequency.FromMegahertz(40), Pf(33), Pf(235), Pf(4)).Refusal);

    [Theory]
    [MemberData(nameof(Ruled))]
    public void OscillatorShiftByRule_ReferenceRow_GivesTheLowFigure(ReferenceRow row) => Assert.Equal(
        row.Number("expected_cm_ff"),
        MotionalMeasurement.ByRuleFromOscillatorShift(
            Frequency.FromHertz(row.Number("alone_hz")), Frequency.FromHertz(row.Number("with_series_hz")), Pf(row.Number("series_pf")), Pf(row.Number("c0_pf")))!.Value.Farad * 1e15,
        row.Number("tolerance_cm_ff"));

    [Fact]
    public void OscillatorShiftByRule_FrequencyThatDoesNotRise_IsNotGiven() =>
        Assert.Null(MotionalMeasurement.ByRuleFromOscillatorShift(Frequency.FromMegahertz(9), Frequency.FromMegahertz(9), Pf(33), Pf(4)));

    [Theory]
    [InlineData(48, true)]
    [InlineData(49, false)]
    public void Transmission_Resolution_WantsTenSteps(double resolutionHz, bool fine) => Assert.Equal(fine, new TransmissionMeasurement(
        Frequency.FromMegahertz(9), 480, Decibels.FromDb(3), Resistance.FromOhm(12.5), Resistance.FromOhm(12.5)).IsResolvedBy(resolutionHz));

    [Fact]
    public void Transmission_SweepOfACrystal_GivesThatCrystalBack()
    {
        // A sweep of the whole equivalent circuit, half-power points found by halving.
        var crystal = NineMegahertz with { MotionalResistance = Resistance.FromOhm(11) };
        double Passed(double hz) => 25 / (25 + crystal.Impedance(Frequency.FromHertz(hz))).Magnitude;
        var peakHz = crystal.ZeroPhaseResonance!.Value.Hertz;
        var width = Edge(peakHz + 2000) - Edge(peakHz - 2000);
        var ends = Resistance.FromOhm(12.5);

        var swept = new TransmissionMeasurement(Frequency.FromHertz(peakHz), width, Decibels.FromAmplitudeRatio(1 / Passed(peakHz)), ends, ends);

        Assert.Equal(11, swept.MotionalResistance.Ohm, 0.02);
        Assert.Equal(17, swept.MotionalCapacitance.Farad * 1e15, 17 * 0.003);

        double Edge(double outside)
        {
            var inside = peakHz;
            for (var i = 0; i < 60; i++)
            {
                var middle = 0.5 * (inside + outside);
                (inside, outside) = Passed(middle) >= Passed(peakHz) / Math.Sqrt(2) ? (middle, outside) : (inside, middle);
            }

            return inside;
        }
    }

    [Fact]
    public void Transmission_NegativeLoss_Throws() => Assert.Throws<ArgumentOutOfRangeException>(() => new TransmissionMeasurement(
        Frequency.FromMegahertz(9), 480, Decibels.FromDb(-0.1), Resistance.FromOhm(12.5), Resistance.FromOhm(12.5)));

    private static MeasuredCrystal Measure(ReferenceRow row)
    {
        var loads = Numbers(row["loads_pf"]);
        var readings = Numbers(row["readings_hz"]);
        return row["method"] switch
        {
            "two" => MotionalMeasurement.FromTwoLoads(Frequency.FromHertz(row.Number("series_hz")), Reading(0), Reading(1)),
            "three" => MotionalMeasurement.FromThreeLoads(Reading(0), Reading(1), Reading(2)),
            _ => MotionalMeasurement.FromOscillatorShift(
                Frequency.FromHertz(readings[0]), Frequency.FromHertz(readings[1]), Pf(loads[0]), Pf(row.Number("oscillator_pf")), Pf(row.Number("c0_pf"))),
        };

        LoadedReading Reading(int i) => new(Pf(loads[i]), Frequency.FromHertz(readings[i]));
    }

    private static LoadedReading Read(CrystalParameters crystal, double pf) => new(Pf(pf), crystal.LoadedFrequency(Pf(pf)));

    private static double[] Numbers(string text) => [.. text.Split(' ').Select(t => double.Parse(t, CultureInfo.InvariantCulture))];

    private static Capacitance Pf(double picofarad) => Capacitance.FromPicofarad(picofarad);

    private static void Share(double expected, double actual) => Assert.Equal(expected, actual, expected * 1e-3);
}
