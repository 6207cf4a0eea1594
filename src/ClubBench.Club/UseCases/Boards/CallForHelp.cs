using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>A builder asks for a mentor.</summary>
/// <param name="Id">Made on the device; sending it again is harmless.</param>
/// <param name="BoardId">The board.</param>
/// <param name="Stage">Stage key.</param>
/// <param name="Text">One line on what is wrong.</param>
public sealed record CallForHelpInput(Guid Id, Guid BoardId, string Stage, string Text = "");

/// <summary>Calls a mentor to a board. A stage that already waits keeps its place in the queue.</summary>
public sealed class CallForHelp(ClubStore store) : Command<CallForHelpInput, Guid>(store)
{
    private const int LongestText = 200;

    /// <inheritdoc/>
    public override Right Required => Right.Build;

    /// <inheritdoc/>
    protected override async Task<Outcome<Guid>> Handle(Work work, CallForHelpInput input, CancellationToken cancellation)
    {
        var board = await work.BoardForWritingAsync(input.BoardId, cancellation);
        if (!board.Succeeded) return Failure(board.Messages);
        if (input.Text.Length > LongestText) return Failure("text", "field.too-long");
        if (await work.StageAsync(input.BoardId, input.Stage, cancellation) is not { } stage) return NotFound("stage");
        var earlier = await work.Db.HelpCalls.FirstOrDefaultAsync(
            c => c.BoardId == input.BoardId && (c.Id == input.Id || (c.Stage == input.Stage && c.DoneUtc == null)),
            cancellation);
        if (earlier is not null) return Success(earlier.Id);
        work.Db.HelpCalls.Add(new HelpCall { Id = input.Id, BoardId = input.BoardId, Stage = input.Stage, Text = input.Text, CalledUtc = work.NowUtc, CalledBy = work.Actor.PersonId });
        if (stage.Progress is not StageProgress.Signed) work.Move(stage, StageEventKind.Moved, stage.Progress, StageHold.Mentor);
        work.Announce(EventKind.HelpCalled, input.Id, input.BoardId, input.Stage);
        return Success(input.Id);
    }
}
