namespace ClubBench.Club.Changes;

/// <summary>Tells watchers what changed in a club, in order and without gaps.</summary>
public interface IChangeFeed
{
    /// <summary>
    /// Every change after <paramref name="sinceOrdinal"/>, in batches, as long as the watcher listens. A watcher that was away names the last ordinal it
    /// saw and misses nothing. Writers never wait for watchers, and what one watcher does with a batch never touches another.
    /// </summary>
    IAsyncEnumerable<IReadOnlyList<ClubEvent>> SubscribeAsync(Guid clubId, long sinceOrdinal, CancellationToken cancellation = default);

    /// <summary>Ordinal of the newest change of a club; 0 when there is none.</summary>
    Task<long> NewestOrdinalAsync(Guid clubId, CancellationToken cancellation = default);

    /// <summary>Says that a club has new changes. Called after the commit; returns at once.</summary>
    void Wake(Guid clubId);
}
