using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Statistics;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Windings;

public class MeasuredInductanceTests
{
    private static readonly WoundBoard[] Seven =
    [
        new("1", Inductance.FromMicrohenry(5.30), 33), new("2", Inductance.FromMicrohenry(5.45), 33), new("3", Inductance.FromMicrohenry(5.38), 33),
        new("4", Inductance.FromMicrohenry(5.02), 32), new("5", Inductance.FromMicrohenry(5.52), 33), new("6", Inductance.FromMicrohenry(5.05), 33),
        new("7", Inductance.FromMicrohenry(5.41), 33),
    ];

    [Fact]
    public void FromTwo_WorkedReadings_GiveInductanceStrayAndUncertainty()
    {
        var result = InductanceFromResonance.FromTwo(Point(220, 5.118), Point(100, 7.463), 1e-4, 0.01);

        Assert.Equal(4.2686, result.Inductance!.Value.Microhenry, 0.0005);
        Assert.Equal(6.543, result.StrayPicofarad, 0.005);
        Assert.Equal(0.0860, result.InductanceUncertainty.Microhenry, 0.0005);
        Assert.Equal(2.72, result.StrayUncertainty.Picofarad, 0.01);
    }

    [Fact]
    [Evidence(typeof(InductanceFromResonance), EvidenceKind.RoundTrip)]
    public void FromTwo_KnownCoilAndStray_RecoversBoth() =>
        Gen.Select(Gen.Double[0.1, 50], Gen.Double[0.5, 25], Gen.Double[20, 100], Gen.Double[2, 10]).Sample((uh, stray, pf, step) =>
        {
            var result = InductanceFromResonance.FromTwo(Forward(uh, stray, pf * step), Forward(uh, stray, pf));
            return Math.Abs((result.Inductance!.Value.Microhenry / uh) - 1) < 1e-9 && Math.Abs(result.StrayPicofarad - stray) < 1e-6;
        });

    [Fact]
    [Evidence(typeof(InductanceFromResonance), EvidenceKind.IndependentRecomputation)]
    public void FromTwo_SimulatedErrors_ScatterAsTheUncertaintySays()
    {
        var random = new SeededRandom(3);
        double Draw()
        {
            var (c1, c2) = (220 * random.Normal(1, 0.01), 100 * random.Normal(1, 0.01));
            return InductanceFromResonance.FromTwo(Point(c1, 5.118), Point(c2, 7.463), 0, 0.01).Inductance!.Value.Microhenry;
        }

        var draws = Enumerable.Range(0, 20_000).Select(_ => Draw()).ToList();
        var deviation = Math.Sqrt(draws.Average(d => (d - draws.Average()) * (d - draws.Average())));

        Assert.Equal(InductanceFromResonance.FromTwo(Point(220, 5.118), Point(100, 7.463), 0, 0.01).InductanceUncertainty.Microhenry, deviation, 0.003);
    }

    [Fact]
    public void FromTwo_ReadingsSwapped_AreRefused()
    {
        var result = InductanceFromResonance.FromTwo(Point(220, 7.463), Point(100, 5.118));

        Assert.Equal(ResonanceRefusal.MixedUp, result.Refusal);
        Assert.Null(result.Inductance);
    }

    [Fact]
    public void FromTwo_WrongCapacitor_IsNoticedByItsNegativeStray()
    {
        // The coil was read with 100 pF but 140 pF was noted.
        var result = InductanceFromResonance.FromTwo(Forward(5, 6, 220), Forward(5, 6, 100) with { Capacitor = Capacitance.FromPicofarad(140) }, 1e-4, 0.01);

        Assert.Equal(ResonanceRefusal.NegativeStray, result.Refusal);
        Assert.True(result.StrayPicofarad < 0);
    }

    [Fact]
    [Evidence(typeof(InductanceFromResonance), EvidenceKind.RoundTrip)]
    public void FromOne_StrayAssumed_CarriesItsUncertainty()
    {
        var result = InductanceFromResonance.FromOne(Forward(5, 6, 220), Capacitance.FromPicofarad(6), 1e-4, 0.01, Capacitance.FromPicofarad(3));

        Assert.Equal(5, result.Inductance.Microhenry, 9);
        Assert.Equal(0.0165, result.RelativeUncertainty, 0.0001);
    }

