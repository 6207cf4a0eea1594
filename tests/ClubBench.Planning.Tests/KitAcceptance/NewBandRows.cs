using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Tests.KitAcceptance;

/// <summary>"What a correct conversion must find", row by row. Figures as printed in the description of the demonstration kit; tolerance its last digit.</summary>
public class NewBandRows
{
    private static StageDocument Oscillator(double megahertz, double femtofarad, double picofarad, double? microhenry = null)
    {
        var stage = KitA.With(KitA.Kit.Stage("A1"), ("X1", x => KitA.Marked(x, megahertz, femtofarad, picofarad)), ("X2", x => KitA.Marked(x, megahertz, femtofarad, picofarad)));
        return microhenry is { } uh ? KitA.With(stage, ("L1", l => l.With((PartValue.Inductance, uh * 1e-6)))) : stage;
    }

    private static Chain On(string band, StageDocument stage) => KitA.Kept(band, KitA.Kit.With(stage));

    private static IReadOnlyList<Finding> Judged(Chain chain, string stage) =>
        chain.KindOf(stage).Judge(chain.Kit.Stage(stage), chain.Model(stage), chain.SurroundingsOf(stage), Planning.Budgets.ChainBudgets.Ask(stage, chain));

    [Fact]
    public void A1On20m_ChokeOf10uHKept_IsChangeBecauseItLeavesTheBand()
    {
        var chain = On("20 m", Oscillator(14.060, 22, 4.8));
        var findings = Judged(chain, "A1");

        Assert.Equal(13.996e6, KitA.Figure(chain, "A1", "lowest-frequency"), 500.0);
        Assert.Equal(14.058e6, KitA.Figure(chain, "A1", "highest-frequency"), 500.0);
        Assert.Equal(62e3, KitA.Figure(chain, "A1", "span"), 500.0);
        Assert.Contains(findings, f => f is { Code: "oscillator.leaves-band", AtLeast: StageAction.Change });
        Assert.Contains(findings, f => f.Code == "oscillator.stretched");
    }

    [Fact]
    public void A1On20m_ChokeOf6u8_Covers27KilohertzAndStaysInside()
    {
        var chain = On("20 m", Oscillator(14.060, 22, 4.8, 6.8));

        Assert.Equal(14.0375e6, KitA.Figure(chain, "A1", "lowest-frequency"), 50.0);
        Assert.Equal(14.0643e6, KitA.Figure(chain, "A1", "highest-frequency"), 50.0);
        Assert.Equal(27e3, KitA.Figure(chain, "A1", "span"), 500.0);
        Assert.DoesNotContain(Judged(chain, "A1"), f => f.AtLeast >= StageAction.Change && f.OpenItem == OpenItemCodes.OscillatorRange);
    }

    [Fact]
    public void A1On40m_ChokeOf10uHKept_HardlyTunes()
    {
        var chain = On("40 m", Oscillator(7.030, 16, 4.2));

        Assert.Equal(5.2e3, KitA.Figure(chain, "A1", "span"), 50.0);
        Assert.Contains(Judged(chain, "A1"), f => f is { Code: "oscillator.hardly-tunes", AtLeast: StageAction.Change });
    }

    [Fact]
    public void A1On40m_ChokeOf33uH_Covers12Kilohertz()
    {
        var chain = On("40 m", Oscillator(7.030, 16, 4.2, 33));

        Assert.Equal(7.0183e6, KitA.Figure(chain, "A1", "lowest-frequency"), 50.0);
        Assert.Equal(7.0307e6, KitA.Figure(chain, "A1", "highest-frequency"), 50.0);
        Assert.Equal(12.4e3, KitA.Figure(chain, "A1", "span"), 50.0);
        Assert.DoesNotContain(Judged(chain, "A1"), f => f.AtLeast >= StageAction.Change);
    }

    [Fact]
    public void A1OffsetOn20m_CapacitorUnchanged_IsWrongByAFactorOfTwo()
    {
        var chain = On("20 m", Oscillator(14.060, 22, 4.8, 6.8));
        var wrong = Judged(chain, "A1").Single(f => f.Code == "oscillator.offset-wrong");

        Assert.Equal(-1441, KitA.Figure(chain, "A1", "receive-offset"), 0.5);
        Assert.Equal(2.06, wrong.Figures.Single(f => f.Name == "factor").Si, 0.005);
        Assert.Equal(OpenItemCodes.Offset, wrong.OpenItem);
    }

    [Theory]
    [InlineData(39)]
    [InlineData(47)]
    public void A1OffsetOn20m_CapacitorOf39To47_IsFine(double picofarad)
    {
        var stage = KitA.With(Oscillator(14.060, 22, 4.8, 6.8), ("C5", c => KitA.Holding(c, picofarad)));

        Assert.DoesNotContain(Judged(On("20 m", stage), "A1"), f => f.OpenItem == OpenItemCodes.Offset);
    }

