using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>A mentor goes to a call, or is done with it.</summary>
/// <param name="CallId">The call.</param>
/// <param name="IsDone">False: on the way. True: done, the stage waits no longer.</param>
/// <param name="SeenVersion">Version the person saw, so that two mentors do not take the same call; null skips the comparison.</param>
public sealed record AnswerCallInput(Guid CallId, bool IsDone = false, Guid? SeenVersion = null);

/// <summary>Takes a call from the queue or ends it.</summary>
public sealed class AnswerCall(ClubStore store) : Command<AnswerCallInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.Mentor;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, AnswerCallInput input, CancellationToken cancellation)
    {
        if (await work.Db.HelpCalls.FirstOrDefaultAsync(c => c.Id == input.CallId, cancellation) is not { } call) return NotFound("callId");
        if (call.DoneUtc is not null) return Failure("callId", "call.done");
        work.Expect(call, input.SeenVersion);
        call.MentorId = work.Actor.PersonId;
        call.AnsweredUtc ??= work.NowUtc;
        if (input.IsDone) await EndAsync(work, call, cancellation);
        work.Announce(EventKind.HelpAnswered, call.Id, call.BoardId, call.Stage);
        return Success(default);
    }

    private static async Task EndAsync(Work work, HelpCall call, CancellationToken cancellation)
    {
        call.DoneUtc = work.NowUtc;
        if (await work.StageAsync(call.BoardId, call.Stage, cancellation) is { Hold: StageHold.Mentor } stage)
            work.Move(stage, StageEventKind.Moved, stage.Progress, StageHold.None);
    }
}
