using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Emissions;

public class HarmonicTests
{
    public static TheoryData<ReferenceRow> Angles => ReferenceTable.Theory("conduction_angle");

    public static TheoryData<ReferenceRow> Suppression => ReferenceTable.Theory("harmonic_suppression");

    [Theory]
    [Evidence(typeof(ConductionAngle), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Angles))]
    public void ConductionAngle_Series_MatchesTheRow(ReferenceRow row)
    {
        var angle = ConductionAngle.FromDegrees(row.Number("angle_deg"));

        Assert.Equal(row.Number("direct"), angle.DirectCurrent, row.Number("tolerance"));
        Assert.Equal(row.Number("fundamental"), angle.Amplitude(1), row.Number("tolerance"));
        Assert.Equal(row.Number("efficiency"), angle.Efficiency, 1e-4);
        foreach (var (column, n) in new[] { ("second_db", 2), ("third_db", 3), ("fourth_db", 4), ("fifth_db", 5) })
            Assert.Equal(row.Has(column) ? row.Number(column) : -999, angle.RelativeLevel(n)?.Db ?? -999, row.Number("db_tolerance"));
    }

    [Theory]
    [Evidence(typeof(ConductionAngle), EvidenceKind.IndependentRecomputation)]
    [InlineData(70)]
    [InlineData(200)]
    public void ConductionAngle_NumericalFourier_Agrees(double degrees)
    {
        var half = degrees * Math.PI / 360;
        const int steps = 200_000;
        double Term(int n) => Enumerable.Range(0, steps).Sum(k =>
        {
            var t = -half + (2 * half * (k + 0.5) / steps);
            return (Math.Cos(t) - Math.Cos(half)) / (1 - Math.Cos(half)) * Math.Cos(n * t) * (2 * half / steps) / Math.PI;
        });

        var angle = ConductionAngle.FromDegrees(degrees);

        Assert.Equal(Term(0) / 2, angle.DirectCurrent, 1e-8);
        for (var n = 1; n <= 5; n++) Assert.Equal(Term(n), angle.Amplitude(n), 1e-8);
    }

    [Fact]
    [Evidence(typeof(ConductionAngle), EvidenceKind.ClosedFormLimit)]
    public void ConductionAngle_HalfSine_SecondHarmonicIsTheClosedForm() =>
        Assert.Equal(20 * Math.Log10(4 / (3 * Math.PI)), ConductionAngle.FromDegrees(180).RelativeLevel(2)!.Value.Db, 1e-9);

    [Theory]
    [MemberData(nameof(Suppression))]
    public void Suppression_ThreeModels_MatchTheRow(ReferenceRow row)
    {
        var f = Frequency.FromMegahertz(7.1);
        var ladder = (row["filter"] == "f7" ? F7 : LowPassDesign.HalfWave(f, FiftyOhm)).ToLadder();

        foreach (var model in Enum.GetValues<HarmonicSourceModel>())
            foreach (var (n, word, rawDb) in new[] { (2, "second", -12), (3, "third", -16) })
            {
                var level = rawDb - HarmonicSuppression.Of(ladder, f, n, FiftyOhm, FiftyOhm, model).Db;
                Assert.Equal(row.Number($"{model}_{word}_dbc".ToLowerInvariant()), level, row.Number("tolerance"));
            }
    }

    [Fact]
    public void Planning_ChebyshevFiveBehindClassC_IsExpectedToMiss()
    {
        var raw = new UncertainLevel(Decibels.FromDb(-12), Decibels.FromDb(5));

        var level = HarmonicMargin.BehindFilter(raw, Decibels.Zero, Decibels.FromDb(25.11), HarmonicMargin.FilterUncertainty);
        var margin = new HarmonicMargin(level, Decibels.FromDb(43));

        Assert.Equal(-37.11, level.Value.Db, 1e-9);
        Assert.Equal(-5.89, margin.Margin.Db, 1e-9);
        Assert.Equal(5.83, level.StandardUncertainty.Db, 0.005);
        Assert.Equal(HarmonicVerdict.ExpectedToMiss, margin.Planning);
    }

    [Theory]
    [Evidence(typeof(HarmonicMargin), EvidenceKind.ClosedFormLimit)]
    [InlineData(-50, 5, HarmonicVerdict.ExpectedToMeet, HarmonicVerdict.Held)]
    [InlineData(-54, 5, HarmonicVerdict.ExpectedToMeet, HarmonicVerdict.Cleared)]
    [InlineData(-46, 5, HarmonicVerdict.TooCloseToTell, HarmonicVerdict.Held)]
    [InlineData(-37, 5, HarmonicVerdict.ExpectedToMiss, HarmonicVerdict.Held)]
    public void Verdicts_Level_PlanningTakesOneSigmaAndOnAirTwo(double levelDbc, double u, HarmonicVerdict planning, HarmonicVerdict onAir)
    {
        var margin = new HarmonicMargin(new(Decibels.FromDb(levelDbc), Decibels.FromDb(u)), Decibels.FromDb(43));

        Assert.Equal((planning, onAir), (margin.Planning, margin.OnAir));
    }

    [Fact]
    [Evidence(typeof(HarmonicMargin), EvidenceKind.ClosedFormLimit)]
    public void AttenuationNeeded_ClassCAndWishMargin_Is41dB() =>
        Assert.Equal(41, HarmonicMargin.AttenuationNeeded(Decibels.FromDb(-12), Decibels.FromDb(43), Decibels.FromDb(10)).Db, 1e-9);

    [Fact]
    public void LearntRawLevel_FourBoards_MatchesWorkedFigures()
    {
        var readings = new[] { -36.5, -38.0, -35.0, -37.5 }.Select(db => (Decibels.FromDb(db), Decibels.FromDb(25.11))).ToList();

        var learnt = LearntRawLevel.From(readings, HarmonicMargin.AnalyserUncertainty);
        var behind = HarmonicMargin.BehindFilter(learnt.Raw, Decibels.Zero, Decibels.FromDb(41), HarmonicMargin.FilterUncertainty);

        Assert.Equal(-11.64, learnt.Raw.Value.Db, 0.01);
        Assert.Equal(1.323, learnt.SampleDeviation.Db, 0.001);
        Assert.Equal(2.487, learnt.Raw.StandardUncertainty.Db, 0.001);
        Assert.Equal(-52.64, behind.Value.Db, 0.01);
        Assert.Equal(3.897, behind.StandardUncertainty.Db, 0.001);
        Assert.Equal(5.487, learnt.OnNewBand().Raw.StandardUncertainty.Db, 0.001);
    }

    [Fact]
    [Evidence(typeof(LearntRawLevel), EvidenceKind.ClosedFormLimit)]
    public void LearntRawLevel_OneBoard_StaysUncertain()
    {
        var learnt = LearntRawLevel.From([(Decibels.FromDb(-40), Decibels.FromDb(25.11))], HarmonicMargin.AnalyserUncertainty);

        Assert.Equal(-14.89, learnt.Raw.Value.Db, 1e-9);
        Assert.Equal(6.000, learnt.Raw.StandardUncertainty.Db, 1e-9);
    }

    [Fact]
    public void RawHarmonicLevels_EveryClass_HasFourHarmonicsWithSources()
    {
        foreach (var stage in Enum.GetValues<StageClass>().Where(s => s != StageClass.Unknown))
            for (var n = 2; n <= 5; n++)
                Assert.NotNull(RawHarmonicLevels.Find(stage, n));
        Assert.All(RawHarmonicLevels.All, r => Assert.NotNull(Sources.Find(r.Source.SourceId)));
        Assert.All(RawHarmonicLevels.All.Where(r => r.LowEnd is not null), r => Assert.True(r.LowEnd < r.Level && r.Level < r.HighEnd));
        Assert.Equal(-12, RawHarmonicLevels.Find(StageClass.ClassCBroadband, 2)!.Level.Db);
    }
}
