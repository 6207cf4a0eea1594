using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Kits;

/// <summary>Opens a kit's page.</summary>
/// <param name="KitId">The kit.</param>
/// <param name="Revision">Revision; null for the newest.</param>
public sealed record OpenKitInput(Guid KitId, int? Revision = null);

/// <summary>A kit with its back-check.</summary>
public sealed record OpenedKit(Kit Kit, BackCheck BackCheck, IReadOnlyList<int> Revisions);

/// <summary>A kit, computed on its own band.</summary>
public sealed class OpenKit(ClubStore store) : Query<OpenKitInput, OpenedKit>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<OpenedKit>> Handle(Work work, OpenKitInput input, CancellationToken cancellation)
    {
        if (await work.Db.KitAsync(input.KitId, input.Revision, cancellation) is not { } kit) return NotFound("kitId");
        var revisions = await work.Db.KitRevisions.Where(r => r.KitId == input.KitId).OrderByDescending(r => r.Revision).Select(r => r.Revision).ToListAsync(cancellation);
        return Success(new OpenedKit(kit, BackCheck.Of(kit, LearntValues.None), revisions));
    }
}
