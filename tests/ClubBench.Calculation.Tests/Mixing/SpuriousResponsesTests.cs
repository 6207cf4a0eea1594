using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Mixing;

public class SpuriousResponsesTests
{
    private static readonly IReadOnlyList<SpuriousResponse> TwentyMetres =
        SpuriousResponses.Of(Frequency.FromMegahertz(5.06), Frequency.FromMegahertz(9));

    public static TheoryData<ReferenceRow> SidebandRows => ReferenceTable.Theory("sidebands");

    [Fact]
    public void Of_20Metres_FindsAllToOrder7() => Assert.Equal(49, TwentyMetres.Count);

    [Theory]
    [Evidence(typeof(SpuriousResponses), EvidenceKind.ClosedFormLimit)]
    [InlineData(0, 3.94, 1, 1, 0)]
    [InlineData(1, 14.06, 1, 1, 0)]
    [InlineData(2, 6.18, 3, 1, 9.54)]
    [InlineData(3, 24.18, 3, 1, 9.54)]
    [InlineData(4, 16.30, 5, 1, 13.98)]
    [InlineData(5, 34.30, 5, 1, 13.98)]
    [InlineData(6, 9.0, 0, 1, 25)]
    [InlineData(7, 1.12, 2, 1, 31.02)]
    [InlineData(8, 19.12, 2, 1, 31.02)]
    public void Of_20Metres_RanksTheFirst(int index, double mhz, int m, int n, double rankDb)
    {
        var response = TwentyMetres[index];

        Assert.Equal(mhz * 1e6, response.Frequency.Hertz, 1.0);
        Assert.Equal((m, n), (response.OscillatorOrder, response.SignalOrder));
        Assert.Equal(rankDb, response.Rank.Db, 0.05);
    }

    [Fact]
    [Evidence(typeof(SpuriousResponses), EvidenceKind.Identity)]
    public void Of_AnyResponse_MixesToTheIntermediate() => Assert.All(TwentyMetres, r =>
    {
        var (lo, rf) = (r.OscillatorOrder * 5.06e6, r.SignalOrder * r.Frequency.Hertz);
        Assert.True(new[] { lo + rf, Math.Abs(lo - rf) }.Any(f => Math.Abs(f - 9e6) < 1), r.ToString());
    });

    [Fact]
    public void Of_UnbalancedMixer_RanksEvenOrdersHigher() =>
        Assert.Equal(0, SpuriousResponses.Of(Frequency.FromMegahertz(5.06), Frequency.FromMegahertz(9), balanced: false).Single(r => r is { OscillatorOrder: 0, SignalOrder: 1 }).Rank.Db);

    [Theory]
    [InlineData(InjectionSide.LowSide, 9, 14.0, 14.35)]
    public void WithSignal_CleanScheme_FindsNone(InjectionSide side, double mid, double low, double high) =>
        Assert.Empty(Find(side, mid, low, high));

    [Theory]
    [Evidence(typeof(Birdies), EvidenceKind.ClosedFormLimit)]
    [InlineData(InjectionSide.SumToIntermediate, 9, 3.5, 3.8, 3.6, 1, 4, true)]
    [InlineData(InjectionSide.SumToIntermediate, 9, 3.5, 3.8, 3.6, 3, 2, true)]
    [InlineData(InjectionSide.HighSide, 9, 3.5, 3.8, 3.6, 1, 6, true)]
    [InlineData(InjectionSide.HighSide, 4.7, 14.0, 14.35, 14.1, 2, 3, true)]
    [InlineData(InjectionSide.LowSide, 10.7, 21.0, 21.45, 21.4, 1, 0, true)]
    [InlineData(InjectionSide.LowSide, 9, 18.068, 18.168, 18.0, 1, 0, false)]
    public void WithSignal_KnownBirdie_IsFound(
        InjectionSide side, double mid, double low, double high, double mhz, int m, int n, bool inside) =>
        Assert.Contains(Find(side, mid, low, high), b =>
            Math.Abs(b.Signal.Hertz - (mhz * 1e6)) < 1 && (b.OscillatorOrder, b.OtherOrder, b.IsInside) == (m, n, inside));

    [Fact]
    public void WithSignal_17MetresWith9Megahertz_HasNoneInside() =>
        Assert.DoesNotContain(Find(InjectionSide.LowSide, 9, 18.068, 18.168), b => b.IsInside);

    [Fact]
    public void WithSignal_KeptCrystalsOf80MetreSetOn40Metres_WhistlesAtTheEdge() =>
        Assert.Contains(Find(InjectionSide.LowSide, 5.9991, 7.0, 7.08), b => b.OscillatorOrder == 6 && b.OtherOrder == 0 && Math.Abs(b.Signal.Megahertz - 6.99895) < 1e-5);

    [Fact]
    public void Internal_ThirdHarmonicOfTheBeatOscillator_IsFoundOnDialAndIntermediate()
    {
        var whistles = Birdies.Internal(Scheme(InjectionSide.HighSide, 4.7), Band(14.0, 14.35), Frequency.FromMegahertz(4.6985));

        Assert.Contains(whistles, b => (b.OscillatorOrder, b.OtherOrder) == (0, 3) && Math.Abs(b.Signal.Hertz - 14_095_500) < 1);
        Assert.Contains(whistles, b => (b.OscillatorOrder, b.OtherOrder) == (1, 3) && Math.Abs(b.Signal.Hertz - 14_095_500) < 1);
    }

    [Fact]
    public void Internal_CleanScheme_FindsNoneToOrder8() =>
        Assert.DoesNotContain(
            Birdies.Internal(Scheme(InjectionSide.HighSide, 4.9152), Band(14.0, 14.35), Frequency.FromMegahertz(4.9137), 8), b => b.IsInside);

    [Fact]
    public void WithSignal_DirectConversion_IsEmpty() =>
        Assert.Empty(Birdies.WithSignal(FrequencyScheme.DirectConversion, Band(7.0, 7.2)));

    [Theory]
    [Evidence(typeof(Sidebands), EvidenceKind.ClosedFormLimit)]
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
            var other => throw new InvalidOperationException(other),
        };

        Assert.Equal(row.Number("expected"), figure, row.Number("tolerance"));
    }

    [Fact]
    public void AtIntermediate_OscillatorBelow_KeepsTheSideband()
    {
        var carrier = Sidebands.CarrierFor(
            Sidebands.AtIntermediate(Sideband.Upper, Scheme(InjectionSide.LowSide, 9)), Frequency.FromMegahertz(9), new FrequencyRange(Frequency.FromHertz(300), Frequency.FromHertz(2700)));

        Assert.Equal(8_998_500, carrier.Hertz, 1e-6);
    }

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

    private static IReadOnlyList<Birdie> Find(InjectionSide side, double mid, double low, double high) =>
        Birdies.WithSignal(Scheme(side, mid), Band(low, high));

    private static FrequencyScheme Scheme(InjectionSide side, double mid) => new(side, Frequency.FromMegahertz(mid));

    private static FrequencyRange Band(double low, double high) => FrequencyRange.FromMegahertz(low, high);

    private static FrequencyRange Audio(ReferenceRow row) => new(Frequency.FromHertz(row.Number("a")), Frequency.FromHertz(row.Number("b")));
}
