using System.Collections.Concurrent;
using ClubBench.Planning.Plans;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>How a thorough search stands.</summary>
public enum SearchState
{
    Running,
    Found,
    Cancelled,
    Failed,
}

/// <summary>A thorough search as a person sees it.</summary>
/// <param name="Id">The job.</param>
/// <param name="PlanId">Plan it searches for.</param>
/// <param name="Stage">Stage key.</param>
/// <param name="State">How it stands.</param>
/// <param name="Share">How far it is, 0 to 1.</param>
/// <param name="Found">What it found, best first; empty until it has.</param>
public sealed record SearchStatus(Guid Id, Guid PlanId, string Stage, SearchState State, double Share, IReadOnlyList<Alternative> Found);

/// <summary>The thorough searches of this process: one a person at a time, and never more than leave a core for everybody else. A new one of the same person ends the old.</summary>
public sealed class SearchJobs : IDisposable
{
    private static readonly TimeSpan LongestRun = TimeSpan.FromMinutes(2);

    private readonly ConcurrentDictionary<Guid, Job> _byPerson = new();
    private readonly SemaphoreSlim _cores = new(Math.Max(1, Environment.ProcessorCount - 1));

    internal SearchStatus Start(Guid person, Guid planId, string stage, PlanInputs inputs)
    {
        var job = new Job(Guid.NewGuid(), planId, stage);
        if (_byPerson.TryGetValue(person, out var old)) old.Stop.Cancel();
        _byPerson[person] = job;
        _ = RunAsync(job, inputs);
        return job.Status;
    }

    internal SearchStatus? Find(Guid person, Guid id) => JobOf(person, id)?.Status;

    internal bool Cancel(Guid person, Guid id)
    {
        var job = JobOf(person, id);
        job?.Stop.Cancel();
        return job is not null;
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        foreach (var job in _byPerson.Values) job.Stop.Cancel();
        _cores.Dispose();
    }

    private Job? JobOf(Guid person, Guid id) => _byPerson.TryGetValue(person, out var job) && job.Id == id ? job : null;

    private async Task RunAsync(Job job, PlanInputs inputs)
    {
        try
        {
            await _cores.WaitAsync(job.Stop.Token);
            try
            {
                job.Stop.CancelAfter(LongestRun);
                var found = await Task.Run(() => ThoroughSearches.Run(inputs, job.Stage, job, job.Stop.Token), job.Stop.Token);
                job.End(SearchState.Found, found);
            }
            finally
            {
                _cores.Release();
            }
        }
        catch (OperationCanceledException)
        {
            job.End(SearchState.Cancelled, []);
        }
        catch (Exception)
        {
            job.End(SearchState.Failed, []);
            throw;
        }
    }

    /// <summary>One search; tells its own progress.</summary>
    private sealed class Job(Guid id, Guid planId, string stage) : IProgress<double>
    {
        private volatile SearchStatus _status = new(id, planId, stage, SearchState.Running, 0, []);

        public Guid Id { get; } = id;

        public string Stage { get; } = stage;

        public CancellationTokenSource Stop { get; } = new();

        public SearchStatus Status => _status;

        public void Report(double value) => _status = _status with { Share = Math.Clamp(value, 0, 1) };

        public void End(SearchState state, IReadOnlyList<Alternative> found) => _status = _status with { State = state, Share = 1, Found = found };
    }
}
