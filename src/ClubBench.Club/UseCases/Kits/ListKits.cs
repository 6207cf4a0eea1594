using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning;
using ClubBench.Planning.Kits;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Kits;

/// <summary>Asks for kits.</summary>
public sealed record ListKitsInput;

/// <summary>A kit in a list.</summary>
public sealed record KitSummary(Guid Id, int Revision, string Name, string BoardIssue, Mode Mode, FrequencyRange Band, int Stages, int Plans);

/// <summary>Kits by name, each in its newest revision.</summary>
public sealed class ListKits(ClubStore store) : Query<ListKitsInput, IReadOnlyList<KitSummary>>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<IReadOnlyList<KitSummary>>> Handle(Work work, ListKitsInput input, CancellationToken cancellation)
    {
        var rows = await work.Db.Kits.OrderBy(k => k.Name).Select(k => new { k.Id, Plans = work.Db.Plans.Count(p => p.KitId == k.Id) }).ToListAsync(cancellation);
        var kits = new List<KitSummary>();
        foreach (var row in rows)
            if (await work.Db.KitAsync(row.Id, revision: null, cancellation) is { } kit)
                kits.Add(new KitSummary(kit.Id, kit.Revision, kit.Name, kit.BoardIssue, kit.Mode, kit.Band, kit.Stages.Count, row.Plans));
        return Success(kits);
    }
}
