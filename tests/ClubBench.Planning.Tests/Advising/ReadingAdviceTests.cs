using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Tests.KitAcceptance;

namespace ClubBench.Planning.Tests.Advising;

/// <summary>Advice on the 20 m filter's coils with the demonstration's readings: a club meter with a fixture offset of 20 nH that nobody had subtracted.</summary>
public class ReadingAdviceTests
{
    private const double Nanohenry = 1e-9;

    /// <summary>Board, coil, reading in microhenry.</summary>
    public static TheoryData<string, string, double> DemonstrationReadings => new()
    {
        { "Q01", "L4", 0.736 }, { "Q01", "L5", 0.836 }, { "Q01", "L6", 0.728 },
        { "Q02", "L4", 0.728 }, { "Q02", "L5", 0.822 }, { "Q02", "L6", 0.725 },
        { "Q03", "L4", 0.728 }, { "Q03", "L5", 0.816 }, { "Q03", "L6", 0.721 },
        { "Q04", "L4", 0.714 }, { "Q04", "L5", 0.809 }, { "Q04", "L6", 0.716 },
        { "Q05", "L4", 0.734 }, { "Q05", "L5", 0.828 }, { "Q05", "L6", 0.732 },
        { "Q06", "L4", 0.727 }, { "Q06", "L5", 0.801 }, { "Q06", "L6", 0.717 },
        { "Q07", "L4", 0.725 }, { "Q07", "L5", 0.833 }, { "Q07", "L6", 0.741 },
    };

    private static readonly Instrument Meter = new("M2", InstrumentClass.LcMeter, 0.03, 0, 20 * Nanohenry);

    [Theory]
    [MemberData(nameof(DemonstrationReadings))]
    public void Give_OffsetSubtracted_LeavesTheTurnsAndAtMostSpreads(string board, string coil, double microhenry)
    {
        var advice = Give(coil, microhenry * 1e-6, Meter);

        Assert.NotEmpty(board);
        Assert.DoesNotContain(advice.Ladder, s => s.Code.Contains("turns", StringComparison.Ordinal));
        Assert.True(advice.Verdict is ReadingVerdict.Good || advice.Ladder.Any(s => s.Code is "advice.spread" or "advice.remeasure" or "advice.near-edge"), advice.Verdict.ToString());
    }

    [Fact]
    public void Give_BatchOffToOneSide_TellsNobodyToRewind()
    {
        var advice = Give("L4", 0.745e-6, Meter with { OffsetSi = 0 }, batchAlert: true);

        Assert.Equal(ReadingVerdict.Out, advice.Verdict);
        Assert.Equal("advice.batch-off", Assert.Single(advice.Ladder).Code);
    }

    [Fact]
    public void Give_OneOutlierWithoutBatchAlert_GetsAdviceOfItsOwn() =>
        Assert.Contains(Give("L4", 0.80e-6, Meter with { OffsetSi = 0 }).Ladder, s => s.Code.StartsWith("advice.remove-turns", StringComparison.Ordinal));

    [Fact]
    public void Give_TenTimesTooLarge_AsksWhetherTheDecimalPointSlipped()
    {
        var advice = Give("L5", 7.68e-6, Meter with { OffsetSi = 0 });

        Assert.Equal(ReadingVerdict.Doubtful, advice.Verdict);
        var step = Assert.Single(advice.Ladder);
        Assert.Equal("advice.did-you-mean", step.Code);
        Assert.Equal(0.768e-6, step.Figures.Single(f => f.Name == "likely").Si, 1e-12);
    }

    [Fact]
    public void Give_AsPlanned_IsGoodAndPointsToTheNext()
    {
        var advice = Give("L4", 0.675e-6, Meter with { OffsetSi = 0 });

        Assert.Equal(ReadingVerdict.Good, advice.Verdict);
        Assert.Empty(advice.Ladder);
        Assert.Equal("A5.L5.L", advice.NextPoint);
    }

    [Fact]
    public void Give_WithoutInstrument_IsARemark()
    {
        var reading = new Reading("A5.L4.L", QuantityKind.Inductance, 0.9e-6, "0.9", null, 1);
        var advice = StageKindList.Get(Filter.Before.Kind).Advise(new AdviceRequest(Filter, AsBuilt.AsPlanned, [reading], [], false));

        Assert.Equal(ReadingVerdict.Noted, advice.Verdict);
        Assert.Empty(advice.Ladder);
    }

    [Fact]
    public void Give_OneTurnTooMany_CountsTheTurnsReallyWound()
    {
        var request = new AdviceRequest(Filter, new AsBuilt(new Dictionary<string, int> { ["L4"] = 17 }, new Dictionary<string, string>()), [Read("L4", 0.867e-6)], [Meter with { OffsetSi = 0 }], false);
        var advice = StageKindList.Get(Filter.Before.Kind).Advise(request);

        var remove = advice.Ladder.Single(s => s.Code.StartsWith("advice.remove-turns", StringComparison.Ordinal));
        Assert.Equal(17, remove.Figures.Single(f => f.Name == "turns").Si);
        Assert.Equal(2, remove.Figures.Single(f => f.Name == "in-all").Si);
    }

    private static StagePlan Filter { get; } = KitA.Plan("20 m", new Choice("A5", "by-hand", KitA.With(
        KitA.Kit.Stage("A5"),
        ("C15", c => KitA.Holding(c, 200)),
        ("C16", c => KitA.Holding(c, 360)),
        ("C17", c => KitA.Holding(c, 360)),
        ("C18", c => KitA.Holding(c, 200)),
        ("L4", l => KitA.Wound(l, "T37-6", 15)),
        ("L5", l => KitA.Wound(l, "T37-6", 16)),
        ("L6", l => KitA.Wound(l, "T37-6", 15))))).Stage("A5");

    private static Reading Read(string coil, double henry) => new($"A5.{coil}.L", QuantityKind.Inductance, henry, "typed", "M2", 1);

    private static Advice Give(string coil, double henry, Instrument meter, bool batchAlert = false) =>
        StageKindList.Get(Filter.Before.Kind).Advise(new AdviceRequest(Filter, AsBuilt.AsPlanned, [Read(coil, henry)], [meter], batchAlert));
}
