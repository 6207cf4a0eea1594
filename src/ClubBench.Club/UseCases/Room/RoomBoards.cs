using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning.Advising;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Room;

/// <summary>The rows of the room.</summary>
internal static class RoomBoards
{
    public static async Task<IReadOnlyList<RoomBoard>> OfAsync(ClubContext db, Night night, IReadOnlyList<Board> boards, IReadOnlyList<ArchivedPlan> plans, CancellationToken cancellation)
    {
        var ids = boards.Select(b => b.Id).ToList();
        var stages = (await db.BoardStages.Where(s => ids.Contains(s.BoardId)).ToListAsync(cancellation)).ToDictionary(s => (s.BoardId, s.Stage));
        var verdicts = await LastVerdictsAsync(db, ids, cancellation);
        var present = (await db.Attendances.Where(a => a.NightId == night.Id).Select(a => a.PersonId).ToListAsync(cancellation)).ToHashSet();
        var byPlan = plans.ToDictionary(p => p.Row.Id);
        return [.. boards.Select(b => new RoomBoard(b.Id, b.Tag, b.PlanId, byPlan[b.PlanId].Row.BandName, b.BuilderId is { } builder && present.Contains(builder), Cells(b, byPlan[b.PlanId], stages, verdicts)))];
    }

    private static List<RoomCell> Cells(Board board, ArchivedPlan plan, Dictionary<(Guid, string), BoardStage> stages, Dictionary<(Guid, string), ReadingVerdict> verdicts) =>
        [.. from stage in BringUp.Order(plan.Plan)
            let key = (board.Id, stage.Stage)
            where stages.ContainsKey(key)
            select new RoomCell(stage.Stage, stage.Action, stages[key].Progress, stages[key].Hold, verdicts.TryGetValue(key, out var verdict) ? verdict : null)];

    private static async Task<Dictionary<(Guid, string), ReadingVerdict>> LastVerdictsAsync(ClubContext db, List<Guid> boards, CancellationToken cancellation) =>
        (await db.AdviceGiven.Where(a => boards.Contains(a.BoardId)).Select(a => new { a.BoardId, a.Stage, a.Ordinal, a.Verdict }).ToListAsync(cancellation))
        .GroupBy(a => (a.BoardId, a.Stage)).ToDictionary(g => g.Key, g => g.MaxBy(a => a.Ordinal)!.Verdict);
}
