using System.Diagnostics;
using System.Runtime.CompilerServices;
using System.Text.Json;

namespace ClubBench.Calculation.Tests.SecondLeg;

/// <summary>Has cases computed again by the script beside the tests, in the system's Python with numpy and scipy.</summary>
internal static class Recomputed
{
    private static readonly JsonSerializerOptions Names = new(JsonSerializerDefaults.Web);

    /// <summary>One list of numbers a case, in the order of the cases.</summary>
    public static async Task<double[][]> ByScriptAsync<TCase>(string area, IReadOnlyList<TCase> cases, CancellationToken cancellation)
    {
        using var python = Process.Start(new ProcessStartInfo(File.Exists("/usr/bin/python3") ? "/usr/bin/python3" : "python3", [Script()])
        {
            UseShellExecute = false, RedirectStandardInput = true, RedirectStandardOutput = true, RedirectStandardError = true,
        })!;
        var faults = python.StandardError.ReadToEndAsync(cancellation);
        var answer = python.StandardOutput.ReadToEndAsync(cancellation);
        await python.StandardInput.WriteAsync(JsonSerializer.Serialize(new { area, cases }, Names).AsMemory(), cancellation);
        python.StandardInput.Close();
        await python.WaitForExitAsync(cancellation);
        Assert.True(python.ExitCode == 0, $"The script stopped (numpy and scipy are needed): {await faults}");
        return JsonSerializer.Deserialize<double[][]>(await answer)!;
    }

    private static string Script([CallerFilePath] string here = "") =>
        Path.Combine(Path.GetDirectoryName(here)!, "..", "..", "Recomputed", "second_leg.py");
}
