using System.Collections.Concurrent;
using System.Runtime.CompilerServices;
using System.Threading.Channels;
using ClubBench.Club.Persistence;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.Changes;

/// <summary>
/// The feed inside one process. A watcher only receives wake-up calls and reads the changes by ordinal itself: nothing queues up for a slow one,
/// and what happened while it was busy is in its next batch.
/// </summary>
public sealed class ChangeFeed(ClubContexts contexts) : IChangeFeed
{
    private const int BatchSize = 500;

    private readonly ConcurrentDictionary<Channel<bool>, Guid> _watchers = new();

    /// <inheritdoc/>
    public void Wake(Guid clubId)
    {
        foreach (var (bell, club) in _watchers)
            if (club == clubId) bell.Writer.TryWrite(true);
    }

    /// <inheritdoc/>
    public async IAsyncEnumerable<IReadOnlyList<ClubEvent>> SubscribeAsync(Guid clubId, long sinceOrdinal, [EnumeratorCancellation] CancellationToken cancellation = default)
    {
        var bell = Channel.CreateBounded<bool>(new BoundedChannelOptions(1) { FullMode = BoundedChannelFullMode.DropWrite });
        _watchers[bell] = clubId;
        try
        {
            for (var seen = sinceOrdinal; ; await bell.Reader.ReadAsync(cancellation))
                while (await AfterAsync(clubId, seen, cancellation) is { Count: > 0 } batch)
                {
                    yield return batch;
                    seen = batch[^1].Ordinal;
                }
        }
        finally
        {
            _watchers.TryRemove(bell, out _);
        }
    }

    /// <inheritdoc/>
    public async Task<long> NewestOrdinalAsync(Guid clubId, CancellationToken cancellation = default)
    {
        await using var db = contexts.Open(clubId);
        return await db.Events.MaxAsync(e => (long?)e.Ordinal, cancellation) ?? 0;
    }

    private async Task<List<ClubEvent>> AfterAsync(Guid clubId, long ordinal, CancellationToken cancellation)
    {
        await using var db = contexts.Open(clubId);
        return await db.Events.Where(e => e.Ordinal > ordinal).OrderBy(e => e.Ordinal).Take(BatchSize)
            .Select(e => new ClubEvent(e.Ordinal, e.Kind, e.BoardId, e.Stage, e.SubjectId))
            .ToListAsync(cancellation);
    }
}
