using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>A stage got further, or waits.</summary>
/// <param name="BoardId">The board.</param>
/// <param name="Stage">Stage key.</param>
/// <param name="Progress">How far it has got; signing is a mentor's word, see <see cref="SignOff"/>.</param>
/// <param name="Hold">What it waits for.</param>
/// <param name="SeenVersion">Version the person saw; null skips the comparison.</param>
public sealed record MoveStageInput(Guid BoardId, string Stage, StageProgress Progress, StageHold Hold = StageHold.None, Guid? SeenVersion = null);

/// <summary>Moves a stage of a board. A signed stage stays signed until it is reopened.</summary>
public sealed class MoveStage(ClubStore store) : Command<MoveStageInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.Build;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, MoveStageInput input, CancellationToken cancellation)
    {
        var board = await work.BoardForWritingAsync(input.BoardId, cancellation);
        if (!board.Succeeded) return Failure(board.Messages);
        if (await work.StageAsync(input.BoardId, input.Stage, cancellation) is not { } stage) return NotFound("stage");
        if (input.Progress is StageProgress.Signed) return Failure("progress", "stage.sign-off-needed");
        if (stage.Progress is StageProgress.Signed) return Failure("progress", "stage.signed");
        work.Expect(stage, input.SeenVersion);
        work.Move(stage, StageEventKind.Moved, input.Progress, input.Hold);
        return Success(default);
    }
}
