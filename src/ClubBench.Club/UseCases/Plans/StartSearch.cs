using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Asks for a thorough search.</summary>
/// <param name="PlanId">The plan; its newest revision counts.</param>
/// <param name="Stage">Stage key.</param>
public sealed record StartSearchInput(Guid PlanId, string Stage);

/// <summary>Starts a thorough search of one stage. What it finds becomes a choice that is frozen in the plan (<see cref="ChangePlan"/>).</summary>
public sealed class StartSearch(ClubStore store, PlanArchive archive, SearchJobs jobs) : Query<StartSearchInput, SearchStatus>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.PlanKits;

    /// <inheritdoc/>
    protected override async Task<Outcome<SearchStatus>> Handle(Work work, StartSearchInput input, CancellationToken cancellation)
    {
        if (await archive.OpenAsync(work.Db, input.PlanId, revision: null, cancellation) is not { } found) return NotFound("planId");
        if (found.Plan.Inputs.Kit.Stages.All(s => s.Key != input.Stage)) return NotFound("stage");
        return Success(jobs.Start(work.Actor.PersonId, input.PlanId, input.Stage, found.Plan.Inputs));
    }
}
