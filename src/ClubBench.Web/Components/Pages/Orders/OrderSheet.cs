using System.Globalization;
using System.Text;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Orders;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;
using MiniExcelLibs;

namespace ClubBench.Web.Components.Pages.Orders;

/// <summary>One row of a parts order as people read it.</summary>
public sealed record OrderRow(string Part, string Type, string Value, double Needed, double Spare, double InStock, double ToBuy);

/// <summary>A parts order as table, CSV and spreadsheet: the same rows in all three.</summary>
public static class OrderSheet
{
    private const string WireInMetres = "wire, in metres";

    public static IReadOnlyList<OrderRow> Rows(PartsOrder order) =>
        [.. order.Lines.Select(l => new OrderRow(Phrases.Word(l.Class), l.Type == PartsOrder.Wire ? WireInMetres : l.Type, l.ValueSi is { } si ? QuantityText.Format(KindOf(l), si) : "", l.Needed, l.Spare, l.InStock, l.ToBuy))];

    /// <summary>CSV in UTF-8 with a heading line. Cells a spreadsheet could take for a formula get a leading apostrophe.</summary>
    public static byte[] Csv(PartsOrder order)
    {
        var text = new StringBuilder("part,type,value,needed,spare,in_stock,to_buy\r\n");
        foreach (var r in Rows(order))
            text.AppendJoin(',', Cell(r.Part), Cell(r.Type), Cell(r.Value), Number(r.Needed), Number(r.Spare), Number(r.InStock), Number(r.ToBuy)).Append("\r\n");
        return [.. Encoding.UTF8.Preamble, .. Encoding.UTF8.GetBytes(text.ToString())];
    }

    public static byte[] Xlsx(PartsOrder order)
    {
        using var stream = new MemoryStream();
        stream.SaveAs(Rows(order).Select(r => r with { Part = Safe(r.Part), Type = Safe(r.Type), Value = Safe(r.Value) }));
        return stream.ToArray();
    }

    /// <summary>Text a spreadsheet would compute is disarmed; strict numbers stay numbers.</summary>
    public static string Safe(string text) =>
        text.Length > 0 && text[0] is '=' or '+' or '-' or '@' or '\t' or '\r' or '\0' && !double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out _) ? "'" + text : text;

    private static string Cell(string text) => $"\"{Safe(text).Replace("\"", "\"\"", StringComparison.Ordinal)}\"";

    private static string Number(double amount) => amount.ToString("0.###", CultureInfo.InvariantCulture);

    private static QuantityKind KindOf(OrderLine line) => line.Class switch
    {
        PartClass.Winding => QuantityKind.Length,
        PartClass.Capacitor or PartClass.Trimmer or PartClass.VariableCapacitor => QuantityKind.Capacitance,
        PartClass.Resistor or PartClass.Potentiometer => QuantityKind.Resistance,
        PartClass.MouldedChoke => QuantityKind.Inductance,
        PartClass.Crystal => QuantityKind.Frequency,
        PartClass.Hardware => QuantityKind.Current,
        PartClass.Diode => QuantityKind.Voltage,
        _ => QuantityKind.Number,
    };
}