    [Fact]
    public void A1OffsetOn40m_With33uH_IsFineUnchanged()
    {
        var chain = On("40 m", Oscillator(7.030, 16, 4.2, 33));

        Assert.Equal(-662, KitA.Figure(chain, "A1", "receive-offset"), 0.5);
        Assert.DoesNotContain(Judged(chain, "A1"), f => f.OpenItem == OpenItemCodes.Offset);
    }

    [Theory]
    [InlineData("20 m", 14.05, 20, 80.2)]
    [InlineData("40 m", 7.03, 24, 222.5)]
    public void A3Tank_NamedTurnsOnT50Dash6_NeedNamedCapacitance(string band, double megahertz, int turns, double picofarad)
    {
        var stage = KitA.With(KitA.Kit.Stage("A3"), ("L2", l => KitA.Wound(l, "T50-6", turns)));
        var kit = KitA.Kit.With(stage);
        var at = Frequency.FromMegahertz(megahertz);
        var chain = new Chain(kit, ChainConditions.On(KitA.Target(band) with { Reference = at }, kit, LearntValues.None));

        Assert.Equal(picofarad, KitA.Figure(chain, "A3", "needed-capacitance") * 1e12, 0.06);
    }

    [Fact]
    public void A4On20m_GainFalls_ByAbout2Point9Decibels()
    {
        var chain = KitA.Kept("20 m");
        var lost = KitA.Figure(KitA.OwnBand(), "A4", "gain") - KitA.Figure(chain, "A4", "gain");

        Assert.Equal(2.9, lost, 0.1);
        Assert.Equal(13.5, KitA.Figure(chain, "A4", "transition-ratio"), 0.05);
    }

    [Fact]
    public void A4_ChokeOnTheNewBands_IsFineAndItsDirectCurrentWarningStays()
    {
        var (twenty, forty) = (KitA.Kept("20 m"), KitA.Kept("40 m"));

        Assert.Equal(1100, KitA.Figure(twenty, "A4", "choke-impedance"), 50.0);
        Assert.Equal(840, KitA.Figure(forty, "A4", "choke-impedance"), 10.0);
        Assert.All(new[] { twenty, forty }, c => Assert.Contains(Judged(c, "A4"), f => f.Code == "final.choke-biased"));
        Assert.All(new[] { twenty, forty }, c => Assert.DoesNotContain(Judged(c, "A4"), f => f.OpenItem == OpenItemCodes.ChokeReactance));
    }

    [Fact]
    public void A5Unconverted_On20m_LosesThePowerAndIsRefused()
    {
        var chain = KitA.Kept("20 m");

        Assert.Equal(6.7, KitA.LossDb(chain, "A5", 14.06), 0.05);
        Assert.Equal(1.5, KitA.ReturnLossDb(chain, "A5", 14.06), 0.05);
        Assert.Contains(Judged(chain, "A5"), f => f is { Code: "filter.blocks-band", Severity: Severity.Fault, OpenItem: OpenItemCodes.OutputFilter });
    }

    [Fact]
    public void A5Unconverted_On40m_LeavesTheSecondHarmonicAtMinus19()
    {
        var plan = KitA.Plan("40 m", new Choice("A5", Choice.Keep));
        var raw = KitA.Kept("40 m").Facet<Planning.StageKinds.IMakesHarmonics>("A4")!.Harmonic(2).Level.Db;

        Assert.Equal(6.7, KitA.LossDb(KitA.Kept("40 m"), "A5", 14.06), 0.05);
        Assert.Equal(-19, raw - KitA.LossDb(KitA.Kept("40 m"), "A5", 14.06), 0.5);
        Assert.Contains(plan.OpenItems, i => i.Code == OpenItemCodes.Harmonics);
    }

    [Theory]
    [InlineData("20 m", 200, 360, "T37-6", 15, 16, 14.05, 26.5, 41.0, 18.5, 20)]
    [InlineData("40 m", 390, 750, "T50-2", 16, 17, 7.03, 33.0, 38.9, 9.47, 20)]
    public void A5Converted_OneGoodAnswer_ComesOutAsPrinted(string band, double outer, double inner, string core, int turns, int middle, double at, double leastReturnLoss, double second, double cutOff, double wanted)
    {
        var chain = On(band, GoodFilter(outer, inner, core, turns, middle));

        Assert.Equal(0.2, KitA.LossDb(chain, "A5", at), 0.05);
        Assert.InRange(KitA.ReturnLossDb(chain, "A5", at), Math.Max(wanted, leastReturnLoss - 0.5), 60);
        Assert.Equal(second, KitA.LossDb(chain, "A5", 2 * at), 0.1);
        Assert.Equal(cutOff * 1e6, KitA.Figure(chain, "A5", "cut-off"), 0.5e5);
    }

    [Theory]
    [InlineData("20 m", 200, 360, "T37-6", 15, 16)]
    [InlineData("40 m", 390, 750, "T50-2", 16, 17)]
    public void A5_PlannersOwnFirstChoice_HasNoSmallerWorstMarginThanTheGoodAnswer(string band, double outer, double inner, string core, int turns, int middle)
    {
        var good = KitA.Plan(band, new Choice("A5", "by-hand", GoodFilter(outer, inner, core, turns, middle)));
        var own = KitA.Plan(band);

        Assert.True(WorstFilterMargin(own) >= WorstFilterMargin(good));
        Assert.DoesNotContain(own.OpenItems, i => i.Stage == "A5");
    }

