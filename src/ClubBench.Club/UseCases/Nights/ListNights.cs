using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Nights;

/// <summary>Asks for nights.</summary>
/// <param name="GroupBuildId">Of one group build; null for all.</param>
public sealed record ListNightsInput(Guid? GroupBuildId = null);

/// <summary>A night in a list.</summary>
public sealed record NightSummary(Guid Id, Guid GroupBuildId, string GroupBuildName, string Title, DateOnly Date, NightState State, int Present);

/// <summary>Nights, newest date first.</summary>
public sealed class ListNights(ClubStore store) : Query<ListNightsInput, IReadOnlyList<NightSummary>>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<IReadOnlyList<NightSummary>>> Handle(Work work, ListNightsInput input, CancellationToken cancellation) =>
        Success(await (from night in work.Db.Nights
                       join build in work.Db.GroupBuilds on night.GroupBuildId equals build.Id
                       where input.GroupBuildId == null || night.GroupBuildId == input.GroupBuildId
                       orderby night.Date descending, night.Title
                       select new NightSummary(night.Id, build.Id, build.Name, night.Title, night.Date, night.State, work.Db.Attendances.Count(a => a.NightId == night.Id)))
            .ToListAsync(cancellation));
}
