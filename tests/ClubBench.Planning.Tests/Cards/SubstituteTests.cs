using System.Globalization;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Tests.Plans;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Cards;

public class SubstituteTests
{
    private static readonly StagePlan Oscillator = DemoPlan.TwentyMetres.Stage("A1");
    private static readonly StageDescription Description = StageKindList.Get(Oscillator.Before.Kind).Description;
    private static readonly Alternative Taken = Oscillator.Alternatives.Single(a => a.Id == Oscillator.AlternativeId);

    [Fact]
    public void Of_OscillatorWithAnotherChoke_NamesItsPartsAndTheSpan()
    {
        var next = Oscillator.Alternatives[1];

        var substitute = Oscillator.Card.Substitute!;

        Assert.Equal(PartChanges.Between(Oscillator.After, next.After).Select(c => c.Designator), substitute.Changes.Select(c => c.Designator));
        Assert.Equal("span", substitute.Effect.Name);
        Assert.Equal(next.Figures.Single(f => f.Name == "span").Si, substitute.Effect.Si);
    }

    [Fact]
    public void Say_Substitute_SaysWhatGoesInAndWhatComesOfIt()
    {
        var said = Phrases.Say(Oscillator.Card.Substitute!, Oscillator.Card.Kind, CultureInfo.InvariantCulture);

        Assert.Equal("Or L1 5.6\u00A0µH and C5 47\u00A0pF: span becomes 21.5\u00A0kHz.", said);
    }

    [Theory]
    [InlineData("20 m")]
    [InlineData("40 m")]
    public void Card_EverySubstitute_ShowsAFigureOfAnAlternativeOfThePlan(string band)
    {
        var plan = band == "20 m" ? DemoPlan.TwentyMetres : DemoPlan.FortyMetres;
        var stages = plan.Stages.Where(s => s.Card.Substitute is not null).ToList();

        Assert.NotEmpty(stages);
        Assert.All(stages, s => Assert.Contains(s.Alternatives, a => a.Id != s.AlternativeId && a.Figures.Any(f => f == s.Card.Substitute!.Effect)));
    }

    [Theory]
    [InlineData("A2")]
    [InlineData("A3")]
    [InlineData("A4")]
    public void Card_KeptStageOrOnlyOtherWindings_HasNone(string stage) => Assert.Null(DemoPlan.TwentyMetres.Stage(stage).Card.Substitute);

    [Fact]
    public void Of_AlternativeThatMissesADemand_IsPassedOver()
    {
        var short_ = Oscillator.Alternatives[1] with { WorstMargin = new Figure("worst-margin", QuantityKind.Ratio, -0.1) };

        Assert.Null(Substitute.Of(Description, Taken, [Taken, short_]));
        Assert.NotNull(Substitute.Of(Description, Taken, [Taken, Oscillator.Alternatives[1]]));
    }

    [Fact]
    public void Of_AlternativeThatDoesNotFit_IsPassedOver() =>
        Assert.Null(Substitute.Of(Description, Taken, [Taken, Oscillator.Alternatives[1] with { FitsPlaces = false }]));

    [Fact]
    public void Of_NothingTaken_GivesNone() => Assert.Null(Substitute.Of(Description, null, Oscillator.Alternatives));
}
