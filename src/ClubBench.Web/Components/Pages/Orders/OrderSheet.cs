using System.Globalization;
using System.Text;
using ClubBench.Planning.Orders;
using MiniExcelLibs;

namespace ClubBench.Web.Components.Pages.Orders;

/// <summary>A parts order as files to keep: the rows of the page as CSV and as a spreadsheet.</summary>
public static class OrderSheet
{
    /// <summary>First line of the CSV.</summary>
    public const string Headings = "part,type,value,rated_voltage,needed,spare,in_stock,to_buy\r\n";

    /// <summary>CSV in UTF-8 with a heading line. Cells a spreadsheet could take for a formula get a leading apostrophe.</summary>
    public static byte[] Csv(PartsOrder order)
    {
        var text = new StringBuilder(Headings);
        foreach (var r in OrderTable.Rows(order))
            text.AppendJoin(',', Cell(r.Part), Cell(r.Type), Cell(r.Value), Cell(r.Rating), Number(r.Needed), Number(r.Spare), Number(r.InStock), Number(r.ToBuy)).Append("\r\n");
        return [.. Encoding.UTF8.Preamble, .. Encoding.UTF8.GetBytes(text.ToString())];
    }

    /// <summary>A workbook of one sheet, cells guarded like those of the CSV.</summary>
    public static byte[] Xlsx(PartsOrder order)
    {
        using var stream = new MemoryStream();
        stream.SaveAs(OrderTable.Rows(order).Select(r => r with { Part = CellText.Safe(r.Part), Type = CellText.Safe(r.Type), Value = CellText.Safe(r.Value), Rating = CellText.Safe(r.Rating) }));
        return stream.ToArray();
    }

    private static string Cell(string text) => $"\"{CellText.Safe(text).Replace("\"", "\"\"", StringComparison.Ordinal)}\"";

    private static string Number(double amount) => amount.ToString("0.##", CultureInfo.InvariantCulture);
}
