using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Filters;

public class LowPassSearchTests
{
    private static readonly double[] E12 = [10, 12, 15, 18, 22, 27, 33, 39, 47, 56, 68, 82];
    private static readonly double[] E24 = [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91];

    public static TheoryData<ReferenceRow> Optima => ReferenceTable.Theory("low_pass_search");

    [Theory]
    [MemberData(nameof(Optima))]
    [Evidence(typeof(LowPassSearch), EvidenceKind.IndependentRecomputation)]
    public void Run_WholeWindow_FindsTheOptimumOfNodalAnalysis(ReferenceRow row)
    {
        var (design, requirement) = row["filter"] == "f7" ? (F7, Band40m) : (F14, Band20m);
        var question = Question(design, row["series"] == "E12" ? E12 : E24, row.Number("window"), row["pairs"] == "true", row.Number("factor_nh"), requirement);

        var result = LowPassSearch.Run(question);

        var optimum = result.Best.MaxBy(c => c.LosslessMargin)!;
        Assert.Equal(((long)row.Number("tried"), true), (result.Tried, result.Exhausted));
        Assert.Equal(row.Number("margin_db"), optimum.LosslessMargin.Db, row.Number("tolerance"));
        Assert.Equal(row.Numbers("capacitors_pf"), optimum.Capacitors.Select(c => Math.Round(c.Value.Picofarad)));
        Assert.Equal(row.Numbers("turns"), optimum.Coils.Select(l => (double)l.Turns));
    }

