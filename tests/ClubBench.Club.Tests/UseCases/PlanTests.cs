using ClubBench.Club.Entities;
using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases.Clubs;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Club.Tests.UseCases;

public sealed class PlanTests
{
    [Fact]
    public async Task CreatePlan_MeasuredCrystalsInTheDrawer_ReckonsWithThem()
    {
        await using var club = await TestClub.FilledAsync();
        var measured = new Dictionary<string, double> { [PartValue.MotionalCapacitance] = 22e-15, [PartValue.StaticCapacitance] = 4.8e-12 };
        await club.Run(club.Get<StockIn>(), club.Ids.Coordinator, new StockInInput(PartClass.Crystal, "HC-49/U", 14.060e6, 16, Lot: "measured", MeasuredSi: measured));

        var plan = (await OpenAsync(club, (await CreateAsync(club, TestClub.TwentyMetres())).PlanId)).Plan;

        Assert.Equal(22e-15, plan.Stage("A1").After.Part("X1").Value(PartValue.MotionalCapacitance));
    }

    [Fact]
    public async Task ChangePlan_SameInputs_KeepsEveryCardNumber()
    {
        await using var club = await TestClub.FilledAsync();
        var before = await OpenAsync(club);

        var changed = await club.Run(club.Get<ChangePlan>(), club.Ids.Coordinator, new ChangePlanInput(club.Ids.PlanId, before.Version));
        var after = await OpenAsync(club);

        Assert.Equal(2, changed.Value.Revision);
        Assert.Equal(before.Cards, after.Cards);
    }

    [Fact]
    public async Task ChangePlan_OneStageKept_CountsOnlyCardsWhoseContentChanged()
    {
        await using var club = await TestClub.FilledAsync();
        var before = await OpenAsync(club);
        var stage = before.Plan.Stages.First(s => s.Action == StageAction.Change).Stage;

        await club.Run(club.Get<ChangePlan>(), club.Ids.Coordinator, new ChangePlanInput(club.Ids.PlanId, before.Version, Choices: [new Choice(stage, Choice.Keep, Reason: "try", By: "Ingrid")]));
        var after = await OpenAsync(club);

        foreach (var (old, now) in before.Cards.Zip(after.Cards))
        {
            var isSame = StoredText(before.Plan.Stage(old.Stage)) == StoredText(after.Plan.Stage(old.Stage));
            Assert.Equal(isSame ? (old.Id, 1) : (now.Id, 2), (now.Id, now.Number));
        }

        Assert.Equal(2, after.Cards.Single(c => c.Stage == stage).Number);
        Assert.Contains(after.Cards, c => c.Number == 1);
        var status = await club.Run(club.Get<CardStatus>(), club.Ids.Mentor, new CardStatusInput(before.Cards.Single(c => c.Stage == stage).Id));
        Assert.Equal((1, 2), (status.Value.Number, status.Value.ReplacedBy));
    }

    [Fact]
    public async Task ChangePlan_FromAStaleVersion_IsRefusedAndStoresNothing()
    {
        await using var club = await TestClub.FilledAsync();
        var seen = (await OpenAsync(club)).Version;
        await club.Run(club.Get<ChangePlan>(), club.Ids.Coordinator, new ChangePlanInput(club.Ids.PlanId, seen));

        var stale = await club.Run(club.Get<ChangePlan>(), club.Ids.Coordinator, new ChangePlanInput(club.Ids.PlanId, seen));

        Assert.Contains(stale.Messages, m => m.Code == "conflict.stale");
        Assert.Equal(2, (await OpenAsync(club)).NewestRevision);
    }

    [Fact]
    public async Task IssuePlan_WithOpenItems_IsRefusedAndNamesThem()
    {
        await using var club = await TestClub.FilledAsync();
        var plan = await CreateAsync(club, TestClub.TwentyMetres() with { LimitsConfirmedBy = null });

        var issued = await club.Run(club.Get<IssuePlan>(), club.Ids.Coordinator, new IssuePlanInput(plan.PlanId, plan.Version));

        Assert.Contains(issued.Messages, m => m.Code == "plan.open-item" && m.Arguments["item"] == OpenItemCodes.LimitConfirmation);
        Assert.Equal(PlanState.Draft, (await OpenAsync(club, plan.PlanId)).State);
    }

    [Fact]
    public async Task IssuePlan_EverythingSettled_IsIssuedAndInForce()
    {
        await using var club = await TestClub.FilledAsync();
        var plan = await CreateAsync(club, TestClub.TwentyMetres());
        var open = (await OpenAsync(club, plan.PlanId)).Plan.OpenItems.Select(i => i.Stage).Distinct(StringComparer.Ordinal);
        plan = (await club.Run(club.Get<ChangePlan>(), club.Ids.Coordinator, new ChangePlanInput(plan.PlanId, plan.Version, Choices: [.. open.Select(s => new Choice(s, Choice.Accept, Reason: "tried on one board"))]))).Value;

        var issued = await club.Run(club.Get<IssuePlan>(), club.Ids.Coordinator, new IssuePlanInput(plan.PlanId, plan.Version));

        Assert.True(issued.Succeeded, string.Join("; ", issued.Messages.Select(m => m.Path)));
        var opened = await OpenAsync(club, plan.PlanId);
        Assert.Equal((PlanState.Issued, plan.Revision), (opened.State, opened.IssuedRevision!.Value));
    }

    [Fact]
    public async Task OpenPlan_AnEarlierRevision_GivesTheFiguresStoredThen()
    {
        await using var club = await TestClub.FilledAsync();
        var before = await OpenAsync(club);
        await club.Run(club.Get<ChangePlan>(), club.Ids.Coordinator, new ChangePlanInput(club.Ids.PlanId, before.Version, Choices: [new Choice("A5", Choice.Keep, Reason: "try")]));

        var again = (await club.Run(club.Get<OpenPlan>(), club.Ids.Coordinator, new OpenPlanInput(club.Ids.PlanId, 1))).Value;

        Assert.Equal(StoredText(before.Plan.Stage("A5")), StoredText(again.Plan.Stage("A5")));
        Assert.NotEqual(StoredText(again.Plan.Stage("A5")), StoredText((await OpenAsync(club)).Plan.Stage("A5")));
    }

    private static string StoredText(StagePlan stage) => System.Text.Json.JsonSerializer.Serialize(stage.Card, PlanJson.Options);

    private static async Task<OpenedPlan> OpenAsync(TestClub club, Guid? plan = null) =>
        (await club.Run(club.Get<OpenPlan>(), club.Ids.Coordinator, new OpenPlanInput(plan ?? club.Ids.PlanId))).Value;

    private static async Task<PlanReference> CreateAsync(TestClub club, Target target) =>
        (await club.Run(club.Get<CreatePlan>(), club.Ids.Coordinator, new CreatePlanInput(club.Ids.KitId, "Another plan", target))).Value;
}
