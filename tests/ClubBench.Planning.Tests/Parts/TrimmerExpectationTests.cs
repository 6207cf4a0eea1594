using ClubBench.Planning.Parts;
using ClubBench.Planning.Tests.Plans;

namespace ClubBench.Planning.Tests.Parts;

public class TrimmerExpectationTests
{
    [Theory]
    [InlineData(0.5, 0.2, 0.8)]
    [InlineData(0.25, 0.2, 0.8)]
    [InlineData(0.18, 0.09, 0.8)]
    [InlineData(0.9, 0.2, 0.95)]
    [InlineData(-0.1, 0.2, 0.8)]
    [InlineData(1.2, 0.2, 0.8)]
    public void Window_KeepsAFifthFree_UnlessThePlanItselfGoesThere(double travel, double low, double high)
    {
        var window = TrimmerExpectation.Window(travel, 0.2);

        Assert.Equal(low, window.Low, 12);
        Assert.Equal(high, window.High, 12);
    }

    [Fact]
    public void Expect_EveryReadingOfTheDemonstrationPlans_LiesInItsOwnWindow() =>
        Assert.All(
            new[] { DemoPlan.TwentyMetres, DemoPlan.FortyMetres }.SelectMany(p => p.Stages).SelectMany(s => s.Expected),
            r => Assert.True(r.Nominal >= r.LowSi && r.Nominal <= r.HighSi, $"{r.Point}: {r.Nominal} in {r.LowSi} to {r.HighSi}"));
}
