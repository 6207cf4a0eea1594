using ClubBench.Calculation.Choosing;
using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Choosing;

public class LowPassComparisonTests
{
    [Theory]
    [InlineData(24, LowPassFamily.Chebyshev, 5)]
    [InlineData(30, LowPassFamily.Elliptic, 5)]
    [InlineData(42, LowPassFamily.Elliptic, 5)]
    [InlineData(62, LowPassFamily.Elliptic, 7)]
    public void Of_GrowingNeed_TakesTheFewestPartsThatMeetIt(double secondDb, LowPassFamily family, int order)
    {
        var first = LowPassComparison.Of(Task(secondDb)).First!;

        Assert.Equal((family, order), (first.Family, first.Order));
    }

    [Fact]
    public void Of_Need_ShowsTheFourInTheirOrderWithTheirParts()
    {
        var options = LowPassComparison.Of(Task(24)).Options;

        Assert.Equal(
            [(LowPassFamily.Chebyshev, 5, 2, 3), (LowPassFamily.Elliptic, 5, 2, 5), (LowPassFamily.Chebyshev, 7, 3, 4), (LowPassFamily.Elliptic, 7, 3, 7)],
            options.Select(o => (o.Family, o.Order, o.Coils, o.Capacitors)));
    }

    [Fact]
    public void Of_NothingReachesTheNeed_HasNoFirst() => Assert.Null(LowPassComparison.Of(Task(120)).First);

    [Fact]
    public void Of_HalfWaveAgainstChebyshevOfTheSameParts_IsAboutTheSameAtTheSecondHarmonicAndPerfectInTheMiddle()
    {
        var comparison = LowPassComparison.Of(Task(24) with { Edge = Frequency.FromMegahertz(7.15 * 1.12), CoilQ = null, CapacitorQ = null });
        var (chebyshev, halfWave) = (comparison.Options[0], comparison.Others.Single(o => o.Family == LowPassFamily.HalfWave));
        var middle = Frequency.FromMegahertz(7.15);

        Assert.Equal(chebyshev.Ladder!.Loss(middle * 2, FiftyOhm, FiftyOhm).Db, halfWave.Ladder!.Loss(middle * 2, FiftyOhm, FiftyOhm).Db, 0.5);
        Assert.InRange(halfWave.Ladder.ReturnLoss(middle, FiftyOhm, FiftyOhm).Db, 100, 120);
        Assert.False(halfWave.MeetsAll && halfWave.Figures!.Harmonics[0].Attenuation.Db > 43);
    }

    [Fact]
    [Evidence(typeof(ScatterTrial), EvidenceKind.IndependentRecomputation)]
    public void Of_Scatter_TellsAYieldThatIsTheOneOfTheDesign()
    {
        var scatter = new PartScatter(0.05, 0, 0.05);
        var task = Task(23) with { Trial = new ScatterTrial(scatter, 1, 4000), Requirement = Requirement(17, 23, 43) };

        var told = LowPassComparison.Of(task).Options[0].Yield!.Value;

        // Another random sequence of the same distribution: within three standard deviations of the difference.
        var design = LadderYield.Of(new(F7, task.Requirement, scatter, 2, 150, 1000) { Trials = 20_000 }).Passed.Share;
        Assert.Equal(design, told.Share, 3 * Math.Sqrt(design * (1 - design) * ((1.0 / 4000) + (1.0 / 20_000))));
    }

    [Fact]
    [Evidence(typeof(ScatterTrial), EvidenceKind.ClosedFormLimit)]
    public void Of_NoScatter_AllBoardsAreTheNominalOne() =>
        Assert.All(LowPassComparison.Of(Task(24) with { Trial = new(new(0, 0, 0), 1, 100) }).Options, o => Assert.Equal(o.MeetsAll ? 1 : 0, o.Yield!.Value.Share));

    [Fact]
    [Evidence(typeof(LowPassComparison), EvidenceKind.IndependentRecomputation)]
    public void Of_EveryFamily_HasTheLossesOfTheNodalEquations()
    {
        var (task, comparison) = (Task(24), LowPassComparison.Of(Task(24)));

        Assert.All(comparison.Options.Concat(comparison.Others), o =>
        {
            Assert.Equal(task.Requirement.Band.Points(17).Max(Loss), o.Figures!.WorstPassLoss.Db, 1e-9);
            Assert.All(o.Figures.Harmonics, h => Assert.Equal(new[] { 7.0, 7.3 }.Min(mhz => Loss(Frequency.FromMegahertz(h.Harmonic * mhz))), h.Attenuation.Db, 1e-6));

            double Loss(Frequency f) => -20 * Math.Log10(NodalEquations.Transmission(o.Ladder!, f, FiftyOhm, FiftyOhm, 150, 1000).Magnitude);
        });
    }

    [Fact]
    [Evidence(typeof(LowPassComparison), EvidenceKind.ClosedFormLimit)]
    public void Of_LosslessParts_LosesTheChebyshevPolynomialAtTheHarmonics()
    {
        var comparison = LowPassComparison.Of(Task(24) with { CoilQ = null, CapacitorQ = null });

        foreach (var option in comparison.Options.Where(o => o.Family == LowPassFamily.Chebyshev))
        {
            var shape = PassBandRipple.FromReflection(0.1).Epsilon * Math.Cosh(option.Order * Math.Acosh(14.0 / 8.0));
            Assert.Equal(10 * Math.Log10(1 + (shape * shape)), option.Figures!.Harmonics[0].Attenuation.Db, 1e-6);
        }
    }

    [Theory]
    [InlineData(0.5)]
    [InlineData(7)]
    [Evidence(typeof(LowPassComparison), EvidenceKind.Identity)]
    public void Of_EverythingWantedHarder_TakesThatMuchOffEveryMargin(double db)
    {
        var (easy, hard) = (LowPassComparison.Of(Task(24)), LowPassComparison.Of(Task(24) with { Requirement = Requirement(17 + db, 24 + db, 24 + db) }));

        Assert.All(easy.Options.Concat(easy.Others).Zip(hard.Options.Concat(hard.Others)), x => Assert.Equal(db, (x.First.Figures!.Margin - x.Second.Figures!.Margin).Db, 1e-9));
    }

    [Fact]
    public void Of_EdgeInsideTheBand_Throws() =>
        Assert.Throws<ArgumentException>(() => LowPassComparison.Of(Task(24) with { Edge = Frequency.FromMegahertz(7.2) }));

    [Fact]
    public void Of_NotchThatNoAngleReaches_TellsTheRefusalInItsRow()
    {
        var task = Task(24) with { Edge = Frequency.FromMegahertz(14.2) };

        var elliptic = LowPassComparison.Of(task).Options[1];

        Assert.Equal((EllipticRefusal.NotchOutOfReach, false), (elliptic.Refusal, elliptic.MeetsAll));
    }

    private static LowPassTask Task(double secondDb) =>
        new(Requirement(17, secondDb, secondDb), PassBandRipple.FromReflection(0.1), Frequency.FromMegahertz(8.0), FiftyOhm, 150, 1000);

    private static LowPassRequirement Requirement(double returnLossDb, double secondDb, double thirdDb) => new(
        FrequencyRange.FromMegahertz(7.0, 7.3), Decibels.FromDb(returnLossDb), [new(2, Decibels.FromDb(secondDb)), new(3, Decibels.FromDb(thirdDb))]);
}
