namespace ClubBench.Browser.Tests.Site;

/// <summary>Where the sources are and how these tests were built.</summary>
internal static class Sources
{
    public static string Root { get; } = Find();

    public static string Configuration { get; } =
        AppContext.BaseDirectory.Contains($"{Path.DirectorySeparatorChar}Release{Path.DirectorySeparatorChar}", StringComparison.Ordinal) ? "Release" : "Debug";

    /// <summary>Pictures kept for people to look at.</summary>
    public static string Artefacts { get; } = Directory.CreateDirectory(Path.Combine(Root, "tests", "test-artefacts")).FullName;

    private static string Find()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "ClubBench.sln"))) folder = folder.Parent;
        return folder?.FullName ?? throw new InvalidOperationException("The tests do not run below their solution.");
    }
}
