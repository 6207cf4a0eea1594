using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>What a builder reads on a low-pass ladder: each coil before it goes in, then the ladder swept cold. Windows: common practice.</summary>
internal static class LowPassReadings
{
    private const double LossRoomDb = 0.3;
    private const double HarmonicRoomDb = 4;
    private const double ReturnLossShare = 0.7;

    public static IReadOnlyList<ExpectedReading> Of(LowPassStage stage, LowPassModel model, Surroundings surroundings, string key) =>
    [
        .. stage.Coils.Select(c => WindingPart.Of(c, surroundings.Learnt)).OfType<WindingPart>().Select(w => WindingExpectation.For(key, w)),
        Swept($"{key}.loss", model.Loss.Db, 0, model.Loss.Db + LossRoomDb, WindowSides.AtMost),
        Swept($"{key}.return-loss", model.WorstReturnLoss.Db, Math.Max(LowPassJudgement.LeastReturnLossDb, ReturnLossShare * model.WorstReturnLoss.Db), 60, WindowSides.AtLeast),
        Swept($"{key}.second-harmonic", model.Second.Db, model.Second.Db - HarmonicRoomDb, 100, WindowSides.AtLeast),
    ];

    private static ExpectedReading Swept(string point, double nominalDb, double lowDb, double highDb, WindowSides sides) =>
        new(point, QuantityKind.Decibels, nominalDb, lowDb, highDb, "set-up.swept-cold", InstrumentClass.NetworkAnalyser, sides, new Dictionary<string, double>());
}
