using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Windings;

public class BatchInductanceFactorTests
{
    [Fact]
    [Evidence(typeof(BatchInductanceFactor), EvidenceKind.ClosedFormLimit)]
    public void From_BoardsThatAgree_LeavesTheInstrumentAlone()
    {
        var batch = BatchInductanceFactor.From([Board("1", 4.9, 33, 33), Board("2", 4.9, 20, 20), Board("3", 4.9, 15, 15)], 0.01, 0.02);

        Assert.Equal(4.9, batch.Mean.NanohenryPerTurnSquared, 12);
        Assert.Equal(0, batch.Deviation, 12);
        Assert.Equal(0.02 * 4.9, batch.StandardUncertainty, 12);
    }

    [Fact]
    [Evidence(typeof(BatchInductanceFactor), EvidenceKind.RoundTrip)]
    public void From_MiscountedBoardPutRight_TeachesTheTrueIndex() =>
        Gen.Select(Gen.Double[1, 20], Gen.Int[10, 40], Gen.Bool).Sample((index, turns, missing) =>
        {
            WoundBoard[] sound = [Board("1", index, turns, turns), Board("2", index, turns + 1, turns + 1), Board("3", index, turns, turns)];
            var wrong = Board("4", index, turns + (missing ? -1 : 1), turns);

            var unfit = BatchInductanceFactor.From([.. sound, wrong], 0.01, 0.01).Unfit.Single();
            var after = BatchInductanceFactor.From([.. sound, wrong with { Turns = unfit.LikelyTurns!.Value }], 0.01, 0.01);

            return unfit.Board == wrong && after.Unfit.Count == 0 && Math.Abs((after.Mean.NanohenryPerTurnSquared / index) - 1) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(BatchInductanceFactor), EvidenceKind.Identity)]
    public void From_EveryInductanceScaledAndOrderTurned_ScalesAllButTheTolerance() =>
        Gen.Select(Gen.Double[4.5, 5.5].Array[3, 12], Gen.Double[0.1, 10]).Sample((indices, k) =>
        {
            var plain = BatchInductanceFactor.From([.. indices.Select((x, i) => Board($"{i}", x, 20, 20))], 0.01, 0.01);
            var scaled = BatchInductanceFactor.From([.. indices.Reverse().Select((x, i) => Board($"{i}", k * x, 20, 20))], 0.01, 0.01);
            return plain.Used.Count == scaled.Used.Count
                && Math.Abs((scaled.Mean.NanohenryPerTurnSquared / (k * plain.Mean.NanohenryPerTurnSquared)) - 1) < 1e-9
                && Math.Abs((scaled.StandardUncertainty / (k * plain.StandardUncertainty)) - 1) < 1e-9
                && Math.Abs((scaled.RelativeTolerance!.Value / plain.RelativeTolerance!.Value) - 1) < 1e-9;
        });

    private static WoundBoard Board(string name, double index, int wound, int said) => new(name, InductanceFactor.FromNanohenryPerTurnSquared(index).Of(wound), said);
}
