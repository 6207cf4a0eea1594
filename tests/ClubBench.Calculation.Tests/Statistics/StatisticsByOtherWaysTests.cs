using System.Numerics;
using ClubBench.Calculation.Statistics;
using CsCheck;

namespace ClubBench.Calculation.Tests.Statistics;

public class StatisticsByOtherWaysTests
{
    private static readonly Gen<double[]> Readings = Gen.Double[-100, 100].Array[1, 15];

    [Fact]
    [Evidence(typeof(Median), EvidenceKind.IndependentRecomputation)]
    public void Of_EveryReadingTriedAsTheMiddle_LeavesTheLeastSumOfDistances() => Readings.Sample(values =>
    {
        double Distances(double from) => values.Sum(v => Math.Abs(v - from));
        Assert.Equal(values.Min(Distances), Distances(Median.Of(values)), 1e-9);
    });

    [Fact]
    [Evidence(typeof(Median), EvidenceKind.Identity)]
    public void Of_ReadingsMovedAndStretched_MovesAndStretchesAlong() => Gen.Select(Readings, Gen.Double[-50, 50], Gen.Double[-3, 3]).Sample((values, moved, factor) =>
    {
        double[] changed = [.. values.Select(v => (factor * v) + moved)];
        Assert.Equal((factor * Median.Of(values)) + moved, Median.Of(changed), 1e-9);
        Assert.Equal(Math.Abs(factor) * Median.AbsoluteDeviation(values), Median.AbsoluteDeviation(changed), 1e-9);
    });

    [Fact]
    [Evidence(typeof(Median), EvidenceKind.ClosedFormLimit)]
    public void AbsoluteDeviation_QuantilesOfTheNormalDistribution_IsItsStandardDeviation()
    {
        var quantiles = Enumerable.Range(0, 100_000).Select(k => MathNet.Numerics.Distributions.Normal.InvCDF(5, 2, (k + 0.5) / 100_000)).ToList();

        Assert.Equal(5, Median.Of(quantiles), 1e-9);
        Assert.Equal(2, Median.AbsoluteDeviation(quantiles), 1e-4);
    }

    [Fact]
    [Evidence(typeof(SeededRandom), EvidenceKind.IndependentRecomputation)]
    public void NextBits_AlgorithmInWholeNumbersOfAnySize_Agrees() => Gen.ULong.Sample(seed =>
    {
        var (random, modulus, state) = (new SeededRandom(seed), BigInteger.Pow(2, 64), new BigInteger(seed));
        for (var i = 0; i < 5; i++)
        {
            state = (state + 11400714819323198485) % modulus;
            var z = Folded(state, 30) * 13787848793156543929 % modulus;
            z = Folded(z, 27) * 10723151780598845931 % modulus;
            Assert.Equal(Folded(z, 31), random.NextBits());
        }

        static BigInteger Folded(BigInteger z, int bits) => z ^ (z / BigInteger.Pow(2, bits));
    });

    [Fact]
    [Evidence(typeof(SeededRandom), EvidenceKind.Identity)]
    public void Draws_OfTheSameSeed_AreOneSequenceSeenThroughItsRange() => Gen.Select(Gen.ULong, Gen.Double[-10, 10], Gen.Double[0.1, 10], Gen.Int[1, 1000]).Sample((seed, low, width, count) =>
    {
        var unit = new SeededRandom(seed).NextUnit();
        Assert.Equal(low + (width * unit), new SeededRandom(seed).Uniform(low, low + width), 1e-9);
        Assert.Equal((int)Math.Floor(count * unit), new SeededRandom(seed).Below(count));
    });

    [Fact]
    [Evidence(typeof(StudentT), EvidenceKind.IndependentRecomputation)]
    public void Factor95_DensityAddedUpBetweenTheLimits_Is95Percent()
    {
        foreach (var readings in new[] { 3, 5, 10, 30 })
        {
            const int steps = 100_000;
            var (factor, freedom) = (StudentT.Factor95(readings), readings - 1.0);
            double Density(double t) => Math.Pow(1 + (t * t / freedom), -(freedom + 1) / 2);

            // The density over all of the line is that over an angle: t = sqrt(freedom) tan(a).
            var whole = Enumerable.Range(0, steps).Average(k => Math.Pow(Math.Cos(Math.PI * ((k + 0.5) / steps - 0.5)), freedom - 1)) * Math.PI * Math.Sqrt(freedom);
            var within = Enumerable.Range(0, steps).Average(k => Density(factor * ((2 * (k + 0.5) / steps) - 1))) * 2 * factor;

            Assert.Equal(0.95, within / whole, 1e-6);
        }
    }

    [Fact]
    [Evidence(typeof(StudentT), EvidenceKind.ClosedFormLimit)]
    public void Factor95_TwoAndThreeReadings_AreTheClosedForms()
    {
        Assert.Equal(Math.Tan(0.475 * Math.PI), StudentT.Factor95(2), 1e-6);
        Assert.Equal(0.95 * Math.Sqrt(2 / (1 - (0.95 * 0.95))), StudentT.Factor95(3), 1e-6);
    }

    [Fact]
    [Evidence(typeof(Proportion), EvidenceKind.ClosedFormLimit)]
    public void Expected_HalfOfThem_IsHalfTheBoardsRoundedUp() => Assert.Equal((5, 6), (new Proportion(3, 6).Expected(10), new Proportion(3, 6).Expected(11)));
}
