using System.Globalization;
using System.Text.RegularExpressions;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Components;

/// <summary>
/// What is printed on small parts: two figures and a number of zeros, counted in picofarad, ohm or microhenry (271 is 270 pF, 101 on a choke
/// is 100 uH), with a tolerance letter behind it. Only to be read where the reader knows that it is a marking.
/// Source: iec-60062, three-character code; chokes by common practice.
/// </summary>
public static partial class PartMarking
{
    /// <summary>Reads a marking such as 104, 104K, 4p7 or 1R0. Two figures alone ("47") are that many units.</summary>
    public static ParsedValue Parse(string text, PartKind kind)
    {
        var marking = text.Trim();
        if (marking.Length == 0) return new(kind, null, ValueRefusal.Empty);
        if (Digits().Match(marking) is { Success: true } code) return Code(code, kind);
        if (PicofaradMark().Match(marking) is { Success: true } mark && kind == PartKind.Capacitor)
            return ValueNotation.Value(mark.Groups["whole"].Value + "." + mark.Groups["fraction"].Value, -12, kind);
        return ValueNotation.Parse(marking, kind);
    }

    /// <summary>The marking of a capacitor above zero: 271 for 270 pF; below 10 pF the letter code (4p7), which has no third figure.</summary>
    public static string Of(Capacitance capacitance) =>
        Of(capacitance.Picofarad) ?? ValueNotation.Format(capacitance);

    /// <summary>The marking of a resistor: 472 for 4.7 kohm; below 10 ohm the letter code.</summary>
    public static string Of(Resistance resistance) =>
        Of(resistance.Ohm) ?? ValueNotation.Format(resistance);

    /// <summary>The marking of a moulded choke: 101 for 100 uH; below 10 uH with R as decimal mark.</summary>
    public static string Of(Inductance inductance) =>
        Of(inductance.Microhenry) ?? Math.Round(inductance.Microhenry, 2).ToString("0.0#", CultureInfo.InvariantCulture).Replace('.', 'R');

    private static string? Of(double units)
    {
        var (mantissa, exponent) = ValueNotation.ThreeDigits(units);
        var isTwoFigures = mantissa % 10 == 0;
        return exponent + 1 is >= 0 and <= 9 && isTwoFigures
            ? string.Create(CultureInfo.InvariantCulture, $"{mantissa / 10}{exponent + 1}")
            : null;
    }

    private static ParsedValue Code(Match code, PartKind kind)
    {
        var unit = kind switch { PartKind.Capacitor => -12, PartKind.Inductor => -6, _ => 0 };
        var zeros = code.Groups["zeros"].Value;
        var exponent = unit + (zeros.Length == 0 ? 0 : zeros[0] - '0');
        var letter = code.Groups["tolerance"].Value;
        return ValueNotation.Value(code.Groups["figures"].Value, exponent, kind) with { ToleranceLetter = letter.Length == 0 ? null : letter[0] };
    }

    [GeneratedRegex(@"^(?<figures>[0-9][0-9])(?<zeros>[0-9]?)(?<tolerance>[A-Z]?)$", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex Digits();

    [GeneratedRegex(@"^(?<whole>[0-9]*)R(?<fraction>[0-9]+)$", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex PicofaradMark();
}
