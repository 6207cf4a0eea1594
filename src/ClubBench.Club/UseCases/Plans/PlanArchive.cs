using System.Collections.Concurrent;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>A stored plan with one of its revisions read.</summary>
internal sealed record ArchivedPlan(StoredPlan Row, int Revision, Plan Plan);

/// <summary>Reads stored plans. The figures of a revision never change, so a plan that was read once is kept for the many readings of a night.</summary>
public sealed class PlanArchive
{
    private const int MostKept = 32;

    private readonly ConcurrentDictionary<(Guid Club, Guid Plan, int Revision), Plan> _kept = new();

    /// <summary>A plan in a revision, newest if none is named; null where there is none.</summary>
    internal async Task<ArchivedPlan?> OpenAsync(ClubContext db, Guid planId, int? revision, CancellationToken cancellation)
    {
        if (await db.Plans.FirstOrDefaultAsync(p => p.Id == planId, cancellation) is not { } row) return null;
        var wanted = revision ?? row.NewestRevision;
        return await ReadAsync(db, planId, wanted, cancellation) is { } plan ? new ArchivedPlan(row, wanted, plan) : null;
    }

    /// <summary>The plan boards are built by.</summary>
    internal async Task<ArchivedPlan> InForceAsync(ClubContext db, Guid planId, CancellationToken cancellation)
    {
        var row = await db.Plans.FirstAsync(p => p.Id == planId, cancellation);
        var plan = await ReadAsync(db, planId, row.RevisionInForce, cancellation);
        return new ArchivedPlan(row, row.RevisionInForce, plan ?? throw new InvalidOperationException($"Plan {planId} lost revision {row.RevisionInForce}."));
    }

    private async Task<Plan?> ReadAsync(ClubContext db, Guid planId, int revision, CancellationToken cancellation)
    {
        var key = (db.ClubId, planId, revision);
        if (_kept.TryGetValue(key, out var kept)) return kept;
        var json = await db.PlanRevisions.Where(r => r.PlanId == planId && r.Revision == revision).Select(r => r.OutputsJson).FirstOrDefaultAsync(cancellation);
        if (json is null) return null;
        if (_kept.Count >= MostKept) _kept.Clear();
        return _kept[key] = StoredJson.Read<Plan>(json);
    }
}
