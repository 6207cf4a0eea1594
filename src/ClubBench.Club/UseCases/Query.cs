using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases;

/// <summary>A use case that only reads.</summary>
public abstract class Query<TInput, TResult>(ClubStore store) : UseCase<TInput, TResult>
    where TResult : notnull
{
    private protected sealed override async Task<Outcome<TResult>> ExecuteAsync(Actor actor, TInput input, CancellationToken cancellation)
    {
        await using var db = store.Open(actor.ClubId);
        db.ChangeTracker.QueryTrackingBehavior = QueryTrackingBehavior.NoTracking;
        var work = new Work(actor, db, store.NowUtc);
        var admitted = await AdmitAsync(work, cancellation);
        return admitted.Succeeded ? await Handle(work with { Actor = admitted.Value }, input, cancellation) : Failure(admitted.Messages);
    }
}
