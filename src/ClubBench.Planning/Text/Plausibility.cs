using System.Globalization;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Text;

/// <summary>Looks for slips of the decimal point or the prefix in typed values.</summary>
public static class Plausibility
{
    private static readonly double[] Factors = [10, 0.1, 1000, 1e-3, 1e6, 1e-6];

    /// <summary>The value that was probably meant, when <paramref name="si"/> lies outside low to high and ten, a thousand or a million times more or less lies inside; else null.</summary>
    public static double? LikelySi(double si, double lowSi, double highSi)
    {
        if (si >= lowSi && si <= highSi) return null;
        return Factors.Select(f => (double?)(si * f)).FirstOrDefault(v => v >= lowSi && v <= highSi);
    }

    /// <summary>A warning that can be confirmed, or null where the value is plausible or no slip explains it.</summary>
    public static FieldMessage? Check(string path, QuantityKind kind, double si, double lowSi, double highSi, CultureInfo? culture = null) =>
        LikelySi(si, lowSi, highSi) is { } likely
            ? FieldMessage.Warning(path, "quantity.implausible", ("typed", QuantityText.Format(kind, si, culture: culture)), ("likely", QuantityText.Format(kind, likely, culture: culture)))
            : null;
}
