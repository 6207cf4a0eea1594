using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.UseCases;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.Persistence;

/// <summary>Opens contexts for use cases and runs their writes one after the other: SQLite has one writer, and a queue here is fair where polling a lock is not.</summary>
public sealed class ClubStore(ClubContexts contexts, IChangeFeed feed, TimeProvider clock) : IDisposable
{
    private readonly SemaphoreSlim _writing = new(1, 1);

    /// <summary>Time by the club's clock.</summary>
    public DateTime NowUtc => clock.GetUtcNow().UtcDateTime;

    /// <summary>A context that sees this club only.</summary>
    public ClubContext Open(Guid clubId) => contexts.Open(clubId);

    /// <summary>Runs a write in one transaction. Saved, committed, then announced; a failure or a stale version leaves everything as it was.</summary>
    public async Task<Outcome<TResult>> WriteAsync<TResult>(Actor actor, Func<Work, Task<Outcome<TResult>>> write, CancellationToken cancellation)
        where TResult : notnull
    {
        await _writing.WaitAsync(cancellation);
        try
        {
            await using var db = contexts.Open(actor.ClubId);
            await using var transaction = await db.Database.BeginTransactionAsync(cancellation);
            var outcome = await write(new Work(actor, db, NowUtc));
            if (!outcome.Succeeded) return outcome;
            await db.SaveChangesAsync(cancellation);
            await transaction.CommitAsync(cancellation);
            feed.Wake(db.ClubId);
            return outcome;
        }
        catch (DbUpdateConcurrencyException stale)
        {
            return Outcome<TResult>.Failure(stale.Entries.Select(e => Refusals.Stale(e.Metadata.ClrType.Name)));
        }
        finally
        {
            _writing.Release();
        }
    }

    /// <inheritdoc/>
    public void Dispose() => _writing.Dispose();
}
