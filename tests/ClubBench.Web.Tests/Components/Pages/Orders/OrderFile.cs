using System.Globalization;
using ClubBench.Planning.Orders;
using CsvHelper;
using MiniExcelLibs;

namespace ClubBench.Web.Tests.Components.Pages.Orders;

/// <summary>Reads the files of an order back, as a spreadsheet does.</summary>
internal static class OrderFile
{
    public static IReadOnlyList<OrderRow> Read(string format, byte[] file) => format == "csv" ? Csv(file) : Xlsx(file);

    private static List<OrderRow> Csv(byte[] file)
    {
        using var text = new StreamReader(new MemoryStream(file));
        using var csv = new CsvReader(text, CultureInfo.InvariantCulture);
        csv.Read();
        csv.ReadHeader();
        var rows = new List<OrderRow>();
        while (csv.Read())
            rows.Add(new OrderRow(csv["part"]!, csv["type"]!, csv["value"]!, csv["rated_voltage"]!, csv.GetField<double>("needed"), csv.GetField<double>("spare"), csv.GetField<double>("in_stock"), csv.GetField<double>("to_buy")));
        return rows;
    }

    private static List<OrderRow> Xlsx(byte[] file)
    {
        using var stream = new MemoryStream(file);
        return [.. stream.Query(useHeaderRow: true).Cast<IDictionary<string, object?>>().Select(r => new OrderRow(
            Text(r["Part"]), Text(r["Type"]), Text(r["Value"]), Text(r["Rating"]), (double)r["Needed"]!, (double)r["Spare"]!, (double)r["InStock"]!, (double)r["ToBuy"]!))];
    }

    private static string Text(object? cell) => cell as string ?? "";
}
