using System.Globalization;
using CsvHelper;

namespace ClubBench.Calculation.Tests;

/// <summary>Rows of <c>ReferenceValues/&lt;name&gt;.csv</c> for theory tests: one string map a row.</summary>
public static class ReferenceTable
{
    public static IEnumerable<ReferenceRow> Read(string name)
    {
        using var text = new StreamReader(Path.Combine(AppContext.BaseDirectory, "ReferenceValues", name + ".csv"));
        using var csv = new CsvReader(text, CultureInfo.InvariantCulture);
        csv.Read();
        csv.ReadHeader();
        while (csv.Read())
            yield return new ReferenceRow(csv.HeaderRecord!.ToDictionary(h => h, h => csv.GetField(h) ?? "", StringComparer.Ordinal));
    }

    public static TheoryData<ReferenceRow> Theory(string name)
    {
        var data = new TheoryData<ReferenceRow>();
        foreach (var row in Read(name)) data.Add(new TheoryDataRow<ReferenceRow>(row) { TestDisplayName = name + ": " + row["case_id"] });
        return data;
    }
}

/// <summary>One row: <c>row["column"]</c> as text, <c>row.Number("column")</c> as a number.</summary>
public sealed class ReferenceRow(IReadOnlyDictionary<string, string> cells)
{
    public string this[string column] => cells[column];

    public IEnumerable<string> Columns => cells.Keys;

    public bool Has(string column) => cells.TryGetValue(column, out var v) && v.Length > 0;

    public double Number(string column) => double.Parse(cells[column], CultureInfo.InvariantCulture);

    /// <summary>Numbers with semicolons between them, in their order.</summary>
    public IReadOnlyList<double> Numbers(string column) => [.. cells[column].Split(';').Select(c => double.Parse(c, CultureInfo.InvariantCulture))];

    public override string ToString() => cells["case_id"];
}
