using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Asks how a search stands.</summary>
/// <param name="SearchId">The job.</param>
public sealed record WatchSearchInput(Guid SearchId);

/// <summary>How one's own search stands.</summary>
public sealed class WatchSearch(ClubStore store, SearchJobs jobs) : Query<WatchSearchInput, SearchStatus>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.PlanKits;

    /// <inheritdoc/>
    protected override Task<Outcome<SearchStatus>> Handle(Work work, WatchSearchInput input, CancellationToken cancellation) =>
        Task.FromResult(jobs.Find(work.Actor.PersonId, input.SearchId) is { } status ? Success(status) : NotFound("searchId"));
}
