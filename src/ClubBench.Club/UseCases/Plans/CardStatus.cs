using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Asks whether a printed card may still be built by.</summary>
public sealed record CardStatusInput(Guid CardId);

/// <summary>Whether a card is current, and besides that only what stands on the paper.</summary>
/// <param name="PlanId">Plan of the card; opening it asks for more than the paper.</param>
/// <param name="InForce">Number of the card boards are built by; zero where the revision in force has no such stage.</param>
public sealed record CardStanding(Guid PlanId, string BandName, string Stage, int Number, int InForce)
{
    /// <summary>Number of the card that replaced it; null while it is current or not yet in force.</summary>
    public int? ReplacedBy => InForce > Number ? InForce : null;

    /// <summary>Whether it comes from a revision that is not issued yet while another one is.</summary>
    public bool IsAhead => Number > InForce;
}

/// <summary>Says whether a card is current or what replaced it: what the code on the printed card leads to. Whoever holds the paper may ask.</summary>
public sealed class CardStatus(ClubStore store) : Query<CardStatusInput, CardStanding>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.ComeIn;

    /// <inheritdoc/>
    protected override async Task<Outcome<CardStanding>> Handle(Work work, CardStatusInput input, CancellationToken cancellation)
    {
        if (await work.Db.Cards.IgnoreQueryFilters().FirstOrDefaultAsync(c => c.Id == input.CardId, cancellation) is not { } card) return NotFound("cardId");
        work.Enter(card.ClubId);
        var plan = await work.Db.Plans.SingleAsync(p => p.Id == card.PlanId, cancellation);
        var revision = plan.RevisionInForce;
        var inForce = await work.Db.Cards.Where(c => c.PlanId == card.PlanId && c.Stage == card.Stage && c.FirstPlanRevision <= revision).MaxAsync(c => (int?)c.Number, cancellation);
        return Success(new CardStanding(card.PlanId, plan.BandName, card.Stage, card.Number, inForce ?? 0));
    }
}
