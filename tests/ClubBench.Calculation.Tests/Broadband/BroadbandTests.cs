using System.Numerics;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Broadband;

public class BroadbandTests
{
    private static readonly FerriteWinding Choke = new(Cores.Find("FT37-43")!, 10);

    public static TheoryData<ReferenceRow> Impedances => ReferenceTable.Theory("ferrite-impedance");

    public static TheoryData<ReferenceRow> Judgements => ReferenceTable.Theory("winding-judgement");

    public static TheoryData<ReferenceRow> Reactances => ReferenceTable.Theory("shunt-reactance");

    [Theory]
    [MemberData(nameof(Impedances))]
    public void Impedance_FerriteChoke_MatchesTheTable(ReferenceRow row)
    {
        var winding = new FerriteWinding(Cores.Find(row["core"])!, (int)row.Number("turns"));
        var z = winding.Impedance(Frequency.FromMegahertz(row.Number("frequency_mhz")), Capacitance.FromPicofarad(row.Number("parallel_pf")))!.Value;

        Assert.Equal(1, z.Real / row.Number("real_ohm"), row.Number("tolerance_relative"));
        Assert.Equal(1, z.Imaginary / row.Number("imaginary_ohm"), row.Number("tolerance_relative"));
    }

    [Theory]
    [InlineData(3.5, 538, 770)]
    [InlineData(7, 835, 1539)]
    [InlineData(10, 992, 2199)]
    [InlineData(14, 1105, 3079)]
    public void Impedance_FromPermeability_IsFarBelowTheIndexAlone(double mhz, double ohm, double fromIndex)
    {
        var f = Frequency.FromMegahertz(mhz);

        Assert.Equal(ohm, Complex.Abs(Choke.Impedance(f)!.Value), 0.51);
        Assert.Equal(fromIndex, Choke.ReactanceFromIndex(f).Ohm, 0.6);
    }

    [Fact]
    public void Impedance_PublishedOneTurnCore_MatchesThePublishedOhms()
    {
        // One turn on a core of 1075 nH: 0.5 + j6 ohm at 1 MHz, 24 + j24 ohm at 14 MHz.
        var core = (FerriteCore)Cores.Find("FT37-43")! with { InductanceFactor = InductanceFactor.FromNanohenryPerTurnSquared(1075) };
        var one = new FerriteWinding(core, 1);

        Assert.Equal(6, one.Impedance(Frequency.FromMegahertz(1))!.Value.Imaginary, 0.05);
        Assert.Equal(0.5, one.Impedance(Frequency.FromMegahertz(1))!.Value.Real, 0.05);
        Assert.Equal(24, one.Impedance(Frequency.FromMegahertz(14))!.Value.Imaginary, 0.05);
        Assert.Equal(24, one.Impedance(Frequency.FromMegahertz(14))!.Value.Real, 0.05);
    }

    [Fact]
    public void Impedance_OutsideTheTable_IsNotStated()
    {
        Assert.Null(Choke.Impedance(Frequency.FromMegahertz(144)));
        Assert.Null(new FerriteWinding(Cores.Find("FT37-77")!, 10).Impedance(Frequency.FromMegahertz(7)));
        Assert.NotNull(Choke.Impedance(Frequency.FromMegahertz(100)));
    }

    [Fact]
    public void Impedance_IronPowder_IsThatOfTheIndex()
    {
        var (winding, f) = (new FerriteWinding(Cores.Find("T50-2")!, 33), Frequency.FromMegahertz(7.1));

        Assert.Equal(winding.ReactanceFromIndex(f).Ohm, winding.Impedance(f)!.Value.Imaginary, 9);
        Assert.Equal(0, winding.Impedance(f)!.Value.Real);
    }

    [Fact]
    public void PermeabilityAt_BetweenTwoPoints_LiesBetweenThem() =>
        Gen.Double[0.1, 100].Sample(mhz =>
        {
            var mu = FerritePermeability.At("43", Frequency.FromMegahertz(mhz))!.Value;
            return mu.Inductive is >= 35 and <= 800 && mu.Lossy is >= 5 and <= 275 + 1e-9;
        });

    [Theory]
    [MemberData(nameof(Judgements))]
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
    public void ChokeJudgement_CollectorChoke_HasTwentyTimesTheLoad()
    {
        var judgement = ChokeJudgement.Of(Choke.Impedance(Frequency.FromMegahertz(10.1))!.Value, Resistance.FromOhm(50));

        Assert.Equal(20, judgement.ImpedanceRatio, 0.5);
        Assert.Equal(Verdict.Leave, judgement.Verdict);
        Assert.Equal(Verdict.Check, ChokeJudgement.Of(new(0, 300), Resistance.FromOhm(50)).Verdict);
        Assert.Equal(Verdict.Change, ChokeJudgement.Of(new(0, 200), Resistance.FromOhm(50)).Verdict);
    }

