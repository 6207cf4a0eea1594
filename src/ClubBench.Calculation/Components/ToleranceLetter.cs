using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Components;

/// <summary>Limits of a part around its nominal value, relative (-0.2 = 20 % below).</summary>
/// <param name="Below">Lower limit, zero or negative.</param>
/// <param name="Above">Upper limit, zero or positive.</param>
public readonly record struct RelativeLimits(double Below, double Above)
{
    /// <summary>The larger of both sides.</summary>
    public double Widest => Math.Max(-Below, Above);
}

/// <summary>Tolerance letters. Source: iec-60062, tolerance letters; H, N, E, L, P, W and the lopsided ones from memory.</summary>
public static class ToleranceLetter
{
    private static readonly Dictionary<char, double> Percent = new()
    {
        ['E'] = 0.005, ['L'] = 0.01, ['P'] = 0.02, ['W'] = 0.05, ['B'] = 0.1, ['C'] = 0.25, ['D'] = 0.5,
        ['F'] = 1, ['G'] = 2, ['H'] = 3, ['J'] = 5, ['K'] = 10, ['M'] = 20, ['N'] = 30,
    };

    private static readonly Dictionary<char, (double Below, double Above)> LopsidedPercent = new()
    {
        ['Q'] = (-10, 30), ['T'] = (-10, 50), ['S'] = (-20, 50), ['Z'] = (-20, 80),
    };

    // Below 10 pF these letters count picofarad, not per cent.
    private static readonly Dictionary<char, double> SmallCapacitorPicofarad = new()
    {
        ['B'] = 0.1, ['C'] = 0.25, ['D'] = 0.5, ['F'] = 1, ['G'] = 2,
    };

    /// <summary>Limits of a letter for a part that is not a small capacitor, or null for a letter without a meaning.</summary>
    public static RelativeLimits? Read(char letter)
    {
        if (LopsidedPercent.TryGetValue(letter, out var sides)) return new(sides.Below / 100, sides.Above / 100);
        return Percent.TryGetValue(letter, out var percent) ? new(-percent / 100, percent / 100) : null;
    }

    /// <summary>Limits of a letter on a capacitor above zero: below 10 pF the letters B to G mean picofarad.</summary>
    public static RelativeLimits? Read(char letter, Capacitance value)
    {
        Guard.Positive(value.Farad, nameof(value));
        if (value.Picofarad >= 10 - 1e-9 || !SmallCapacitorPicofarad.TryGetValue(letter, out var picofarad)) return Read(letter);
        return new(-picofarad / value.Picofarad, picofarad / value.Picofarad);
    }
}
