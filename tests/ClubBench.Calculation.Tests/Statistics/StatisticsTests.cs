using ClubBench.Calculation.Statistics;
using CsCheck;

namespace ClubBench.Calculation.Tests.Statistics;

public class StatisticsTests
{
    [Fact]
    public void NextBits_KnownSeed_GivesTheKnownSequence()
    {
        var random = new SeededRandom(1234567);

        Assert.Equal(
            [6457827717110365317, 3203168211198807973, 9817491932198370423, 4593380528125082431, 16408922859458223821],
            Enumerable.Range(0, 5).Select(_ => random.NextBits()));
    }

    [Fact]
    [Evidence(typeof(SeededRandom), EvidenceKind.ClosedFormLimit)]
    public void NextUnit_ManyDraws_HaveTheMomentsOfTheUniformDistribution()
    {
        var random = new SeededRandom(99);
        var draws = Enumerable.Range(0, 100_000).Select(_ => random.NextUnit()).ToList();

        Assert.All(draws, d => Assert.InRange(d, 0, 1));
        Assert.Equal(0.5, draws.Average(), 0.004);
        Assert.Equal(1 / 12.0, draws.Average(d => (d - 0.5) * (d - 0.5)), 0.002);
    }

    [Fact]
    [Evidence(typeof(SeededRandom), EvidenceKind.ClosedFormLimit)]
    public void Normal_ManyDraws_HaveMeanAndDeviation()
    {
        var random = new SeededRandom(5);
        var draws = Enumerable.Range(0, 100_000).Select(_ => random.Normal(3, 2)).ToList();

        Assert.Equal(3, draws.Average(), 0.03);
        Assert.Equal(2, Math.Sqrt(draws.Average(d => (d - 3) * (d - 3))), 0.03);
    }

    [Fact]
    public void Below_SmallCount_ReachesEveryNumberAndNoOther()
    {
        var random = new SeededRandom(5);

        Assert.Equal([0, 1, 2], Enumerable.Range(0, 200).Select(_ => random.Below(3)).Distinct().Order());
    }

    [Fact]
    [Evidence(typeof(Proportion), EvidenceKind.ClosedFormLimit)]
    public void Interval_NoneOfTen_MatchesTheClosedForm()
    {
        // With none found the upper limit is z^2/(n + z^2).
        var (low, high) = new Proportion(0, 10).Interval(1.959964);

        Assert.Equal(0, low, 12);
        Assert.Equal(3.841459 / 13.841459, high, 1e-6);
    }

    [Fact]
    [Evidence(typeof(Proportion), EvidenceKind.Identity)]
    public void Interval_AnyProportion_HoldsTheShareAndMirrors() =>
        Gen.Int[1, 200].SelectMany(of => Gen.Int[0, of].Select(count => new Proportion(count, of))).Sample(p =>
        {
            var (low, high) = p.Interval();
            var (mirrorLow, mirrorHigh) = new Proportion(p.Of - p.Count, p.Of).Interval();
            return low <= p.Share + 1e-12 && p.Share <= high + 1e-12 && Math.Abs(low + mirrorHigh - 1) < 1e-9 && Math.Abs(high + mirrorLow - 1) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(Proportion), EvidenceKind.RoundTrip)]
    public void Interval_Ends_SolveTheScoreEquation() =>
        Gen.Int[2, 200].SelectMany(of => Gen.Int[1, of - 1].Select(count => new Proportion(count, of))).Sample(p =>
        {
            var (low, high) = p.Interval(2);
            double Score(double true_) => Math.Abs(p.Share - true_) / Math.Sqrt(true_ * (1 - true_) / p.Of);
            return Math.Abs(Score(low) - 2) < 1e-9 && Math.Abs(Score(high) - 2) < 1e-9;
        });

    [Theory]
    [Evidence(typeof(StudentT), EvidenceKind.PublishedValue)]
    [InlineData(3, 4.30)]
    [InlineData(4, 3.18)]
    [InlineData(5, 2.78)]
    [InlineData(6, 2.57)]
    [InlineData(7, 2.45)]
    [InlineData(8, 2.36)]
    [InlineData(9, 2.31)]
    [InlineData(10, 2.26)]
    [InlineData(21, 2.09)]
    public void Factor95_FewReadings_MatchesThePrintedTable(int readings, double factor) =>
        Assert.Equal(factor, StudentT.Factor95(readings), 0.0051);

    [Fact]
    [Evidence(typeof(StudentT), EvidenceKind.ClosedFormLimit)]
    public void Factor95_ManyReadings_IsThatOfTheNormalDistribution() => Assert.Equal(1.96, StudentT.Factor95(100_000), 0.001);

    [Fact]
    [Evidence(typeof(Median), EvidenceKind.ClosedFormLimit)]
    public void AbsoluteDeviation_OneWrongReading_DoesNotMoveIt()
    {
        double[] sound = [1, 2, 3, 4, 5];
        double[] faulty = [1, 2, 3, 4, 500];

        Assert.Equal(1.4826, Median.AbsoluteDeviation(sound), 9);
        Assert.Equal(Median.AbsoluteDeviation(sound), Median.AbsoluteDeviation(faulty), 9);
        Assert.Throws<ArgumentException>(() => Median.Of([]));
    }
}
