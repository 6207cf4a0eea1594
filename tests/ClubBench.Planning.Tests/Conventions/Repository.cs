using System.Diagnostics;

namespace ClubBench.Planning.Tests.Conventions;

/// <summary>The files under version control, for tests that hold the whole repository to a rule.</summary>
internal static class Repository
{
    public sealed record TrackedFile(string Path, string Text)
    {
        public string Name => System.IO.Path.GetFileName(Path);

        public IReadOnlyList<string> Lines => Text.Split('\n');
    }

    private static readonly string[] Binary = [".png", ".ico", ".woff2", ".pdf", ".db", ".xlsx"];

    public static string Root { get; } = FindRoot();

    /// <summary>Every tracked path, with forward slashes.</summary>
    public static IReadOnlyList<string> Paths { get; } = Tracked();

    /// <summary>Every tracked text file.</summary>
    public static IReadOnlyList<TrackedFile> Files { get; } =
        [.. Paths.Where(p => !Binary.Contains(System.IO.Path.GetExtension(p)) && File.Exists(Full(p))).Select(p => new TrackedFile(p, File.ReadAllText(Full(p))))];

    /// <summary>Code written by hand under src.</summary>
    public static IReadOnlyList<TrackedFile> Sources { get; } =
        [.. Files.Where(f => f.Path.StartsWith("src/", StringComparison.Ordinal) && !f.Path.Contains("/Migrations/", StringComparison.Ordinal) && IsCode(f.Name))];

    public static IEnumerable<TrackedFile> Under(string folder) => Files.Where(f => f.Path.StartsWith(folder, StringComparison.Ordinal));

    private static bool IsCode(string name) => System.IO.Path.GetExtension(name) is ".cs" or ".razor" or ".js";

    private static string Full(string path) => System.IO.Path.Combine(Root, path);

    private static List<string> Tracked()
    {
        var start = new ProcessStartInfo("git", ["ls-files", "--cached", "--others", "--exclude-standard"]) { WorkingDirectory = Root, RedirectStandardOutput = true, UseShellExecute = false };
        using var git = Process.Start(start)!;
        var listing = git.StandardOutput.ReadToEnd();
        git.WaitForExit();
        return [.. listing.Split('\n', StringSplitOptions.RemoveEmptyEntries)];
    }

    private static string FindRoot()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (!File.Exists(System.IO.Path.Combine(folder.FullName, "ClubBench.sln"))) folder = folder.Parent!;
        return folder.FullName;
    }
}
