using System.Globalization;

namespace ClubBench.Benchmarks;

/// <summary>Medians of a few runs each, where a full benchmark takes too long.</summary>
internal static class QuickTable
{
    private static readonly TimeSpan WarmUpTime = TimeSpan.FromSeconds(3);

    public static void Print(TextWriter output, IReadOnlyList<Workload> workloads, int runs)
    {
        Median(Yardstick.Run, runs);
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{"work",-42} {"median ms",10} {"least ms",10} {"wanted ms",10} {"yardsticks",11}"));
        foreach (var work in workloads)
        {
            var (median, least) = Median(work.Run, runs);
            var (yardstick, _) = Median(Yardstick.Run, runs);
            output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{work.Name,-42} {median,10:F2} {least,10:F2} {work.WantedMs,10:F0} {median / yardstick,11:F3}"));
        }
    }

    private static (double Median, double Least) Median<T>(Func<T> run, int runs)
    {
        var kept = WarmUp(run);
        var times = new double[runs];
        for (var i = 0; i < runs; i++)
        {
            var start = TimeProvider.System.GetTimestamp();
            kept = run();
            times[i] = TimeProvider.System.GetElapsedTime(start).TotalMilliseconds;
        }

        GC.KeepAlive(kept);
        Array.Sort(times);
        return (times[runs / 2], times[0]);
    }

    // Until the compiler has had time to replace its first, quick code.
    private static T WarmUp<T>(Func<T> run)
    {
        var start = TimeProvider.System.GetTimestamp();
        var kept = run();
        while (TimeProvider.System.GetElapsedTime(start) < WarmUpTime) kept = run();
        return kept;
    }
}
