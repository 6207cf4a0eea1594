using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Stops a search.</summary>
/// <param name="SearchId">The job.</param>
public sealed record CancelSearchInput(Guid SearchId);

/// <summary>Stops one's own search; the plan stays as it is.</summary>
public sealed class CancelSearch(ClubStore store, SearchJobs jobs) : Query<CancelSearchInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.PlanKits;

    /// <inheritdoc/>
    protected override Task<Outcome<Done>> Handle(Work work, CancelSearchInput input, CancellationToken cancellation) =>
        Task.FromResult(jobs.Cancel(work.Actor.PersonId, input.SearchId) ? Success(default) : NotFound("searchId"));
}
