using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Components;

/// <summary>
/// Reads and writes values in the letter-and-digit code (4n7, 0R47) and in engineering notation (4.7 nF, 0,47 ohm). Comma and point are both
/// decimal marks and the machine's culture plays no part. What is written can be read again. A bare number is never given a unit silently.
/// Source: iec-60062, letter and digit code; capital P, N, U and the R of chokes are common practice.
/// </summary>
public static partial class ValueNotation
{
    private const string Letter = "[A-Za-z]";

    /// <summary>Reads a value. Never throws for bad text: the answer carries the refusal.</summary>
    public static ParsedValue Parse(string text, PartKind kind)
    {
        var plain = Plain(text);
        if (plain.Length == 0) return new(kind, null, ValueRefusal.Empty);
        if (plain[0] == '-') return new(kind, null, ValueRefusal.Negative);
        if (plain.Count(c => c is '.' or ',') > 1) return new(kind, null, ValueRefusal.TwoDecimalMarks);
        if (NumberThenLetters().Match(plain) is { Success: true } number)
            return NumberThenUnit(number.Groups["number"].Value, number.Groups["letters"].Value, kind);
        return LetterAsMark().Match(plain) is { Success: true } code
            ? LetterCode(code, kind)
            : new(kind, null, ValueRefusal.NotANumber);
    }

    /// <summary>Writes a value of a kind (SI, above zero; zero for a link): three significant digits, the letter as decimal mark.</summary>
    public static string Format(double si, PartKind kind)
    {
        if (Guard.NotNegative(si, nameof(si)) == 0) return "0" + Prefixes.OneOf(kind);
        var (mantissa, exponent) = ThreeDigits(si);
        var prefix = Prefixes.For(exponent + 2, kind);
        var number = mantissa * Prefixes.PowerOfTen(exponent - prefix.Exponent);
        var digits = number.ToString("0.######", CultureInfo.InvariantCulture).Split('.');
        return digits[0] + prefix.Letter + (digits.Length > 1 ? digits[1] : "");
    }

    /// <summary>Writes a capacitance: 270p, 4n7.</summary>
    public static string Format(Capacitance capacitance) => Format(capacitance.Farad, PartKind.Capacitor);

    /// <summary>Writes a resistance: 47R, 4K7.</summary>
    public static string Format(Resistance resistance) => Format(resistance.Ohm, PartKind.Resistor);

    /// <summary>Writes an inductance: 675n, 5u64.</summary>
    public static string Format(Inductance inductance) => Format(inductance.Henry, PartKind.Inductor);

    // Rounded to three digits before the prefix is chosen, so that 999.9 p becomes 1n and not 1000p.
    internal static (int Mantissa, int Exponent) ThreeDigits(double si)
    {
        var exponent = (int)Math.Floor(Math.Log10(si)) - 2;
        var mantissa = (int)Math.Round(si / Math.Pow(10, exponent), MidpointRounding.AwayFromZero);
        return mantissa == 1000 ? (100, exponent + 1) : (mantissa, exponent);
    }

    private static ParsedValue NumberThenUnit(string number, string letters, PartKind kind)
    {
        var prefix = Prefixes.WithoutUnit(letters, kind);
        if (prefix.Length == 0)
            return letters.Length == 0 ? new(kind, null, ValueRefusal.NoUnit) : Value(number, 0, kind);
        if (prefix.Length > 1) return new(kind, null, ValueRefusal.TrailingCharacters);
        return Prefixes.Exponent(prefix[0], kind) is { } exponent
            ? Value(number, exponent, kind) with { WasReadAsMicrohenry = Prefixes.IsMicrohenryMark(prefix[0], kind) }
            : Wrong(prefix[0], kind);
    }

    private static ParsedValue LetterCode(Match code, PartKind kind)
    {
        var letter = code.Groups["letter"].Value[0];
        if (Prefixes.Exponent(letter, kind) is not { } exponent) return Wrong(letter, kind);
        if (Prefixes.WithoutUnit(code.Groups["rest"].Value, kind).Length > 0) return new(kind, null, ValueRefusal.TrailingCharacters);
        var number = "0" + code.Groups["whole"].Value + "." + code.Groups["fraction"].Value;
        return Value(number, exponent, kind) with { WasReadAsMicrohenry = Prefixes.IsMicrohenryMark(letter, kind) };
    }

    // The decimal text goes through one conversion, so that 4n7 is the double nearest to 4.7e-9.
    internal static ParsedValue Value(string number, int exponent, PartKind kind)
    {
        var parts = number.Replace(',', '.').Split('e', 'E');
        var shift = parts.Length > 1 ? int.Parse(parts[1], CultureInfo.InvariantCulture) : 0;
        var text = string.Create(CultureInfo.InvariantCulture, $"{parts[0]}E{exponent + shift}");
        var si = double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture);
        if (!double.IsFinite(si)) return new(kind, null, ValueRefusal.NotANumber);
        return si == 0 && kind != PartKind.Resistor ? new(kind, null, ValueRefusal.Zero) : new(kind, si, ValueRefusal.None);
    }

    private static ParsedValue Wrong(char letter, PartKind kind) => new(kind, null, ValueRefusal.WrongLetter) { Letter = letter };

    // Blanks of every kind go; the two micro signs become u, the two ohm signs become the word, the minus sign the hyphen.
    private static string Plain(string text)
    {
        var plain = new StringBuilder(text.Length);
        foreach (var c in text.Where(c => !char.IsWhiteSpace(c)))
            _ = c switch
            {
                '\u00B5' or '\u03BC' => plain.Append('u'),
                '\u2126' or '\u03A9' => plain.Append("ohm"),
                '\u2212' => plain.Append('-'),
                _ => plain.Append(c),
            };
        return plain.ToString();
    }

    [GeneratedRegex(@"^(?<number>([0-9]+([.,][0-9]*)?|[.,][0-9]+)([eE][+-]?[0-9]{1,3})?)(?<letters>" + Letter + "*)$", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex NumberThenLetters();

    [GeneratedRegex(@"^(?<whole>[0-9]*)(?<letter>" + Letter + @")(?<fraction>[0-9]+)(?<rest>" + Letter + "*)$", RegexOptions.ExplicitCapture, 1000)]
    private static partial Regex LetterAsMark();
}
