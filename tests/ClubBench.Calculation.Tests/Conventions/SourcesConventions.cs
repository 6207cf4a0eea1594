using System.Globalization;
using ClubBench.Calculation.Tables;
using CsvHelper;

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
    public void EveryEmbeddedTable_EveryRow_NamesASourceThatResolves()
    {
        var product = typeof(Sources).Assembly;
        var tables = product.GetManifestResourceNames().Where(n => n.EndsWith(".csv", StringComparison.Ordinal) && !n.Contains(".sources", StringComparison.Ordinal)).ToList();

        var unresolved = tables.SelectMany(t => SourceIds(product.GetManifestResourceStream(t)!).Where(id => Sources.Find(id) is null).Select(id => $"{t}: '{id}'"));

        Assert.True(tables.Count >= 10);
        Assert.Empty(unresolved);
    }

    [Fact]
    public void Calculation_References_NothingOfOurs() =>
        Assert.DoesNotContain(typeof(Sources).Assembly.GetReferencedAssemblies(), a => a.Name!.StartsWith("ClubBench", StringComparison.Ordinal));

    private static List<string> SourceIds(Stream table)
    {
        using var csv = new CsvReader(new StreamReader(table), CultureInfo.InvariantCulture);
        csv.Read();
        csv.ReadHeader();
        var ids = new List<string>();
        while (csv.Read()) ids.Add(csv.GetField("source_id")!);
        return ids;
    }
}
