using ClubBench.Calculation.Fitting;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Fitting;

public class GrossFaultTests
{
    [Fact]
    [Evidence(typeof(GrossFaultSearch), EvidenceKind.RoundTrip)]
    public void Of_EveryShortAndOpenWithScatteredParts_RanksFirstAndIsNamed()
    {
        for (var seed = 1UL; seed <= 5; seed++)
            for (var arm = 0; arm < 5; arm++)
                foreach (var kind in new[] { GrossFaultKind.Open, GrossFaultKind.Shorted })
                {
                    var search = GrossFaultSearch.Of(Boards.Question(Boards.Shown(Faulty(arm, kind, seed), 0.002, seed)), []);

                    Assert.Equal((kind, arm), (search.Explanations[0].Kind, search.Explanations[0].Arm));
                    Assert.True(search.Explanations[0].Rms < search.Explanations[1].Rms / 2.5);
                    Assert.Equal(search.Explanations[1].Rms > 3 * search.Explanations[0].Rms ? search.Explanations[0] : null, search.Named);
                }
    }

    [Fact]
    public void Of_EveryShortAndOpenOfNominalParts_LeavesNearlyNothing()
    {
        for (var arm = 0; arm < 5; arm++)
            foreach (var kind in new[] { GrossFaultKind.Open, GrossFaultKind.Shorted })
            {
                var search = GrossFaultSearch.Of(Boards.Question(Boards.Shown(Faulty(arm, kind, 1, 0))), []);

                Assert.Equal(search.Explanations[0], search.Named);
                Assert.InRange(search.Explanations[0].Rms, 0, 0.01);
            }
    }

    [Fact]
    public void Of_SoundBoard_NamesNothing()
    {
        var search = GrossFaultSearch.Of(Boards.Question(Boards.Shown(Boards.Built([1.05, 0.95, 1.03, 0.97, 1.01]), 0.002)), []);

        Assert.Equal(GrossFaultKind.None, search.Explanations[0].Kind);
        Assert.Null(search.Named);
    }

    [Fact]
    [Evidence(typeof(GrossFaultSearch), EvidenceKind.Identity)]
    public void Of_TransmissionAlone_CannotTellAShortFromItsMirrorImage()
    {
        var question = Boards.Question(Boards.Shown(Faulty(0, GrossFaultKind.Open, 1))) with { Data = FittedData.Transmission };

        var search = GrossFaultSearch.Of(question, []);

        Assert.Null(search.Named);
        Assert.Equal([0, 4], search.Explanations.Take(2).Select(e => e.Arm).Order());
    }

    [Fact]
    public void Of_OneOfAPairMissing_IsTheFirstExplanation()
    {
        var pair = new ParallelPair(2, Capacitance.FromPicofarad(560), Capacitance.FromPicofarad(157.46));

        var search = GrossFaultSearch.Of(Boards.Question(Boards.Shown(Boards.Built([1, 1, 560 / 717.46, 1, 1]), 0.002)), [pair]);

        Assert.Equal((GrossFaultKind.OnlyFirstOfPair, 2), (search.Explanations[0].Kind, search.Explanations[0].Arm));
        Assert.Equal(search.Explanations[0], search.Named);
    }

    [Theory]
    [InlineData(true, GrossFaultKind.Open)]
    [InlineData(true, GrossFaultKind.Shorted)]
    [InlineData(false, GrossFaultKind.Open)]
    [InlineData(false, GrossFaultKind.Shorted)]
    public void Of_TrapWithAFault_IsNamed(bool isCoil, GrossFaultKind kind)
    {
        var (coil, capacitor) = (Inductance.FromMicrohenry(1.2), Capacitance.FromPicofarad(60));
        Ladder With(LadderElement arm) => new([F7.ToLadder().Elements[0], arm, F7.ToLadder().Elements[2], .. F7.ToLadder().Elements.Skip(3)]);
        var arm = (isCoil, kind) switch
        {
            (true, GrossFaultKind.Open) => LadderElement.SeriesCapacitor(capacitor),
            (false, GrossFaultKind.Open) => LadderElement.SeriesInductor(coil),
            _ => LadderElement.SeriesInductor(Inductance.FromNanohenry(0.1)),
        };

        var search = GrossFaultSearch.Of(new(With(LadderElement.SeriesTrap(coil, capacitor)), 150, 1000, Boards.Shown(new(With(arm).Elements.Select(e => e.WithQ(150, 1000))))), []);

        // A trap is shorted by either of its parts.
        Assert.Equal((kind, 1), (search.Explanations[0].Kind, search.Explanations[0].Arm));
        if (kind == GrossFaultKind.Open) Assert.Equal(isCoil, search.Explanations[0].IsCoil);
    }

    private static Ladder Faulty(int arm, GrossFaultKind kind, ulong seed, double scatter = 0.05)
    {
        var random = new SeededRandom(seed);
        double[] scales = [.. Enumerable.Range(0, 5).Select(_ => random.Uniform(1 - scatter, 1 + scatter))];
        scales[arm] = (arm % 2 == 0) == (kind == GrossFaultKind.Open) ? 1e-4 : 1e4;
        return Boards.Built(scales);
    }
}
