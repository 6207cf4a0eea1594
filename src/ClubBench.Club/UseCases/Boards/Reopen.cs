using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>A signed stage has to be looked at again.</summary>
public sealed record ReopenInput(Guid BoardId, string Stage, string Reason, Guid? SeenVersion = null);

/// <summary>Reopens a signed stage, with a reason. The sign-off lapses and stays on record.</summary>
public sealed class Reopen(ClubStore store) : Command<ReopenInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.Mentor;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, ReopenInput input, CancellationToken cancellation)
    {
        if (string.IsNullOrWhiteSpace(input.Reason)) return Failure("reason", "field.needed");
        if (await work.StageAsync(input.BoardId, input.Stage, cancellation) is not { } stage) return NotFound("stage");
        if (stage.Progress is not StageProgress.Signed) return Failure("stage", "stage.not-signed");
        work.Expect(stage, input.SeenVersion);
        foreach (var word in await work.Db.SignOffs.Where(s => s.BoardId == input.BoardId && s.Stage == input.Stage && s.LapsedUtc == null).ToListAsync(cancellation))
            word.LapsedUtc = work.NowUtc;
        work.Move(stage, StageEventKind.Reopened, StageProgress.BeingBuilt, StageHold.None, input.Reason);
        return Success(default);
    }
}
