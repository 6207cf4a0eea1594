using System.Diagnostics;

namespace ClubBench.Browser.Tests.Site;

/// <summary>The system's chromium. Where it is missing it is installed through the system's package manager, so that the test command is all a fresh machine needs.</summary>
internal static class SystemBrowser
{
    private static readonly string[] Places = ["/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome"];

    public static async Task<string> PathAsync()
    {
        if (Places.FirstOrDefault(File.Exists) is { } path) return path;
        await AptAsync("update", "-qq");
        await AptAsync("install", "-y", "--no-install-recommends", "chromium");
        return Places.FirstOrDefault(File.Exists) ?? throw new InvalidOperationException("No chromium, and the package manager brought none.");
    }

    private static async Task AptAsync(params string[] arguments)
    {
        var command = Environment.UserName == "root" ? "apt-get" : "sudo";
        var start = new ProcessStartInfo(command, Environment.UserName == "root" ? arguments : ["-n", "apt-get", .. arguments]);
        start.Environment["DEBIAN_FRONTEND"] = "noninteractive";
        using var apt = Process.Start(start)!;
        await apt.WaitForExitAsync();
        if (apt.ExitCode != 0) throw new InvalidOperationException($"apt-get {string.Join(' ', arguments)} ended with {apt.ExitCode}.");
    }
}
