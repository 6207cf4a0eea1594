using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Tests.KitAcceptance;

/// <summary>"Checked (computed)", row by row, as printed in the description of the demonstration kit; tolerance half its last digit unless it says "about".</summary>
public class CheckedRows
{
    private static readonly Frequency DesignSpot = Frequency.FromMegahertz(10.12);

    private static double At(string stage, string figure) => KitA.Figure(KitA.OwnBand(at: DesignSpot), stage, figure);

    private static double OnBand(string stage, string figure) => KitA.Figure(KitA.OwnBand(), stage, figure);

    [Fact]
    public void A1Range_Variable150To12Picofarad_Covers13Kilohertz()
    {
        Assert.Equal(10.1112e6, OnBand("A1", "lowest-frequency"), 50.0);
        Assert.Equal(10.1244e6, OnBand("A1", "highest-frequency"), 50.0);
        Assert.Equal(13.2e3, OnBand("A1", "span"), 50.0);
        Assert.Equal(10.1145e6, OnBand("A1", "one-crystal-low"), 50.0);
        Assert.Equal(10.1214e6, OnBand("A1", "one-crystal-high"), 50.0);
        Assert.Equal(7.0e3, OnBand("A1", "one-crystal-span"), 50.0);
    }

    [Fact]
    public void A1ReceiveOffset_With100Picofarad_DependsOnTheDial()
    {
        Assert.Equal(-249, OnBand("A1", "offset-top"), 0.5);
        Assert.Equal(-663, OnBand("A1", "receive-offset"), 0.5);
        Assert.Equal(-882, OnBand("A1", "offset-bottom"), 0.5);
    }

    [Fact]
    public void A3Tank_OnItsBand_TunesAndMatches()
    {
        Assert.Equal(107.3e-12, At("A3", "needed-capacitance"), 0.06e-12);
        Assert.Equal(97e-12, At("A3", "tank-least"), 0.5e-12);
        Assert.Equal(122e-12, At("A3", "tank-most"), 0.5e-12);
        Assert.Equal(9.49e6, At("A3", "tunes-low"), 0.005e6);
        Assert.Equal(10.65e6, At("A3", "tunes-high"), 0.005e6);
        Assert.Equal(146.5, At("A3", "reactance"), 0.05);
        Assert.Equal(432, At("A3", "load"), 0.5);
        Assert.Equal(2.9, At("A3", "loaded-q"), 0.05);
        Assert.Equal(94e-3, At("A3", "available-power"), 0.5e-3);
    }

    [Fact]
    public void A4_FilterMatched_Gives1Point18WattAndWarnsOfItsChoke()
    {
        Assert.Equal(1.18, OnBand("A4", "output-power"), 0.005);
        Assert.Equal(0.68e3, KitA.Figure(KitA.OwnBand(at: Frequency.FromMegahertz(10.1)), "A4", "choke-resistance"), 5.0);
        Assert.Equal(0.73e3, KitA.Figure(KitA.OwnBand(at: Frequency.FromMegahertz(10.1)), "A4", "choke-reactance"), 5.0);
        Assert.Equal(1.0e3, KitA.Figure(KitA.OwnBand(at: Frequency.FromMegahertz(10.1)), "A4", "choke-impedance"), 50.0);
        Assert.Equal(0.164, OnBand("A4", "supply-current"), 0.0005);
        Assert.Equal(0.26, OnBand("A4", "choke-bias"), 0.005);
        Assert.Contains(BackCheck.Of(KitA.Kit, LearntValues.None).Stages.Single(s => s.Stage == "A4").Findings, f => f is { Code: "final.choke-biased", AtLeast: StageAction.Check });
    }

    [Fact]
    public void A5_OnItsBand_PassesTheCarrierAndHoldsTheHarmonics()
    {
        var chain = KitA.OwnBand();
        var raw = chain.Facet<IMakesHarmonics>("A4")!.Harmonic(2).Level.Db;

        Assert.Equal(0.20, KitA.LossDb(chain, "A5", 10.10), 0.005);
        Assert.Equal(42, KitA.ReturnLossDb(chain, "A5", 10.10), 0.5);
        Assert.Equal(13.50e6, OnBand("A5", "cut-off"), 0.005e6);
        Assert.Equal(39.7, KitA.LossDb(chain, "A5", 20.26), 0.05);
        Assert.Equal(68.4, KitA.LossDb(chain, "A5", 30.39), 0.05);
        Assert.Equal(-51.5, raw - (KitA.LossDb(chain, "A5", 20.26) - KitA.LossDb(chain, "A5", 10.13)), 0.05);
    }

    [Fact]
    public void A6_OnItsBand_Needs36Picofarad() => Assert.Equal(36.4e-12, At("A6", "needed-capacitance"), 0.05e-12);

    [Fact]
    public void A7_OnItsBand_TunesWithLoadedQ8Point9()
    {
        Assert.Equal(78.9e-12, At("A7", "needed-capacitance"), 0.05e-12);
        Assert.Equal(63e-12, At("A7", "tank-least"), 0.5e-12);
        Assert.Equal(95e-12, At("A7", "tank-most"), 0.5e-12);
        Assert.Equal(9.22e6, At("A7", "tunes-low"), 0.005e6);
        Assert.Equal(11.32e6, At("A7", "tunes-high"), 0.005e6);
        Assert.Equal(8.9, At("A7", "loaded-q"), 0.05);
    }

    [Fact]
    public void A9_EachSection_701HertzQ3Point97Gain1Point45()
    {
        Assert.Equal(701, OnBand("A9", "centre"), 0.5);
        Assert.Equal(3.97, OnBand("A9", "section-q"), 0.005);
        Assert.Equal(1.45, OnBand("A9", "section-gain"), 0.005);
    }

    [Fact]
    public void DriveChain_OnItsBand_EachStageGivesWhatTheNextAsks()
    {
        var lines = BackCheck.Of(KitA.Kit, LearntValues.None).Budgets.Single(b => b.Id == "drive").Lines.ToDictionary(l => l.Stage, StringComparer.Ordinal);
        double Si(string stage, string name) => lines[stage].Figures.Single(f => f.Name == name).Si;

        Assert.Equal(2e-3, Si("A2", "given"), 0.05e-3);
        Assert.Equal(94e-3, Si("A3", "given"), 0.5e-3);
        Assert.Equal(80e-3, OnBand("A4", "drive"), 0.5e-3);
        Assert.Equal(11.7, Si("A4", "gain"), 0.05);
        Assert.Equal(19, OnBand("A4", "transition-ratio"), 0.5);
        Assert.All(lines.Values.Where(l => l.Figures.Any(f => f.Name == "margin")), l => Assert.True(l.Figures.Single(f => f.Name == "margin").Si >= 0));
    }
}
