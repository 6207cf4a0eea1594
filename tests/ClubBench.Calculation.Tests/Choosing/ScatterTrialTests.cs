using ClubBench.Calculation.Choosing;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Choosing;

public class ScatterTrialTests
{
    private static readonly ScatterTrial Trial = new(new(0.05, 0.03, 0.05), 7, 500);

    private static readonly LowPassRequirement Requirement =
        new(FrequencyRange.FromMegahertz(7.0, 7.3), Decibels.FromDb(17), [new(2, Decibels.FromDb(23)), new(3, Decibels.FromDb(43))]);

    [Theory]
    [InlineData(4)]
    [InlineData(0.5)]
    [Evidence(typeof(ScatterTrial), EvidenceKind.Identity)]
    public void Of_PartsAndEndsScaledTogether_PassesTheSameBoards(double k)
    {
        var ladder = F7.ToLadder(150, 1000);
        var scaled = new Ladder(ladder.Elements.Select(e => e.Scaled(k, 1 / k)));

        var (first, second) = (Trial.Of(ladder, FiftyOhm, Requirement), Trial.Of(scaled, k * FiftyOhm, Requirement));

        Assert.Equal(first, second);
        Assert.InRange(first.Share, 0.2, 0.95);
    }
}
