using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Components;

/// <summary>Kind of part a value belongs to; it decides which letters are understood.</summary>
public enum PartKind
{
    /// <summary>Value in farad.</summary>
    Capacitor,

    /// <summary>Value in ohm.</summary>
    Resistor,

    /// <summary>Value in henry.</summary>
    Inductor,
}

/// <summary>Why a written value was not understood. Stable codes; wording is made elsewhere.</summary>
public enum ValueRefusal
{
    /// <summary>It was understood.</summary>
    None,

    /// <summary>Nothing was written.</summary>
    Empty,

    /// <summary>No number is to be found at the start.</summary>
    NotANumber,

    /// <summary>A bare number: 47 what?</summary>
    NoUnit,

    /// <summary>Comma and point together, or one of them twice.</summary>
    TwoDecimalMarks,

    /// <summary>A letter that is not used for this kind of part, such as K or M on a capacitor.</summary>
    WrongLetter,

    /// <summary>Something follows the complete value.</summary>
    TrailingCharacters,

    /// <summary>A minus sign.</summary>
    Negative,

    /// <summary>Zero, where a part needs a value (a zero-ohm link is a part).</summary>
    Zero,
}

/// <summary>A value read from text, or the reason why not. Immutable.</summary>
/// <param name="Kind">Kind of part.</param>
/// <param name="Si">Value in farad, ohm or henry; null where refused.</param>
/// <param name="Refusal">The reason; None where understood.</param>
public sealed record ParsedValue(PartKind Kind, double? Si, ValueRefusal Refusal)
{
    /// <summary>An R on a coil was read as the decimal mark in microhenry: say so to the reader.</summary>
    public bool WasReadAsMicrohenry { get; init; }

    /// <summary>The letter that was refused; null where none was.</summary>
    public char? Letter { get; init; }

    /// <summary>Tolerance letter after a complete marking; null where there was none.</summary>
    public char? ToleranceLetter { get; init; }

    /// <summary>Whether a value was read.</summary>
    public bool IsUnderstood => Refusal == ValueRefusal.None;

    /// <summary>The value as a capacitance. Throws where refused or of another kind.</summary>
    public Capacitance ToCapacitance() => Capacitance.FromFarad(Value(PartKind.Capacitor));

    /// <summary>The value as a resistance. Throws where refused or of another kind.</summary>
    public Resistance ToResistance() => Resistance.FromOhm(Value(PartKind.Resistor));

    /// <summary>The value as an inductance. Throws where refused or of another kind.</summary>
    public Inductance ToInductance() => Inductance.FromHenry(Value(PartKind.Inductor));

    private double Value(PartKind wanted) =>
        Kind == wanted && Si is { } si ? si : throw new InvalidOperationException($"No {wanted} value: {Kind}, {Refusal}.");
}
