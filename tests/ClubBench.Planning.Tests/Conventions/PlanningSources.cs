using System.Text.RegularExpressions;

namespace ClubBench.Planning.Tests.Conventions;

/// <summary>The source files of Planning, for tests that hold the whole code to a rule.</summary>
internal static partial class PlanningSources
{
    public sealed record Source(string Path, string Text);

    /// <summary>Every file, path relative to the project with forward slashes.</summary>
    public static IReadOnlyList<Source> All { get; } = Read();

    private static IReadOnlySet<string> Literals { get; } =
        All.SelectMany(f => Literal().Matches(f.Text)).Select(m => m.Groups["name"].Value).ToHashSet(StringComparer.Ordinal);

    private static readonly string[] Stems =
        [.. All.SelectMany(f => Stem().Matches(f.Text)).Select(m => m.Groups["stem"].Value).Distinct(StringComparer.Ordinal)];

    /// <summary>Whether a name stands in the sources as a literal, or begins like one that is put together there.</summary>
    public static bool Know(string name) => Literals.Contains(name) || Stems.Any(s => name.StartsWith(s, StringComparison.Ordinal));

    private static List<Source> Read()
    {
        var root = Folder();
        return [.. Directory.EnumerateFiles(root, "*.cs", SearchOption.AllDirectories)
            .Select(f => new Source(System.IO.Path.GetRelativePath(root, f).Replace('\\', '/'), File.ReadAllText(f)))
            .Where(f => !f.Path.StartsWith("obj/", StringComparison.Ordinal) && !f.Path.StartsWith("bin/", StringComparison.Ordinal))];
    }

    private static string Folder()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (!File.Exists(System.IO.Path.Combine(folder.FullName, "ClubBench.sln"))) folder = folder.Parent!;
        return System.IO.Path.Combine(folder.FullName, "src", "ClubBench.Planning");
    }

    [GeneratedRegex("\"(?<name>[a-z0-9][a-z0-9.-]*)\"", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Literal();

    [GeneratedRegex("\\$\"(?<stem>[a-z][a-z0-9.-]+[.-])\\{", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Stem();
}
