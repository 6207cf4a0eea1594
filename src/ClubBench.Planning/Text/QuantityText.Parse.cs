using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;
using ClubBench.Calculation.Components;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Text;

/// <summary>A quantity that was typed.</summary>
/// <param name="Si">Value in SI units.</param>
/// <param name="Echo">What was understood, with its unit, to be shown before saving.</param>
/// <param name="Typed">What was typed, to be kept beside the value.</param>
public sealed record ParsedQuantity(double Si, string Echo, string Typed);

public static partial class QuantityText
{
    private const int LongestText = 40;
    private const string Femtofarad = "fF";
    private const string Zero = "quantity.zero";

    /// <summary>
    /// Reads a quantity. Point and comma are both decimal marks whatever the culture, and never thousands marks; blanks, U+2212, units, prefixes and
    /// letters as marks (2n2, 4k7, 3V3) are understood. Never throws for bad text: one message with code "quantity.*" says what is wrong.
    /// </summary>
    /// <param name="text">What was typed.</param>
    /// <param name="kind">What it measures.</param>
    /// <param name="defaultUnit">Unit of a bare number; null where the unit must be typed (counts and pure numbers have none).</param>
    /// <param name="mayBeNegative">Whether zero and a minus sign are taken where a part of this kind has none, such as in the offset of a meter.</param>
    /// <param name="path">Field path for the message.</param>
    /// <param name="culture">Culture of the echo.</param>
    public static Outcome<ParsedQuantity> Parse(
        string? text, QuantityKind kind, string? defaultUnit = null, bool mayBeNegative = false, string path = "", CultureInfo? culture = null)
    {
        var plain = Plain(text ?? "");
        var isNegative = plain.StartsWith('-');
        var unsigned = plain.TrimStart('-', '+');
        if (Refusal(plain, unsigned) is { } refused) return Fail(refused);
        if (isNegative && !mayBeNegative && !HasSign(kind)) return Fail("quantity.negative");
        var (si, code) = PartOf(kind) is { } part && !IsFemtofarad(unsigned, defaultUnit) ? PartValue(unsigned, part, defaultUnit) : Value(unsigned, kind, defaultUnit);
        if (code is not null && !(code == Zero && mayBeNegative)) return Fail(code);
        if (kind == QuantityKind.Count && si != Math.Truncate(si)) return Fail("quantity.not-whole");
        var signed = isNegative ? -si : si;
        return Outcome<ParsedQuantity>.Success(new(signed, Echo(kind, signed, culture), text!));

        Outcome<ParsedQuantity> Fail(string why) => Outcome<ParsedQuantity>.Failure(
            FieldMessage.Error(path, why, ("typed", Shortened(text)), ("units", string.Join(", ", QuantityUnits.Of(kind).Select(u => u.Symbol)))));
    }

    /// <summary>Text without blanks, in plain letters: u for micro, ohm, deg, hyphen for minus, 2 for squared.</summary>
    internal static string Plain(string text)
    {
        var plain = new StringBuilder(text.Length);
        foreach (var c in text.Where(c => !char.IsWhiteSpace(c)))
            _ = c switch
            {
                '\u00B5' or '\u03BC' => plain.Append('u'),
                '\u03A9' or '\u2126' => plain.Append("ohm"),
                '\u2212' or '\u2013' => plain.Append('-'),
                '\u00B0' => plain.Append("deg"),
                '\u00B2' => plain.Append('2'),
                _ => plain.Append(c),
            };
        return plain.ToString();
    }

    // No part is marked in femtofarad, crystals are told in it.
    private static bool IsFemtofarad(string text, string? defaultUnit) =>
        text.EndsWith(Femtofarad, StringComparison.OrdinalIgnoreCase) || (defaultUnit == Femtofarad && !text.Any(c => char.IsAsciiLetter(c) && c is not ('e' or 'E')));

    private static string? Refusal(string plain, string unsigned) => plain switch
    {
        "" => "quantity.empty",
        { Length: > LongestText } => "quantity.too-long",
        _ when unsigned.Length < plain.Length - 1 || unsigned.Any(c => !char.IsAscii(c)) => "quantity.not-a-number",
        _ when plain.Count(c => c is '.' or ',') > 1 => "quantity.two-marks",
        _ => null,
    };

