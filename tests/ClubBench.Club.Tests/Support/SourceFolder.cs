using System.Runtime.CompilerServices;

namespace ClubBench.Club.Tests.Support;

internal static class SourceFolder
{
    public static string Root { get; } = Find();

    private static string Find([CallerFilePath] string here = "") =>
        new DirectoryInfo(Path.GetDirectoryName(here)!).Parent!.Parent!.Parent!.FullName;
}
