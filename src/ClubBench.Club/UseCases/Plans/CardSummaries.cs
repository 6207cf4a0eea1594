using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>A build card in a list.</summary>
public sealed record CardSummary(Guid Id, string Stage, string Kind, StageAction Action, int Number, int FirstPlanRevision);

/// <summary>The cards of a plan revision.</summary>
internal static class CardSummaries
{
    /// <summary>For each stage the newest card a revision has, in kit order.</summary>
    public static async Task<IReadOnlyList<(Card Row, CardContent Content)>> CardsAsync(this ClubContext db, ArchivedPlan plan, CancellationToken cancellation)
    {
        var rows = await db.Cards.Where(c => c.PlanId == plan.Row.Id && c.FirstPlanRevision <= plan.Revision).ToListAsync(cancellation);
        var newest = rows.GroupBy(c => c.Stage, StringComparer.Ordinal).ToDictionary(g => g.Key, g => g.MaxBy(c => c.Number)!, StringComparer.Ordinal);
        return [.. plan.Plan.Stages.Where(s => newest.ContainsKey(s.Stage)).Select(s => (newest[s.Stage], s.Card))];
    }

    /// <summary>The same without the content.</summary>
    public static async Task<IReadOnlyList<CardSummary>> CardSummariesAsync(this ClubContext db, ArchivedPlan plan, CancellationToken cancellation) =>
        [.. (await db.CardsAsync(plan, cancellation)).Select(c => new CardSummary(c.Row.Id, c.Row.Stage, c.Content.Kind, c.Content.Action, c.Row.Number, c.Row.FirstPlanRevision))];
}
