using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using ClubBench.Planning.Orders;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Asks what has to be bought.</summary>
/// <param name="GroupBuildId">For all boards of a group build; or null.</param>
/// <param name="PlanId">For one plan; or null.</param>
/// <param name="Boards">Boards of that plan; null takes the boards there are, at least one.</param>
public sealed record PartsOrderOfInput(Guid? GroupBuildId, Guid? PlanId = null, int? Boards = null);

/// <summary>All parts for all boards: merged, with spares, minus stock.</summary>
public sealed class PartsOrderOf(ClubStore store, PlanArchive archive) : Query<PartsOrderOfInput, PartsOrder>(store)
{
    private const int MostBoards = 500;

    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<PartsOrder>> Handle(Work work, PartsOrderOfInput input, CancellationToken cancellation)
    {
        if (input.Boards is < 1 or > MostBoards) return Failure("boards", "order.boards-range");
        if (input is { GroupBuildId: null, PlanId: null }) return Failure("planId", "field.needed");
        if (input.GroupBuildId is { } build && !await work.Db.GroupBuilds.AnyAsync(b => b.Id == build, cancellation)) return NotFound("groupBuildId");
        var counts = await work.Db.Boards.Where(b => (input.GroupBuildId == null || b.GroupBuildId == input.GroupBuildId) && (input.PlanId == null || b.PlanId == input.PlanId))
            .GroupBy(b => b.PlanId).Select(g => new { PlanId = g.Key, Boards = g.Count() }).ToDictionaryAsync(g => g.PlanId, g => g.Boards, cancellation);
        if (input.PlanId is { } one) counts[one] = input.Boards ?? Math.Max(1, counts.GetValueOrDefault(one));
        var plans = new List<(Plan, int)>();
        foreach (var (planId, boards) in counts.OrderBy(c => c.Key))
        {
            if (!await work.Db.Plans.AnyAsync(p => p.Id == planId, cancellation)) return NotFound("planId");
            plans.Add(((await archive.InForceAsync(work.Db, planId, cancellation)).Plan, boards));
        }

        return Success(PartsOrder.Of(plans, await work.Db.ShelfAsync(cancellation)));
    }
}
