using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;

namespace ClubBench.Calculation.Tests.Resonators;

public class TrimmerCoverageTests
{
    private static readonly TrimmedCircuit Sound = new(
        Inductance.FromMicrohenry(1.4), 0.05, Capacitance.FromPicofarad(68), 0.02, Capacitance.FromPicofarad(5), Capacitance.FromPicofarad(30),
        Capacitance.FromPicofarad(3), Capacitance.FromPicofarad(7), FrequencyRange.FromMegahertz(14.0, 14.35));

    public static TheoryData<ReferenceRow> Circuits => ReferenceTable.Theory("trimmer-coverage");

    [Theory]
    [MemberData(nameof(Circuits))]
    [Evidence(typeof(TrimmerCoverage), EvidenceKind.IndependentRecomputation)]
    public void Coverage_WorstCaseAndYield_MatchTheTable(ReferenceRow row)
    {
        var coverage = TrimmerCoverage.Of(Circuit(row));

        Assert.Equal(row.Number("margin_high_pf"), coverage.MarginHighPicofarad, 0.006);
        Assert.Equal(row.Number("margin_low_pf"), coverage.MarginLowPicofarad, 0.006);
        Assert.Equal(row.Number("margin_low_pf") >= 0, coverage.Covered);
        Assert.Equal(row.Number("yield"), coverage.Yield(seed: 30).Share, 0.0105);
    }

    [Fact]
    public void Yield_SameSeed_IsTheSameCount()
    {
        var coverage = TrimmerCoverage.Of(Sound with { TrimmerMaximum = Capacitance.FromPicofarad(20) });

        Assert.Equal(coverage.Yield(7), coverage.Yield(7));
        Assert.NotEqual(coverage.Yield(7), coverage.Yield(8));
    }

    [Fact]
    [Evidence(typeof(TrimmerCoverage), EvidenceKind.Identity)]
    public void Yield_Covered_IsEveryBoard() => Assert.Equal(20_000, TrimmerCoverage.Of(Sound).Yield(1).Count);

    [Fact]
    [Evidence(typeof(TrimmerCoverage), EvidenceKind.RoundTrip)]
    public void CentredFixedCapacitor_Used_MakesMarginsEqual()
    {
        var centred = TrimmerCoverage.Of(Sound).CentredFixedCapacitor!.Value;
        var coverage = TrimmerCoverage.Of(Sound with { FixedCapacitor = centred });

        Assert.Equal(coverage.MarginHighPicofarad, coverage.MarginLowPicofarad, 9);
    }

    [Fact]
    [Evidence(typeof(TrimmerCoverage), EvidenceKind.RoundTrip)]
    public void NeededTrimmerMaximum_Used_JustCovers()
    {
        var small = Sound with { TrimmerMaximum = Capacitance.FromPicofarad(20) };
        var needed = TrimmerCoverage.Of(small).NeededTrimmerMaximum;

        Assert.False(TrimmerCoverage.Of(small).Covered);
        Assert.Equal(0, TrimmerCoverage.Of(small with { TrimmerMaximum = needed }).MarginLowPicofarad, 9);
    }

    [Fact]
    public void NominalRange_TankOf24Turns_MatchesTheInventedKit()
    {
        var tank = new TrimmedCircuit(
            Inductance.FromMicrohenry(2.304), 0.05, Capacitance.FromPicofarad(82), 0.05, Capacitance.FromPicofarad(5), Capacitance.FromPicofarad(30),
            Capacitance.FromPicofarad(10), Capacitance.FromPicofarad(10), FrequencyRange.FromMegahertz(10.1, 10.13));

        var range = TrimmerCoverage.Of(tank).NominalRange;

        Assert.Equal(9.49, range.Low.Megahertz, 0.006);
        Assert.Equal(10.65, range.High.Megahertz, 0.006);
    }

    [Fact]
    public void Of_TrimmerUpsideDown_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => TrimmerCoverage.Of(Sound with { TrimmerMaximum = Capacitance.FromPicofarad(4) }));

    [Fact]
    [Evidence(typeof(TrimmerCoverage), EvidenceKind.ClosedFormLimit)]
    public void Margins_PartsWithoutTolerance_AreThePlainDifferences()
    {
        var exact = TrimmerCoverage.Of(Sound with { InductanceTolerance = 0, FixedTolerance = 0, StrayMinimum = Capacitance.FromPicofarad(5), StrayMaximum = Capacitance.FromPicofarad(5) });
        double Needed(double mhz) => 1e12 / (Math.Pow(2 * Math.PI * mhz * 1e6, 2) * 1.4e-6);

        Assert.Equal(Needed(14.35) - (68 + 5 + 5), exact.MarginHighPicofarad, 9);
        Assert.Equal((68 + 5 + 30) - Needed(14.0), exact.MarginLowPicofarad, 9);
    }

    private static TrimmedCircuit Circuit(ReferenceRow r) => new(
        Inductance.FromMicrohenry(r.Number("inductance_uh")),
        r.Number("inductance_tolerance"),
        Capacitance.FromPicofarad(r.Number("fixed_pf")),
        r.Number("fixed_tolerance"),
        Capacitance.FromPicofarad(r.Number("trimmer_low_pf")),
        Capacitance.FromPicofarad(r.Number("trimmer_high_pf")),
        Capacitance.FromPicofarad(r.Number("stray_low_pf")),
        Capacitance.FromPicofarad(r.Number("stray_high_pf")),
        FrequencyRange.FromMegahertz(r.Number("band_low_mhz"), r.Number("band_high_mhz")));
}
