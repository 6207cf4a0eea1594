using System.Globalization;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Text;

/// <summary>A number and its unit, ready to be shown apart.</summary>
/// <param name="Number">The number with the culture's decimal mark and a true minus sign.</param>
/// <param name="Unit">The unit; empty for counts and pure numbers.</param>
public readonly record struct QuantityParts(string Number, string Unit)
{
    /// <summary>Number and unit with a space that does not break between them; the degree of arc stands close.</summary>
    public override string ToString() => Unit.Length == 0 ? Number : Unit == "°" ? Number + Unit : $"{Number}\u00A0{Unit}";
}

/// <summary>Writes and reads quantities as people of the trade do. Nobody else writes a unit or reads a number with one.</summary>
/// <remarks>A null culture is the current one; it decides the decimal mark of what is written, never what can be read.</remarks>
public static partial class QuantityText
{
    private const int MostTypedDigits = 9;

    private const string Minus = "\u2212";

    /// <summary>Writes a figure: its own digits, or the usual number of its kind. Given figures lose idle zeros, computed and measured ones keep them.</summary>
    public static string Format(Figure figure, CultureInfo? culture = null) => Split(figure, culture).ToString();

    /// <summary>Writes a value in the unit people use. Throws for a value that is not finite.</summary>
    /// <param name="kind">What it measures.</param>
    /// <param name="si">Value in SI units.</param>
    /// <param name="digits">Significant digits; null for the kind's usual number without idle zeros.</param>
    /// <param name="culture">Decides the decimal mark.</param>
    public static string Format(QuantityKind kind, double si, int? digits = null, CultureInfo? culture = null) =>
        Split(kind, si, digits, culture).ToString();

    /// <summary>A figure as number and unit.</summary>
    public static QuantityParts Split(Figure figure, CultureInfo? culture = null) =>
        Parts(figure.Kind, figure.Si, NumberStyle.Of(figure.Kind, figure.Si, figure.Digits, figure.Digits is not null || IsComputed(figure)), culture);

    /// <summary>A value as number and unit.</summary>
    public static QuantityParts Split(QuantityKind kind, double si, int? digits = null, CultureInfo? culture = null) =>
        Parts(kind, si, NumberStyle.Of(kind, si, digits, digits is not null), culture);

    /// <summary>A value as one would type it: nine digits at most, no idle zeros.</summary>
    public static QuantityParts Entry(QuantityKind kind, double si, CultureInfo? culture = null) =>
        Parts(kind, si, NumberStyle.Of(kind, si, MostTypedDigits, keepsZeros: false), culture);

    /// <summary>Writes a figure with its expanded uncertainty (k = 2), "0.714 ± 0.020 µH"; without one as usual.</summary>
    public static string FormatUncertain(Figure figure, CultureInfo? culture = null)
    {
        if (figure.ExpandedUncertaintySi is not { } u || u <= 0) return Format(figure, culture);
        var unit = QuantityUnits.For(figure.Kind, figure.Si);
        var decimals = Math.Clamp(1 - (int)Math.Floor(Math.Log10(u / unit.Si)), 0, 6);
        var format = "F" + decimals.ToString(CultureInfo.InvariantCulture);
        var sign = figure.Si < 0 ? Minus : "";
        var to = culture ?? CultureInfo.CurrentCulture;
        return new QuantityParts($"{sign}{(Math.Abs(figure.Si) / unit.Si).ToString(format, to)} ± {(u / unit.Si).ToString(format, to)}", unit.Symbol).ToString();
    }

    /// <summary>Writes a span in one unit: "10.111–10.124 MHz"; where a sign may stand, "−43…−38 dBc".</summary>
    public static string FormatSpan(QuantityKind kind, double lowSi, double highSi, int? digits = null, CultureInfo? culture = null)
    {
        var unit = QuantityUnits.For(kind, Math.Max(Math.Abs(lowSi), Math.Abs(highSi)));
        var low = NumberStyle.Of(kind, lowSi, digits, digits is not null).Write(lowSi, unit, culture ?? CultureInfo.CurrentCulture);
        var high = NumberStyle.Of(kind, highSi, digits, digits is not null).Write(highSi, unit, culture ?? CultureInfo.CurrentCulture);
        return new QuantityParts(low + (lowSi < 0 || highSi < 0 || kind == QuantityKind.FrequencyShift ? "…" : "–") + high, unit.Symbol).ToString();
    }

    /// <summary>Writes a run of frequencies.</summary>
    public static string Format(FrequencyRange range, int? digits = null, CultureInfo? culture = null) =>
        range.WidthHertz == 0
            ? Format(QuantityKind.Frequency, range.Low.Hertz, digits, culture)
            : FormatSpan(QuantityKind.Frequency, range.Low.Hertz, range.High.Hertz, digits, culture);

    private static bool IsComputed(Figure figure) => figure.From is Provenance.Derived or Provenance.Measured;

    private static QuantityParts Parts(QuantityKind kind, double si, NumberStyle style, CultureInfo? culture)
    {
        if (!double.IsFinite(si)) throw new ArgumentOutOfRangeException(nameof(si), si, "Only finite values can be written.");
        var unit = QuantityUnits.For(kind, NumberStyle.Significant(si, style.Digits));
        return new QuantityParts(style.Write(si, unit, culture ?? CultureInfo.CurrentCulture), unit.Symbol);
    }
}
