using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Broadband;

public class WindingJudgementTests
{
    public static TheoryData<ReferenceRow> Judgements => ReferenceTable.Theory("winding-judgement");

    public static TheoryData<ReferenceRow> Reactances => ReferenceTable.Theory("shunt-reactance");

    [Theory]
    [MemberData(nameof(Judgements))]
    [Evidence(typeof(WindingJudgement), EvidenceKind.IndependentRecomputation)]
    public void JudgementOf_Winding_MatchesTheTable(ReferenceRow row)
    {
        var winding = new FerriteWinding(Cores.Find(row["core"])!, (int)row.Number("turns"));
        var duty = new WindingDuty(winding, Frequency.FromMegahertz(row.Number("frequency_mhz")), Resistance.FromOhm(row.Number("resistance_ohm")))
        {
            WidenForTolerance = false,
        };

        var judgement = WindingJudgement.Of(duty)!;

        Assert.Equal(1, judgement.Loading.Impedance.Real / row.Number("real_ohm"), 0.005);
        Assert.Equal(1, judgement.Loading.Impedance.Imaginary / row.Number("imaginary_ohm"), 0.005);
        Assert.Equal(row.Number("ratio"), judgement.Loading.Ratio, 0.0051);
        Assert.Equal(row.Number("insertion_db"), judgement.Loading.InsertionLoss.Db, 0.0006);
        Assert.Equal(row.Number("dissipation_db"), judgement.Loading.CoreDissipation.Db, 0.0006);
        Assert.Equal(row["verdict"], judgement.Verdict.ToString());
        Assert.Equal(row.Number("proposed_turns"), judgement.ProposedTurns);
    }

    [Fact]
    public void JudgementOf_JustEnoughTurns_IsUncertainOnceTolerancesCount()
    {
        var duty = new WindingDuty(new(Cores.Find("FT37-61")!, 11), Frequency.FromMegahertz(5), Resistance.FromOhm(50));

        Assert.Equal(Verdict.Leave, WindingJudgement.Of(duty with { WidenForTolerance = false })!.Verdict);
        Assert.Equal((Verdict.Check, WindingReason.Uncertain), (WindingJudgement.Of(duty)!.Verdict, WindingJudgement.Of(duty)!.Reason));
        Assert.Equal(Verdict.Leave, WindingJudgement.Of(duty with { Winding = duty.Winding with { Turns = 20 } })!.Verdict);
    }

    [Fact]
    [Evidence(typeof(WindingJudgement), EvidenceKind.RoundTrip)]
    public void JudgementOf_ProposedTurns_PassTheSameTest() =>
        Gen.Select(Gen.Int[1, 12], Gen.Double[1, 20], Gen.Double[10, 300]).Sample((turns, mhz, ohm) =>
        {
            var duty = new WindingDuty(new(Cores.Find("FT50-43")!, turns), Frequency.FromMegahertz(mhz), Resistance.FromOhm(ohm)) { WidenForTolerance = false };
            var proposed = duty with { Winding = duty.Winding with { Turns = WindingJudgement.Of(duty)!.ProposedTurns } };
            return WindingJudgement.Of(proposed)!.Verdict == Verdict.Leave;
        });

    [Theory]
    [InlineData(CoreLoad.Check, CoreLoad.Good, false, Verdict.Check, WindingReason.Flux)]
    [InlineData(CoreLoad.Refuse, CoreLoad.Good, false, Verdict.Change, WindingReason.Flux)]
    [InlineData(CoreLoad.Good, CoreLoad.Check, false, Verdict.Check, WindingReason.Bias)]
    [InlineData(CoreLoad.Good, CoreLoad.Refuse, false, Verdict.Change, WindingReason.Bias)]
    [InlineData(CoreLoad.Good, CoreLoad.Good, true, Verdict.Change, WindingReason.WireLength)]
    [InlineData(CoreLoad.Good, CoreLoad.Good, false, Verdict.Leave, WindingReason.None)]
    public void JudgementOf_AmpleImpedance_IsDecidedByTheRest(CoreLoad flux, CoreLoad bias, bool isLong, Verdict verdict, WindingReason reason)
    {
        var duty = new WindingDuty(new(Cores.Find("FT37-61")!, 20), Frequency.FromMegahertz(5), Resistance.FromOhm(50))
        {
            Flux = flux, Bias = bias, IsWireTooLong = isLong,
        };

        var judgement = WindingJudgement.Of(duty)!;

        Assert.Equal((verdict, reason), (judgement.Verdict, judgement.Reason));
    }

    [Theory]
    [MemberData(nameof(Reactances))]
    public void Loading_PureReactance_MatchesTheTable(ReferenceRow row)
    {
        var loading = new ShuntLoading(new(0, 50 * row.Number("ratio")), Resistance.FromOhm(50));

        Assert.Equal(row.Number("insertion_db"), loading.InsertionLoss.Db, 0.0006);
        Assert.Equal(row.Number("standing_wave_ratio"), loading.StandingWaveRatio, 0.0051);
        Assert.Equal(0, loading.CoreDissipation.Db, 12);
    }

    [Fact]
    public void CoreDissipation_PublishedConductance_MatchesThePublishedLoss() =>
        Assert.Equal(0.35, new ShuntLoading(1 / 1.68e-3, Resistance.FromOhm(50)).CoreDissipation.Db, 0.005);

    [Fact]
    [Evidence(typeof(WindingJudgement), EvidenceKind.ClosedFormLimit)]
    public void LongestWire_30Megahertz_IsAnEighthOfAWavelengthInTheLine() =>
        Assert.Equal(0.875, WindingJudgement.LongestWire(Frequency.FromMegahertz(30)).Metre, 0.001);

    [Theory]
    [InlineData(3, 1, 5, 6, 2)]
    [InlineData(3, 1, 7, 9, 3)]
    [InlineData(10, 5, 11, 12, 6)]
    [InlineData(8, 8, 8, 8, 8)]
    public void KeepRatio_ProposedTurns_ScalesBothWindings(int first, int second, int proposed, int wantedFirst, int wantedSecond) =>
        Assert.Equal((wantedFirst, wantedSecond), WindingJudgement.KeepRatio(first, second, proposed));

    [Fact]
    [Evidence(typeof(WindingJudgement), EvidenceKind.Identity)]
    public void KeepRatio_AnyTransformer_KeepsTheRatioWithNoSmallerPairThatServes() =>
        Gen.Select(Gen.Int[1, 30], Gen.Int[1, 30], Gen.Int[1, 60]).Sample((first, second, proposed) =>
        {
            var kept = WindingJudgement.KeepRatio(first, second, proposed);
            bool Serves(int a, int b) => a >= proposed && (long)a * second == (long)b * first;
            return Serves(kept.First, kept.Second) && !Enumerable.Range(1, kept.Second - 1).Any(b => Serves(b * first / second, b));
        });

    [Fact]
    [Evidence(typeof(WindingJudgement), EvidenceKind.Identity)]
    public void JudgementOf_TwiceTheTurnsAtFourTimesTheResistance_IsTheSame() =>
        Gen.Select(Gen.Int[1, 20], Gen.Double[1, 20], Gen.Double[10, 300]).Sample((turns, mhz, ohm) =>
        {
            var duty = new WindingDuty(new(Cores.Find("FT50-43")!, turns), Frequency.FromMegahertz(mhz), Resistance.FromOhm(ohm));
            var scaled = duty with { Winding = duty.Winding with { Turns = 2 * turns }, Resistance = 4 * duty.Resistance };
            return WindingJudgement.Of(duty)!.Verdict == WindingJudgement.Of(scaled)!.Verdict;
        });
}
