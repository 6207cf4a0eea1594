using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Asks whether a printed card may still be built by.</summary>
public sealed record CardStatusInput(Guid CardId);

/// <summary>Whether a card is current.</summary>
/// <param name="ReplacedBy">Number of the card that replaced it; null while it is current.</param>
/// <param name="NewestCardId">The card to build by.</param>
public sealed record CardStanding(Guid PlanId, string PlanName, string BandName, string Stage, int Number, int? ReplacedBy, Guid NewestCardId);

/// <summary>Says whether a card is current or what replaced it: what the code on the printed card leads to.</summary>
public sealed class CardStatus(ClubStore store) : Query<CardStatusInput, CardStanding>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<CardStanding>> Handle(Work work, CardStatusInput input, CancellationToken cancellation)
    {
        if (await work.Db.Cards.FirstOrDefaultAsync(c => c.Id == input.CardId, cancellation) is not { } card) return NotFound("cardId");
        var newest = await work.Db.Cards.Where(c => c.PlanId == card.PlanId && c.Stage == card.Stage).OrderByDescending(c => c.Number).FirstAsync(cancellation);
        var plan = await work.Db.Plans.SingleAsync(p => p.Id == card.PlanId, cancellation);
        return Success(new CardStanding(plan.Id, plan.Name, plan.BandName, card.Stage, card.Number, newest.Number == card.Number ? null : newest.Number, newest.Id));
    }
}
