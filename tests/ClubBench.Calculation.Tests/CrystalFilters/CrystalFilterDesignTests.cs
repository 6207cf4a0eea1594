using ClubBench.Calculation.CrystalFilters;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.CrystalFilters;

public class CrystalFilterDesignTests
{
    private static readonly CrystalParameters Nine =
        new(Frequency.FromHertz(8_998_000), Capacitance.FromFarad(17e-15), Capacitance.FromPicofarad(4.2), Resistance.FromOhm(12));

    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("crystal-filter-design");

    [Theory]
    [Evidence(typeof(CrystalFilterDesign), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Cases))]
    public void Design_ReferenceRow_HasThePartsOfTheTable(ReferenceRow row)
    {
        var design = CrystalFilterRows.Design(row);
        var (filter, share) = (design.Filter!, row.Number("relative_tolerance"));

        Assert.Equal(row.Number("design_width_hz"), design.DesignBandwidth.Hertz, row.Number("design_width_hz") * share);
        Assert.Equal(row.Number("end_ohm"), filter.Source.Ohm, row.Number("end_ohm") * share);
        foreach (var (pf, i) in CrystalFilterRows.Numbers(row["coupling_pf"]).Select((pf, i) => (pf, i))) Assert.Equal(pf, filter.Couplings[i].Picofarad, pf * share);
        if (row.Has("series_pf")) Assert.All(row["series_pf"].Split(' ').Zip(filter.Meshes), p => AssertSeries(p.First, p.Second.Series, share));
        if (row.Has("middle_hz")) Assert.Equal(row.Number("middle_hz"), filter.Middle.Hertz, row.Number("tolerance_hz"));
    }

    [Fact]
    [Evidence(typeof(CrystalFilterDesign), EvidenceKind.Identity)]
    public void Design_AnyTask_TunesEveryMeshAlike() => Gen.Select(Gen.Int[2, 12], Gen.Double[0.01, 1], Gen.Double[300, 2400]).Sample((n, ripple, hz) =>
    {
        var filter = CrystalFilterDesign.Of(new(CrystalFilterPrototype.Chebyshev(n, PassBandRipple.FromRipple(Decibels.FromDb(ripple))), Nine, Frequency.FromHertz(hz))).Filter!;
        return Enumerable.Range(0, n).All(i => Math.Abs(filter.MeshFrequency(i).Hertz - filter.Middle.Hertz) < 2e-3 * hz);
    });

    [Fact]
    [Evidence(typeof(CrystalFilterDesign), EvidenceKind.RoundTrip)]
    public void Corrected_AnalysedAgain_IsTheWidthWanted()
    {
        foreach (var hz in new[] { 500, 1200, 2400, 4000 })
        {
            var wanted = Frequency.FromHertz(hz);
            var filter = CrystalFilterDesign.Corrected(new(CrystalFilterPrototype.Butterworth(5), Nine, wanted)).Filter!;
            Assert.Equal(hz, CrystalFilterResponse.Of(filter, wanted)!.Width3dBHertz, 0.1);
        }
    }

    [Theory]
    [InlineData(0.349, CrystalFilterRefusal.None)]
    [InlineData(0.351, CrystalFilterRefusal.TooWide)]
    public void Design_WiderThanAThirdOfTheSpacing_IsRefused(double share, CrystalFilterRefusal refusal)
    {
        var spacing = Nine.ParallelResonance.Hertz - Nine.SeriesResonance.Hertz;
        var design = CrystalFilterDesign.Of(new(CrystalFilterPrototype.Butterworth(4), Nine, Frequency.FromHertz(share * spacing)));

        Assert.Equal(18_192, spacing, 0.5);
        Assert.Equal(refusal, design.Refusal);
        Assert.Equal(refusal == CrystalFilterRefusal.None, design.Filter is not null);
        Assert.Equal(0.35 * spacing, design.WidestBandwidth.Hertz, 1e-6);
    }

    [Theory]
    [Evidence(typeof(CrystalFilterDesign), EvidenceKind.RoundTrip)]
    [InlineData(2, 6300)]
    [InlineData(4, 6300)]
    [InlineData(8, 3900)]
    public void Corrected_NearTheWidest_IsReached(int crystals, double hz)
    {
        var task = new CrystalFilterTask(CrystalFilterPrototype.Butterworth(crystals), Nine, Frequency.FromHertz(hz));

        var design = CrystalFilterDesign.Corrected(task);

        Assert.Equal(CrystalFilterRefusal.None, design.Refusal);
        Assert.Equal(hz, CrystalFilterResponse.Of(design.Filter!, task.Bandwidth3dB)!.Width3dBHertz, 0.12);
        Assert.True(design.DesignBandwidth > task.Bandwidth3dB);
    }

    [Fact]
    public void Corrected_ManyCrystalsAtTheWidestPermitted_SaturateAndAreNotReached()
    {
        var task = new CrystalFilterTask(CrystalFilterPrototype.Butterworth(8), Nine, Frequency.FromHertz(6300));

        Assert.Equal(CrystalFilterRefusal.None, CrystalFilterDesign.Of(task).Refusal);
        var design = CrystalFilterDesign.Corrected(task);
        Assert.Equal(CrystalFilterRefusal.NotReached, design.Refusal);
        Assert.Null(design.Filter);
        Assert.InRange(design.WidestBandwidth.Hertz, 3900, 4200);
        Assert.Equal(CrystalFilterRefusal.None, CrystalFilterDesign.Corrected(task with { Bandwidth3dB = design.WidestBandwidth * 0.99 }).Refusal);
    }

    [Theory]
    [InlineData(12, CrystalFilterRefusal.None)]
    [InlineData(60, CrystalFilterRefusal.None)]
    [InlineData(300, CrystalFilterRefusal.WidenedByLoss)]
    [InlineData(2000, CrystalFilterRefusal.WidenedByLoss)]
    public void Corrected_LossThatRoundsThePassBand_IsTheWidthOrRefused(double rm, CrystalFilterRefusal refusal)
    {
        var task = new CrystalFilterTask(CrystalFilterPrototype.EqualCapacitor(4), Nine with { MotionalResistance = Resistance.FromOhm(rm) }, Frequency.FromHertz(400));

        var design = CrystalFilterDesign.Corrected(task);

        Assert.Equal(refusal, design.Refusal);
        if (design.Filter is { } filter) Assert.Equal(400, CrystalFilterResponse.Of(filter, task.Bandwidth3dB)!.Width3dBHertz, 0.05);
    }

    [Fact]
    public void Corrected_TooWide_IsRefusedToo() =>
        Assert.Equal(CrystalFilterRefusal.TooWide, CrystalFilterDesign.Corrected(new(CrystalFilterPrototype.Butterworth(4), Nine, Frequency.FromHertz(7000))).Refusal);

    [Theory]
    [InlineData(250, new[] { CrystalFilterRemark.LowerCrystalsLoseLess })]
    [InlineData(500, new CrystalFilterRemark[0])]
    [InlineData(1000, new[] { CrystalFilterRemark.NarrowedByStaticCapacitance })]
    [InlineData(2400, new[] { CrystalFilterRemark.NarrowedByStaticCapacitance, CrystalFilterRemark.BeyondDesignFormulas })]
    public void Design_UnusualWidths_AreRemarkedOn(double hz, CrystalFilterRemark[] remarks) =>
        Assert.Equal(remarks, CrystalFilterDesign.Of(new(CrystalFilterPrototype.EqualCapacitor(4), Nine, Frequency.FromHertz(hz))).Remarks);

    [Fact]
    public void EstimatedLoss_SmallLosses_IsWithinThreeTenthsOfTheAnalysis()
    {
        foreach (var hz in new[] { 400, 600, 800 })
        {
            var design = CrystalFilterDesign.Of(new(CrystalFilterPrototype.Butterworth(4), Nine, Frequency.FromHertz(hz)));
            Assert.Equal(CrystalFilterResponse.Of(design.Filter!, Frequency.FromHertz(hz))!.Loss.Db, design.EstimatedLoss!.Value.Db, 0.3);
        }
    }

    [Fact]
    public void EstimatedLoss_ResistanceNotStated_IsNotGiven() =>
        Assert.Null(CrystalFilterDesign.Of(new(CrystalFilterPrototype.Butterworth(4), Nine with { MotionalResistance = default }, Frequency.FromHertz(500))).EstimatedLoss);

    [Theory]
    [Evidence(typeof(CrystalFilterChoice), EvidenceKind.ClosedFormLimit)]
    [InlineData(500, true, false, CrystalFilterShape.EqualCapacitor)]
    [InlineData(2400, false, false, CrystalFilterShape.EqualCapacitor)]
    [InlineData(2400, true, false, CrystalFilterShape.Chebyshev)]
    [InlineData(2400, true, true, CrystalFilterShape.Butterworth)]
    public void Choice_UseAndCrystals_GiveTheShape(double hz, bool matched, bool leastRinging, CrystalFilterShape expected) =>
        Assert.Equal(expected, CrystalFilterChoice.For(Frequency.FromHertz(hz), matched, leastRinging));

    private static void AssertSeries(string expected, Capacitance? actual, double share)
    {
        if (expected == "-") Assert.Null(actual);
        else Assert.Equal(CrystalFilterRows.Numbers(expected)[0], actual!.Value.Picofarad, CrystalFilterRows.Numbers(expected)[0] * share);
    }
}
