using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Tests.Bands;

/// <summary>Edges are those of the ITU Radio Regulations, Article 5, table of allocations; segments and centres those of the IARU Region 1 HF band plan.</summary>
public class AmateurBandsTests
{
    [Fact]
    public void Names_All_RunFromTheLongestWave() =>
        Assert.Equal(["160 m", "80 m", "60 m", "40 m", "30 m", "20 m", "17 m", "15 m", "12 m", "10 m", "6 m"], AmateurBands.Names);

    [Theory]
    [InlineData("30 m", ItuRegion.Region1, 10.1, 10.15)]
    [InlineData("20 m", ItuRegion.Region1, 14.0, 14.35)]
    [InlineData("40 m", ItuRegion.Region1, 7.0, 7.2)]
    [InlineData("40 m", ItuRegion.Region2, 7.0, 7.3)]
    [InlineData("160 m", ItuRegion.Region1, 1.81, 1.85)]
    [Evidence(typeof(AmateurBands), EvidenceKind.PublishedValue)]
    public void Allocation_BandInARegion_JoinsItsParts(string band, ItuRegion region, double low, double high) =>
        Assert.Equal(FrequencyRange.FromMegahertz(low, high), AmateurBands.Allocation(band, region)!.Range);

    [Fact]
    [Evidence(typeof(AmateurBands), EvidenceKind.Identity)]
    public void Allocation_EveryBandAndRegion_HasPartsThatAdjoin() =>
        Assert.All(
            from n in AmateurBands.Names from r in Regions select AmateurBands.Allocation(n, r)!,
            a => Assert.All(a.Parts.Zip(a.Parts.Skip(1)), p => Assert.Equal(p.First.Range.High, p.Second.Range.Low)));

    [Fact]
    [Evidence(typeof(AmateurBands), EvidenceKind.Identity)]
    public void Segments_EveryPlanRow_LiesInsideItsAllocation() =>
        Assert.All(
            AmateurBands.All.Where(s => s.Use >= BandUse.CwSegment),
            s => Assert.True(AmateurBands.Allocation(s.Band, s.Region)!.Range is var a && a.Contains(s.Range.Low) && a.Contains(s.Range.High), s.ToString()));

    [Theory]
    [InlineData("20 m", 14.0, 14.07, 14.06)]
    [InlineData("40 m", 7.0, 7.04, 7.03)]
    [InlineData("30 m", 10.1, 10.13, 10.116)]
    [Evidence(typeof(AmateurBands), EvidenceKind.PublishedValue)]
    public void CwSegmentAndCentre_Region1_AreThoseOfThePlan(string band, double low, double high, double centre)
    {
        Assert.Equal(FrequencyRange.FromMegahertz(low, high), AmateurBands.CwSegment(band, ItuRegion.Region1)!.Range);
        Assert.Equal(centre, AmateurBands.QrpCwCentres(band, ItuRegion.Region1)[0].Range.Low.Megahertz, 9);
    }

    [Fact]
    public void QrpCwCentres_40MetresRegion2_AreBoth() =>
        Assert.Equal([7.03, 7.04], AmateurBands.QrpCwCentres("40 m", ItuRegion.Region2).Select(s => Math.Round(s.Range.Low.Megahertz, 9)));

    [Fact]
    public void Containing_Frequency_FindsTheBand()
    {
        Assert.Equal("20 m", AmateurBands.Containing(Frequency.FromMegahertz(14.06), ItuRegion.Region1)!.Band);
        Assert.Null(AmateurBands.Containing(Frequency.FromMegahertz(13.996), ItuRegion.Region1));
        Assert.Null(AmateurBands.Containing(Frequency.FromMegahertz(7.25), ItuRegion.Region1));
    }

    [Fact]
    public void IsChecked_EdgesFromMemory_StayMarked()
    {
        Assert.False(AmateurBands.Allocation("30 m", ItuRegion.Region1)!.IsChecked);
        Assert.True(AmateurBands.Allocation("80 m", ItuRegion.Region1)!.IsChecked);
        Assert.Equal(SourceStatus.FromMemory, AmateurBands.CwSegment("20 m", ItuRegion.Region1)!.Source.Status);
    }

    [Fact]
    public void Allocation_30Metres_IsSecondary()
    {
        Assert.True(AmateurBands.Allocation("30 m", ItuRegion.Region2)!.IsSecondary);
        Assert.False(AmateurBands.Allocation("20 m", ItuRegion.Region2)!.IsSecondary);
    }

    [Fact]
    public void Allocation_UnknownBand_IsNull() => Assert.Null(AmateurBands.Allocation("4 m", ItuRegion.Region1));

    [Fact]
    public void All_Rows_NameAResolvableSource() => Assert.All(AmateurBands.All, s => Assert.NotNull(Sources.Find(s.Source.SourceId)));

    private static IEnumerable<ItuRegion> Regions => [ItuRegion.Region1, ItuRegion.Region2, ItuRegion.Region3];

    [Fact]
    [Evidence(typeof(AmateurBands), EvidenceKind.RoundTrip)]
    public void Containing_EdgesAndMiddleOfEveryPart_NameTheBandAgain() =>
        Assert.All(
            from n in AmateurBands.Names from r in Regions from p in AmateurBands.Allocation(n, r)!.Parts from f in new[] { p.Range.Low, p.Range.Middle, p.Range.High } select (n, r, f),
            x => Assert.Equal(x.n, AmateurBands.Containing(x.f, x.r)!.Band));
}
