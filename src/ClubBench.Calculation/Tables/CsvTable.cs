using System.Globalization;
using System.Reflection;
using CsvHelper;
using CsvHelper.Configuration;

namespace ClubBench.Calculation.Tables;

/// <summary>Reads the embedded tables. A faulty row stops the start and names file, line and column.</summary>
internal static class CsvTable
{
    /// <summary>Reads every row of <c>Tables/&lt;name&gt;.csv</c> with the given row reader, in file order.</summary>
    public static IReadOnlyList<T> Read<T>(string name, Func<CsvRow, T> row)
    {
        using var text = new StreamReader(Open(name));
        using var csv = new CsvReader(text, new CsvConfiguration(CultureInfo.InvariantCulture));
        csv.Read();
        csv.ReadHeader();
        var rows = new List<T>();
        while (csv.Read()) rows.Add(row(new CsvRow(csv, name)));
        return rows;
    }

    private static Stream Open(string name) =>
        Assembly.GetExecutingAssembly().GetManifestResourceStream($"ClubBench.Calculation.Tables.{name}.csv")
        ?? throw new InvalidOperationException($"Table {name}.csv is not embedded.");
}

/// <summary>One row of a table: cells by column name. Blank means "not stated".</summary>
internal sealed class CsvRow(CsvReader csv, string table)
{
    public string Text(string column) =>
        csv.TryGetField<string>(column, out var value) && value is not null ? value.Trim() : throw Fault(column, "column is missing");

    public double Number(string column) => OptionalNumber(column) ?? throw Fault(column, "a number is needed");

    public double? OptionalNumber(string column)
    {
        var text = Text(column);
        if (text.Length == 0) return null;
        return double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && double.IsFinite(value)
            ? value
            : throw Fault(column, $"'{text}' is not a number");
    }

    /// <summary>Source of the row from the closing columns <c>source_id, locator, status</c>.</summary>
    public SourceRef Source() => new(Text("source_id"), Text("locator"), Text("status") switch
    {
        "published" => SourceStatus.Published,
        "derived" => SourceStatus.Derived,
        "common_practice" => SourceStatus.CommonPractice,
        "from_memory" => SourceStatus.FromMemory,
        var other => throw Fault("status", $"'{other}' is not a status"),
    });

    public InvalidDataException Fault(string column, string what) =>
        new($"{table}.csv line {csv.Parser.Row}, column {column}: {what}.");
}
