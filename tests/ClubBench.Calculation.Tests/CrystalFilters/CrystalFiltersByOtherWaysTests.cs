using ClubBench.Calculation.CrystalFilters;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;
using MathNet.Numerics.LinearAlgebra;
using Complex = System.Numerics.Complex;

namespace ClubBench.Calculation.Tests.CrystalFilters;

public class CrystalFiltersByOtherWaysTests
{
    private static readonly Frequency Narrow = Frequency.FromHertz(500);

    private static readonly CrystalFilter Four = Filter(8_998_000, 17, 4.2, Narrow);

    private static readonly Gen<CrystalBatch> Drawer = Gen.Int[0, 700].Array[9].Select(off => new CrystalBatch([.. off.Select(o => Frequency.FromHertz(8_998_000 + o))]));

    public static TheoryData<ReferenceRow> Spreads => [.. ReferenceTable.Theory("crystal-filter-nodal").Where(r => r.Data["case_id"].StartsWith("equal-4-nine-", StringComparison.Ordinal))];

    [Fact]
    [Evidence(typeof(CrystalFilterResponse), EvidenceKind.Identity)]
    public void Response_TwiceEveryFrequencyAtTheSameImpedance_IsTwiceAsWide()
    {
        var (once, twice) = (CrystalFilterResponse.Of(Four, Narrow)!, CrystalFilterResponse.Of(Filter(2 * 8_998_000, 8.5, 2.1, Narrow * 2), Narrow * 2)!);

        Assert.Equal(once.Loss.Db, twice.Loss.Db, 1e-6);
        Assert.Equal(2 * once.Width3dBHertz, twice.Width3dBHertz, 0.01);
        Assert.Equal(2 * once.Band60dB!.Value.WidthHertz, twice.Band60dB!.Value.WidthHertz, 0.01);
        Assert.Equal(once.ShapeFactor!.Value, twice.ShapeFactor!.Value, 1e-4);
    }

    [Theory]
    [Evidence(typeof(CrystalSpread), EvidenceKind.IndependentRecomputation)]
    [MemberData(nameof(Spreads))]
    public void Spread_NodalRow_IsTheDifferenceToTheRowOfEqualCrystals(ReferenceRow row)
    {
        var equal = ReferenceTable.Read("crystal-filter-nodal").Single(r => r["case_id"] == "equal-4-nine");
        var measured = CrystalFilterRows.Numbers(row["off_hz"]).Select(off => Frequency.FromHertz(row.Number("fs_hz") + off)).ToList();

        var spread = CrystalSpread.Of(CrystalFilterRows.Built(equal), measured, Frequency.FromHertz(row.Number("width_hz")))!;

        Assert.Equal(row.Number("expected_loss_db") - equal.Number("expected_loss_db"), spread.ExtraLoss!.Value.Db, 1e-4);
        Assert.Equal(row.Number("expected_width3_hz") - equal.Number("expected_width3_hz"), spread.WidthChangeHertz!.Value, 0.1);
    }

    [Fact]
    [Evidence(typeof(CrystalSpread), EvidenceKind.Identity)]
    public void Spread_CrystalsInReverse_CostTheSame() => Gen.Double[-60, 60].Array[4].Sample(
        off =>
        {
            Frequency[] measured = [.. off.Select(o => Frequency.FromHertz(8_998_000 + o))];
            var (there, back) = (CrystalSpread.Of(Four, measured, Narrow)!, CrystalSpread.Of(Four, [.. measured.Reverse()], Narrow)!);
            Assert.Equal(there.ExtraLoss!.Value.Db, back.ExtraLoss!.Value.Db, 1e-6);
            Assert.Equal(there.WidthChangeHertz!.Value, back.WidthChangeHertz!.Value, 0.01);
        },
        iter: 20);

    [Fact]
    [Evidence(typeof(CrystalSpreadTrial), EvidenceKind.ClosedFormLimit)]
    public void Trial_NoSpread_IsTheFilterItself()
    {
        var (trial, response) = (CrystalSpreadTrial.Of(Four, Narrow, 0, 5, 20)!, CrystalFilterResponse.Of(Four, Narrow)!);

        Assert.Equal((20, 1.0), (trial.Builds, trial.WithPassBand.Share));
        Assert.Equal(0, trial.ExtraLoss.Db, 1e-9);
        Assert.Equal(response.Ripple.Db, trial.Ripple.Db, 1e-9);
        Assert.Equal(response.Width3dBHertz, trial.NarrowestHertz, 1e-6);
    }

