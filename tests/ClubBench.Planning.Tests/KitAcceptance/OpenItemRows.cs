using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Tests.KitAcceptance;

/// <summary>What cannot be forgotten: taking any answer out of the plan raises a named open item, and the plan cannot be issued.</summary>
public class OpenItemRows
{
    [Theory]
    [InlineData("20 m")]
    [InlineData("40 m")]
    public void Plan_OwnChoicesAndConfirmedLimits_HasNothingOpen(string band)
    {
        var plan = KitA.Plan(KitA.Kit, KitA.Target(band) with { LimitsConfirmedBy = "coordinator" }, []);

        Assert.Empty(plan.OpenItems);
    }

    [Theory]
    [InlineData("20 m", "A1", OpenItemCodes.OscillatorRange)]
    [InlineData("20 m", "A3", OpenItemCodes.TunedCircuit)]
    [InlineData("20 m", "A5", OpenItemCodes.OutputFilter)]
    [InlineData("40 m", "A5", OpenItemCodes.OutputFilter)]
    [InlineData("40 m", "A6", OpenItemCodes.ReceiveTap)]
    [InlineData("20 m", "A7", OpenItemCodes.TunedCircuit)]
    public void Plan_StageKeptAgainstAdvice_KeepsItsItemOpen(string band, string stage, string item)
    {
        var plan = KitA.Plan(band, new Choice(stage, Choice.Keep));

        Assert.Contains(plan.OpenItems, i => i.Code == item && i.Stage == stage);
    }

    [Fact]
    public void Plan_OffsetCapacitorForgotten_KeepsTheOffsetOpen()
    {
        var planned = KitA.Plan("20 m").Stage("A1").After;
        var forgotten = planned with { Parts = [.. planned.Parts.Where(p => p.Designator != "C5")] };

        Assert.Contains(KitA.Plan("20 m", new Choice("A1", "by-hand", forgotten)).OpenItems, i => i is { Code: OpenItemCodes.Offset, Stage: "A1" });
    }

    [Fact]
    public void Plan_FeedbackPairTooLarge_KeepsThePairOpen()
    {
        var planned = KitA.Plan("20 m").Stage("A1").After;
        var large = KitA.With(planned, ("C1", c => KitA.Holding(c, 330)), ("C2", c => KitA.Holding(c, 330)));

        Assert.Contains(KitA.Plan("20 m", new Choice("A1", "by-hand", large)).OpenItems, i => i.Code == OpenItemCodes.FeedbackPair);
    }

    [Fact]
    public void Plan_CouplingTooSmallOnALowBand_KeepsTheCouplingOpen()
    {
        var kit = KitA.Kit.With(KitA.With(KitA.Kit.Stage("A2"), ("C6", c => KitA.Holding(c, 100))));

        Assert.Contains(KitA.Plan(kit, KitA.Target("160 m"), [new Choice("A2", Choice.Keep)]).OpenItems, i => i is { Code: OpenItemCodes.CouplingCapacitors, Stage: "A2" });
    }

    [Fact]
    public void Plan_ChokeTooSmall_KeepsTheChokeOpen()
    {
        var kit = KitA.Kit.With(KitA.With(KitA.Kit.Stage("A4"), ("L3", l => l.With((PartValue.Turns, 4)))));

        Assert.Contains(KitA.Plan(kit, KitA.Target("40 m"), [new Choice("A4", Choice.Keep)]).OpenItems, i => i is { Code: OpenItemCodes.ChokeReactance, Stage: "A4" });
    }

    [Fact]
    public void Plan_DeviceWithoutGain_KeepsTheDeviceOpen() =>
        Assert.Contains(KitA.Plan("10 m").OpenItems, i => i is { Code: OpenItemCodes.DeviceGain, Stage: "A4" });

    [Fact]
    public void Plan_AcceptedWithAReason_ClosesWhatAWordMayCloseAndNothingElse()
    {
        var accepted = KitA.Plan("15 m", new Choice("A4", Choice.Accept, Reason: "half the power will do"));
        var filter = KitA.Plan("20 m", new Choice("A5", Choice.Keep, Reason: "we are in a hurry"));

        Assert.DoesNotContain(accepted.OpenItems, i => i.Code == OpenItemCodes.DeviceGain);
        Assert.Contains(filter.OpenItems, i => i.Code == OpenItemCodes.OutputFilter);
    }

    [Fact]
    public void Plan_LimitsNotConfirmed_StayOpen() =>
        Assert.Contains(KitA.Plan("20 m").OpenItems, i => i.Code == OpenItemCodes.LimitConfirmation);
}
