using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>What a builder reads on a low-pass ladder: each coil before it goes in, then the ladder swept cold. Windows: common practice.</summary>
internal static class LowPassReadings
{
    private const double LossRoomDb = 0.3;
    public const double HarmonicRoomDb = 4;
    private const double ReturnLossShare = 0.7;

    public static IReadOnlyList<ExpectedReading> Of(LowPassStage stage, LowPassModel model, Surroundings surroundings, string key) =>
    [
        .. stage.Coils.Select(c => WindingPart.Of(c, surroundings.Learnt)).OfType<WindingPart>().Select(w => WindingExpectation.For(key, w)),
        Swept($"{key}.loss", model.Loss.Db, 0, model.Loss.Db + LossRoomDb, WindowSides.AtMost),
        Swept($"{key}.return-loss", model.WorstReturnLoss.Db, LeastReturnLossDb(model), 60, WindowSides.AtLeast),
        Swept($"{key}.second-harmonic", model.Second.Db, model.Second.Db - HarmonicRoomDb, 100, WindowSides.AtLeast),
    ];

    /// <summary>A return loss above this is good whatever the plan's nominal.</summary>
    private const double AlwaysGoodReturnLossDb = 20;

    /// <summary>Least return loss of a good board.</summary>
    public static double LeastReturnLossDb(LowPassModel model) =>
        Math.Clamp(ReturnLossShare * model.WorstReturnLoss.Db, LowPassJudgement.LeastReturnLossDb, AlwaysGoodReturnLossDb);

    private static ExpectedReading Swept(string point, double nominalDb, double lowDb, double highDb, WindowSides sides) =>
        new(point, QuantityKind.Decibels, nominalDb, lowDb, highDb, "set-up.swept-cold", InstrumentClass.NetworkAnalyser, sides, new Dictionary<string, double>());
}
