using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Switching;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Switching;

public class SwitchingTests
{
    private static readonly DiodeSwitch Pin = new(Current.FromMilliampere(50), Duration.FromSecond(2e-6));

    public static TheoryData<ReferenceRow> Taps => ReferenceTable.Theory("series_tuned_tap");

    [Theory]
    [MemberData(nameof(Taps))]
    public void SeriesTunedTap_Frequency_MatchesTheRow(ReferenceRow row)
    {
        var tap = Tap(row.Number("frequency_mhz"));

        Near(row, "reactance_ohm", tap.Reactance.Ohm);
        Near(row, "capacitor_pf", tap.Capacitor.Picofarad);
        Near(row, "loss_db", tap.Loss.Db);
        Near(row, "diode_ma", tap.DiodeCurrent(Power.FromWatt(1.177)).Milliampere);
        Near(row, "transmit_return_loss_db", tap.TransmitReturnLoss.Db);
    }

    [Fact]
    public void SeriesTunedTap_On30m_IsBroad() => Assert.Equal(2.594e6, Tap(10.12).BandwidthHertz, 2.594e6 * 0.005);

    [Fact]
    [Evidence(typeof(SeriesTunedTap), EvidenceKind.Identity)]
    public void SeriesTunedTap_CoilScaledWithTheBand_KeepsItsReactance()
    {
        var scaled = new SeriesTunedTap(Inductance.FromMicrohenry(6.8 / 2), 40, Frequency.FromMegahertz(14.06), FiftyOhm, FiftyOhm);

        Assert.Equal(Tap(7.03).Reactance.Ohm, scaled.Reactance.Ohm, 1e-9);
        Assert.Equal(Tap(7.03).Loss.Db, scaled.Loss.Db, 1e-9);
    }

    [Fact]
    [Evidence(typeof(SeriesTunedTap), EvidenceKind.Identity)]
    public void DiodeCurrent_HigherStandingWave_GrowsWithItsRoot() =>
        Assert.Equal(2 * Tap(7).DiodeCurrent(Power.FromWatt(1)).Ampere, Tap(7).DiodeCurrent(Power.FromWatt(1), 4).Ampere, 1e-12);

    [Theory]
    [InlineData(3.5, 2.46, DiodeSwitchVerdict.CheckHarmonics)]
    [InlineData(14, 9.83, DiodeSwitchVerdict.Clean)]
    [InlineData(1.8, 1.264, DiodeSwitchVerdict.Unsuitable)]
    [Evidence(typeof(DiodeSwitch), EvidenceKind.ClosedFormLimit)]
    public void DiodeSwitch_FiveWatt_IsJudgedByItsChargeRatio(double megahertz, double ratio, DiodeSwitchVerdict verdict)
    {
        var f = Frequency.FromMegahertz(megahertz);

        Assert.Equal(ratio, Pin.ChargeRatio(Power.FromWatt(5), FiftyOhm, f), ratio * 0.005);
        Assert.Equal(verdict, Pin.Judge(Power.FromWatt(5), FiftyOhm, f));
    }

    [Fact]
    public void CleanAbove_FiveWatt_Is7Point12Megahertz() =>
        Assert.Equal(7.12, Pin.CleanAbove(Power.FromWatt(5), FiftyOhm).Megahertz, 7.12 * 0.005);

    [Theory]
    [InlineData(3.5, 47.1)]
    [InlineData(14, 35.1)]
    public void OffIsolation_TwoPicofarad_FallsTwelveDecibelsInTwoOctaves(double megahertz, double db) =>
        Assert.Equal(db, DiodeSwitch.OffIsolation(Capacitance.FromPicofarad(2), FiftyOhm, Frequency.FromMegahertz(megahertz)).Db, 0.05);

    [Theory]
    [InlineData(10, 5, 45, true)]
    [InlineData(15, 5, 40, false)]
    [InlineData(70, 5, 0, false)]
    [Evidence(typeof(SwitchSequence), EvidenceKind.ClosedFormLimit)]
    public void SwitchSequence_RelayAndRise_ShortenTheFirstDot(double relayMs, double riseMs, double leftMs, bool keeps)
    {
        var dot = Duration.FromMillisecond(60);
        var sequence = new SwitchSequence(Duration.FromMillisecond(relayMs), Duration.FromMillisecond(riseMs), Duration.FromMillisecond(5), Duration.FromMillisecond(10));

        Assert.Equal(leftMs, sequence.FirstDotLeft(dot).Millisecond, 1e-9);
        Assert.Equal(keeps, sequence.KeepsFirstDot(dot));
        Assert.True(sequence.SwitchesCold);
        Assert.False((sequence with { SwitchHold = Duration.FromMillisecond(2) }).SwitchesCold);
    }

    private static SeriesTunedTap Tap(double megahertz) =>
        new(Inductance.FromMicrohenry(6.8), 40, Frequency.FromMegahertz(megahertz), FiftyOhm, FiftyOhm);

    private static void Near(ReferenceRow row, string column, double actual) =>
        Assert.Equal(row.Number(column), actual, row.Number(column) * row.Number("relative_tolerance"));
}
