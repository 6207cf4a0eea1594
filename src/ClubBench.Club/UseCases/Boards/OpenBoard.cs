using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>Opens a board at the bench.</summary>
public sealed record OpenBoardInput(Guid BoardId);

/// <summary>A reading of a board with what was said to it.</summary>
/// <param name="IsReplaced">Whether a later reading corrects it.</param>
public sealed record BenchReading(
    long Ordinal,
    Guid Id,
    string Point,
    QuantityKind Kind,
    double ValueSi,
    string TypedText,
    string? Instrument,
    string Note,
    Guid? Replaces,
    bool IsReplaced,
    DateTime AtUtc,
    Advice Advice);

/// <summary>What was fitted in one place, newest entry.</summary>
public sealed record BenchFitted(string Designator, int? Turns, string Type, string Lot, DateTime AtUtc);

/// <summary>A mentor's word on a stage.</summary>
public sealed record BenchSignOff(string Mentor, string Remark, DateTime AtUtc);

/// <summary>A call that waits.</summary>
public sealed record BenchCall(Guid Id, DateTime CalledUtc, bool IsAnswered);

/// <summary>One stage of a board, with everything the bench shows: card, windows, ladders, readings so far.</summary>
/// <param name="Version">Version of the stage's progress, for <see cref="MoveStage"/>.</param>
/// <param name="CardId">The card to build by.</param>
public sealed record BenchStage(
    string Key,
    string Kind,
    StageAction Action,
    StageProgress Progress,
    StageHold Hold,
    Guid Version,
    Guid CardId,
    int CardNumber,
    CardContent Card,
    IReadOnlyList<ExpectedReading> Expected,
    IReadOnlyList<BenchReading> Readings,
    IReadOnlyList<BenchFitted> Fitted,
    BenchSignOff? SignOff,
    BenchCall? Call);

/// <summary>A board with all its stages in the order they are brought up.</summary>
/// <param name="MayWrite">Whether whoever asks may write on it.</param>
/// <param name="UpToOrdinal">Newest change this picture contains; ask the change feed for what comes after.</param>
public sealed record OpenedBoard(
    Guid Id,
    string Tag,
    Guid GroupBuildId,
    Guid PlanId,
    string PlanName,
    int PlanRevision,
    string KitName,
    string BandName,
    Guid? BuilderId,
    string? BuilderName,
    bool MayWrite,
    IReadOnlyList<BenchStage> Stages,
    IReadOnlyList<Instrument> Instruments,
    long UpToOrdinal,
    Guid Version);

/// <summary>A board as its builder needs it on a phone, whole, so that the page works while the network is away.</summary>
public sealed class OpenBoard(ClubStore store, PlanArchive archive) : Query<OpenBoardInput, OpenedBoard>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<OpenedBoard>> Handle(Work work, OpenBoardInput input, CancellationToken cancellation)
    {
        var db = work.Db;
        if (await db.Boards.FirstOrDefaultAsync(b => b.Id == input.BoardId, cancellation) is not { } board) return NotFound("boardId");
        var newest = await db.Events.MaxAsync(e => (long?)e.Ordinal, cancellation) ?? 0;
        var plan = await archive.InForceAsync(db, board.PlanId, cancellation);
        var builder = board.BuilderId is { } id ? await db.People.Where(p => p.Id == id).Select(p => p.DisplayName).FirstOrDefaultAsync(cancellation) : null;
        var instruments = await db.Instruments.OrderBy(i => i.Name).ToListAsync(cancellation);
        return Success(new OpenedBoard(
            board.Id,
            board.Tag,
            board.GroupBuildId,
            board.PlanId,
            plan.Row.Name,
            plan.Revision,
            plan.Plan.Inputs.Kit.Name,
            plan.Plan.Inputs.Target.BandName,
            board.BuilderId,
            builder,
            BoardAccess.MayWrite(work.Actor, board),
            await BenchStages.OfAsync(db, board, plan, cancellation),
            [.. instruments.Select(i => i.For(i.OffsetKind))],
            newest,
            board.Version));
    }
}
