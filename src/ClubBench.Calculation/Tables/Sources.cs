namespace ClubBench.Calculation.Tables;

/// <summary>A publication, standard, law or practice that figures come from.</summary>
/// <param name="Id">Short key used by tables and methods.</param>
/// <param name="Kind">standard, law, recommendation, book, paper, data sheet, list, practice.</param>
/// <param name="Issuer">Author or issuing body.</param>
/// <param name="Title">Title as printed.</param>
/// <param name="Edition">Edition or number; empty where there is none.</param>
/// <param name="Year">Year of that edition; empty where unknown.</param>
public sealed record Source(string Id, string Kind, string Issuer, string Title, string Edition, string Year);

/// <summary>All sources, from <c>Tables/sources*.csv</c> by subject. Immutable, thread safe.</summary>
public static class Sources
{
    private static readonly string[] Files = ["sources", "sources-windings", "sources-transmitter", "sources-receiver"];

    private static readonly Dictionary<string, Source> ById = Files.SelectMany(f => CsvTable.Read(f, Row)).ToDictionary(s => s.Id, StringComparer.Ordinal);

    /// <summary>Every source, sorted by id.</summary>
    public static IReadOnlyList<Source> All { get; } = [.. ById.Values.OrderBy(s => s.Id, StringComparer.Ordinal)];

    /// <summary>The source with this id, or null.</summary>
    public static Source? Find(string id) => ById.GetValueOrDefault(id);

    private static Source Row(CsvRow r) =>
        new(r.Text("source_id"), r.Text("kind"), r.Text("issuer"), r.Text("title"), r.Text("edition"), r.Text("year"));
}