    [Fact]
    public void LongestWire_30Megahertz_IsAnEighthOfAWavelengthInTheLine() =>
        Assert.Equal(0.875, WindingJudgement.LongestWire(Frequency.FromMegahertz(30)).Metre, 0.001);

    [Theory]
    [InlineData(3, 1, 5, 6, 2)]
    [InlineData(3, 1, 7, 9, 3)]
    [InlineData(10, 5, 11, 12, 6)]
    [InlineData(8, 8, 8, 8, 8)]
    public void KeepRatio_ProposedTurns_ScalesBothWindings(int first, int second, int proposed, int wantedFirst, int wantedSecond) =>
        Assert.Equal((wantedFirst, wantedSecond), WindingJudgement.KeepRatio(first, second, proposed));

    [Theory]
    [InlineData(10, 1.9, 100, 0.0304, Verdict.Leave)]
    [InlineData(1, 1.9, 250, 0.462, Verdict.Change)]
    [InlineData(2.2, 1.9, 250, 0.0996, Verdict.Check)]
    public void Loss_CouplingCapacitor_MatchesTheWorkedExamples(double nanofarad, double mhz, double ohm, double db, Verdict verdict)
    {
        var (c, f, r) = (Capacitance.FromNanofarad(nanofarad), Frequency.FromMegahertz(mhz), Resistance.FromOhm(ohm));

        Assert.Equal(db, CouplingCapacitor.Loss(c, f, r).Db, 0.0006);
        Assert.Equal(verdict, CouplingCapacitor.Judge(c, f, r));
    }

    [Theory]
    [InlineData(1.9, 1.590, Verdict.Change)]
    [InlineData(7.1, 0.135, Verdict.Leave)]
    public void Loss_EmitterBypass_MatchesTheWorkedExamples(double mhz, double db, Verdict verdict)
    {
        var node = CouplingCapacitor.EmitterResistance(Current.FromMilliampere(10)) + Resistance.FromOhm(10);
        var loss = CouplingCapacitor.Loss(Capacitance.FromNanofarad(10), Frequency.FromMegahertz(mhz), node);

        Assert.Equal(db, loss.Db, 0.0006);
        Assert.Equal(verdict, CouplingCapacitor.JudgeBypass(loss));
    }

    [Fact]
    public void Wanted_ReplacementCapacitor_IsLeftByTheSameTest() =>
        Gen.Select(Gen.Double[0.5, 60], Gen.Double[5, 5000]).Sample((mhz, ohm) =>
        {
            var (f, r) = (Frequency.FromMegahertz(mhz), Resistance.FromOhm(ohm));
            return CouplingCapacitor.Judge(CouplingCapacitor.Wanted(f, r), f, r) == Verdict.Leave;
        });

    [Fact]
    public void WithLeads_HundredNanofaradWithTenNanohenry_VanishesAt5Megahertz() =>
        Assert.Equal(0, CouplingCapacitor.WithLeads(Capacitance.FromNanofarad(100), Inductance.FromNanohenry(10), Frequency.FromMegahertz(5.0329)).Ohm, 1e-4);

    [Fact]
    public void CurrentTransformer_TenTurns_MatchesTheWorkedExample()
    {
        var transformer = new CurrentTransformer(10, Resistance.FromOhm(50), Resistance.FromOhm(50));

        Assert.Equal(1.5811, transformer.BurdenRms(Power.FromWatt(5)).Volt, 0.0001);
        Assert.Equal(0.5, transformer.Inserted.Ohm, 12);
        Assert.Equal(0.0433, transformer.Loss.Db, 0.0001);
        Assert.Equal(-20, transformer.Coupling.Db, 9);
        Assert.True(transformer.IsEnough(Choke.Impedance(Frequency.FromMegahertz(3.5))!.Value));
        Assert.False(transformer.IsEnough(new(0, 499)));
    }

    [Theory]
    [InlineData(75.0, 0.1, 1.111)]
    [InlineData(25.0, 0.1667, 1.167)]
    [InlineData(null, 0.5, 2.0)]
    [InlineData(0.0, 0.5, 1.5)]
    [InlineData(50.0, 0.0, 1.0)]
    public void ResistiveBridge_Load_MatchesTheWorkedExamples(double? load, double detector, double standingWaveRatio)
    {
        var bridge = new ResistiveBridge(Resistance.FromOhm(50));
        Resistance? resistance = load is { } ohm ? Resistance.FromOhm(ohm) : null;

        Assert.Equal(detector, bridge.DetectorShare(resistance), 0.00005);
        Assert.Equal(standingWaveRatio, bridge.SourceStandingWaveRatio(resistance), 0.0005);
        Assert.Equal(6.02, ResistiveBridge.MatchedLoss.Db, 0.005);
    }
}
