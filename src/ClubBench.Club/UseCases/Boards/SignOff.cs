using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>A mentor says that a stage is done.</summary>
public sealed record SignOffInput(Guid BoardId, string Stage, string Remark = "", Guid? SeenVersion = null);

/// <summary>Signs a stage off. Never by the board's own builder, whatever their role.</summary>
public sealed class SignOff(ClubStore store) : Command<SignOffInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.Mentor;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, SignOffInput input, CancellationToken cancellation)
    {
        var db = work.Db;
        if (await db.Boards.FirstOrDefaultAsync(b => b.Id == input.BoardId, cancellation) is not { } board) return NotFound("boardId");
        if (board.BuilderId == work.Actor.PersonId) return Failure(Refusals.OwnSignOff());
        if (await work.StageAsync(board.Id, input.Stage, cancellation) is not { } stage) return NotFound("stage");
        if (stage.Progress is StageProgress.Signed) return Failure("stage", "stage.signed");
        work.Expect(stage, input.SeenVersion);
        var card = await db.Cards.Where(c => c.PlanId == board.PlanId && c.Stage == input.Stage).OrderByDescending(c => c.Number).FirstOrDefaultAsync(cancellation);
        db.SignOffs.Add(new StageSignOff { BoardId = board.Id, Stage = input.Stage, MentorId = work.Actor.PersonId, CardId = card?.Id, Remark = input.Remark, AtUtc = work.NowUtc });
        work.Move(stage, StageEventKind.Signed, StageProgress.Signed, StageHold.None, input.Remark);
        return Success(default);
    }
}
