using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Planning.Figures;

/// <summary>Where a figure came from.</summary>
public enum Provenance
{
    /// <summary>Not known.</summary>
    Unknown,

    /// <summary>A standard or law.</summary>
    Standard,

    /// <summary>Printed by the kit's designer or a data sheet.</summary>
    Published,

    /// <summary>Measured by the club.</summary>
    Measured,

    /// <summary>Computed here.</summary>
    Derived,

    /// <summary>A typical value that a measurement should replace.</summary>
    Typical,

    /// <summary>Common practice of the trade.</summary>
    CommonPractice,

    /// <summary>Written down from memory: check.</summary>
    FromMemory,
}

/// <summary>A number with everything needed to show it: its name, what it measures, its uncertainty and how it came about.</summary>
/// <param name="Name">Stable short name, used by texts and tests ("range.low").</param>
/// <param name="Kind">What it measures.</param>
/// <param name="Si">Value in the SI base unit of the kind (dB and dBm for gains and levels).</param>
/// <param name="ExpandedUncertaintySi">Expanded uncertainty, k = 2 (GUM), same unit; null where none is known.</param>
/// <param name="From">Where it came from.</param>
/// <param name="Working">How it was computed; null for given figures.</param>
/// <param name="Digits">Significant digits worth showing; null for the kind's usual number.</param>
public sealed record Figure(
    string Name,
    QuantityKind Kind,
    double Si,
    double? ExpandedUncertaintySi = null,
    Provenance From = Provenance.Derived,
    Working? Working = null,
    int? Digits = null)
{
    /// <summary>A computed frequency.</summary>
    public static Figure Of(string name, Frequency value, Working? working = null) => new(name, QuantityKind.Frequency, value.Hertz, Working: working);

    /// <summary>A computed inductance.</summary>
    public static Figure Of(string name, Inductance value, Working? working = null) => new(name, QuantityKind.Inductance, value.Henry, Working: working);

    /// <summary>A computed capacitance.</summary>
    public static Figure Of(string name, Capacitance value, Working? working = null) => new(name, QuantityKind.Capacitance, value.Farad, Working: working);

    /// <summary>A computed resistance.</summary>
    public static Figure Of(string name, Resistance value, Working? working = null) => new(name, QuantityKind.Resistance, value.Ohm, Working: working);

    /// <summary>A computed power.</summary>
    public static Figure Of(string name, Power value, Working? working = null) => new(name, QuantityKind.Power, value.Watt, Working: working);

    /// <summary>A computed level.</summary>
    public static Figure Of(string name, PowerLevel value, Working? working = null) => new(name, QuantityKind.PowerLevel, value.Dbm, Working: working);

    /// <summary>A computed gain, loss or margin.</summary>
    public static Figure Of(string name, Decibels value, Working? working = null) => new(name, QuantityKind.Decibels, value.Db, Working: working);

    /// <summary>A computed length.</summary>
    public static Figure Of(string name, Length value, Working? working = null) => new(name, QuantityKind.Length, value.Metre, Working: working);

    /// <summary>A computed current.</summary>
    public static Figure Of(string name, Current value, Working? working = null) => new(name, QuantityKind.Current, value.Ampere, Working: working);

    /// <summary>A computed temperature.</summary>
    public static Figure Of(string name, Temperature value, Working? working = null) => new(name, QuantityKind.Temperature, value.Celsius, Working: working);

    /// <summary>A figure of another kind, value in SI.</summary>
    public static Figure Of(string name, QuantityKind kind, double si, Working? working = null) => new(name, kind, si, Working: working);

    /// <summary>A figure printed by the kit's designer or a data sheet.</summary>
    public static Figure Stated(string name, QuantityKind kind, double si) => new(name, kind, si, From: Provenance.Published);
}

/// <summary>How a figure came about. Codes and numbers only; <c>Text</c> renders the words.</summary>
/// <param name="MethodId">Key of the method's name and formula in the texts ("method.&lt;id&gt;").</param>
/// <param name="Inputs">The figures that went in, in the order of the formula.</param>
/// <param name="Source">Where the method comes from.</param>
public sealed record Working(string MethodId, IReadOnlyList<Figure> Inputs, SourceRef Source);
