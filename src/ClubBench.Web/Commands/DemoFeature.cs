using System.Net;

namespace ClubBench.Web.Commands;

/// <summary>The demo: an invented club in a folder that goes away again, reached from this machine only, with sign-in links printed on the console.</summary>
internal static class DemoFeature
{
    private const string Option = "demo";
    private const string Address = "http://127.0.0.1:5080";

    /// <summary>Whether the program was started with <c>--demo</c>.</summary>
    public static bool IsDemo(this WebApplicationBuilder builder) => IsDemo(builder.Configuration);

    public static bool IsDemo(IConfiguration configuration) => configuration[Option] is { } value && !string.Equals(value, "false", StringComparison.OrdinalIgnoreCase);

    /// <summary>Keeps the demo on loopback and gives it a fresh folder. Throws for an address others could reach.</summary>
    public static string UseDemo(this WebApplicationBuilder builder)
    {
        if (string.IsNullOrEmpty(builder.Configuration[WebHostDefaults.ServerUrlsKey])) builder.WebHost.UseUrls(Address);
        foreach (var url in (builder.Configuration[WebHostDefaults.ServerUrlsKey] ?? "").Split(';', StringSplitOptions.RemoveEmptyEntries))
            if (!IsLoopback(url)) throw new InvalidOperationException($"The demo answers on this machine only; {url} is reached from outside. Start without --demo, or give a loopback address.");
        builder.Services.AddHostedService<DemoFolder>();
        return DemoFolder.Path;
    }

    private static bool IsLoopback(string url)
    {
        var host = BindingAddress.Parse(url).Host.Trim('[', ']');
        return string.Equals(host, "localhost", StringComparison.OrdinalIgnoreCase) || (IPAddress.TryParse(host, out var address) && IPAddress.IsLoopback(address));
    }

    /// <summary>The folder of one demo; removed when the program ends.</summary>
    private sealed class DemoFolder : IHostedService
    {
        public static string Path { get; } = Directory.CreateTempSubdirectory("clubbench-demo-").FullName;

        public Task StartAsync(CancellationToken cancellationToken) => Task.CompletedTask;

        public Task StopAsync(CancellationToken cancellationToken)
        {
            Microsoft.Data.Sqlite.SqliteConnection.ClearAllPools();
            Directory.Delete(Path, recursive: true);
            return Task.CompletedTask;
        }
    }
}
