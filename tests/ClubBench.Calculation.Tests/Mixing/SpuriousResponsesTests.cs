using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Mixing;

public class SpuriousResponsesTests
{
    private static readonly IReadOnlyList<SpuriousResponse> TwentyMetres =
        SpuriousResponses.Of(Frequency.FromMegahertz(5.06), Frequency.FromMegahertz(9));

    public static TheoryData<ReferenceRow> SidebandRows => ReferenceTable.Theory("sidebands");

    public static TheoryData<ReferenceRow> RankedRows => ReferenceTable.Theory("spurious-responses");

    public static TheoryData<ReferenceRow> BirdieRows => ReferenceTable.Theory("birdies");

    [Fact]
    public void Of_20Metres_FindsAllToOrder7() => Assert.Equal(49, TwentyMetres.Count);

    [Theory]
    [Evidence(typeof(SpuriousResponses), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(RankedRows))]
    public void Of_20Metres_RanksLikeTheTable(ReferenceRow row)
    {
        var response = TwentyMetres[(int)row.Number("place")];

        Assert.Equal(row.Number("expected_mhz") * 1e6, response.Frequency.Hertz, row.Number("tolerance_hz"));
        Assert.Equal((row.Number("oscillator_order"), row.Number("signal_order")), (response.OscillatorOrder, response.SignalOrder));
        Assert.Equal(row.Number("expected_rank_db"), response.Rank.Db, row.Number("tolerance_db"));
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
    [MemberData(nameof(BirdieRows))]
    public void Birdies_ReferenceRow_AreFound(ReferenceRow row)
    {
        var (scheme, band) = (Scheme(Enum.Parse<InjectionSide>(row["side"]), row.Number("if_mhz")), Band(row.Number("low_mhz"), row.Number("high_mhz")));

        var found = row["kind"] == "signal" ? Birdies.WithSignal(scheme, band) : Birdies.Internal(scheme, band, Frequency.FromMegahertz(row.Number("beat_mhz")));

        Assert.Contains(found, b => Math.Abs(b.Signal.Hertz - (row.Number("expected_mhz") * 1e6)) < row.Number("tolerance_hz")
            && (b.OscillatorOrder, b.OtherOrder, b.IsInside) == ((int)row.Number("oscillator_order"), (int)row.Number("other_order"), row["inside"] == "yes"));
    }

    [Fact]
    public void WithSignal_AnyScheme_CrossesWhereTheProductIsTheIntermediate() => Gen.Select(Gen.Double[3, 29], Gen.Double[0.455, 11], Gen.Int[2, 4]).Sample((low, mid, side) =>
    {
        var scheme = Scheme((InjectionSide)side, mid);
        return Birdies.WithSignal(scheme, Band(low, low + 0.3)).All(b => scheme.OscillatorFor(b.Signal) is not { } lo
            || new[] { 1, -1 }.Any(n => Math.Abs(Math.Abs((b.OscillatorOrder * lo.Hertz) + (n * b.OtherOrder * b.Signal.Hertz)) - (mid * 1e6)) < 1));
    });

    [Fact]
    public void WithSignal_17MetresWith9Megahertz_HasNoneInside() =>
        Assert.DoesNotContain(Find(InjectionSide.LowSide, 9, 18.068, 18.168), b => b.IsInside);

    [Fact]
    public void WithSignal_KeptCrystalsOf80MetreSetOn40Metres_WhistlesAtTheEdge() =>
        Assert.Contains(Find(InjectionSide.LowSide, 5.9991, 7.0, 7.08), b => b.OscillatorOrder == 6 && b.OtherOrder == 0 && Math.Abs(b.Signal.Megahertz - 6.99895) < 1e-5);

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
    public void Behind_ResonatorAtTheSignal_PutsTheImageBelowTheSignal()
    {
        var signal = Frequency.FromMegahertz(14.06);

        var behind = SpuriousResponses.Behind(TwentyMetres, f => Decibels.FromPowerRatio(1 + Math.Pow(20 * ((f / signal) - (signal / f)), 2)), signal);

        Assert.Equal(signal.Hertz, behind[0].Frequency.Hertz, 1e-3);
        Assert.Equal(0, behind[0].Total.Db, 1e-9);
        Assert.Equal(36.4, behind.Single(r => Math.Abs(r.Frequency.Megahertz - 3.94) < 1e-6).Total.Db, 0.1);
        Assert.Equal(TwentyMetres.Count, behind.Count);
    }

    [Fact]
    public void OfDirectConversion_Seven_AnswersOnHarmonicsAndTheirFractions()
    {
        var responses = SpuriousResponses.OfDirectConversion(Frequency.FromMegahertz(7.03));

        Assert.Equal((7.03, 0.0), (Math.Round(responses[0].Frequency.Megahertz, 6), responses[0].Rank.Db));
        Assert.Equal(21.09, responses[1].Frequency.Megahertz, 1e-9);
        Assert.Contains(responses, r => (r.OscillatorOrder, r.SignalOrder) == (1, 2) && Math.Abs(r.Frequency.Megahertz - 3.515) < 1e-9);
        Assert.Equal(responses.Count, responses.Select(r => Math.Round(r.Frequency.Hertz)).Distinct().Count());
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
