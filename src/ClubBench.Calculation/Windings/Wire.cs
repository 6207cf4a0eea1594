using System.Globalization;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Windings;

/// <summary>How a wire size is named. The same number means different wire in two systems.</summary>
public enum WireSystem
{
    /// <summary>Bare diameter in millimetre.</summary>
    Metric,

    /// <summary>American wire gauge.</summary>
    Awg,

    /// <summary>British standard wire gauge.</summary>
    Swg,
}

/// <summary>Thickness of the enamel.</summary>
public enum EnamelGrade
{
    /// <summary>Single build.</summary>
    Grade1 = 1,

    /// <summary>Double build: the safe assumption where a reel does not say.</summary>
    Grade2,
}

/// <summary>An enamelled round copper wire: bare diameter for resistance, overall diameter for what fits through a ring. Immutable.</summary>
/// <param name="System">How the size is named.</param>
/// <param name="Size">Name of the size: "0.400" or "26".</param>
/// <param name="Bare">Diameter of the copper.</param>
/// <param name="Source">Source of the bare diameter.</param>
public sealed record Wire(WireSystem System, string Size, Length Bare, SourceRef Source)
{
    // Two-term fits to the metric table, millimetre in and out. Valid: 0.1 to 1.0 mm bare, within 0.004 mm (0.005 mm for gauges).
    private static readonly (double Factor, double Exponent)[] EnamelFit = [(0.0642, 0.571), (0.0975, 0.572)];

    /// <summary>Largest overall diameter listed for grade 1; null where the table states none.</summary>
    public Length? ListedGrade1 { get; init; }

    /// <summary>Largest overall diameter listed for grade 2; null where the table states none.</summary>
    public Length? ListedGrade2 { get; init; }

    /// <summary>Largest overall diameter with enamel of grade 2, listed or by the fit.</summary>
    public Length Overall => OverallOf(EnamelGrade.Grade2);

    /// <summary>
    /// Largest overall diameter with enamel: the listed value, else a power-law fit to the metric list.
    /// Valid: fit 0.1 to 1.0 mm bare within 0.005 mm; thicker and thinner wire is an estimate. Source: iec-60317-0-1, from memory.
    /// </summary>
    public Length OverallOf(EnamelGrade grade) => (grade == EnamelGrade.Grade1 ? ListedGrade1 : ListedGrade2) ?? Fit(Bare, grade);

    /// <summary>A metric wire of any bare diameter, from the list where it is a listed size.</summary>
    public static Wire Millimetre(double bareMillimetre) =>
        Wires.FindMetric(bareMillimetre) ?? new(
            WireSystem.Metric,
            bareMillimetre.ToString("0.000", CultureInfo.InvariantCulture),
            Length.FromMillimetre(Guard.Positive(bareMillimetre, nameof(bareMillimetre))),
            SourceRef.Derived("diameter as entered"));

    /// <summary>Bare diameter of an American gauge, 0 to 40: 0.127 mm times 92^((36 - n)/39). Source: astm-b258.</summary>
    public static Length AwgBare(int gauge) =>
        Length.FromMillimetre(0.127 * Math.Pow(92, (36 - Guard.Within(gauge, 0, 40, nameof(gauge))) / 39.0));

    private static Length Fit(Length bare, EnamelGrade grade)
    {
        var (factor, exponent) = EnamelFit[(int)grade - 1];
        return Length.FromMillimetre(bare.Millimetre + (factor * Math.Pow(bare.Millimetre, exponent)));
    }
}
