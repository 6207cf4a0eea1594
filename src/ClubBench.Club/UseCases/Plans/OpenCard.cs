using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Opens one build card.</summary>
public sealed record OpenCardInput(Guid CardId);

/// <summary>A build card with everything its sheet needs.</summary>
/// <param name="PlanRevision">First plan revision with this content.</param>
public sealed record OpenedCard(
    Guid Id,
    Guid PlanId,
    string PlanName,
    string BandName,
    string KitName,
    string BoardIssue,
    string Stage,
    int Number,
    int PlanRevision,
    CardContent Content);

/// <summary>A build card as it was stored: the same words and figures next year.</summary>
public sealed class OpenCard(ClubStore store, PlanArchive archive) : Query<OpenCardInput, OpenedCard>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<OpenedCard>> Handle(Work work, OpenCardInput input, CancellationToken cancellation)
    {
        if (await work.Db.Cards.FirstOrDefaultAsync(c => c.Id == input.CardId, cancellation) is not { } card) return NotFound("cardId");
        return Success(await CardSheets.OfAsync(work.Db, archive, card, cancellation));
    }
}

/// <summary>Cards with what their sheets need.</summary>
internal static class CardSheets
{
    public static async Task<OpenedCard> OfAsync(ClubContext db, PlanArchive archive, Card card, CancellationToken cancellation)
    {
        var plan = await archive.OpenAsync(db, card.PlanId, card.FirstPlanRevision, cancellation) ?? throw new InvalidOperationException($"Card {card.Id} lost its plan.");
        var kit = plan.Plan.Inputs.Kit;
        return new OpenedCard(
            card.Id, card.PlanId, plan.Row.Name, plan.Plan.Inputs.Target.BandName, kit.Name, kit.BoardIssue, card.Stage, card.Number, card.FirstPlanRevision,
            StoredJson.Read<CardContent>(card.ContentJson));
    }
}