    [Fact]
    [Evidence(typeof(BatchInductanceFactor), EvidenceKind.IndependentRecomputation)]
    public void BatchFrom_SevenBoards_FindsTheMiscountedOne()
    {
        var batch = BatchInductanceFactor.From(Seven, 0.01, 0.01);

        var unfit = Assert.Single(batch.Unfit);
        Assert.Equal(("6", 32), (unfit.Board.Board, unfit.LikelyTurns));
        Assert.Equal(6, batch.Used.Count);
        // Recomputed/resonators_and_windings.py.
        Assert.Equal(4.958, batch.Mean.NanohenryPerTurnSquared, 0.0005);
        Assert.Equal(0.0725, batch.Deviation, 0.0004);
        Assert.Equal(0.0577, batch.StandardUncertainty, 0.0003);
        Assert.Equal(2.57 * 0.0577, batch.ExpandedUncertainty!.Value, 0.001);
    }

    [Fact]
    public void BatchFrom_SoundBoards_LeavesNoneOut()
    {
        var sound = Seven.Where(b => b.Board != "6").ToArray();

        Assert.Empty(BatchInductanceFactor.From(sound, 0.01, 0.01).Unfit);
    }

    [Fact]
    public void BatchFrom_CoilThatFitsNoTurns_NamesNoCount()
    {
        WoundBoard[] boards = [.. Seven, new("8", Inductance.FromNanohenry(22), 3)];

        Assert.Null(BatchInductanceFactor.From(boards, 0.01, 0.01).Unfit.Single(u => u.Board.Board == "8").LikelyTurns);
    }

    [Fact]
    public void BatchFrom_YellowRingsOfTheInventedKit_LearnTheirIndex()
    {
        // Seven boards of 15, 16 and 15 turns, 20 nH of the fixture taken off.
        double[,] microhenry =
        {
            { 0.736, 0.836, 0.728 }, { 0.728, 0.822, 0.725 }, { 0.728, 0.816, 0.721 }, { 0.714, 0.809, 0.716 },
            { 0.734, 0.828, 0.732 }, { 0.727, 0.801, 0.717 }, { 0.725, 0.833, 0.741 },
        };
        var boards = Enumerable.Range(0, 21).Select(i =>
            new WoundBoard($"{i}", Inductance.FromMicrohenry(microhenry[i / 3, i % 3] - 0.020), i % 3 == 1 ? 16 : 15)).ToList();

        var batch = BatchInductanceFactor.From(boards, 0.01, 0.005);

        Assert.Equal(3.136, batch.Mean.NanohenryPerTurnSquared, 0.0006);
        Assert.Equal(0.040, batch.Deviation, 0.0006);
        Assert.Equal(21, batch.Used.Count);
        Assert.True(batch.CanBeLearntFrom);
    }

    [Fact]
    public void BatchFrom_TwoBoards_ReportButDoNotTeach() => Assert.False(BatchInductanceFactor.From(Seven[..2], 0.01, 0.01).CanBeLearntFrom);

    [Fact]
    public void OtherMixes_RedRingsInAYellowBag_NamesTheRedMix()
    {
        var boards = Enumerable.Range(1, 4).Select(i => new WoundBoard($"{i}", Inductance.FromMicrohenry(0.9 + (0.002 * i)), 15)).ToList();
        var batch = BatchInductanceFactor.From(boards, 0.01, 0.01);

        Assert.Contains(batch.OtherMixes((IronPowderCore)Cores.Find("T37-6")!), c => c.Designation == "T37-2");
        Assert.Empty(batch.OtherMixes((IronPowderCore)Cores.Find("T37-2")!));
    }

    [Fact]
    [Evidence(typeof(InductanceFromResonance), EvidenceKind.ClosedFormLimit)]
    public void Uncertainty_FrequencyAlone_CountsTwice()
    {
        Assert.Equal(2e-4, InductanceFromResonance.FromOne(Forward(5, 0, 220), default, 1e-4, 0, default).RelativeUncertainty, 12);
        Assert.Equal(0, InductanceFromResonance.FromTwo(Point(220, 5.118), Point(100, 7.463)).InductanceUncertainty.Henry);
    }

    private static ResonancePoint Point(double picofarad, double megahertz) =>
        new(Capacitance.FromPicofarad(picofarad), Frequency.FromMegahertz(megahertz));

    private static ResonancePoint Forward(double microhenry, double strayPicofarad, double picofarad) => new(
        Capacitance.FromPicofarad(picofarad),
        TunedCircuit.ResonantFrequency(Inductance.FromMicrohenry(microhenry), Capacitance.FromPicofarad(picofarad + strayPicofarad)));
}
