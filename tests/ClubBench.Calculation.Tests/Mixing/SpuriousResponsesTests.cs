using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Mixing;

public class SpuriousResponsesTests
{
    private static readonly IReadOnlyList<SpuriousResponse> TwentyMetres =
        SpuriousResponses.Of(Frequency.FromMegahertz(5.06), Frequency.FromMegahertz(9));

    public static TheoryData<ReferenceRow> RankedRows => ReferenceTable.Theory("spurious-responses");

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
}
