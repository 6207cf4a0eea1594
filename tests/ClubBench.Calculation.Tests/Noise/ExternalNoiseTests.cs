using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Noise;

public class ExternalNoiseTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("external-noise-figures");

    public static TheoryData<ReferenceRow> Deciles => ReferenceTable.Theory("noise-deciles");

    [Theory]
    [MemberData(nameof(Rows))]
    public void Noise_ReferenceRow_GivesThePrintedFigure(ReferenceRow row)
    {
        var frequency = Frequency.FromMegahertz(row.Number("f_mhz"));

        var figure = (row["site"], row["kind"]) switch
        {
            ("Galactic", _) => ExternalNoise.Galactic(frequency),
            (var site, "median") => ExternalNoise.ManMade(Enum.Parse<NoiseSite>(site), frequency),
            (var site, _) => ExternalNoise.At(Enum.Parse<NoiseSite>(site), frequency, NoiseHour.Quiet).Figure,
        };

        Assert.Equal(row.Number("expected_db"), figure.Db, row.Number("tolerance_db"));
    }

    [Theory]
    [MemberData(nameof(Deciles))]
    public void Deciles_ReferenceRow_AreThoseOfTheRecommendation(ReferenceRow row)
    {
        var (below, above) = ExternalNoise.DecilesOf(Enum.Parse<NoiseSite>(row["site"]));

        Assert.Equal(row.Number("below_db"), below.Db, row.Number("tolerance_db"));
        Assert.Equal(row.Number("above_db"), above.Db, row.Number("tolerance_db"));
    }

    [Fact]
    public void At_BelowTheCriticalFrequency_LeavesGalacticNoiseOut()
    {
        var f = Frequency.FromMegahertz(7.03);

        Assert.False(ExternalNoise.At(NoiseSite.QuietRural, f, NoiseHour.Median).CountsGalactic);
        Assert.True(ExternalNoise.At(NoiseSite.QuietRural, f, NoiseHour.Median, Frequency.FromMegahertz(5)).CountsGalactic);
    }

    [Fact]
    public void ManMade_OneOctaveUp_FallsBy8Decibels() =>
        Assert.Equal(
            -8.34,
            (ExternalNoise.ManMade(NoiseSite.Rural, Frequency.FromMegahertz(14)) - ExternalNoise.ManMade(NoiseSite.Rural, Frequency.FromMegahertz(7))).Db,
            0.005);

    [Fact]
    public void At_QuietRuralAbove30Megahertz_SaysItIsExtrapolated()
    {
        Assert.True(ExternalNoise.At(NoiseSite.QuietRural, Frequency.FromMegahertz(50.1), NoiseHour.Quiet).IsExtrapolated);
        Assert.False(ExternalNoise.At(NoiseSite.QuietRural, Frequency.FromMegahertz(28), NoiseHour.Quiet).IsExtrapolated);
    }

    [Theory]
    [InlineData(0.29)]
    [InlineData(251)]
    public void ManMade_OutsideTheModel_Throws(double mhz) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => ExternalNoise.ManMade(NoiseSite.City, Frequency.FromMegahertz(mhz)));

    [Fact]
    [Evidence(typeof(ExternalNoise), EvidenceKind.ClosedFormLimit)]
    public void FromMeasuredRise_NoRise_IsNoMoreThanTheLoadItself() =>
        Assert.Equal(0, ExternalNoise.FromMeasuredRise(Decibels.FromDb(15), Decibels.Zero).Db, 1e-12);

    [Fact]
    public void FromMeasuredRise_NoiseThatFalls_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => ExternalNoise.FromMeasuredRise(Decibels.FromDb(15), Decibels.FromDb(-1)));

    [Fact]
    public void At_UnknownSite_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => ExternalNoise.At(NoiseSite.Unknown, Frequency.FromMegahertz(7), NoiseHour.Median));

    // The constants c and d printed in itu-r-p372: at one megahertz the logarithm vanishes and c is left.
    [Theory]
    [Evidence(typeof(ExternalNoise), EvidenceKind.PublishedValue)]
    [InlineData(NoiseSite.City, 76.8, 27.7)]
    [InlineData(NoiseSite.Residential, 72.5, 27.7)]
    [InlineData(NoiseSite.Rural, 67.2, 27.7)]
    [InlineData(NoiseSite.QuietRural, 53.6, 28.6)]
    public void ManMade_AtOneAndTenMegahertz_HasThePrintedConstants(NoiseSite site, double c, double d)
    {
        var (one, ten) = (ExternalNoise.ManMade(site, Frequency.FromMegahertz(1)), ExternalNoise.ManMade(site, Frequency.FromMegahertz(10)));

        Assert.Equal(c, one.Db, 1e-9);
        Assert.Equal(d, (one - ten).Db, 1e-9);
    }

    [Fact]
    [Evidence(typeof(ExternalNoise), EvidenceKind.PublishedValue)]
    public void Galactic_AtOneAndTenMegahertz_HasThePrintedConstants()
    {
        Assert.Equal(52, ExternalNoise.Galactic(Frequency.FromMegahertz(1)).Db, 1e-9);
        Assert.Equal(52 - 23, ExternalNoise.Galactic(Frequency.FromMegahertz(10)).Db, 1e-9);
    }

    [Fact]
    [Evidence(typeof(ExternalNoise), EvidenceKind.RoundTrip)]
    public void FromMeasuredRise_RiseThatASiteMakes_GivesTheSiteBack() => Gen.Select(Gen.Double[1, 30], Gen.Double[5, 25]).Sample((mhz, receiverDb) =>
    {
        var (site, receiver) = (ExternalNoise.At(NoiseSite.Rural, Frequency.FromMegahertz(mhz), NoiseHour.Quiet).Figure, Decibels.FromDb(receiverDb));
        var rise = Decibels.FromPowerRatio((site.PowerRatio - 1 + receiver.PowerRatio) / receiver.PowerRatio);
        Assert.Equal(site.Db, ExternalNoise.FromMeasuredRise(receiver, rise).Db, 1e-9);
    });

    [Fact]
    [Evidence(typeof(ExternalNoise), EvidenceKind.Identity)]
    public void At_AnyFrequency_IsQuieterAtTheQuietHourAndQuieterSites() => Gen.Double[0.5, 30].Sample(mhz =>
    {
        double At(NoiseSite site, NoiseHour hour) => ExternalNoise.At(site, Frequency.FromMegahertz(mhz), hour).Figure.Db;
        var sites = new[] { NoiseSite.City, NoiseSite.Residential, NoiseSite.Rural, NoiseSite.QuietRural }.Select(s => At(s, NoiseHour.Median)).ToList();
        Assert.Equal(sites.OrderDescending(), sites);
        Assert.True(At(NoiseSite.Rural, NoiseHour.Quiet) < At(NoiseSite.Rural, NoiseHour.Median));
    });
}
