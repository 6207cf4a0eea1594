using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.GroupBuilds;

/// <summary>Asks for group builds.</summary>
public sealed record ListGroupBuildsInput;

/// <summary>A group build in a list.</summary>
public sealed record GroupBuildSummary(Guid Id, string Name, Guid KitId, string KitName, DateTime StartedUtc, int Boards, int Nights);

/// <summary>Group builds, newest first.</summary>
public sealed class ListGroupBuilds(ClubStore store) : Query<ListGroupBuildsInput, IReadOnlyList<GroupBuildSummary>>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<IReadOnlyList<GroupBuildSummary>>> Handle(Work work, ListGroupBuildsInput input, CancellationToken cancellation) =>
        Success(await (from build in work.Db.GroupBuilds
                       join kit in work.Db.Kits on build.KitId equals kit.Id
                       orderby build.StartedUtc descending, build.Name
                       select new GroupBuildSummary(
                           build.Id, build.Name, kit.Id, kit.Name, build.StartedUtc, work.Db.Boards.Count(b => b.GroupBuildId == build.Id), work.Db.Nights.Count(n => n.GroupBuildId == build.Id)))
            .ToListAsync(cancellation));
}
