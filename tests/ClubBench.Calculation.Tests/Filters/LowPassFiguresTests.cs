using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Filters;

public class LowPassFiguresTests
{
    private static readonly LowPassRequirement Requirement =
        new(FrequencyRange.FromMegahertz(7.0, 8.0), Decibels.FromDb(17), [new(2, Decibels.FromDb(23)), new(3, Decibels.FromDb(43))]);

    [Fact]
    [Evidence(typeof(LowPassFigures), EvidenceKind.ClosedFormLimit)]
    public void Of_ChebyshevUpToItsEdge_IsTheRippleAndTheIdealAttenuation()
    {
        var ideal = LowPassPrototype.Chebyshev(5, PassBandRipple.FromReflection(0.1));

        var figures = LowPassFigures.Of(F7, Requirement);

        Assert.Equal(20, figures.WorstReturnLoss.Db, 1e-6);
        Assert.Equal(PassBandRipple.FromReflection(0.1).Ripple.Db, figures.WorstPassLoss.Db, 1e-6);
        Assert.Equal([ideal.Attenuation(14.0 / 8).Db, ideal.Attenuation(21.0 / 8).Db], figures.Harmonics.Select(h => h.Attenuation.Db), (a, b) => Math.Abs(a - b) < 1e-6);
        Assert.Equal(Math.Min(ideal.Attenuation(14.0 / 8).Db - 23, Math.Min(ideal.Attenuation(21.0 / 8).Db - 43, 3)), figures.Margin.Db, 1e-6);
    }

    [Theory]
    [InlineData(0.5)]
    [InlineData(5)]
    [Evidence(typeof(LowPassFigures), EvidenceKind.Identity)]
    public void Of_EverythingWantedHarder_LosesThatMuchMargin(double db)
    {
        var more = Decibels.FromDb(db);
        var harder = new LowPassRequirement(Requirement.Band, Requirement.ReturnLoss + more, [.. Requirement.Harmonics.Select(h => h with { Attenuation = h.Attenuation + more })]);

        var (easy, hard) = (LowPassFigures.Of(F7, Requirement, 150, 1000), LowPassFigures.Of(F7, harder, 150, 1000));

        Assert.Equal(db, (easy.Margin - hard.Margin).Db, 1e-9);
        Assert.Equal(easy.WorstPassLoss, hard.WorstPassLoss);
        Assert.True(easy.WorstPassLoss > LowPassFigures.Of(F7, Requirement).WorstPassLoss);
    }
}
