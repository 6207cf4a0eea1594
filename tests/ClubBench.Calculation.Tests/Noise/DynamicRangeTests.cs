using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Noise;

public class DynamicRangeTests
{
    private static readonly ReceiverStage[] Ring = [new(Decibels.FromDb(-6.5), Decibels.FromDb(15), PowerLevel.FromDbm(15))];

    public static TheoryData<ReferenceRow> Ranges => ReferenceTable.Theory("dynamic-range");

    public static TheoryData<ReferenceRow> Powers => ReferenceTable.Theory("noise-power");

    [Theory]
    [Evidence(typeof(DynamicRange), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Ranges))]
    public void Range_ReferenceRow_GivesItsFigure(ReferenceRow row)
    {
        var range = DynamicRange.Of(
            [.. row["chain"].Split(' ').Select(CascadeTests.Stage)],
            row.Number("bandwidth_hz"),
            row.Has("compression_dbm") ? PowerLevel.FromDbm(row.Number("compression_dbm")) : null,
            row.Has("phase_noise") ? row.Number("phase_noise") : null);

        var figure = row["quantity"] switch
        {
            "blocking_db" => range.Blocking,
            "reciprocal_db" => range.ReciprocalMixing,
            _ => range.Smallest,
        };

        Assert.Equal(row.Number("expected"), figure!.Value.Db, row.Number("tolerance"));
    }

    [Theory]
    [InlineData(5.0, -140.0, RangeLimit.Intermodulation)]
    [InlineData(-40.0, -140.0, RangeLimit.Blocking)]
    [InlineData(5.0, -120.0, RangeLimit.ReciprocalMixing)]
    public void Limit_SmallestRange_IsNamed(double compressionDbm, double phaseNoise, RangeLimit expected) =>
        Assert.Equal(expected, DynamicRange.Of(Ring, 500, PowerLevel.FromDbm(compressionDbm), phaseNoise).Limit);

    [Fact]
    public void Range_NothingStated_HasNoLimit()
    {
        var range = DynamicRange.Of([new(Decibels.Zero, Decibels.FromDb(15))], 500);

        Assert.Null(range.Smallest);
        Assert.Equal(RangeLimit.Unknown, range.Limit);
        Assert.Equal(-131.985, range.MinimumSignal.Dbm, 0.01);
    }

    [Fact]
    [Evidence(typeof(DynamicRange), EvidenceKind.Identity)]
    public void Intermodulation_TwoSignalsAtItsTop_MakeAProductAsStrongAsTheNoise()
    {
        var range = DynamicRange.Of(Ring, 500);
        var each = range.MinimumSignal + range.Intermodulation!.Value;

        // Third-order products lie twice as far below the signals as these below the intercept.
        Assert.Equal(range.MinimumSignal.Dbm, each.Dbm - (2 * (15 - each.Dbm)), 1e-9);
    }

    [Fact]
    [Evidence(typeof(DynamicRange), EvidenceKind.Identity)]
    public void Range_TenTimesTheBandwidth_CostsTwoThirdsOfTenDecibels() =>
        Assert.Equal(20.0 / 3, DynamicRange.Of(Ring, 500).Intermodulation!.Value.Db - DynamicRange.Of(Ring, 5000).Intermodulation!.Value.Db, 1e-9);

    [Fact]
    [Evidence(typeof(DynamicRange), EvidenceKind.ClosedFormLimit)]
    public void CompressionFromIntercept_CubicCurve_LosesADecibel()
    {
        // y = x (1 - (3/4) a x^2) for the fundamental; the intercept is where both lines meet.
        var powerShare = DynamicRange.CompressionFromIntercept(PowerLevel.FromDbm(0)).ToPower().Milliwatt;

        Assert.Equal(-1, 20 * Math.Log10(1 - powerShare), 1e-9);
        Assert.Equal(-9.64, DynamicRange.CompressionFromIntercept(PowerLevel.FromDbm(0)).Dbm, 0.005);
    }

    [Theory]
    [Evidence(typeof(AntennaEfficiency), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Powers))]
    public void NoisePower_ReferenceRow_IsThatOfTheSite(ReferenceRow row)
    {
        var noise = ExternalNoise.At(Enum.Parse<NoiseSite>(row["site"]), Frequency.FromMegahertz(row.Number("f_mhz")), NoiseHour.Median);

        Assert.Equal(row.Number("expected_dbm"), AntennaEfficiency.NoisePower(noise.Figure, row.Number("bandwidth_hz")).Dbm, row.Number("tolerance_db"));
    }

    [Theory]
    [InlineData(NoiseSite.City, true)]
    [InlineData(NoiseSite.Rural, true)]
    [InlineData(NoiseSite.QuietRural, false)]
    public void AntennaLoss_TenDecibelsAt7Megahertz_IsFineExceptAtAQuietSite(NoiseSite site, bool fine)
    {
        var loss = AntennaEfficiency.Loss(Resistance.FromOhm(5), Resistance.FromOhm(45));

        var judgement = PreamplifierNeed.Judge(Decibels.FromDb(15) + loss, site, Frequency.FromMegahertz(7.03));

        Assert.Equal(10, loss.Db, 1e-12);
        Assert.Equal(fine, judgement.AtQuietHour.Db <= 1);
    }

    [Fact]
    [Evidence(typeof(AntennaEfficiency), EvidenceKind.ClosedFormLimit)]
    public void AntennaLoss_NoLossResistance_IsNone() => Assert.Equal(0, AntennaEfficiency.Loss(Resistance.FromOhm(36), default).Db, 1e-12);

    [Fact]
    public void AntennaLoss_NoRadiationResistance_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => AntennaEfficiency.Loss(default, Resistance.FromOhm(10)));
}
