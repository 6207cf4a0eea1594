using ClubBench.Calculation.CrystalFilters;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;

namespace ClubBench.Calculation.Tests.CrystalFilters;

public class CrystalSpreadTests
{
    private static readonly CrystalParameters Nine =
        new(Frequency.FromHertz(8_998_000), Capacitance.FromFarad(17e-15), Capacitance.FromPicofarad(4.2), Resistance.FromOhm(12));

    private static readonly Frequency Narrow = Frequency.FromHertz(500);

    private static readonly CrystalFilter Four = CrystalFilterDesign.Of(new(CrystalFilterPrototype.EqualCapacitor(4), Nine, Narrow)).Filter!;

    public static TheoryData<ReferenceRow> Drawers => ReferenceTable.Theory("filter-matching");

    [Fact]
    [Evidence(typeof(CrystalSpread), EvidenceKind.ClosedFormLimit)]
    public void Of_EqualCrystals_CostsNothing()
    {
        var spread = CrystalSpread.Of(Four, Off(20, 20, 20, 20), Narrow)!;

        Assert.Equal(0, spread.ExtraLoss!.Value.Db, 1e-9);
        Assert.Equal(0, spread.WidthChangeHertz!.Value, 1e-6);
    }

    [Fact]
    public void Of_OneCrystalHigh_CostsMoreTheHigherItIs()
    {
        var (fifty, hundred) = (CrystalSpread.Of(Four, Off(0, 50, 0, 0), Narrow)!, CrystalSpread.Of(Four, Off(0, 100, 0, 0), Narrow)!);

        Assert.InRange(fifty.ExtraLoss!.Value.Db, 0.05, 0.2);
        Assert.True(hundred.ExtraLoss > fifty.ExtraLoss);
        Assert.True(hundred.WidthChangeHertz < 0);
    }

    [Fact]
    public void Of_CrystalsFarApart_LeavesNoPassBandButTellsTheEqualOnes()
    {
        var spread = CrystalSpread.Of(Four, Off(0, 3000, -4000, 8000), Narrow);

        Assert.Null(spread?.Actual);
        Assert.Null(spread?.ExtraLoss);
        Assert.NotNull(CrystalSpread.Of(Four, Off(0, 30, -40, 10), Narrow)!.Actual);
    }

    [Fact]
    public void Trial_SameSeed_GivesTheSameAnswer() =>
        Assert.Equal(CrystalSpreadTrial.Of(Four, Narrow, 100, 7, 20), CrystalSpreadTrial.Of(Four, Narrow, 100, 7, 20));

    [Fact]
    [Evidence(typeof(CrystalSpreadTrial), EvidenceKind.IndependentRecomputation)]
    public void Trial_SameDrawsByHand_LeaveNineOutOfTenWithinEachFigure()
    {
        var trial = CrystalSpreadTrial.Of(Four, Narrow, 200, 3, 20)!;
        var random = new SeededRandom(3);
        var (equal, byHand) = (CrystalFilterResponse.Of(Four, Narrow)!, new List<CrystalFilterResponse>());
        for (var i = 0; i < 20; i++) byHand.Add(CrystalFilterResponse.Of(Four.WithResonances(Off([.. Enumerable.Range(0, 4).Select(_ => random.Uniform(-100, 100))])), Narrow)!);

        Assert.Equal(18, byHand.Count(r => r.Width3dBHertz >= trial.NarrowestHertz - 1e-6));
        Assert.Equal(18, byHand.Count(r => r.Loss.Db - equal.Loss.Db <= trial.ExtraLoss.Db + 1e-9));
        Assert.True(byHand.Count(r => r.Ripple.Db <= trial.Ripple.Db + 1e-9) >= 18);
    }

    [Fact]
    [Evidence(typeof(CrystalSpreadTrial), EvidenceKind.Identity)]
    public void Trial_WithinATenthOfTheBandwidth_CostsLittleAndBeyondItMuch()
    {
        var (none, matched, wild) = (Trial(0), Trial(FilterMatching.LimitFor(Narrow)), Trial(500));

        Assert.Equal(0, none.ExtraLoss.Db, 1e-9);
        Assert.InRange(matched.ExtraLoss.Db, 0, 0.2);
        Assert.True(wild.ExtraLoss.Db > 2, wild.ToString());
        Assert.Equal(1, matched.WithPassBand.Share);

        CrystalSpreadTrial Trial(double spreadHertz) => CrystalSpreadTrial.Of(Four, Narrow, spreadHertz, 11, 20)!;
    }

    [Theory]
    [Evidence(typeof(FilterMatching), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Drawers))]
    public void Matching_ReferenceRow_TakesTheTightestWithinTheLimit(ReferenceRow row)
    {
        var drawer = new CrystalBatch([.. CrystalFilterRows.Numbers(row["resonances_hz"]).Select(Frequency.FromHertz)]);

        var matching = FilterMatching.Of(drawer, (int)row.Number("per_filter"), Frequency.FromHertz(row.Number("width_hz")));

        Assert.Equal(CrystalFilterRows.Numbers(row["expected_members_hz"]), matching.Sets[0].Indices.Select(i => drawer.Frequencies[i].Hertz));
        Assert.Equal(row.Number("expected_spread_hz"), matching.Sets[0].SpreadHertz, row.Number("tolerance"));
        Assert.Equal(row.Number("expected_limit_hz"), matching.Limit, row.Number("tolerance"));
    }

    [Fact]
    public void Matching_DrawerOfEight_LeavesTheOddOnesAndTellsTheNextSpread()
    {
        var drawer = new CrystalBatch([.. new double[] { 8998120, 8998310, 8998355, 8998402, 8998390, 8998650, 8998371, 8998010 }.Select(Frequency.FromHertz)]);

        var matching = FilterMatching.Of(drawer, 4, Narrow);

        Assert.Single(matching.Sets);
        Assert.Equal([7, 0, 1, 5], matching.LeftOver);
        Assert.Equal(640, matching.NextSpreadHertz!.Value, 1e-6);
        Assert.Equal(Enumerable.Range(0, 8), matching.Sets.SelectMany(s => s.Indices).Concat(matching.LeftOver).Order());
    }

    private static Frequency[] Off(params double[] hertz) => [.. hertz.Select(h => Frequency.FromHertz(8_998_000 + h))];
}
