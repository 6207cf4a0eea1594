using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases;

/// <summary>
/// A use case that changes something. It runs in one transaction: a success is saved with its events and then told to watchers; a failure changes nothing.
/// </summary>
public abstract class Command<TInput, TResult>(ClubStore store) : UseCase<TInput, TResult>
    where TResult : notnull
{
    private protected sealed override Task<Outcome<TResult>> ExecuteAsync(Actor actor, TInput input, CancellationToken cancellation) =>
        store.WriteAsync(
            actor,
            async work =>
            {
                var admitted = await AdmitAsync(work, cancellation);
                return admitted.Succeeded ? await Handle(work with { Actor = admitted.Value }, input, cancellation) : Failure(admitted.Messages);
            },
            cancellation);
}
