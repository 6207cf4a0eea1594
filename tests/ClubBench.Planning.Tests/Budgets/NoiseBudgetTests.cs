using System.Globalization;
using ClubBench.Calculation.Noise;
using ClubBench.Planning.Budgets;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Tests.Plans;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Budgets;

public class NoiseBudgetTests
{
    [Theory]
    [InlineData("20 m")]
    [InlineData("40 m")]
    public void Check_NothingLost_SaysSoInWordsAndWritesNoZero(string band)
    {
        var noise = NoiseOf(band == "20 m" ? DemoPlan.TwentyMetres : DemoPlan.FortyMetres);

        Assert.Equal("budget.preamplifier-nothing-lost", Assert.Single(noise.Findings).Code);
        Assert.DoesNotContain(WholeOf(noise), f => f.Name.StartsWith("degradation", StringComparison.Ordinal));
        Assert.DoesNotContain(noise.Lines.SelectMany(l => l.Figures), f => QuantityText.Format(f, CultureInfo.InvariantCulture).StartsWith("0.0\u00A0", StringComparison.Ordinal));
    }

    [Fact]
    public void Check_LossyFrontEndAtAQuietSite_WritesWhatIsLost()
    {
        var inputs = DemoPlan.TwentyMetres.Inputs;
        var noise = NoiseOf(Planner.Plan(inputs with { Target = inputs.Target with { Site = NoiseSite.QuietRural }, Choices = [new Choice("A7", Choice.Keep)] }));

        var lost = WholeOf(noise).Single(f => f.Name == "degradation");

        Assert.True(lost.Si >= 0.1, $"{lost.Si}");
    }

    private static Budget NoiseOf(Plan plan) => plan.Budgets.Single(b => b.Id == "noise");

    private static IReadOnlyList<Planning.Figures.Figure> WholeOf(Budget budget) => budget.Lines.Single(l => l.Stage.Length == 0).Figures;
}
