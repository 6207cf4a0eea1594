using ClubBench.Calculation.CrystalFilters;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Mixing;

public class SidebandFilterTests
{
    private static readonly FrequencyRange Audio = new(Frequency.FromHertz(300), Frequency.FromHertz(2700));
    private static readonly Decibels Balance = Decibels.FromDb(30);
    private static readonly Frequency Width = Frequency.FromHertz(2400);

    private static readonly CrystalFilter Six = CrystalFilterDesign.Corrected(new(
        CrystalFilterPrototype.Chebyshev(6, PassBandRipple.FromRipple(Decibels.FromDb(0.1))),
        new CrystalParameters(Frequency.FromHertz(8_998_000), Capacitance.FromFarad(17e-15), Capacitance.FromPicofarad(4.2), Resistance.FromOhm(12)),
        Width)).Filter!;

    private static readonly CrystalFilterResponse Response = CrystalFilterResponse.Of(Six, Width)!;

    [Fact]
    [Evidence(typeof(SidebandFilter), EvidenceKind.ClosedFormLimit)]
    public void Of_BrickWall_GivesItsDepthAndNoDroop()
    {
        static Decibels Loss(Frequency f) => Decibels.FromDb(f.Hertz is >= 9_000_250 and <= 9_002_750 ? 2 : 62);

        var filter = SidebandFilter.Of(Loss, Frequency.FromMegahertz(9), Sideband.Upper, Audio, Balance);

        Assert.Equal((60.0, 90.0, 60.0, 0.0), (filter.CarrierAttenuation.Db, filter.CarrierSuppression.Db, filter.OppositeSideband.Db, filter.PassBandDroop.Db));
        Assert.True(filter.Suffices);
        Assert.False(SidebandFilter.Of(Loss, Frequency.FromMegahertz(9), Sideband.Lower, Audio, Balance).Suffices);
    }

    [Theory]
    [Evidence(typeof(SidebandFilter), EvidenceKind.RoundTrip)]
    [InlineData(Sideband.Upper)]
    [InlineData(Sideband.Lower)]
    public void Nearest_SixCrystals_SufficesAndTenHertzNearerDoesNot(Sideband side)
    {
        var nearest = SidebandFilter.Nearest(Six.Loss, Response.PassBand.Band, side, Audio, Balance)!;
        var nearer = Frequency.FromHertz(nearest.Carrier.Hertz + (side == Sideband.Upper ? 10 : -10));

        Assert.True(nearest.Suffices);
        Assert.False(SidebandFilter.Of(Six.Loss, nearer, side, Audio, Balance).Suffices);
        Assert.Equal(side == Sideband.Upper, nearest.Carrier < Response.PassBand.Band.Low);
    }

    [Fact]
    public void Nearest_SteeperSkirtOfTheLadder_LetsTheCarrierComeNearerAbove()
    {
        var (below, above) = (Carrier(Sideband.Upper), Carrier(Sideband.Lower));

        Assert.True(above.Hertz - Response.PassBand.Band.High.Hertz < Response.PassBand.Band.Low.Hertz - below.Hertz);

        static Frequency Carrier(Sideband side) => SidebandFilter.Nearest(Six.Loss, Response.PassBand.Band, side, Audio, Balance)!.Carrier;
    }

    [Fact]
    public void Of_CarrierOfTheRule_LeavesThePassBandWithinTheFilter()
    {
        var carrier = Sidebands.CarrierFor(Sideband.Lower, Response.Center, Audio);

        var filter = SidebandFilter.Of(Six.Loss, carrier, Sideband.Lower, Audio, Balance);

        Assert.InRange(filter.PassBandDroop.Db, 2.5, 3.5);
        Assert.Equal(Six.Loss(Frequency.FromHertz(carrier.Hertz + 300)).Db - Response.Loss.Db, filter.OppositeSideband.Db, 0.05);
        Assert.Equal(Six.Loss(carrier).Db + 30, filter.CarrierSuppression.Db + Response.Loss.Db, 0.05);
    }

    [Theory]
    [Evidence(typeof(SidebandFilter), EvidenceKind.Identity)]
    [InlineData(8_996_500)]
    [InlineData(8_997_500)]
    [InlineData(9_000_500)]
    public void Of_FilterMirroredAndTheOtherSideband_IsTheSame(double carrierHz)
    {
        Decibels Mirrored(Frequency f) => Six.Loss(Frequency.FromHertz(18_000_000 - f.Hertz));

        var straight = SidebandFilter.Of(Six.Loss, Frequency.FromHertz(carrierHz), Sideband.Upper, Audio, Balance);
        var mirrored = SidebandFilter.Of(Mirrored, Frequency.FromHertz(18_000_000 - carrierHz), Sideband.Lower, Audio, Balance);

        Assert.Equal(straight.CarrierSuppression.Db, mirrored.CarrierSuppression.Db, 1e-6);
        Assert.Equal(straight.OppositeSideband.Db, mirrored.OppositeSideband.Db, 1e-6);
        Assert.Equal(straight.PassBandDroop.Db, mirrored.PassBandDroop.Db, 1e-6);
    }

    [Fact]
    public void Nearest_FilterThatIsNone_IsNotFound() =>
        Assert.Null(SidebandFilter.Nearest(_ => Decibels.FromDb(1), Response.PassBand.Band, Sideband.Upper, Audio, Balance));

    [Fact]
    public void Of_SidebandNotStated_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => SidebandFilter.Of(Six.Loss, Response.Center, Sideband.Unknown, Audio, Balance));

    [Theory]
    [Evidence(typeof(SuppressionReading), EvidenceKind.RoundTrip)]
    [InlineData(SuppressionSignal.SingleSidebandOneTone)]
    [InlineData(SuppressionSignal.SingleSidebandTwoTone)]
    [InlineData(SuppressionSignal.DoubleSideband)]
    public void SuppressionReading_ThereAndBack_IsTheSame(SuppressionSignal signal) =>
        Assert.Equal(43, SuppressionReading.BelowOneLine(SuppressionReading.BelowPeakEnvelope(Decibels.FromDb(43), signal), signal).Db, 1e-12);

    [Fact]
    [Evidence(typeof(SuppressionReading), EvidenceKind.Identity)]
    public void SuppressionReading_DoubleSideband_AgreesWithThePowers() => Assert.Equal(
        10 * Math.Log10(Power.FromWatt(5).Watt / Sidebands.OneOfTwoSidebands(Power.FromWatt(5)).Watt),
        SuppressionReading.BelowPeakEnvelope(Decibels.Zero, SuppressionSignal.DoubleSideband).Db,
        1e-12);
}
