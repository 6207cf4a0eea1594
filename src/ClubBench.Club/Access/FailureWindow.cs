namespace ClubBench.Club.Access;

/// <summary>Counts wrong guesses over a sliding time, so that guessing leads nowhere. Kept in memory: a restart costs a guesser more than it gains.</summary>
public sealed class FailureWindow(TimeProvider clock)
{
    /// <summary>Wrong guesses within the window that are too many.</summary>
    public const int Most = 30;

    /// <summary>Length of the window.</summary>
    public static readonly TimeSpan Length = TimeSpan.FromMinutes(10);

    private readonly Queue<DateTimeOffset> _failures = new();
    private readonly Lock _lock = new();

    /// <summary>Whether there were too many within the window.</summary>
    public bool IsFull
    {
        get
        {
            lock (_lock)
            {
                while (_failures.TryPeek(out var oldest) && clock.GetUtcNow() - oldest > Length) _failures.Dequeue();
                return _failures.Count >= Most;
            }
        }
    }

    /// <summary>Notes a wrong guess.</summary>
    public void Note()
    {
        lock (_lock) _failures.Enqueue(clock.GetUtcNow());
    }

    /// <summary>Starts afresh, because what was guessed at has changed.</summary>
    public void Clear()
    {
        lock (_lock) _failures.Clear();
    }
}

/// <summary>The windows of this process.</summary>
public sealed class FailureWindows(TimeProvider clock)
{
    /// <summary>Wrong codes of nights.</summary>
    public FailureWindow Codes { get; } = new(clock);

    /// <summary>Wrong passwords.</summary>
    public FailureWindow Passwords { get; } = new(clock);
}
