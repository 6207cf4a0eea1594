using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>Who may write on which board, and how a stage moves.</summary>
internal static class BoardAccess
{
    /// <summary>Whether an actor may write on a board: builders on their own, mentors and coordinators on all.</summary>
    public static bool MayWrite(Actor actor, Board board) => actor.Role > Role.Builder || board.BuilderId == actor.PersonId;

    /// <summary>The board, if the actor may write on it.</summary>
    public static async Task<Outcome<Board>> BoardForWritingAsync(this Work work, Guid boardId, CancellationToken cancellation)
    {
        var board = await work.Db.Boards.FirstOrDefaultAsync(b => b.Id == boardId, cancellation);
        if (board is null) return Outcome<Board>.Failure(FieldMessage.Error("boardId", "not-found"));
        return MayWrite(work.Actor, board) ? Outcome<Board>.Success(board) : Outcome<Board>.Failure(Refusals.OwnBoardOnly());
    }

    /// <summary>A stage of a board, or null.</summary>
    public static Task<BoardStage?> StageAsync(this Work work, Guid boardId, string stage, CancellationToken cancellation) =>
        work.Db.BoardStages.FirstOrDefaultAsync(s => s.BoardId == boardId && s.Stage == stage, cancellation);

    /// <summary>Moves a stage and writes its history.</summary>
    public static void Move(this Work work, BoardStage stage, StageEventKind kind, StageProgress progress, StageHold hold, string note = "")
    {
        (stage.Progress, stage.Hold) = (progress, hold);
        work.Db.StageEvents.Add(new StageEvent { BoardId = stage.BoardId, Stage = stage.Stage, Kind = kind, Progress = progress, Hold = hold, Note = note, AtUtc = work.NowUtc, By = work.Actor.PersonId });
        work.Announce(EventOf(kind), stage.Id, stage.BoardId, stage.Stage);
    }

    private static EventKind EventOf(StageEventKind kind) => kind switch
    {
        StageEventKind.Signed => EventKind.SignedOff,
        StageEventKind.Reopened => EventKind.Reopened,
        _ => EventKind.StageMoved,
    };
}