    [Fact]
    [Evidence(typeof(FilterMatching), EvidenceKind.IndependentRecomputation)]
    public void Matching_EveryThreeOfADrawerTriedOut_NoneAreTighterThanTheFirst() => Drawer.Sample(drawer =>
    {
        var hertz = drawer.Frequencies.Select(f => f.Hertz).ToList();
        var tightest = (from i in Enumerable.Range(0, 9) from j in Enumerable.Range(0, i) from k in Enumerable.Range(0, j)
                        select new[] { hertz[i], hertz[j], hertz[k] }).Min(s => s.Max() - s.Min());

        var matching = FilterMatching.Of(drawer, 3, Narrow);

        Assert.Equal(tightest <= 50, matching.Sets.Count > 0);
        Assert.Equal(tightest, matching.Sets.Count > 0 ? matching.Sets[0].SpreadHertz : matching.NextSpreadHertz!.Value, 1e-6);
    });

    [Fact]
    [Evidence(typeof(FilterMatching), EvidenceKind.Identity)]
    public void Matching_AnyDrawer_PutsEveryCrystalIntoOneFilterOrAside() => Drawer.Sample(drawer =>
    {
        var matching = FilterMatching.Of(drawer, 3, Narrow);

        Assert.Equal(Enumerable.Range(0, 9), matching.Sets.SelectMany(s => s.Indices).Concat(matching.LeftOver).Order());
        Assert.All(matching.Sets, s => Assert.Equal(s.SpreadHertz, s.Indices.Max(i => drawer.Frequencies[i].Hertz) - s.Indices.Min(i => drawer.Frequencies[i].Hertz), 1e-6));
    });

    [Theory]
    [Evidence(typeof(CrystalFilterChoice), EvidenceKind.IndependentRecomputation)]
    [InlineData(3)]
    [InlineData(4)]
    [InlineData(6)]
    [InlineData(8)]
    public void Choice_LeastRinging_IsTheShapeWhoseSlowestPoleDiesAwayFastest(int order)
    {
        var ripple = PassBandRipple.FromRipple(Decibels.FromDb(0.1));
        var shapes = new Dictionary<CrystalFilterShape, CrystalFilterPrototype>
        {
            [CrystalFilterShape.EqualCapacitor] = CrystalFilterPrototype.EqualCapacitor(order),
            [CrystalFilterShape.Chebyshev] = CrystalFilterPrototype.Chebyshev(order, ripple),
            [CrystalFilterShape.Butterworth] = CrystalFilterPrototype.Butterworth(order),
        };

        Assert.Equal(shapes.MaxBy(s => SlowestDecay(s.Value)).Key, CrystalFilterChoice.For(Frequency.FromHertz(2400), crystalsMatched: true, leastRinging: true));
    }

    [Fact]
    [Evidence(typeof(CrystalFilterChoice), EvidenceKind.Identity)]
    public void Choice_MoreWidth_NeverGoesBackToOneCapacitor() => Gen.Select(Gen.Double[100, 4000], Gen.Double[100, 4000], Gen.Bool, Gen.Bool).Sample((a, b, matched, leastRinging) =>
    {
        CrystalFilterShape For(double hz) => CrystalFilterChoice.For(Frequency.FromHertz(hz), matched, leastRinging);
        return For(Math.Max(a, b)) == For(Math.Min(a, b)) || (For(Math.Min(a, b)), For(Math.Max(a, b))) == (CrystalFilterShape.EqualCapacitor, CrystalFilterShape.Chebyshev);
    });

    // Natural oscillations of coupled resonators: eigenvalues of the matrix with 1/q at the ends and j k between neighbours.
    private static double SlowestDecay(CrystalFilterPrototype p)
    {
        var matrix = Matrix<Complex>.Build.Dense(p.Order, p.Order, (i, j) => Math.Abs(i - j) == 1 ? new Complex(0, p.Couplings[Math.Min(i, j)])
            : i == j && (i == 0 || i == p.Order - 1) ? 1 / p.EndQ : Complex.Zero);
        return matrix.Evd().EigenValues.Min(e => e.Real);
    }

    private static CrystalFilter Filter(double seriesHz, double motionalFf, double staticPf, Frequency bandwidth) => CrystalFilterDesign.Of(new(
        CrystalFilterPrototype.EqualCapacitor(4),
        new(Frequency.FromHertz(seriesHz), Capacitance.FromFarad(motionalFf * 1e-15), Capacitance.FromPicofarad(staticPf), Resistance.FromOhm(12)),
        bandwidth)).Filter!;
}
