using System.Globalization;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class CrystalFitTests
{
    private static readonly PulledCrystalLoop Bench = Plain(10.1, 20, 5, 10) with
    {
        VariableMinimum = Pf(12), VariableMaximum = Pf(110), OscillatorCapacitance = Pf(90),
    };

    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("crystal-fit");

    public static TheoryData<ReferenceRow> Recommendations => ReferenceTable.Theory("fit-recommendation");

    [Theory]
    [MemberData(nameof(Rows))]
    public void Fit_ReferenceRow_GivesTheCrystal(ReferenceRow row)
    {
        var fit = Fit(row);

        Assert.Equal(row.Number("expected_fs_hz"), fit.Crystal!.SeriesResonance.Hertz, row.Number("tolerance_fs_hz"));
        Assert.Equal(row.Number("expected_cm_ff"), fit.Crystal.MotionalCapacitance.Farad * 1e15, row.Number("tolerance_cm_ff"));
        Assert.Equal(row.Number("expected_c0_pf"), fit.Crystal.StaticCapacitance.Picofarad, row.Number("tolerance_c0_pf"));
        if (row.Has("expected_rms_hz")) Assert.Equal(row.Number("expected_rms_hz"), fit.RmsResidualHertz, row.Number("tolerance_rms_hz"));
    }

    [Fact]
    [Evidence(typeof(CrystalFit), EvidenceKind.RoundTrip)]
    public void FromOscillator_ReadingsOfAKnownCrystal_GiveThatCrystalBack()
    {
        var truth = Bench with { Crystal = Bench.Crystal with { SeriesResonance = Frequency.FromHertz(10_114_000), MotionalCapacitance = Capacitance.FromFarad(23e-15) } };
        LoadedReading[] readings = [.. new[] { 12, 25, 50, 100 }.Select(pf => new LoadedReading(Pf(pf), truth.FrequencyAt(Pf(pf))))];

        var fit = CrystalFit.FromOscillator(readings, Bench);

        Assert.Equal(10_114_000, fit.Crystal!.SeriesResonance.Hertz, 0.05);
        Assert.Equal(23, fit.Crystal.MotionalCapacitance.Farad * 1e15, 1e-3);
        Assert.Equal(2, fit.DegreesOfFreedom);
        Assert.InRange(fit.RmsResidualHertz, 0, 0.01);
    }

    [Theory]
    [MemberData(nameof(Recommendations))]
    public void FittedCrystal_Recommendation_IsThatOfTheTable(ReferenceRow row)
    {
        var fit = Fit(ReferenceTable.Read("crystal-fit").Single(r => r["case_id"] == row["fit"]));

        var answer = PulledCrystalDesign.ForSpan(Bench with { Crystal = fit.Crystal! }, row.Number("span_hz"));

        Assert.Equal(row.Number("expected_uh"), answer.Inductance.Microhenry, row.Number("expected_uh") * row.Number("relative_tolerance"));
        Assert.Equal(Enum.Parse<CrystalControlState>(row["state"]), answer.Range.State);
        Assert.Equal(row.Number("lowest_pull_hz"), answer.Range.AtMaximum.PullHertz, row.Number("tolerance_pull_hz"));
        Assert.Equal(row.Number("inductor_sensitivity"), answer.Range.AtMaximum.Sensitivities.Inductor, row.Number("tolerance_sensitivity"));
        Assert.Equal(row.Number("resonance_ratio"), answer.Range.AtMaximum.InductorResonanceRatio!.Value, row.Number("tolerance_ratio"));
    }

    [Fact]
    [Evidence(typeof(FittedCrystal), EvidenceKind.ClosedFormLimit)]
    public void SuspectReadings_OneFarOff_IsNamedAndSoundReadingsAreNot()
    {
        var sound = Fit(ReferenceTable.Read("crystal-fit").First());
        var wrong = sound with { ResidualsHertz = [2, -3, 1, 250, -2, 4, -1] };
        var slight = sound with { ResidualsHertz = [2, -3, 1, 19, -2, 4, -1] };

        Assert.Empty(sound.SuspectReadings());
        Assert.Equal([3], wrong.SuspectReadings());
        Assert.Empty(slight.SuspectReadings());
        Assert.Empty((sound with { ResidualsHertz = [] }).SuspectReadings());
    }

    [Fact]
    public void FromLoads_AsManyReadingsAsParameters_FitsWithoutStandardError()
    {
        var truth = Bench.Crystal with { StaticCapacitance = Pf(4.4) };
        LoadedReading[] readings = [.. new[] { 12, 33, 100 }.Select(pf => new LoadedReading(Pf(pf), truth.LoadedFrequency(Pf(pf))))];

        var fit = CrystalFit.FromLoads(readings);

        Assert.Equal(20, fit.Crystal!.MotionalCapacitance.Farad * 1e15, 0.01);
        Assert.Equal((0, (double?)null), (fit.DegreesOfFreedom, fit.StandardErrorOfMotional));
    }

    [Fact]
    public void Fit_TwoLoads_IsRefused() =>
        Assert.Equal(MeasurementRefusal.TooFewLoads, CrystalFit.FromLoads([Reading(12, 10_121_830), Reading(22, 10_119_607)]).Refusal);

    [Fact]
    public void Fit_FrequencyThatRisesWithTheLoad_IsRefused() =>
        Assert.Equal(
            MeasurementRefusal.NotFalling,
            CrystalFit.FromLoads([Reading(12, 10_121_830), Reading(22, 10_119_607), Reading(33, 10_119_700)]).Refusal);

    private static FittedCrystal Fit(ReferenceRow row)
    {
        LoadedReading[] readings = [.. row["loads_pf"].Split(' ').Zip(row["readings_hz"].Split(' '), (c, f) => Reading(Number(c), Number(f)))];
        if (row["kind"] == "oscillator") return CrystalFit.FromOscillator(readings, Bench);
        return row.Has("c0_pf") ? CrystalFit.FromLoads(readings, Pf(row.Number("c0_pf"))) : CrystalFit.FromLoads(readings);
    }

    private static LoadedReading Reading(double pf, double hertz) => new(Pf(pf), Frequency.FromHertz(hertz));

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
