using BenchmarkDotNet.Running;
using ClubBench.Benchmarks;

if (args.Contains("--quick"))
{
    QuickTable.Print(Console.Out, Workloads.All, runs: 15);
    return 0;
}

var summary = BenchmarkRunner.Run<WorkloadBenchmarks>(WorkloadBenchmarks.Settings, args);
return summary.HasCriticalValidationErrors ? 1 : 0;
