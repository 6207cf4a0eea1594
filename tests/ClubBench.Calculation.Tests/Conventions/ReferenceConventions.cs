using System.Text.RegularExpressions;

namespace ClubBench.Calculation.Tests.Conventions;

/// <summary>Reference values are many, name their origin, and say how closely they must be met.</summary>
public partial class ReferenceConventions
{
    private const int Wanted = 120;
    private static readonly string[] OwnWork = ["derived", "common-practice", "from-memory"];
    private static readonly string Folder = Path.Combine(AppContext.BaseDirectory, "ReferenceValues");

    private static IEnumerable<(string Table, ReferenceRow Row)> Rows =>
        from file in Directory.GetFiles(Folder, "*.csv")
        let table = Path.GetFileNameWithoutExtension(file)
        from row in ReferenceTable.Read(table)
        select (table, row);

    [Fact]
    public void Rows_WithSourceAndLocator_AreEnough() =>
        Assert.InRange(Rows.Count(x => x.Row.Has("source_id") && x.Row.Has("locator")), Wanted, int.MaxValue);

    [Fact]
    public void Rows_OfPublications_AreEnoughByThemselves() =>
        Assert.InRange(Rows.Count(x => x.Row.Has("source_id") && x.Row.Has("locator") && !OwnWork.Contains(x.Row["source_id"])), Wanted, int.MaxValue);

    [Fact]
    public void Rows_OfOneTable_AreNamedOnce()
    {
        var twice = Rows.GroupBy(x => (x.Table, x.Row["case_id"])).Where(g => g.Count() > 1).Select(g => $"{g.Key.Table}: {g.Key.Item2}");

        Assert.Empty(twice);
    }

    [Fact]
    public void Rows_All_HaveATolerance()
    {
        var stated = StatedInTheReadMe();

        var without = Rows.Where(x => !stated.Contains(x.Table) && !x.Row.Columns.Where(IsTolerance).Any(x.Row.Has)).Select(x => $"{x.Table}: {x.Row}");

        Assert.Empty(without);
    }

    [Fact]
    public void ReadMe_TolerancesOfTables_AreOfTablesWithoutAColumn()
    {
        var superfluous = StatedInTheReadMe().Where(t => Rows.Where(x => x.Table == t).All(x => x.Row.Columns.Any(IsTolerance)));

        Assert.Empty(superfluous);
    }

    // Part tolerances are inputs of some methods; what the expected value may be off by starts or ends with the word.
    private static bool IsTolerance(string column) =>
        column is "tolerance" or "relative_tolerance" or "db_tolerance" || column.StartsWith("tolerance_", StringComparison.Ordinal) || column is "ripple_tolerance" or "return_loss_tolerance";

    private static HashSet<string> StatedInTheReadMe() =>
        [.. File.ReadLines(Path.Combine(Folder, "README.md")).Select(l => TableLine().Match(l)).Where(m => m.Success).Select(m => m.Groups["table"].Value)];

    [GeneratedRegex(@"^\| `(?<table>[a-z_0-9-]+)` \| \S.* \|$", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex TableLine();
}
