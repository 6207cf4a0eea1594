using ClubBench.Club.Entities;
using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.GroupBuilds;
using ClubBench.Club.UseCases.Room;

namespace ClubBench.Club.Tests.UseCases;

public sealed class BoardTests
{
    [Fact]
    public async Task SignOff_ByTheBoardsOwnBuilder_IsRefusedWhateverTheRole()
    {
        await using var club = await TestClub.FilledAsync();
        await club.Run(club.Get<AssignBoard>(), club.Ids.Coordinator, new AssignBoardInput(club.Ids.Boards[0], club.Ids.Mentor.PersonId));

        var own = await club.Run(club.Get<SignOff>(), club.Ids.Mentor, new SignOffInput(club.Ids.Boards[0], "A5"));
        var foreign = await club.Run(club.Get<SignOff>(), club.Ids.Mentor, new SignOffInput(club.Ids.Boards[1], "A5"));

        Assert.Equal("refused.own-sign-off", Assert.Single(own.Messages).Code);
        Assert.True(foreign.Succeeded);
    }

    [Fact]
    public async Task MoveStage_ASignedStage_MovesOnlyAfterItWasReopened()
    {
        await using var club = await TestClub.FilledAsync();
        var (board, move) = (club.Ids.Boards[0], new MoveStageInput(club.Ids.Boards[0], "A5", StageProgress.Measured));
        await club.Run(club.Get<SignOff>(), club.Ids.Mentor, new SignOffInput(board, "A5"));

        Assert.Equal("stage.signed", Assert.Single((await club.Run(club.Get<MoveStage>(), club.Ids.Builders[0], move)).Messages).Code);
        Assert.Equal("field.needed", Assert.Single((await club.Run(club.Get<Reopen>(), club.Ids.Mentor, new ReopenInput(board, "A5", " "))).Messages).Code);
        Assert.True((await club.Run(club.Get<Reopen>(), club.Ids.Mentor, new ReopenInput(board, "A5", "cold joint"))).Succeeded);
        Assert.True((await club.Run(club.Get<MoveStage>(), club.Ids.Builders[0], move)).Succeeded);
    }

    [Fact]
    public async Task MoveStage_FromAStaleVersion_IsRefusedAndTheFirstStands()
    {
        await using var club = await TestClub.FilledAsync();
        var seen = (await StageAsync(club)).Version;
        var input = new MoveStageInput(club.Ids.Boards[0], "A5", StageProgress.BeingBuilt, SeenVersion: seen);

        Assert.True((await club.Run(club.Get<MoveStage>(), club.Ids.Builders[0], input)).Succeeded);
        var stale = await club.Run(club.Get<MoveStage>(), club.Ids.Mentor, input with { Progress = StageProgress.Powered });

        Assert.Contains(stale.Messages, m => m.Code == "conflict.stale");
        Assert.Equal(StageProgress.BeingBuilt, (await StageAsync(club)).Progress);
    }

    [Fact]
    public async Task MoveStage_ToSigned_NeedsAMentorsWord()
    {
        await using var club = await TestClub.FilledAsync();

        var outcome = await club.Run(club.Get<MoveStage>(), club.Ids.Mentor, new MoveStageInput(club.Ids.Boards[0], "A5", StageProgress.Signed));

        Assert.Equal("stage.sign-off-needed", Assert.Single(outcome.Messages).Code);
    }

    [Fact]
    public async Task OpenRoom_TwoCalls_LongestWaitFirstAndDoneOnesGone()
    {
        await using var club = await TestClub.FilledAsync();
        var first = (await club.Run(club.Get<CallForHelp>(), club.Ids.Builders[1], new CallForHelpInput(Guid.NewGuid(), club.Ids.Boards[1], "A5"))).Value;
        club.Clock.Advance(TimeSpan.FromMinutes(3));
        await club.Run(club.Get<CallForHelp>(), club.Ids.Builders[0], new CallForHelpInput(Guid.NewGuid(), club.Ids.Boards[0], "A5"));

        Assert.Equal(["Q02", "Q01"], (await RoomAsync(club)).Help.Select(c => c.Tag));
        await club.Run(club.Get<AnswerCall>(), club.Ids.Mentor, new AnswerCallInput(first, IsDone: true));
        Assert.Equal(["Q01"], (await RoomAsync(club)).Help.Select(c => c.Tag));
    }

    [Fact]
    public async Task CallForHelp_SentAgain_KeepsItsPlace()
    {
        await using var club = await TestClub.FilledAsync();
        var call = new CallForHelpInput(Guid.NewGuid(), club.Ids.Boards[0], "A5");
        await club.Run(club.Get<CallForHelp>(), club.Ids.Builders[0], call);
        await club.Run(club.Get<CallForHelp>(), club.Ids.Builders[0], call);
        await club.Run(club.Get<CallForHelp>(), club.Ids.Builders[0], call with { Id = Guid.NewGuid() });

        Assert.Equal(call.Id, Assert.Single((await RoomAsync(club)).Help).Id);
    }

    private static async Task<BenchStage> StageAsync(TestClub club) =>
        (await club.Run(club.Get<OpenBoard>(), club.Ids.Builders[0], new OpenBoardInput(club.Ids.Boards[0]))).Value.Stages.Single(s => s.Key == "A5");

    private static async Task<RoomPicture> RoomAsync(TestClub club) => (await club.Run(club.Get<OpenRoom>(), club.Ids.Mentor, new OpenRoomInput(club.Ids.NightId))).Value;
}
