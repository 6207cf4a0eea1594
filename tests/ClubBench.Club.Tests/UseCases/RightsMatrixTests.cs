using System.Runtime.CompilerServices;
using ClubBench.Club.Access;
using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases;
using ClubBench.Planning;

namespace ClubBench.Club.Tests.UseCases;

/// <summary>Every use case, found by reflection, with every role. A new use case has to be written into the table.</summary>
public sealed class RightsMatrixTests
{
    /// <summary>V visitor, B builder, M mentor, C coordinator, H the program itself.</summary>
    private static readonly Dictionary<string, string> MayRun = new(StringComparer.Ordinal)
    {
        ["AboutClub"] = "BMC", ["AddBoards"] = "C", ["AddInstrument"] = "C", ["AddPerson"] = "C", ["AnswerCall"] = "MC", ["AssignBoard"] = "C", ["CallForHelp"] = "BMC", ["CancelSearch"] = "C", ["CardStatus"] = "VBMCH",
        ["ChangeInstrument"] = "C", ["ChangePlan"] = "C", ["CheckIn"] = "C", ["CloseNight"] = "C", ["CreateGroupBuild"] = "C", ["CreateNight"] = "C", ["CreatePlan"] = "C",
        ["EndMembership"] = "C", ["FindByToken"] = "VBMCH", ["FirstSetUp"] = "VBMCH", ["ImportKit"] = "C", ["IssuePlan"] = "C", ["JoinByCode"] = "VBMCH", ["ListBoards"] = "BMC",
        ["ListCards"] = "BMC", ["ListGroupBuilds"] = "BMC", ["ListKits"] = "BMC", ["ListNights"] = "BMC", ["ListPlans"] = "BMC", ["LogPrint"] = "MC", ["MakeSignInLink"] = "C",
        ["MakeToken"] = "C", ["MarkPlan"] = "C", ["MoveStage"] = "BMC", ["OfferSetUp"] = "H", ["OpenBoard"] = "BMC", ["OpenCard"] = "BMC", ["OpenCards"] = "BMC", ["OpenClub"] = "C",
        ["OpenGroupBuild"] = "C", ["OpenKit"] = "BMC", ["OpenNight"] = "BMC", ["OpenPlan"] = "BMC", ["OpenRoom"] = "BMC", ["PartsOrderOf"] = "BMC", ["PreviewPlan"] = "BMC", ["Record"] = "BMC",
        ["RecordFitted"] = "BMC", ["RecordMany"] = "BMC", ["RedeemLink"] = "VBMCH", ["RejoinBoard"] = "VBMCH", ["Reopen"] = "MC", ["RevokeToken"] = "C", ["SignInByPassword"] = "VBMCH",
        ["SignOff"] = "MC", ["StartNight"] = "C", ["StartSearch"] = "C", ["StockIn"] = "C", ["SurveyBands"] = "BMC", ["WatchSearch"] = "C", ["WhoAmI"] = "BMC",
    };

    [Fact]
    public void Table_NamesEveryUseCase() =>
        Assert.Equal(ClubServices.UseCases.Select(t => t.Name).Order(StringComparer.Ordinal), MayRun.Keys.Order(StringComparer.Ordinal));

    [Fact]
    public async Task Run_EveryUseCaseWithEveryRole_IsRefusedExactlyWhereTheRoleHasNoRight()
    {
        await using var club = await TestClub.FilledAsync();
        var actors = new[] { Actor.Visitor, club.Ids.Builders[0], club.Ids.Mentor, club.Ids.Coordinator, Actor.Host };

        foreach (var useCase in ClubServices.UseCases)
            foreach (var actor in actors)
            {
                var mayRun = MayRun[useCase.Name].Contains(actor.Role.ToString()[0], StringComparison.Ordinal);
                Assert.True(await IsRefusedAsync(club.Get(useCase), actor) != mayRun, $"{useCase.Name} as {actor.Role}: expected {(mayRun ? "admitted" : "refused")}");
            }
    }

    [Fact]
    public async Task Run_RoleClaimedAboveTheStoredOne_CountsAsTheStoredOne()
    {
        await using var club = await TestClub.FilledAsync();
        var pretender = club.Ids.Builders[0] with { Role = Role.Coordinator };

        foreach (var useCase in ClubServices.UseCases.Where(t => MayRun[t.Name] is "C" or "MC"))
            Assert.True(await IsRefusedAsync(club.Get(useCase), pretender), useCase.Name);
    }

    /// <summary>Runs with an empty input: a refusal comes before the handler, anything else means that the handler was reached.</summary>
    private static async Task<bool> IsRefusedAsync(object useCase, Actor actor)
    {
        var run = useCase.GetType().GetMethod("Run")!;
        var input = RuntimeHelpers.GetUninitializedObject(run.GetParameters()[1].ParameterType);
        var task = (Task)run.Invoke(useCase, [actor, input, CancellationToken.None])!;
        try
        {
            await task;
        }
        catch (Exception e) when (e is NullReferenceException or ArgumentNullException)
        {
            return false;
        }

        var outcome = task.GetType().GetProperty("Result")!.GetValue(task)!;
        var messages = (IReadOnlyList<FieldMessage>)outcome.GetType().GetProperty("Messages")!.GetValue(outcome)!;
        return messages.Any(m => m.Code == "refused.right");
    }
}
