using System.Globalization;
using ClubBench.Planning.Figures;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Orders;

/// <summary>One row of an order as people read it; quantities stay numbers.</summary>
/// <param name="Part">Sort of part in words.</param>
/// <param name="Type">Type.</param>
/// <param name="Value">Value with its unit; empty for cores and devices.</param>
/// <param name="Rating">Voltage it must stand, with its unit; empty where none is asked.</param>
/// <param name="Needed">For all boards.</param>
/// <param name="Spare">Spares.</param>
/// <param name="InStock">From the drawers.</param>
/// <param name="ToBuy">To be bought.</param>
public sealed record OrderRow(string Part, string Type, string Value, string Rating, double Needed, double Spare, double InStock, double ToBuy);

/// <summary>An order as rows: the same ones on the page, in CSV and in a spreadsheet.</summary>
public static class OrderTable
{
    /// <summary>Rows in the order's own sequence. A null culture is the current one.</summary>
    public static IReadOnlyList<OrderRow> Rows(PartsOrder order, CultureInfo? culture = null) =>
    [
        .. order.Lines.Select(l => new OrderRow(
            PartOf(l, culture),
            l.Type == PartsOrder.Wire ? Phrases.Say("order.wire.type", culture: culture) : l.Type,
            ValueOf(l, culture),
            l.RatedVoltageV is { } volt ? QuantityText.Format(QuantityKind.Voltage, volt, culture: culture) : "",
            Rounded(l.Needed),
            Rounded(l.Spare),
            Rounded(l.InStock),
            Rounded(l.ToBuy))),
    ];

    // What is bought for a winding is a core and wire.
    private static string PartOf(OrderLine line, CultureInfo? culture) =>
        line.Type == PartsOrder.Wire ? Phrases.Say("order.wire", culture: culture)
        : line.Class == PartClass.Winding ? Phrases.Say("order.core", culture: culture)
        : Phrases.Word(line.Class, culture);

    private static string ValueOf(OrderLine line, CultureInfo? culture) => line switch
    {
        { ValueSi: { } highest, LowestSi: { } lowest } => QuantityText.FormatSpan(KindOf(line), lowest, highest, culture: culture),
        { ValueSi: { } si } => QuantityText.Format(KindOf(line), si, culture: culture),
        _ => "",
    };

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
