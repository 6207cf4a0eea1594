using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Asks for the cards of a plan.</summary>
/// <param name="PlanId">The plan.</param>
/// <param name="Revision">Revision; null for the newest.</param>
public sealed record ListCardsInput(Guid PlanId, int? Revision = null);

/// <summary>The build cards of a plan, in kit order.</summary>
public sealed class ListCards(ClubStore store, PlanArchive archive) : Query<ListCardsInput, IReadOnlyList<CardSummary>>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<IReadOnlyList<CardSummary>>> Handle(Work work, ListCardsInput input, CancellationToken cancellation) =>
        await archive.OpenAsync(work.Db, input.PlanId, input.Revision, cancellation) is { } plan ? Success(await work.Db.CardSummariesAsync(plan, cancellation)) : NotFound("planId");
}
