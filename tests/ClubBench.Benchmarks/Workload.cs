namespace ClubBench.Benchmarks;

/// <summary>One piece of work that people wait for.</summary>
/// <param name="Name">Short name, one word or several joined by dashes.</param>
/// <param name="WantedMs">What it may take on two ordinary cores, in milliseconds.</param>
/// <param name="Run">Does it once; the result keeps the work from being optimised away.</param>
public sealed record Workload(string Name, double WantedMs, Func<object> Run)
{
    public override string ToString() => Name;
}
