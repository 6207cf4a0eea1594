using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Tests.Builders;
using BoardPlaces = ClubBench.Planning.Tests.Builders.Places;

namespace ClubBench.Planning.Tests.StageKinds.SeriesTunedTap;

public class TapTests
{
    private static readonly StageDocument Kit = Quern.Stage("A6");

    [Theory]
    [InlineData(10.12, 36.4e-12)]
    [InlineData(14.05, 18.9e-12)]
    [InlineData(7.025, 75.5e-12)]
    public void Figures_NeededCapacitance_IsThatOfThePapers(double megahertz, double farad) =>
        Assert.Equal(farad, Quern.Figure(Kit, "needed-capacitance", BoardPlaces.On(megahertz, megahertz, megahertz)), 0.05e-12);

    [Fact]
    public void Judge_TwentyMetres_TrimmerNearItsEnd() =>
        Assert.Equal("tap.trimmer-near-end", Assert.Single(Quern.Judge(Kit, BoardPlaces.TwentyMetres)).Code);

    [Fact]
    public void Judge_FortyMetres_MustChangeAndStaysOpen()
    {
        var finding = Assert.Single(Quern.Judge(Kit, BoardPlaces.FortyMetres));

        Assert.Equal((StageAction.Change, OpenItemCodes.ReceiveTap), (finding.AtLeast, finding.OpenItem));
    }

    [Fact]
    public void Judge_TooMuchPower_OverloadsTheDiodes() =>
        Assert.Contains(Quern.Judge(Kit, BoardPlaces.On(10.111, 10.124, 10.1175, powerW: 25)), f => f.Code == "tap.diodes-overloaded");

    [Fact]
    public void Judge_ClampsForgotten_IsSaid() =>
        Assert.Contains(Quern.Judge(Kit with { Parts = [.. Kit.Parts.Where(p => p.Role != "clamp-diode")] }, BoardPlaces.ThirtyMetres), f => f.Code == "tap.clamps-missing");

    [Fact]
    public void Convert_FortyMetres_OffersPaddingAndAnotherChoke()
    {
        var ids = Quern.Convert(Kit, BoardPlaces.FortyMetres).Select(a => a.Id).ToList();

        Assert.Contains("pad:39 pF", ids);
        Assert.Contains(ids, i => i is "choke:15 uH" or "choke:12 uH");
    }

    [Fact]
    public void Convert_FortyMetres_EveryOfferMeetsTheLimits() =>
        Assert.All(Quern.Convert(Kit, BoardPlaces.FortyMetres).Where(a => a.WorstMargin.Si >= 0), a => Assert.Empty(Quern.Judge(a.After, BoardPlaces.FortyMetres)));

    [Fact]
    public void Convert_Padding_AddsAPartTheKindAccepts()
    {
        var padded = Quern.Convert(Kit, BoardPlaces.FortyMetres).Single(a => a.Id == "pad:39 pF");

        Assert.Equal("padding-capacitor", Assert.Single(padded.Changes).After!.Role);
        Assert.Empty(Quern.KindOf(Kit).Validate(padded.After, "stage"));
    }

    [Fact]
    public void Validate_TrimmerMissing_IsRefused() =>
        Assert.Contains(Quern.KindOf(Kit).Validate(Quern.Without(Kit, "TC2"), "stage"), m => m.Code == "kit.role-missing");
}
