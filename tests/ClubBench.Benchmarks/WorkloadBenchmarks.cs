using BenchmarkDotNet.Attributes;
using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Jobs;
using BenchmarkDotNet.Toolchains.InProcess.Emit;

namespace ClubBench.Benchmarks;

/// <summary>The same work under BenchmarkDotNet, with a short job in this process: a figure in some seconds each.</summary>
[MemoryDiagnoser]
public class WorkloadBenchmarks
{
    private Func<object> _run = () => 0;

    public static IConfig Settings => DefaultConfig.Instance.AddJob(Job.ShortRun.WithToolchain(InProcessEmitToolchain.Instance));

    public static IEnumerable<string> Names => Workloads.All.Select(w => w.Name);

    [ParamsSource(nameof(Names))]
    public string Work { get; set; } = "";

    [GlobalSetup]
    public void Prepare() => _run = Workloads.Named(Work).Run;

    [Benchmark]
    public object Run() => _run();

    [Benchmark(Baseline = true)]
    public double YardstickLoop() => Yardstick.Run();
}
