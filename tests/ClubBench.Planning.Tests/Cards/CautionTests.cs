using System.Globalization;
using System.Text.Json;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Tests.Plans;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Cards;

public class CautionTests
{
    [Theory]
    [InlineData("A1", "dummy load on")]
    [InlineData("A3", "hot enough to burn")]
    [InlineData("A4", "Dummy load on")]
    [InlineData("A4", "RF burns")]
    [InlineData("A4", "Hot tab")]
    [InlineData("A4", "in series")]
    [InlineData("A5", "No key-down")]
    [InlineData("A6", "RF burns")]
    [InlineData("A7", "No key-down")]
    [InlineData("A10", "in series")]
    [InlineData("A11", "Dummy load first")]
    [InlineData("A12", "slips")]
    public void Measure_WhereAReadingCanHurt_SaysHow(string stage, string danger) =>
        Assert.Contains(Said(stage, CardStep.Measure), t => t.Contains(danger, StringComparison.Ordinal));

    [Theory]
    [InlineData("A10", "Phones off")]
    [InlineData("A12", "polarity")]
    [InlineData("A12", "lithium")]
    public void BeforePower_WhereTheSupplyCanHurt_SaysHow(string stage, string danger) =>
        Assert.Contains(Said(stage, CardStep.BeforePower), t => t.Contains(danger, StringComparison.Ordinal));

    [Theory]
    [InlineData("A2")]
    [InlineData("A8")]
    [InlineData("A9")]
    public void Cautions_SmallSignalStage_AreNone(string stage) => Assert.Empty(DemoPlan.TwentyMetres.Stage(stage).Card.Notes.Cautions);

    [Fact]
    public void Cautions_EveryStage_HaveAStep() =>
        Assert.All(DemoPlan.TwentyMetres.Stages, s => Assert.Empty(s.Card.Notes.CautionsAt(null)));

    [Fact]
    public void Caution_FromACardBeforeStepsWereToldApart_HoldsForTheWholeStage()
    {
        var read = JsonSerializer.Deserialize<Caution>("""{"code":"caution.rf-burns","figures":[]}""", PlanJson.Options)!;

        Assert.Null(read.At);
        Assert.Equal("""{"code":"caution.rf-burns","figures":[]}""", System.Text.Encoding.UTF8.GetString(ContentHash.CanonicalBytes(read)));
    }

    private static List<string> Said(string stage, CardStep step)
    {
        var card = DemoPlan.TwentyMetres.Stage(stage).Card;
        return [.. card.Notes.CautionsAt(step).Select(c => Phrases.Say(c, card.Kind, CultureInfo.InvariantCulture))];
    }
}
