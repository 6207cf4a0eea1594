using System.Runtime.CompilerServices;

namespace ClubBench.Web.Tests.Hosting;

/// <summary>Tests never write beside the sources: each run of this assembly has a data folder of its own.</summary>
internal static class DataFolder
{
    [ModuleInitializer]
    internal static void Use()
    {
        var folder = Directory.CreateTempSubdirectory("clubbench-tests-").FullName;
        Environment.SetEnvironmentVariable("ClubBench__DataFolder", folder);
        AppDomain.CurrentDomain.ProcessExit += (_, _) => Directory.Delete(folder, recursive: true);
    }
}
