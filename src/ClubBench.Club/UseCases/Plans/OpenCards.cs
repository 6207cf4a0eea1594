using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Opens the cards of a plan for printing.</summary>
/// <param name="PlanId">The plan.</param>
/// <param name="Stage">One stage; null for all.</param>
/// <param name="Revision">Revision; null for the newest.</param>
public sealed record OpenCardsInput(Guid PlanId, string? Stage = null, int? Revision = null);

/// <summary>All build cards of a plan, or that of one stage, in kit order.</summary>
public sealed class OpenCards(ClubStore store, PlanArchive archive) : Query<OpenCardsInput, IReadOnlyList<OpenedCard>>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<IReadOnlyList<OpenedCard>>> Handle(Work work, OpenCardsInput input, CancellationToken cancellation)
    {
        if (await archive.OpenAsync(work.Db, input.PlanId, input.Revision, cancellation) is not { } plan) return NotFound("planId");
        var sheets = new List<OpenedCard>();
        foreach (var (row, _) in (await work.Db.CardsAsync(plan, cancellation)).Where(c => input.Stage is null || c.Row.Stage == input.Stage))
            sheets.Add(await CardSheets.OfAsync(work.Db, archive, row, cancellation));
        return sheets.Count == 0 && input.Stage is not null ? NotFound("stage") : Success(sheets);
    }
}
