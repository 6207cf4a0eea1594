using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Mixing;

public class SidebandTests
{
    public static TheoryData<ReferenceRow> SidebandRows => ReferenceTable.Theory("sidebands");

    [Theory]
    [Evidence(typeof(Sidebands), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(SuppressionReading), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(SidebandRows))]
    public void Sidebands_ReferenceRow_GivesThePrintedFigure(ReferenceRow row)
    {
        var figure = row["quantity"] switch
        {
            "suppression_db" => Sidebands.PhasingSuppression(row.Number("a"), row.Number("b"))!.Value.Db,
            "dsb_mean_w" => Sidebands.DoubleSidebandMean(Power.FromWatt(row.Number("a"))).Watt,
            "dsb_sideband_w" => Sidebands.OneOfTwoSidebands(Power.FromWatt(row.Number("a"))).Watt,
            "bandwidth_double_hz" => Sidebands.NecessaryBandwidthHertz(Audio(row), doubleSideband: true),
            "bandwidth_single_hz" => Sidebands.NecessaryBandwidthHertz(Audio(row), doubleSideband: false),
            "carrier_hz" => Sidebands.CarrierFor(
                Sidebands.AtIntermediate(Sideband.Upper, Scheme(InjectionSide.HighSide, 9)), Frequency.FromMegahertz(9), Audio(row)).Hertz,
            "dsb_below_pep_db" => SuppressionReading.BelowPeakEnvelope(Decibels.FromDb(row.Number("a")), SuppressionSignal.DoubleSideband).Db,
            "ssb_one_below_pep_db" => SuppressionReading.BelowPeakEnvelope(Decibels.FromDb(row.Number("a")), SuppressionSignal.SingleSidebandOneTone).Db,
            "ssb_two_below_pep_db" => SuppressionReading.BelowPeakEnvelope(Decibels.FromDb(row.Number("a")), SuppressionSignal.SingleSidebandTwoTone).Db,
            "spurious_domain_hz" => SuppressionReading.SpuriousDomainFromHertz(row.Number("a")),
            "carrier_low_hz" => Sidebands.CarrierFor(
                Sidebands.AtIntermediate(Sideband.Upper, Scheme(InjectionSide.LowSide, 9)), Frequency.FromMegahertz(9), Audio(row)).Hertz,
            "carrier_move_hz" => Sidebands.CarrierMoveHertz(Sideband.Upper, Scheme(InjectionSide.LowSide, 9), Sideband.Upper, Scheme(InjectionSide.HighSide, 9), Audio(row)),
            var other => throw new InvalidOperationException(other),
        };

        Assert.Equal(row.Number("expected"), figure, row.Number("tolerance"));
    }

    [Fact]
    public void CarrierMove_SidebandOnTheAirChangesWithTheInversion_IsNone() => Assert.Equal(
        0,
        Sidebands.CarrierMoveHertz(
            Sideband.Lower, Scheme(InjectionSide.LowSide, 9), Sideband.Upper, Scheme(InjectionSide.HighSide, 9), new(Frequency.FromHertz(300), Frequency.FromHertz(2700))),
        1e-9);

    [Fact]
    [Evidence(typeof(Sidebands), EvidenceKind.ClosedFormLimit)]
    public void PhasingSuppression_Perfect_HasNoLimit() => Assert.Null(Sidebands.PhasingSuppression(1, 0));

    [Theory]
    [InlineData(3.7, Sideband.Lower)]
    [InlineData(5.36, Sideband.Upper)]
    [InlineData(7.1, Sideband.Lower)]
    [InlineData(14.2, Sideband.Upper)]
    public void Usual_Frequency_IsTheSidebandOfTheBand(double mhz, Sideband expected) =>
        Assert.Equal(expected, Sidebands.Usual(Frequency.FromMegahertz(mhz)));

    [Theory]
    [InlineData(Sideband.Upper, 14.0, 14.3473)]
    [InlineData(Sideband.Lower, 14.0027, 14.35)]
    [InlineData(Sideband.Unknown, 14.0027, 14.3473)]
    public void CarriersWithin_20Metres_KeepTheEmissionInside(Sideband sideband, double low, double high)
    {
        var carriers = Sidebands.CarriersWithin(FrequencyRange.FromMegahertz(14.0, 14.35), sideband, Speech)!.Value;

        Assert.Equal(low, carriers.Low.Megahertz, 1e-9);
        Assert.Equal(high, carriers.High.Megahertz, 1e-9);
    }

    [Fact]
    public void CarriersWithin_BandNarrowerThanBothSidebands_AreNone()
    {
        Assert.Null(Sidebands.CarriersWithin(FrequencyRange.FromMegahertz(5.3515, 5.3565), Sideband.Unknown, Speech));
        Assert.NotNull(Sidebands.CarriersWithin(FrequencyRange.FromMegahertz(5.3515, 5.3565), Sideband.Upper, Speech));
    }

    private static FrequencyRange Speech => new(Frequency.FromHertz(300), Frequency.FromHertz(2700));

    private static FrequencyScheme Scheme(InjectionSide side, double mid) => new(side, Frequency.FromMegahertz(mid));

    private static FrequencyRange Audio(ReferenceRow row) => new(Frequency.FromHertz(row.Number("a")), Frequency.FromHertz(row.Number("b")));
}
