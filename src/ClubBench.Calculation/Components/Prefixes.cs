namespace ClubBench.Calculation.Components;

/// <summary>Letters that stand for a power of ten, by kind of part.</summary>
internal static class Prefixes
{
    private static readonly (char Letter, int Exponent)[] Capacitor = [('p', -12), ('n', -9), ('u', -6), ('m', -3)];
    private static readonly (char Letter, int Exponent)[] Resistor = [('R', 0), ('K', 3), ('M', 6), ('G', 9)];
    private static readonly (char Letter, int Exponent)[] Inductor = [('n', -9), ('u', -6), ('m', -3)];

    /// <summary>Power of ten of a letter, or null where the letter is not used for this kind. Case of m and M is kept apart.</summary>
    public static int? Exponent(char letter, PartKind kind) => (kind, letter) switch
    {
        (PartKind.Resistor, 'R') => 0,
        (PartKind.Resistor, 'K' or 'k') => 3,
        (PartKind.Resistor, 'M') => 6,
        (PartKind.Resistor, 'G') => 9,
        (PartKind.Resistor, 'm' or 'L') => -3,
        (PartKind.Resistor, _) => null,
        (PartKind.Capacitor, 'F') => 0,
        (PartKind.Inductor, 'H') => 0,
        (PartKind.Inductor, 'R') => -6,
        (_, 'p' or 'P') => -12,
        (_, 'n' or 'N') => -9,
        (_, 'u' or 'U') => -6,
        (_, 'm') => -3,
        _ => null,
    };

    /// <summary>Whether this letter is the decimal mark of a choke marking.</summary>
    public static bool IsMicrohenryMark(char letter, PartKind kind) => kind == PartKind.Inductor && letter == 'R';

    /// <summary>The letters without a closing unit (F, H, ohm).</summary>
    public static string WithoutUnit(string letters, PartKind kind)
    {
        var unit = kind switch { PartKind.Capacitor => "F", PartKind.Inductor => "H", _ => "ohm" };
        return letters.EndsWith(unit, StringComparison.OrdinalIgnoreCase) ? letters[..^unit.Length] : letters;
    }

    /// <summary>The letter of one, for writing zero.</summary>
    public static char OneOf(PartKind kind) => Written(kind)[0].Letter;

    /// <summary>The letter to write a number whose leading digit stands at this power of ten, held to the letters of the kind.</summary>
    public static (char Letter, int Exponent) For(int leading, PartKind kind)
    {
        var letters = Written(kind);
        return letters.LastOrDefault(p => p.Exponent <= leading, letters[0]);
    }

    /// <summary>A power of ten as an exact decimal.</summary>
    public static decimal PowerOfTen(int exponent)
    {
        var result = 1m;
        for (var i = 0; i < Math.Abs(exponent); i++) result = exponent > 0 ? result * 10 : result / 10;
        return result;
    }

    private static (char Letter, int Exponent)[] Written(PartKind kind) => kind switch
    {
        PartKind.Capacitor => Capacitor,
        PartKind.Inductor => Inductor,
        _ => Resistor,
    };
}
