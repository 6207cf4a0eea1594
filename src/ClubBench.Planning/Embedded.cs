namespace ClubBench.Planning;

/// <summary>Files that travel inside the assembly.</summary>
internal static class Embedded
{
    public static Stream Open(string name) =>
        typeof(Embedded).Assembly.GetManifestResourceStream(name) ?? throw new InvalidOperationException($"{name} is not embedded.");
}
