using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds.SingleTunedFrontEnd;
using ClubBench.Planning.Tests.Builders;
using BoardPlaces = ClubBench.Planning.Tests.Builders.Places;

namespace ClubBench.Planning.Tests.StageKinds.SingleTunedFrontEnd;

public class FrontEndTests
{
    private static readonly StageDocument Kit = Quern.Stage("A7");

    private static readonly Surroundings Checked = BoardPlaces.On(10.11, 10.13, 10.12);

    [Theory]
    [InlineData("needed-capacitance", 78.9e-12, 0.05e-12)]
    [InlineData("tunes-low", 9.22e6, 0.005e6)]
    [InlineData("tunes-high", 11.32e6, 0.005e6)]
    [InlineData("loaded-q", 8.9, 0.05)]
    [InlineData("tank-least", 63e-12, 1e-15)]
    [InlineData("tank-most", 95e-12, 1e-15)]
    public void Figures_OwnBand_AreThoseOfThePapers(string figure, double expected, double tolerance) =>
        Assert.Equal(expected, Quern.Figure(Kit, figure, Checked), tolerance);

    [Theory]
    [InlineData(14.05)]
    [InlineData(7.025)]
    public void Judge_KeptOnAnotherBand_MustChangeAndStaysOpen(double megahertz)
    {
        var finding = Assert.Single(Quern.Judge(Kit, BoardPlaces.On(megahertz, megahertz, megahertz)), f => f.AtLeast == StageAction.Change);

        Assert.Equal(OpenItemCodes.TunedCircuit, finding.OpenItem);
    }

    [Fact]
    public void Judge_TrimmerNearItsEnd_IsToBeMeasured() =>
        Assert.Contains(Quern.Judge(Kit, BoardPlaces.On(9.3, 9.3, 9.3)), f => f is { Code: "front-end.trimmer-near-end", AtLeast: StageAction.Check });

    [Theory]
    [InlineData(12, "front-end.too-broad")]
    [InlineData(3, null)]
    public void Judge_LinkTurns_ToldWhereTheCircuitGetsTooBroad(int link, string? expected)
    {
        var findings = Quern.Judge(Quern.With(Kit, "L8", PartValue.LinkTurns, link), BoardPlaces.ThirtyMetres);

        Assert.Equal(expected, findings.SingleOrDefault()?.Code);
    }

    [Theory]
    [InlineData(14.05, "T50-6", 22, 33e-12)]
    [InlineData(7.025, "T50-2", 28, 100e-12)]
    public void Convert_AnotherBand_IsNoWorseThanTheHandMadeAnswer(double megahertz, string core, int turns, double farad)
    {
        var to = BoardPlaces.On(megahertz - 0.02, megahertz + 0.02, megahertz);
        var wanted = Quern.Figure(Kit, "loaded-q", BoardPlaces.ThirtyMetres);
        var byHand = Kit.With(Kit.Part("L8").With((PartValue.Turns, turns)) with { Type = core }, Kit.Part("C19").With((PartValue.Capacitance, farad)));
        var hand = FrontEndConversion.Margin(byHand, wanted, to);

        var best = Quern.Convert(Kit, to)[0];

        Assert.True(hand > 0 && best.WorstMargin.Si >= hand, $"{best.Id} {best.WorstMargin.Si} against {hand}");
    }

    [Fact]
    public void Convert_AlternativesOffered_TuneTheBandAndKeepTheSelectivity()
    {
        var wanted = Quern.Figure(Kit, "loaded-q", BoardPlaces.ThirtyMetres);

        var offered = Quern.Convert(Kit, BoardPlaces.TwentyMetres);

        Assert.NotEmpty(offered);
        Assert.All(offered.Where(a => a.WorstMargin.Si >= 0), a => Assert.Empty(Quern.Judge(a.After, BoardPlaces.TwentyMetres)));
        Assert.InRange(Quern.Figure(offered[0].After, "loaded-q", BoardPlaces.TwentyMetres), wanted / 1.5, wanted * 1.5);
    }
}
