using System.Globalization;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Text;

/// <summary>How many digits a number gets.</summary>
/// <param name="Digits">Significant digits at most; whole digits are never replaced by zeros.</param>
/// <param name="LeastDecimals">Decimals that stay even where they are zero.</param>
/// <param name="MostDecimals">Decimals at most.</param>
/// <param name="KeepsZeros">Whether idle zeros stay: they tell how well the value is known.</param>
/// <param name="ShowsPlus">Whether a positive value gets a sign.</param>
internal readonly record struct NumberStyle(int Digits, int LeastDecimals, int MostDecimals, bool KeepsZeros, bool ShowsPlus)
{
    private const int Many = 12;

    /// <summary>The style of a kind. Frequencies from 100 kHz get five digits and in MHz three decimals; levels and gains one decimal.</summary>
    public static NumberStyle Of(QuantityKind kind, double si, int? digits, bool keepsZeros) => kind switch
    {
        QuantityKind.Frequency => new(digits ?? (Math.Abs(si) >= 1e5 ? 5 : 3), Math.Abs(si) >= 1e6 ? 3 : 0, Many, keepsZeros, false),
        QuantityKind.FrequencyShift => new(digits ?? 3, 0, Many, keepsZeros && Math.Abs(si) >= 1e3, true),
        QuantityKind.Decibels or QuantityKind.PowerLevel or QuantityKind.RelativeLevel => new(digits ?? 4, 0, digits is null ? 1 : Many, keepsZeros, false),
        QuantityKind.Ratio or QuantityKind.Temperature or QuantityKind.TemperatureRise => new(digits ?? 2, 0, Many, keepsZeros, false),
        QuantityKind.Angle => new(digits ?? 3, 0, 1, keepsZeros, false),
        QuantityKind.Count => new(digits ?? Many, 0, digits is null ? 0 : Many, false, false),
        _ => new(digits ?? 3, 0, Many, keepsZeros, false),
    };

    /// <summary>Rounds to significant digits, half away from zero on the decimal value.</summary>
    public static double Significant(double value, int digits) =>
        value == 0 ? 0 : double.Parse(value.ToString($"E{digits - 1}", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);

    /// <summary>The number of a value in a unit.</summary>
    public string Write(double si, QuantityUnit unit, CultureInfo culture)
    {
        var value = Math.Abs(si) / unit.Si;
        var rounded = Significant(value, Math.Max(Digits, WholeDigits(value)));
        var decimals = rounded == 0 ? 0 : Math.Clamp(Digits - WholeDigits(rounded), 0, MostDecimals);
        var text = rounded.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), culture);
        if (!KeepsZeros && Math.Abs(Math.Round(rounded, decimals) - value) <= 1e-9 * value) text = WithoutIdleZeros(text, Math.Min(LeastDecimals, decimals), culture);
        return Sign(si, text) + text;
    }

    private string Sign(double si, string text) =>
        text.All(c => c is not (>= '1' and <= '9')) ? "" : si < 0 ? "\u2212" : ShowsPlus ? "+" : "";

    // Whole digits of 0.05 count as minus one, so that decimals follow the first digit that is not zero.
    private static int WholeDigits(double value) => value == 0 ? 1 : (int)Math.Floor(Math.Log10(value)) + 1;

    private static string WithoutIdleZeros(string text, int least, CultureInfo culture)
    {
        var mark = text.IndexOf(culture.NumberFormat.NumberDecimalSeparator, StringComparison.Ordinal);
        if (mark < 0) return text;
        var keep = mark + 1 + least;
        var end = text.Length;
        while (end > keep && text[end - 1] == '0') end--;
        return end == mark + 1 ? text[..mark] : text[..end];
    }
}
