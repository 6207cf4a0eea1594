using System.Globalization;
using ClubBench.Planning.Advising;

namespace ClubBench.Planning.Text;

/// <summary>How an expected reading is written, on page, phone and card alike.</summary>
public static class ReadingText
{
    /// <summary>The value to expect; an expected nothing in the unit of the window. A null culture is the current one.</summary>
    public static string Expected(ExpectedReading reading, CultureInfo? culture = null) => reading.Nominal == 0
        ? new QuantityParts("0", Unit(reading)).ToString()
        : QuantityText.Format(reading.Kind, reading.Nominal, reading.Digits, culture);

    /// <summary>The ends of the window that count: both, or the one that must not be passed. A null culture is the current one.</summary>
    public static string Window(ExpectedReading reading, CultureInfo? culture = null) => reading.Sides switch
    {
        WindowSides.AtLeast => QuantityText.Format(reading.Kind, reading.LowSi, reading.Digits, culture),
        WindowSides.AtMost => QuantityText.Format(reading.Kind, reading.HighSi, reading.Digits, culture),
        _ => QuantityText.FormatSpan(reading.Kind, reading.LowSi, reading.HighSi, reading.Digits, culture),
    };

    /// <summary>Unit to write beside one's own reading: that of the window's far end, which suits an expected nothing too.</summary>
    public static string Unit(ExpectedReading reading) => QuantityText.Split(
        reading.Kind, reading.Sides == WindowSides.AtLeast ? reading.Nominal : Math.Max(Math.Abs(reading.Nominal), Math.Abs(reading.HighSi))).Unit;
}
