using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class PulledCrystalDesignTests
{
    private static readonly FrequencyRange TwentyMetresCw = FrequencyRange.FromMegahertz(14.05, 14.06);
    private static readonly FrequencyRange TwentyMetres = FrequencyRange.FromMegahertz(14.0, 14.35);

    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("series-inductance");

    public static TheoryData<ReferenceRow> SafeRows => ReferenceTable.Theory("safe-range");

    [Theory]
    [MemberData(nameof(Rows))]
    public void Inductance_ReferenceRow_IsFound(ReferenceRow row)
    {
        var loop = Plain(row) with { CrystalCount = (int)row.Number("crystals"), HolderCapacitance = Pf(row.Number("holder_pf")) };

        var inductance = row.Has("span_hz") ? PulledCrystalDesign.ForSpan(loop, row.Number("span_hz")).Inductance : PulledCrystalDesign.LargestSafe(loop);

        Assert.Equal(row.Number("expected_uh"), inductance.Microhenry, row.Number("tolerance_uh"));
    }

    [Fact]
    [Evidence(typeof(PulledCrystalDesign), EvidenceKind.RoundTrip)]
    public void ForSpan_WithinReach_ComesBackWithTheSpan()
    {
        var solution = PulledCrystalDesign.ForSpan(KitA30, 10_000);

        Assert.True(solution.IsFound);
        Assert.Equal(10_000, KitA30.WithInductance(solution.Inductance).Range().SpanHertz, 0.1);
    }

    [Fact]
    public void ForSpan_BeyondTheCrystal_ReturnsTheNearestAndTheReason()
    {
        var solution = PulledCrystalDesign.ForSpan(Plain(7.03, 18, 4.5, 0), 2_000_000);

        Assert.Equal(SpanShortfall.InductorTakesOver, solution.Shortfall);
        Assert.InRange(solution.Range.SpanHertz, 50_000, 2_000_000);
    }

    [Fact]
    [Evidence(typeof(PulledCrystalDesign), EvidenceKind.ClosedFormLimit)]
    public void ForSpan_LessThanWithoutInductor_SaysSo()
    {
        var solution = PulledCrystalDesign.ForSpan(Plain(7.03, 18, 4.5, 0), 1000);

        Assert.Equal(SpanShortfall.AlreadyWider, solution.Shortfall);
        Assert.Equal(0, solution.Inductance.Henry);
    }

    [Fact]
    public void LargestSafe_JustBelowAndJustAbove_ChangesTheState()
    {
        var safe = PulledCrystalDesign.LargestSafe(KitA30);

        Assert.Equal(CrystalControlState.CrystalControlled, KitA30.WithInductance(safe * 0.999).Range().State);
        Assert.NotEqual(CrystalControlState.CrystalControlled, KitA30.WithInductance(safe * 1.001).Range().State);
    }

    [Fact]
    public void Candidates_20MetresFromChokes_PutACrystalControlledCoilThatStaysInsideFirst()
    {
        var candidates = PulledCrystalDesign.Candidates(KitA20, PulledCrystalDesign.MouldedChokes, TwentyMetresCw, TwentyMetres);

        Assert.True(candidates[0].LiesInside);
        Assert.Equal(10_000, candidates[0].CoveredHertz, 1e-6);
        Assert.False(candidates.Single(c => c.Inductance == Inductance.FromMicrohenry(10)).LiesInside);
    }

    [Fact]
    public void Candidates_DialOutsideTheWindow_CoverNothing()
    {
        var candidates = PulledCrystalDesign.Candidates(KitA30, PulledCrystalDesign.MouldedChokes, TwentyMetresCw, TwentyMetres);

        Assert.All(candidates, c => Assert.Equal(0, c.CoveredHertz));
        Assert.All(candidates, c => Assert.False(c.LiesInside));
    }

    [Theory]
    [MemberData(nameof(SafeRows))]
    public void LargestSafe_ReferenceRow_GivesTheSpanAndThePullOfTheTable(ReferenceRow row)
    {
        var loop = Plain(row) with { CrystalCount = (int)row.Number("crystals"), HolderCapacitance = Pf(1), OscillatorCapacitance = Pf(row.Number("oscillator_pf")) };

        var safe = PulledCrystalDesign.LargestSafe(loop);
        var range = loop.WithInductance(safe).Range();

        Assert.Equal(row.Number("span_hz"), row.Number("multiple") * range.SpanHertz, row.Number("tolerance_span_hz"));
        if (row.Has("lowest_pull_hz")) Assert.Equal(row.Number("lowest_pull_hz"), range.AtMaximum.PullHertz, row.Number("tolerance_pull_hz"));
        if (row.Has("expected_uh")) Assert.Equal(row.Number("expected_uh"), safe.Microhenry, row.Number("tolerance_uh"));
        if (row.Has("no_coil_span_hz")) Assert.Equal(row.Number("no_coil_span_hz"), loop.Range().SpanHertz, 2.0);
    }

    [Fact]
    public void Range_PlainOscillator_TunesFarMoreUnevenlyAtTheTop() =>
        Assert.Equal(373.1 / 7.859, Plain(7.03, 18, 4.5, 22).Range().SlopeRatio, 0.5);

    [Fact]
    [Evidence(typeof(PulledCrystalDesign), EvidenceKind.ClosedFormLimit)]
    public void Scaled_TwiceTheFrequency_IsAQuarter() =>
        Assert.Equal(5.5, PulledCrystalDesign.Scaled(Inductance.FromMicrohenry(22), Frequency.FromMegahertz(7.03), Frequency.FromMegahertz(14.06)).Microhenry, 1e-9);
}
