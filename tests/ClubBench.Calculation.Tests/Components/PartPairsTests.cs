using ClubBench.Calculation.Components;
using CsCheck;

namespace ClubBench.Calculation.Tests.Components;

public class PartPairsTests
{
    public static TheoryData<ReferenceRow> Pairs => ReferenceTable.Theory("part-pairs");

    [Theory]
    [MemberData(nameof(Pairs))]
    public void For_SeriesOfParts_FindsTheBestPair(ReferenceRow row)
    {
        var parts = PreferredValues.Between(row.Number("low"), row.Number("high"), Enum.Parse<ESeries>(row["series"]));
        var best = PartPairs.For(row.Number("wanted"), new(parts, Enum.Parse<PairKind>(row["kind"])))[0];

        Assert.Equal(row.Number("larger"), best.Larger, 1e-9);
        Assert.Equal(row.Number("smaller"), best.Smaller!.Value, 1e-9);
        Assert.Equal(row.Number("value"), best.Value, row.Number("tolerance"));
    }

    [Fact]
    [Evidence(typeof(PartPairs), EvidenceKind.ClosedFormLimit)]
    public void For_DrawerHolds180_Makes360OfTwoEqualParts()
    {
        double[] drawer = [33, 47, 180, 330];

        var best = PartPairs.For(360, new(drawer, PairKind.Sum) { InDrawer = drawer })[0];

        Assert.Equal((180, 180), (best.Larger, best.Smaller));
    }

    [Fact]
    public void For_SinglePartInsideTheWindow_GoesBeforeABetterPair()
    {
        double[] parts = [10, 13, 510];

        Assert.Null(PartPairs.For(523, new(parts, PairKind.Sum) { SinglePartWindow = 0.05 })[0].Smaller);
        Assert.NotNull(PartPairs.For(523, new(parts, PairKind.Sum) { SinglePartWindow = 0.01 })[0].Smaller);
    }

    [Fact]
    public void For_SmallPartBelowTheToleranceOfTheLarge_IsNotOffered()
    {
        double[] parts = [10, 510];

        Assert.DoesNotContain(PartPairs.For(520, new(parts, PairKind.Sum) { PartTolerance = 0.05 }), p => p.Smaller == 10 && p.Larger == 510);
        Assert.Contains(PartPairs.For(520, new(parts, PairKind.Sum) { PartTolerance = 0.01 }), p => p.Smaller == 10 && p.Larger == 510);
    }

    [Fact]
    public void Tolerance_Sum_WeighsBySize()
    {
        var tolerance = new PartPair(100, 39, PairKind.Sum, 139).Tolerance(0.02, 0.10);

        Assert.Equal(0.04245, tolerance.WorstCase, 1e-5);
        Assert.Equal(0.03153, tolerance.RootSumSquare, 1e-5);
    }

    [Fact]
    public void Tolerance_Harmonic_CrossesTheWeights()
    {
        var tolerance = new PartPair(100, 39, PairKind.Harmonic, 28).Tolerance(0.02, 0.10);

        Assert.Equal(0.07755, tolerance.WorstCase, 1e-5);
        Assert.Equal(0.07216, tolerance.RootSumSquare, 1e-5);
    }

    [Theory]
    [InlineData(PairKind.Sum)]
    [InlineData(PairKind.Harmonic)]
    [Evidence(typeof(PartPair), EvidenceKind.IndependentRecomputation)]
    public void Tolerance_SmallDeviations_IsTheDerivativeOfTheValue(PairKind kind)
    {
        const double Step = 1e-6;
        var pair = new PartPair(220, 47, kind, 100);
        var moved = new PartPair(220 * (1 + (0.3 * Step)), 47 * (1 + Step), kind, 100);

        Assert.Equal((moved.Value / pair.Value) - 1, pair.Tolerance(0.3 * Step, Step).WorstCase, 1e-10);
    }

    [Fact]
    [Evidence(typeof(PartPairs), EvidenceKind.ClosedFormLimit)]
    public void For_NoParts_IsEmpty() => Assert.Empty(PartPairs.For(100, new([], PairKind.Sum)));

    [Theory]
    [InlineData(PairKind.Sum)]
    [InlineData(PairKind.Harmonic)]
    [Evidence(typeof(PartPairs), EvidenceKind.IndependentRecomputation)]
    public void For_EveryPairTriedInTwoLoops_HasNoneBetter(PairKind kind)
    {
        var parts = PreferredValues.Between(10, 1000, ESeries.E12);

        Gen.Double[20, 900].Sample(wanted =>
        {
            var smallest = parts.Min(a => Math.Abs(a - wanted));
            foreach (var a in parts)
            {
                foreach (var b in parts)
                    smallest = Math.Min(smallest, Math.Abs((kind == PairKind.Sum ? a + b : 1 / ((1 / a) + (1 / b))) - wanted));
            }

            return Math.Abs(PartPairs.For(wanted, new(parts, kind) { PartTolerance = 0 })[0].Value - wanted) <= smallest + (1e-6 * wanted);
        });
    }

    [Fact]
    [Evidence(typeof(PartPairs), EvidenceKind.Identity)]
    public void For_MorePartsToChooseFrom_NeverIncreasesTheError() =>
        Gen.Select(Gen.Double[10, 1000].Array[1, 8], Gen.Double[10, 1000], Gen.Double[20, 900], Gen.Enum<PairKind>()).Sample((parts, extra, wanted, kind) =>
            Math.Abs(PartPairs.For(wanted, new([.. parts, extra], kind))[0].Error) <= Math.Abs(PartPairs.For(wanted, new(parts, kind))[0].Error) + 1e-6);

    [Fact]
    [Evidence(typeof(PartPair), EvidenceKind.ClosedFormLimit)]
    public void ValueAndTolerance_EqualParts_AreDoubleOrHalfAndTheMean()
    {
        Assert.Equal((200, 50), (new PartPair(100, 100, PairKind.Sum, 200).Value, new PartPair(100, 100, PairKind.Harmonic, 50).Value));
        Assert.Equal(0.05, new PartPair(100, 100, PairKind.Sum, 200).Tolerance(0.05, 0.05).WorstCase, 12);
        Assert.Equal(0.05 / Math.Sqrt(2), new PartPair(100, 100, PairKind.Harmonic, 50).Tolerance(0.05, 0.05).RootSumSquare, 12);
        Assert.Equal(0.05, new PartPair(100, null, PairKind.Sum, 100).Tolerance(0.05, 1).WorstCase);
    }

    [Fact]
    [Evidence(typeof(PartPair), EvidenceKind.Identity)]
    public void Tolerance_AnyPair_IsNeverAboveTheWiderPartNorTheRootAboveTheWorstCase() =>
        Gen.Select(Gen.Double[10, 1000], Gen.Double[1, 10], Gen.Double[0.001, 0.2], Gen.Double[0.001, 0.2], Gen.Enum<PairKind>()).Sample((a, b, x, y, kind) =>
        {
            var tolerance = new PartPair(a, b, kind, 100).Tolerance(x, y);
            return tolerance.RootSumSquare <= tolerance.WorstCase && tolerance.WorstCase <= Math.Max(x, y) + 1e-12 && tolerance.WorstCase >= Math.Min(x, y) - 1e-12;
        });
}