    private static (double Si, string? Code) PartValue(string text, PartKind kind, string? defaultUnit)
    {
        var parsed = ValueNotation.Parse(text, kind);
        if (parsed.Refusal == ValueRefusal.NoUnit && defaultUnit is not null) parsed = ValueNotation.Parse(text + Plain(defaultUnit), kind);
        return (parsed.Si ?? 0, parsed.Refusal switch
        {
            ValueRefusal.None => null,
            ValueRefusal.NoUnit => "quantity.no-unit",
            ValueRefusal.WrongLetter or ValueRefusal.TrailingCharacters => "quantity.unit-unknown",
            ValueRefusal.Zero => Zero,
            ValueRefusal.Negative => "quantity.negative",
            _ => "quantity.not-a-number",
        });
    }

    private static (double Si, string? Code) Value(string text, QuantityKind kind, string? defaultUnit)
    {
        if (UnitAsMark().Match(text) is { Success: true } code)
            return Scaled($"0{code.Groups["whole"]}.{code.Groups["fraction"]}", QuantityUnits.Find(kind, code.Groups["letter"].Value + code.Groups["rest"].Value));
        if (NumberThenUnit().Match(text) is not { Success: true } match) return (0, "quantity.not-a-number");
        var unit = match.Groups["unit"].Value;
        if (unit.Length > 0) return Scaled(match.Groups["number"].Value, QuantityUnits.Find(kind, unit));
        if (NeedsNoUnit(kind)) return Scaled(match.Groups["number"].Value, QuantityUnits.Of(kind)[0]);
        return defaultUnit is null ? (0, "quantity.no-unit") : Scaled(match.Groups["number"].Value, QuantityUnits.Find(kind, Plain(defaultUnit)));
    }

    // One conversion from the decimal text, so that 14.06 MHz is the double nearest to 14.06e6.
    private static (double Si, string? Code) Scaled(string number, QuantityUnit? unit)
    {
        if (unit is null) return (0, "quantity.unit-unknown");
        var parts = number.Replace(',', '.').Split('e', 'E');
        var exponent = unit.Exponent + (parts.Length > 1 ? int.Parse(parts[1], CultureInfo.InvariantCulture) : 0);
        var si = unit.Times * double.Parse($"{parts[0]}E{exponent.ToString(CultureInfo.InvariantCulture)}", NumberStyles.Float, CultureInfo.InvariantCulture);
        return double.IsFinite(si) ? (si, null) : (0, "quantity.not-a-number");
    }

    private static string Echo(QuantityKind kind, double si, CultureInfo? culture)
    {
        var style = NumberStyle.Of(kind, si, 9, keepsZeros: false) with { LeastDecimals = 0 };
        return Parts(kind, NumberStyle.Significant(si, 9), style, culture).ToString();
    }

    private static PartKind? PartOf(QuantityKind kind) => kind switch
    {
        QuantityKind.Capacitance => PartKind.Capacitor,
        QuantityKind.Inductance => PartKind.Inductor,
        QuantityKind.Resistance => PartKind.Resistor,
        _ => null,
    };

    private static bool NeedsNoUnit(QuantityKind kind) => kind is QuantityKind.Number or QuantityKind.Count;

    private static bool HasSign(QuantityKind kind) => kind is QuantityKind.Number or QuantityKind.FrequencyShift or QuantityKind.PowerLevel
        or QuantityKind.Decibels or QuantityKind.RelativeLevel or QuantityKind.Temperature or QuantityKind.TemperatureRise or QuantityKind.Angle;

    private static string Shortened(string? text) => text is { Length: > LongestText } ? text[..LongestText] + "…" : text ?? "";

    [GeneratedRegex("^(?<number>([0-9]+([.,][0-9]*)?|[.,][0-9]+)([eE][+-]?[0-9]{1,3})?)(?<unit>([A-Za-z%][A-Za-z0-9/-]*)?)$", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex NumberThenUnit();

    [GeneratedRegex("^(?<whole>[0-9]*)(?<letter>[A-DF-Za-df-z])(?<fraction>[0-9]+)(?<rest>[A-Za-z]*)$", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex UnitAsMark();
}
