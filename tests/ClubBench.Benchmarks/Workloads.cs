namespace ClubBench.Benchmarks;

/// <summary>Everything measured, in the order of the table.</summary>
public static class Workloads
{
    public static IReadOnlyList<Workload> All { get; } = [.. PlanningWork.All, .. PrintingWork.All, .. FilterWork.All, .. OscillatorWork.All];

    public static Workload Named(string name) => All.Single(w => w.Name == name);
}
