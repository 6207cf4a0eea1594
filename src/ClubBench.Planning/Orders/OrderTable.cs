using System.Globalization;
using ClubBench.Planning.Figures;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Orders;

/// <summary>One row of an order as a table: text cells are safe to open in a spreadsheet, quantities stay numbers.</summary>
/// <param name="Class">Sort of part in words.</param>
/// <param name="Type">Type.</param>
/// <param name="Value">Value with its unit; empty for cores and devices.</param>
/// <param name="Rating">Rated voltage with its unit; empty where none is asked.</param>
/// <param name="Needed">For all boards.</param>
/// <param name="Spare">Spares.</param>
/// <param name="InStock">From the drawers.</param>
/// <param name="ToBuy">To be bought.</param>
public sealed record OrderRow(string Class, string Type, string Value, string Rating, double Needed, double Spare, double InStock, double ToBuy);

/// <summary>An order as rows for CSV and spreadsheets.</summary>
public static class OrderTable
{
    /// <summary>Rows in the order's own sequence. A null culture is the current one.</summary>
    public static IReadOnlyList<OrderRow> Rows(PartsOrder order, CultureInfo? culture = null) =>
    [
        .. order.Lines.Select(l => new OrderRow(
            CellText.Safe(Phrases.Word(l.Class, culture)),
            CellText.Safe(l.Type),
            l.ValueSi is { } si ? CellText.Safe(QuantityText.Format(KindOf(l), si, culture: culture)) : "",
            l.RatedVoltageV is { } volt ? CellText.Safe(QuantityText.Format(QuantityKind.Voltage, volt, culture: culture)) : "",
            Rounded(l.Needed),
            Rounded(l.Spare),
            Rounded(l.InStock),
            Rounded(l.ToBuy))),
    ];

    private static QuantityKind KindOf(OrderLine line) => line.Class switch
    {
        PartClass.Winding => QuantityKind.Length,
        PartClass.Crystal => QuantityKind.Frequency,
        PartClass.Resistor or PartClass.Potentiometer => QuantityKind.Resistance,
        PartClass.MouldedChoke => QuantityKind.Inductance,
        _ => QuantityKind.Capacitance,
    };

    // Wire is told to the centimetre.
    private static double Rounded(double quantity) => Math.Round(quantity, 2);
}

/// <summary>Guards text that people may open in a spreadsheet.</summary>
public static class CellText
{
    /// <summary>
    /// The text with a leading apostrophe where a spreadsheet would take it for a formula (first character = + - @ tab CR NUL); a strict number such as -3.2 stays.
    /// </summary>
    public static string Safe(string text) =>
        text.Length > 0 && (text[0] is '=' or '+' or '-' or '@' or '\t' or '\r' or '\0') && !IsNumber(text) ? "'" + text : text;

    private static bool IsNumber(string text) =>
        double.TryParse(text, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out _) && !text.StartsWith('+');
}
