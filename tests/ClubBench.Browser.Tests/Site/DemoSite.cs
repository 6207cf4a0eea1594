using System.Collections.Concurrent;
using System.Diagnostics;
using System.Globalization;
using System.Net;
using System.Net.Sockets;

namespace ClubBench.Browser.Tests.Site;

/// <summary>The application as a fresh machine starts it: a process of its own with <c>--demo</c> on a free loopback port. What it prints is read, not assumed.</summary>
public sealed class DemoSite : IAsyncDisposable
{
    private static readonly TimeSpan StartLimit = TimeSpan.FromMinutes(2);
    private readonly ConcurrentQueue<string> _printed = new();
    private readonly Process _process;

    private DemoSite(Process process, int port) => (_process, Port) = (process, port);

    public int Port { get; }

    public Uri Address => new($"http://127.0.0.1:{Port}/");

    /// <summary>The same server under a plain-http name that is not loopback to the browser.</summary>
    public Uri HallAddress => new($"http://hall.test:{Port}/");

    public IReadOnlyCollection<string> Printed => _printed;

    /// <summary>The sign-in link printed for a role ("coordinator", "mentor", "builder").</summary>
    public Uri LinkOf(string role) => new(PrintedAfter(role));

    public string ApiToken => PrintedAfter("API token");

    public static async Task<DemoSite> StartAsync()
    {
        var port = FreePort();
        var site = new DemoSite(Process.Start(Start(port))!, port);
        site._process.OutputDataReceived += (_, line) => { if (line.Data is { } text) site._printed.Enqueue(text); };
        site._process.ErrorDataReceived += (_, line) => { if (line.Data is { } text) site._printed.Enqueue(text); };
        site._process.BeginOutputReadLine();
        site._process.BeginErrorReadLine();
        await site.AnswersAsync();
        return site;
    }

    public async ValueTask DisposeAsync()
    {
        if (!_process.HasExited) _process.Kill(entireProcessTree: true);
        await _process.WaitForExitAsync();
        _process.Dispose();
    }

    private static ProcessStartInfo Start(int port)
    {
        var project = Path.Combine(Sources.Root, "src", "ClubBench.Web");
        var start = new ProcessStartInfo("dotnet", [Path.Combine(project, "bin", Sources.Configuration, "net10.0", "ClubBench.Web.dll"), "--demo", "--urls", $"http://127.0.0.1:{port.ToString(CultureInfo.InvariantCulture)}"])
        {
            WorkingDirectory = project,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        };
        start.Environment["ASPNETCORE_ENVIRONMENT"] = "Development";
        return start;
    }

    private async Task AnswersAsync()
    {
        using var client = new HttpClient { BaseAddress = Address };
        var watch = Stopwatch.StartNew();
        while (watch.Elapsed < StartLimit && !_process.HasExited)
        {
            try
            {
                using var answer = await client.GetAsync("health/ready");
                if (answer.IsSuccessStatusCode && _printed.Any(l => l.StartsWith("API token:", StringComparison.Ordinal))) return;
            }
            catch (HttpRequestException)
            {
                // not listening yet
            }

            await Task.Delay(100);
        }

        throw new InvalidOperationException("The application did not start:\n" + string.Join('\n', _printed));
    }

    private string PrintedAfter(string label) =>
        _printed.Select(l => l.Trim()).FirstOrDefault(l => l.StartsWith(label + ":", StringComparison.OrdinalIgnoreCase))?[(label.Length + 1)..].Trim()
        ?? throw new InvalidOperationException($"Nothing was printed for {label}.");

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }
}