    [Theory]
    [InlineData("20 m", 14.060, 22, 4.8, 6.8, 39.0)]
    [InlineData("40 m", 7.030, 16, 4.2, 33.0, 100.0)]
    public void A1_PlannersOwnFirstChoice_MeetsTheSameLimitsAsTheGoodAnswer(string band, double megahertz, double femtofarad, double picofarad, double microhenry, double offset)
    {
        var good = KitA.With(Oscillator(megahertz, femtofarad, picofarad, microhenry), ("C5", c => KitA.Holding(c, offset)));
        var own = KitA.Plan(band);
        var byHand = KitA.Plan(band, new Choice("A1", "by-hand", good));

        Assert.DoesNotContain(byHand.OpenItems, i => i.Stage == "A1");
        Assert.DoesNotContain(own.OpenItems, i => i.Stage == "A1");
        Assert.True(own.Stage("A1").Alternatives[0].WorstMargin.Si >= MarginOf(own, good));
    }

    [Theory]
    [InlineData("20 m", 18.9, true)]
    [InlineData("40 m", 75.4, false)]
    public void A6_ChokeKept_NeedsTheNamedCapacitance(string band, double picofarad, bool insideTrimmer)
    {
        var at = Frequency.FromMegahertz(band == "20 m" ? 14.05 : 7.03);
        var chain = new Chain(KitA.Kit, ChainConditions.On(KitA.Target(band) with { Reference = at }, KitA.Kit, LearntValues.None));
        var findings = Judged(chain, "A6");

        Assert.Equal(picofarad, KitA.Figure(chain, "A6", "needed-capacitance") * 1e12, 0.05);
        Assert.Equal(!insideTrimmer, findings.Any(f => f is { AtLeast: StageAction.Change, OpenItem: OpenItemCodes.ReceiveTap }));
        Assert.Contains(findings, f => f.AtLeast >= StageAction.Check);
    }

    [Theory]
    [InlineData("15 m")]
    [InlineData("10 m")]
    public void A6_HighBand_IsRetunedWithASmallerChoke(string band)
    {
        var plan = KitA.Plan(band);

        Assert.Equal(StageAction.Change, plan.Stage("A6").Action);
        Assert.DoesNotContain(plan.OpenItems, i => i.Stage == "A6");
    }

    [Theory]
    [InlineData("20 m", "T50-6", 22, 66.3, 14.05)]
    [InlineData("40 m", "T50-2", 28, 133, 7.03)]
    public void A7_NamedTurns_NeedTheNamedCapacitance(string band, string core, int turns, double picofarad, double megahertz)
    {
        var kit = KitA.Kit.With(KitA.With(KitA.Kit.Stage("A7"), ("L8", l => KitA.Wound(l, core, turns))));
        var chain = new Chain(kit, ChainConditions.On(KitA.Target(band) with { Reference = Frequency.FromMegahertz(megahertz) }, kit, LearntValues.None));

        Assert.Equal(picofarad, KitA.Figure(chain, "A7", "needed-capacitance") * 1e12, picofarad > 100 ? 0.6 : 0.06);
    }

    private static double MarginOf(Plan plan, StageDocument good)
    {
        var target = new Chain(plan.Inputs.Kit.With(good), ChainConditions.On(plan.Inputs.Target, plan.Inputs.Kit, LearntValues.None));
        return Planning.StageKinds.PulledCrystalOscillator.OscillatorConversion.MarginOf(good, KitA.OwnBand().SurroundingsOf("A1"), KitA.Kit.Stage("A1"), target.SurroundingsOf("A1"));
    }

    private static StageDocument GoodFilter(double outer, double inner, string core, int turns, int middle) => KitA.With(
        KitA.Kit.Stage("A5"),
        ("C15", c => KitA.Holding(c, outer)),
        ("C16", c => KitA.Holding(c, inner)),
        ("C17", c => KitA.Holding(c, inner)),
        ("C18", c => KitA.Holding(c, outer)),
        ("L4", l => KitA.Wound(l, core, turns)),
        ("L5", l => KitA.Wound(l, core, middle)),
        ("L6", l => KitA.Wound(l, core, turns)));

    /// <summary>Smallest reserve over return loss 20 dB and the attenuation the limit set asks.</summary>
    private static double WorstFilterMargin(Plan plan)
    {
        var figures = plan.Stage("A5").Figures.ToDictionary(f => f.Name, f => f.Si, StringComparer.Ordinal);
        var harmonics = plan.Budgets.Single(b => b.Id == "harmonics").Lines.Min(l => l.Figures.Single(f => f.Name == "margin").Si);
        return Math.Min(figures["return-loss"] - 20, harmonics - plan.Inputs.Target.WishMargin.Db);
    }
}
