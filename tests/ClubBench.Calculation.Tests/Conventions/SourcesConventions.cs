using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Tests.Conventions;

public class SourcesConventions
{
    [Fact]
    public void EveryReferenceFile_EveryRow_NamesASourceThatResolves()
    {
        var folder = Path.Combine(AppContext.BaseDirectory, "ReferenceValues");
        var unresolved = Directory.GetFiles(folder, "*.csv")
            .SelectMany(f => ReferenceTable.Read(Path.GetFileNameWithoutExtension(f)).Select(r => (File: Path.GetFileName(f), Row: r)))
            .Where(x => Sources.Find(x.Row["source_id"]) is null)
            .Select(x => $"{x.File} {x.Row["case_id"]}: {x.Row["source_id"]}");

        Assert.Empty(unresolved);
    }

    [Fact]
    public void Calculation_References_NothingOfOurs() =>
        Assert.DoesNotContain(typeof(Sources).Assembly.GetReferencedAssemblies(), a => a.Name!.StartsWith("ClubBench", StringComparison.Ordinal));
}
