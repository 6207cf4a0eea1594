using System.Linq.Expressions;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>A board in a list.</summary>
/// <param name="IsHeld">Whether any stage waits for a mentor or a part.</param>
public sealed record BoardSummary(
    Guid Id,
    Guid GroupBuildId,
    string Tag,
    Guid PlanId,
    string BandName,
    Guid? BuilderId,
    string? BuilderName,
    int Stages,
    int Signed,
    int Begun,
    bool IsHeld,
    Guid Version);

/// <summary>Boards with where they stand.</summary>
internal static class BoardSummaries
{
    /// <summary>The boards that meet a condition, by tag.</summary>
    public static async Task<IReadOnlyList<BoardSummary>> OfAsync(ClubContext db, Expression<Func<Board, bool>> condition, CancellationToken cancellation)
    {
        var boards = await (from board in db.Boards.Where(condition)
                            join plan in db.Plans on board.PlanId equals plan.Id
                            join builder in db.People on board.BuilderId equals builder.Id into builders
                            from builder in builders.DefaultIfEmpty()
                            orderby board.Tag
                            select new { Board = board, plan.BandName, BuilderName = builder == null ? null : builder.DisplayName }).AsNoTracking().ToListAsync(cancellation);
        var ids = boards.Select(b => b.Board.Id).ToList();
        var stages = (await db.BoardStages.AsNoTracking().Where(s => ids.Contains(s.BoardId)).ToListAsync(cancellation)).ToLookup(s => s.BoardId);
        return [.. boards.Select(b => Summary(b.Board, b.BandName, b.BuilderName, [.. stages[b.Board.Id]]))];
    }

    private static BoardSummary Summary(Board board, string bandName, string? builderName, IReadOnlyList<BoardStage> stages) =>
        new(
            board.Id,
            board.GroupBuildId,
            board.Tag,
            board.PlanId,
            bandName,
            board.BuilderId,
            builderName,
            stages.Count,
            stages.Count(s => s.Progress == StageProgress.Signed),
            stages.Count(s => s.Progress != StageProgress.NotStarted),
            stages.Any(s => s.Hold != StageHold.None),
            board.Version);
}
