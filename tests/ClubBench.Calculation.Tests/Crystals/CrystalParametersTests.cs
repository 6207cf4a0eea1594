using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Crystals;

public class CrystalParametersTests
{
    private static readonly CrystalParameters FortyMetres = Quartz(7.03, 18, 4.5, 20);

    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("crystals");

    [Theory]
    [Evidence(typeof(CrystalParameters), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Rows))]
    public void Crystal_ReferenceRow_GivesThePrintedFigure(ReferenceRow row)
    {
        var crystal = Quartz(row.Number("fs_hz") * 1e-6, row.Number("cm_ff"), row.Has("c0_pf") ? row.Number("c0_pf") : 5, row.Number("rm_ohm"));

        Assert.Equal(row.Number("expected"), Figure(crystal, row), row.Number("tolerance"));
    }

    [Fact]
    [Evidence(typeof(CrystalParameters), EvidenceKind.RoundTrip)]
    public void FromMarkedFrequency_AnyCrystal_ComesBackAtItsLoad() =>
        Gen.Select(Gen.Double[3, 25], Gen.Double[10, 28], Gen.Double[3, 7], Gen.Double[8, 60]).Sample((mhz, cmFf, c0Pf, loadPf) =>
        {
            var marked = Frequency.FromMegahertz(mhz);
            var crystal = CrystalParameters.FromMarkedFrequency(marked, Pf(loadPf), Capacitance.FromFarad(cmFf * 1e-15), Pf(c0Pf), default);
            Assert.Equal(marked.Hertz, crystal.LoadedFrequency(Pf(loadPf)).Hertz, 1e-6);
        });

    [Fact]
    [Evidence(typeof(CrystalParameters), EvidenceKind.ClosedFormLimit)]
    public void LoadedFrequency_NoLoad_IsTheParallelResonance() =>
        Assert.Equal(FortyMetres.ParallelResonance, FortyMetres.LoadedFrequency(default));

    [Fact]
    [Evidence(typeof(CrystalParameters), EvidenceKind.ClosedFormLimit)]
    public void LoadedFrequency_HugeLoad_IsTheSeriesResonance() =>
        Assert.Equal(7_030_000, FortyMetres.LoadedFrequency(Capacitance.FromMicrofarad(1)).Hertz, 0.1);

    [Fact]
    [Evidence(typeof(CrystalParameters), EvidenceKind.IndependentRecomputation)]
    public void LoadedSlope_AnyLoad_IsTheDifferenceQuotient()
    {
        var rise = FortyMetres.LoadedFrequency(Pf(30.001)).Hertz - FortyMetres.LoadedFrequency(Pf(29.999)).Hertz;

        Assert.Equal(rise / 0.002, FortyMetres.LoadedSlopeHertzPerPicofarad(Pf(30)), 1e-3);
    }

    [Fact]
    public void Issues_OrdinaryCrystal_AreNone() => Assert.Empty(FortyMetres.Issues());

    [Fact]
    public void Issues_LossyCrystal_IsNeverInductive() =>
        Assert.Contains(CrystalIssue.NeverInductive, (FortyMetres with { MotionalResistance = Resistance.FromOhm(3000) }).Issues());

    [Fact]
    public void Issues_RatioOf140_IsBelowQuartzButFineForCeramic()
    {
        var crystal = FortyMetres with { StaticCapacitance = Capacitance.FromFarad(140 * 18e-15) };

        Assert.Equal([CrystalIssue.RatioBelowQuartzLimit], crystal.Issues());
        Assert.Empty((crystal with { Kind = ResonatorKind.Ceramic }).Issues());
    }

    [Theory]
    [InlineData(0.4, true)]
    [InlineData(2000, false)]
    public void Issues_QOutsideHabit_Warns(double rm, bool tooGood)
    {
        var crystal = Quartz(7.03, 18, 4.5, tooGood ? rm : 300);

        Assert.Contains(CrystalIssue.UnusualQ, crystal.Issues());
    }

    [Fact]
    public void UnloadedQ_ResistanceNotStated_IsNotGiven() =>
        Assert.Null(Quartz(7.03, 18, 4.5, 0).UnloadedQ);

    [Fact]
    public void Crystal_WithoutMotionalCapacitance_IsRefused() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Quartz(7.03, 0, 4.5, 20));

    [Fact]
    [Evidence(typeof(ParallelCrystals), EvidenceKind.ClosedFormLimit)]
    public void InParallel_TwoEqual_KeepBothResonances()
    {
        var pair = ParallelCrystals.Of(FortyMetres, 2);

        Assert.Equal(FortyMetres.SeriesResonance, pair.SeriesResonance);
        Assert.Equal(FortyMetres.ParallelResonance.Hertz, pair.ParallelResonance.Hertz, 1e-6);
        Assert.Equal(10, pair.MotionalResistance.Ohm, 1e-12);
        Assert.Equal(FortyMetres.MotionalInductance.Henry / 2, pair.MotionalInductance.Henry, 1e-12);
    }

    [Theory]
    [InlineData(0, PairMatch.Matched)]
    [InlineData(111, PairMatch.Matched)]
    [InlineData(113, PairMatch.Loose)]
    [InlineData(1117, PairMatch.Loose)]
    [InlineData(1119, PairMatch.DeadGap)]
    public void Judge_DifferenceInHertz_FollowsSeriesResonanceOverQ(double differenceHz, PairMatch expected) =>
        Assert.Equal(expected, ParallelCrystals.Judge(FortyMetres, differenceHz));

    [Fact]
    [Evidence(typeof(CrystalParameters), EvidenceKind.IndependentRecomputation)]
    public void LoadedFrequency_EquivalentCircuitByItsNodes_IsARealResistanceThere()
    {
        var w = FortyMetres.LoadedFrequency(Pf(30)).RadiansPerSecond;
        var loaded = new NodalCircuit(2)
            .Element(1, 2, Motional(FortyMetres, w)).Element(1, 2, NodalCircuit.Capacitor(w, 4.5e-12)).Element(2, 0, NodalCircuit.Capacitor(w, 30e-12));

        var ohm = loaded.ImpedanceAt(1);

        Assert.Equal(FortyMetres.EffectiveResistance(Pf(30)).Ohm, ohm.Real, 0.01);
        Assert.Equal(0, ohm.Imaginary / ohm.Real, 0.02);
    }

    [Fact]
    [Evidence(typeof(CrystalParameters), EvidenceKind.Identity)]
    public void OnOvertone_SamePlate_KeepsItsInductanceAndPullsLess() => Gen.Int[1, 4].Select(k => (2 * k) + 1).Sample(n =>
    {
        var overtone = FortyMetres.OnOvertone(n);
        Assert.Equal(FortyMetres.MotionalInductance.Henry, overtone.MotionalInductance.Henry, 1e-12);
        Assert.Equal(n * n, overtone.CapacitanceRatio / FortyMetres.CapacitanceRatio, 1e-9);
    });

    [Fact]
    [Evidence(typeof(ParallelCrystals), EvidenceKind.IndependentRecomputation)]
    public void MidwayResistance_TwoMotionalArmsByTheirNodes_Agrees()
    {
        var other = FortyMetres with { SeriesResonance = Frequency.FromHertz(7_030_300) };
        var w = 2 * Math.PI * 7_030_150;

        var ohm = new NodalCircuit(1).Element(1, 0, Motional(FortyMetres, w)).Element(1, 0, Motional(other, w)).ImpedanceAt(1);

        Assert.Equal(ohm.Real, ParallelCrystals.MidwayResistance(FortyMetres, 300).Ohm, 1e-3 * ohm.Real);
    }

    [Fact]
    [Evidence(typeof(ParallelCrystals), EvidenceKind.Identity)]
    public void InParallel_PairOfPairs_IsFour()
    {
        Assert.Equal(ParallelCrystals.Of(FortyMetres, 4), ParallelCrystals.Of(ParallelCrystals.Of(FortyMetres, 2), 2));
        Assert.Equal(FortyMetres, ParallelCrystals.Of(FortyMetres, 1));
    }

    private static System.Numerics.Complex Motional(CrystalParameters crystal, double w) =>
        crystal.MotionalResistance.Ohm + NodalCircuit.Coil(w, crystal.MotionalInductance.Henry) + NodalCircuit.Capacitor(w, crystal.MotionalCapacitance.Farad);

    private static double Figure(CrystalParameters crystal, ReferenceRow row) => row["quantity"] switch
    {
        "lm_mh" => crystal.MotionalInductance.Henry * 1e3,
        "fp_hz" => crystal.ParallelResonance.Hertz,
        "q" => crystal.UnloadedQ!.Value,
        "ratio" => crystal.CapacitanceRatio,
        "merit" => crystal.FigureOfMerit!.Value,
        "loaded_hz" => crystal.LoadedFrequency(Pf(row.Number("load_pf"))).Hertz,
        "slope_hz_per_pf" => crystal.LoadedSlopeHertzPerPicofarad(Pf(row.Number("load_pf"))),
        "resistance_ohm" => crystal.EffectiveResistance(Pf(row.Number("load_pf"))).Ohm,
        "overtone3_lm_mh" => crystal.OnOvertone(3).MotionalInductance.Henry * 1e3,
        "overtone3_cm_ff" => crystal.OnOvertone(3).MotionalCapacitance.Farad * 1e15,
        "overtone3_ratio" => crystal.OnOvertone(3).CapacitanceRatio,
        "zero_phase_shift_hz" => crystal.ZeroPhaseResonance!.Value.Hertz - crystal.SeriesResonance.Hertz,
        "static_from_10017730_pf" => CrystalParameters.FromResonances(
            crystal.SeriesResonance, Frequency.FromHertz(10_017_730), crystal.MotionalCapacitance, default)!.StaticCapacitance.Picofarad,
        "series_behind_14060000_hz" => CrystalParameters.FromMarkedFrequency(
            Frequency.FromHertz(14_060_000), Pf(row.Number("load_pf")), crystal.MotionalCapacitance, crystal.StaticCapacitance, default).SeriesResonance.Hertz,
        "midway300_ohm" => ParallelCrystals.MidwayResistance(crystal, 300).Ohm,
        var other => throw new InvalidOperationException(other),
    };

    private static Capacitance Pf(double picofarad) => Capacitance.FromPicofarad(picofarad);

    private static CrystalParameters Quartz(double mhz, double cmFf, double c0Pf, double rmOhm) =>
        new(Frequency.FromMegahertz(mhz), Capacitance.FromFarad(cmFf * 1e-15), Pf(c0Pf), Resistance.FromOhm(rmOhm));
}
