using ClubBench.Calculation.CrystalFilters;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.CrystalFilters;

public class CrystalFilterPrototypeTests
{
    private static readonly Gen<CrystalFilterPrototype> Any = Gen.Select(Gen.Int[2, 12], Gen.Double[0.01, 3], Gen.Int[0, 1]).Select((n, ripple, kind) =>
        kind == 0 ? CrystalFilterPrototype.Butterworth(n) : CrystalFilterPrototype.Chebyshev(n, PassBandRipple.FromRipple(Decibels.FromDb(ripple))));

    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("crystal-filter-prototype");

    [Theory]
    [Evidence(typeof(CrystalFilterPrototype), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Cases))]
    public void Shape_ReferenceRow_HasTheFiguresOfTheTable(ReferenceRow row)
    {
        var prototype = CrystalFilterRows.Prototype(row);

        foreach (var (k, i) in CrystalFilterRows.Numbers(row["couplings"]).Select((k, i) => (k, i))) Assert.Equal(k, prototype.Couplings[i], row.Number("tolerance"));
        if (row.Has("end_q")) Assert.Equal(row.Number("end_q"), prototype.EndQ, row.Number("tolerance"));
    }

    [Fact]
    [Evidence(typeof(CrystalFilterPrototype), EvidenceKind.Identity)]
    public void Loss_AtBothEdges_IsHalfThePower() => Any.Sample(p =>
        Math.Abs(p.Loss(1).Db - 3.0103) < 1e-4 && Math.Abs(p.Loss(-1).Db - 3.0103) < 1e-4);

    [Fact]
    [Evidence(typeof(CrystalFilterPrototype), EvidenceKind.ClosedFormLimit)]
    public void Loss_Butterworth_IsTheClosedForm() => Gen.Select(Gen.Int[2, 12], Gen.Double[-3, 3]).Sample((n, w) =>
        Math.Abs(CrystalFilterPrototype.Butterworth(n).Loss(w).Db - (10 * Math.Log10(1 + Math.Pow(w * w, n)))) < 1e-6);

    [Fact]
    [Evidence(typeof(CrystalFilterPrototype), EvidenceKind.IndependentRecomputation)]
    public void Loss_Chebyshev_IsTheClosedFormOfTheLowPass() => Gen.Select(Gen.Int[2, 12], Gen.Double[0.01, 3], Gen.Double[0, 3]).Sample((n, ripple, w) =>
    {
        var quality = PassBandRipple.FromRipple(Decibels.FromDb(ripple));
        var lowPass = LowPassPrototype.Chebyshev(n, quality);
        var middle = n % 2 == 0 ? ripple : 0;
        return Math.Abs(CrystalFilterPrototype.Chebyshev(n, quality).Loss(w).Db - lowPass.Attenuation(w * lowPass.HalfPowerRatio).Db) < 1e-6 + (middle * 1e-9);
    });

    [Theory]
    [InlineData(2)]
    [InlineData(5)]
    [InlineData(6)]
    [InlineData(12)]
    public void EqualCapacitor_AnyOrder_LosesMoreThanHalfEverywhereOutside(int order)
    {
        var prototype = CrystalFilterPrototype.EqualCapacitor(order);

        Assert.Equal(3.0103, prototype.Loss(1).Db, 1e-4);
        Assert.All(Enumerable.Range(1, 300), i => Assert.True(prototype.Loss(1 + (0.01 * i)).Db > 3.0103));
        Assert.Equal(1, prototype.EndQ * prototype.Couplings[0], 1e-12);
    }

    [Theory]
    [InlineData(5, false)]
    [InlineData(6, true)]
    public void EqualCapacitor_FromSixCrystalsOn_DipsBelowHalfThePowerInside(int order, bool dips)
    {
        var prototype = CrystalFilterPrototype.EqualCapacitor(order);

        Assert.Equal(dips, Enumerable.Range(0, 990).Any(i => prototype.Loss(0.001 * i).Db > 3.0103));
    }

    [Fact]
    public void EqualCapacitor_ManyCrystals_NarrowsTowardsHalfTheBandOfAnEndlessLadder() =>
        Assert.Equal(
            [true, true, true],
            new[] { 4, 8, 12 }.Select(n => CrystalFilterPrototype.EqualCapacitor(n).Couplings[0]).Zip(new[] { 8, 12, 12 }, (k, n) => k >= CrystalFilterPrototype.EqualCapacitor(n).Couplings[0] && k > 0.5));

    [Fact]
    public void EndQ_EvenChebyshev_IsTheSameAtBothEnds() => Gen.Select(Gen.Int[1, 6], Gen.Double[0.01, 3]).Sample((half, ripple) =>
    {
        var lowPass = LowPassPrototype.Chebyshev(2 * half, PassBandRipple.FromRipple(Decibels.FromDb(ripple)));
        return Math.Abs((lowPass.Values[^1] * lowPass.LoadRatio / lowPass.Values[0]) - 1) < 1e-9;
    });

    [Theory]
    [InlineData(1)]
    [InlineData(13)]
    public void Order_OutsideTwoToTwelve_IsRefused(int order)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => CrystalFilterPrototype.Butterworth(order));
        Assert.Throws<ArgumentOutOfRangeException>(() => CrystalFilterPrototype.EqualCapacitor(order));
    }

    [Theory]
    [InlineData(0.009, false)]
    [InlineData(0.01, true)]
    [InlineData(3.0, true)]
    [InlineData(3.01, false)]
    public void Chebyshev_Ripple_IsPermittedFromAHundredthToThreeDecibels(double ripple, bool permitted)
    {
        var refused = Record.Exception(() => CrystalFilterPrototype.Chebyshev(5, PassBandRipple.FromRipple(Decibels.FromDb(ripple))));

        Assert.Equal(permitted, refused is null);
    }
}
