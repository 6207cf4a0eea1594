using System.Collections.Concurrent;
using System.Diagnostics;
using System.Globalization;

namespace ClubBench.Browser.Tests.Site;

/// <summary>The application as a fresh machine starts it: a process of its own with <c>--demo</c> on a loopback port that it picks itself. What it prints is read, not assumed.</summary>
public sealed class DemoSite : IAsyncDisposable
{
    private static readonly TimeSpan StartLimit = TimeSpan.FromMinutes(2);
    private readonly ConcurrentQueue<string> _printed = new();
    private readonly Process _process;

    private DemoSite(Process process) => _process = process;

    /// <summary>Where it answers, as its links say.</summary>
    public Uri Address => new(LinkOf("coordinator"), "/");

    /// <summary>The same server under a plain-http name that is not loopback to the browser.</summary>
    public Uri HallAddress => new UriBuilder(Address) { Host = "hall.test" }.Uri;

    public IReadOnlyCollection<string> Printed => _printed;

    /// <summary>The sign-in link printed for a role ("coordinator", "mentor", "builder").</summary>
    public Uri LinkOf(string role) => new(PrintedAfter(role));

    public string ApiToken => PrintedAfter("API token");

    public static async Task<DemoSite> StartAsync()
    {
        var site = new DemoSite(Process.Start(HowToStart())!);
        site._process.OutputDataReceived += (_, line) => { if (line.Data is { } text) site._printed.Enqueue(text); };
        site._process.ErrorDataReceived += (_, line) => { if (line.Data is { } text) site._printed.Enqueue(text); };
        site._process.BeginOutputReadLine();
        site._process.BeginErrorReadLine();
        try
        {
            await site.AnswersAsync();
            return site;
        }
        catch
        {
            await site.DisposeAsync();
            throw;
        }
    }

    public async ValueTask DisposeAsync()
    {
        if (!_process.HasExited) _process.Kill(entireProcessTree: true);
        await _process.WaitForExitAsync();
        _process.Dispose();
    }

    private static ProcessStartInfo HowToStart()
    {
        var project = Path.Combine(Sources.Root, "src", "ClubBench.Web");
        var start = new ProcessStartInfo("dotnet", [Path.Combine(project, "bin", Sources.Configuration, "net10.0", "ClubBench.Web.dll"), "--demo", "--urls", "http://127.0.0.1:0"])
        {
            WorkingDirectory = project,
            UseShellExecute = false,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        };
        start.Environment["ASPNETCORE_ENVIRONMENT"] = "Development";
        return start;
    }

    private async Task AnswersAsync()
    {
        var watch = Stopwatch.StartNew();
        while (watch.Elapsed < StartLimit && !_process.HasExited)
        {
            if (HasPrinted("API token") && await IsReadyAsync()) return;
            await Task.Delay(100);
        }

        throw new InvalidOperationException($"The application {HowItStands()}. It printed:\n{string.Join('\n', _printed)}");
    }

    private async Task<bool> IsReadyAsync()
    {
        using var client = new HttpClient();
        using var answer = await client.GetAsync(new Uri(Address, "health/ready"));
        return answer.IsSuccessStatusCode;
    }

    private bool HasPrinted(string label) => _printed.Any(l => l.StartsWith(label + ":", StringComparison.Ordinal));

    private string HowItStands()
    {
        if (!_process.HasExited) return $"was not ready within {StartLimit.TotalMinutes.ToString(CultureInfo.InvariantCulture)} minutes";
        _process.WaitForExit();
        return $"ended at its start with code {_process.ExitCode.ToString(CultureInfo.InvariantCulture)}";
    }

    private string PrintedAfter(string label) =>
        _printed.Select(l => l.Trim()).FirstOrDefault(l => l.StartsWith(label + ":", StringComparison.OrdinalIgnoreCase))?[(label.Length + 1)..].Trim()
        ?? throw new InvalidOperationException($"Nothing was printed for {label}.");
}