    [Fact]
    [Evidence(typeof(LowPassSearch), EvidenceKind.RoundTrip)]
    public void Run_LosslessParts_RankingMarginIsTheMarginOfTheAnalysedLadder()
    {
        var result = LowPassSearch.Run(Question(F14, E24, 0.12, false, 3.0, Band20m));

        Assert.All(result.Best, c => Assert.Equal(c.LosslessMargin.Db, c.Figures.Margin.Db, 1e-6));
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Run_UnequalEnds_RankingMarginIsTheMarginOfTheAnalysedLadder(bool symmetric)
    {
        var unequal = new LowPassDesign(F14.Form, F14.Capacitors, F14.Coils, FiftyOhm, Resistance.FromOhm(80));

        var result = LowPassSearch.Run(Question(unequal, E24, 0.12, false, 3.0, Band20m) with { Symmetric = symmetric });

        Assert.All(result.Best, c => Assert.Equal(c.LosslessMargin.Db, c.Figures.Margin.Db, 1e-6));
    }

    [Theory]
    [InlineData(3, 0.4)]
    [InlineData(5, 0.14)]
    [InlineData(7, 0.12)]
    [InlineData(9, 0.06)]
    [Evidence(typeof(LowPassSearch), EvidenceKind.Identity)]
    public void Run_Symmetric_IsTheUnrestrictedSearchAmongMirroredCombinations(int order, double window)
    {
        var exact = LowPassPrototype.Chebyshev(order, PassBandRipple.FromRipple(Decibels.FromDb(0.01))).Denormalise(Frequency.FromMegahertz(15.5), FiftyOhm);
        var question = Question(exact, E24, window, false, 3.0, Band20m) with { Keep = 1000 };
        var whole = LowPassSearch.Run(question);

        var symmetric = LowPassSearch.Run(question with { Symmetric = true });

        Assert.True(whole.Tried <= 1000, $"{whole.Tried} combinations do not all fit into the answer.");
        var mirrored = whole.Best.Where(c => c.Design.Capacitors.Reverse().SequenceEqual(c.Design.Capacitors) && c.Design.Coils.Reverse().SequenceEqual(c.Design.Coils));
        Assert.True(symmetric.Tried > 2);
        Assert.Equal(MarginsByParts(mirrored), MarginsByParts(symmetric.Best));
    }

    [Fact]
    [Evidence(typeof(LowPassSearch), EvidenceKind.IndependentRecomputation)]
    public void Run_EveryCombinationByHand_HasNoneBetter()
    {
        var question = Question(F7, E12, 0.15, false, 4.0, Band40m);
        var byHand =
            from a in question.Capacitors[0] from b in question.Capacitors[1] from c in question.Capacitors[2]
            from l in question.Coils[0] from m in question.Coils[1]
            select LowPassFigures.Of(F7 with { Capacitors = [a.Value, b.Value, c.Value], Coils = [l.Value, m.Value] }, Band40m).Margin.Db;

        Assert.Equal(byHand.Max(), LowPassSearch.Run(question).Best.Max(c => c.LosslessMargin.Db), 1e-6);
    }

    [Fact]
    public void Run_SymmetricSevenElementPairs_MeetsTheKitRequirementOn20m()
    {
        var requirement = new LowPassRequirement(FrequencyRange.FromMegahertz(14.0, 14.1), Decibels.FromDb(24), [new(2, Decibels.FromDb(40)), new(3, Decibels.FromDb(60))]);
        var question = Question(F14, E24, 0.12, true, 3.0, requirement) with { Symmetric = true, CoilQ = 150, CapacitorQ = 1000 };

        var result = LowPassSearch.Run(question);

        Assert.Equal(LowPassSearchEnding.Met, result.Ending);
        Assert.All(result.Best, c => Assert.Equal(c.Design.Capacitors.Reverse(), c.Design.Capacitors));
        Assert.True(result.Best[0].Figures.WorstPassLoss.Db > 0.1);
    }

    [Fact]
    [Evidence(typeof(LowPassSearch), EvidenceKind.Identity)]
    public void Run_MoreThanAllowed_ThinsAndSaysSo()
    {
        var full = Question(F7, E12, 0.12, true, 4.0, Band40m);

        var result = LowPassSearch.Run(full with { MostCombinations = 5000 });

        Assert.False(result.Exhausted);
        Assert.InRange(result.Tried, 1000, 5000);
        Assert.True(result.Best.Max(c => c.LosslessMargin) <= LowPassSearch.Run(full).Best.Max(c => c.LosslessMargin));
    }

    [Fact]
    public void Run_PlaceWithoutCandidate_NamesThePlace()
    {
        var question = Question(F7, E12, 0.12, false, 4.0, Band40m);

        var result = LowPassSearch.Run(question with { Capacitors = [question.Capacitors[0], [], question.Capacitors[2]] });

        Assert.Equal((LowPassSearchEnding.PlaceWithoutCandidate, 2), (result.Ending, result.EmptyPlace));
        Assert.Empty(result.Best);
    }

    [Fact]
    public void Run_RequirementOutOfReach_GivesTheNearestAttempt()
    {
        var harder = Band40m with { Harmonics = [new(2, Decibels.FromDb(43))] };

        var result = LowPassSearch.Run(Question(F7, E12, 0.12, true, 4.0, harder));

        Assert.Equal(LowPassSearchEnding.FallsShort, result.Ending);
        Assert.True(result.Best[0].Figures.Margin < Decibels.Zero);
    }

    [Fact]
    public void Run_NearlyEqualMargins_PrefersFewerCapacitors()
    {
        var result = LowPassSearch.Run(Question(F7, E12, 0.12, true, 4.0, Band40m));
        var first = result.Best[0];

        var rivals = result.Best.Where(c => first.Figures.Margin - c.Figures.Margin < Decibels.Zero);

        Assert.All(rivals, c => Assert.True(c.Capacitors.Sum(p => p.Parts) >= first.Capacitors.Sum(p => p.Parts)));
    }

    [Fact]
    [Evidence(typeof(LowPassCandidates), EvidenceKind.ClosedFormLimit)]
    public void Capacitors_EqualSums_KeepTheSinglePart()
    {
        var choices = LowPassCandidates.Capacitors(Capacitance.FromPicofarad(220), Values(E12), 0.01, pairs: true);

        var choice = Assert.Single(choices, c => Math.Abs(c.Value.Picofarad - 220) < 1e-6);
        Assert.Null(choice.Second);
    }

    private static IEnumerable<(string Parts, double MarginDb)> MarginsByParts(IEnumerable<LowPassCombination> found) =>
        found.Select(c => ($"{string.Join(' ', c.Capacitors.Select(p => p.Value.Picofarad))} {string.Join(' ', c.Coils.Select(l => l.Turns))}", Math.Round(c.LosslessMargin.Db, 7)))
            .OrderBy(x => x.Item1, StringComparer.Ordinal);

    private static LowPassRequirement Band40m =>
        new(FrequencyRange.FromMegahertz(7.0, 7.3), Decibels.FromDb(20), [new(2, Decibels.FromDb(24)), new(3, Decibels.FromDb(44))]);

    private static LowPassRequirement Band20m =>
        new(FrequencyRange.FromMegahertz(14.0, 14.35), Decibels.FromDb(24), [new(2, Decibels.FromDb(40)), new(3, Decibels.FromDb(60))]);

    private static LowPassSearchInput Question(LowPassDesign exact, double[] series, double window, bool pairs, double factor, LowPassRequirement requirement) => new(
        exact,
        [.. exact.Capacitors.Select(c => LowPassCandidates.Capacitors(c, Values(series), window, pairs))],
        [.. exact.Coils.Select(l => LowPassCandidates.Coils(l, InductanceFactor.FromNanohenryPerTurnSquared(factor)))],
        requirement);

    private static IEnumerable<(Capacitance Value, int StockRank)> Values(double[] series) =>
        new[] { 0.1, 1.0, 10.0, 100.0 }.SelectMany(d => series.Select(v => (Capacitance.FromPicofarad(v * d), 0)));
}
