using System.Collections.Immutable;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Devices;

/// <summary>Family of a transistor.</summary>
public enum TransistorKind
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>Bipolar junction transistor.</summary>
    Bipolar,

    /// <summary>Insulated-gate field-effect transistor.</summary>
    Mosfet,

    /// <summary>Junction field-effect transistor.</summary>
    Jfet,
}

/// <summary>Type of carriers of a transistor.</summary>
public enum TransistorPolarity
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>NPN.</summary>
    Npn,

    /// <summary>PNP.</summary>
    Pnp,

    /// <summary>N channel, off at zero gate voltage.</summary>
    NChannelEnhancement,

    /// <summary>N channel, on at zero gate voltage.</summary>
    NChannelDepletion,
}

/// <summary>A capacitance of a data sheet with what kind of figure it is, such as "Cobo max".</summary>
/// <param name="Value">Capacitance.</param>
/// <param name="Kind">Symbol and column of the data sheet.</param>
public sealed record SheetCapacitance(Capacitance Value, string Kind);

/// <summary>Ratings and typical figures of one transistor type; null means the sheet does not state it. Immutable.</summary>
/// <param name="Type">Type number.</param>
/// <param name="Kind">Family.</param>
/// <param name="Polarity">Carriers.</param>
/// <param name="VoltageMax">Collector-emitter voltage with the base open, or drain-source voltage.</param>
/// <param name="CurrentMax">Collector or drain current.</param>
/// <param name="Dissipation">Rated dissipation.</param>
/// <param name="DissipationCondition">Temperature it is rated at, as printed.</param>
/// <param name="TransitionFrequencyMin">Least transition frequency.</param>
/// <param name="TransitionFrequencyTypical">Typical transition frequency.</param>
/// <param name="TransitionFrequencyCondition">Current and voltage it is stated at, as printed.</param>
/// <param name="CurrentGainMin">Least direct current gain.</param>
/// <param name="CurrentGainMax">Largest direct current gain.</param>
/// <param name="OutputCapacitance">Output capacitance.</param>
/// <param name="FeedbackCapacitance">Capacitance from output to input.</param>
/// <param name="InputCapacitance">Input capacitance.</param>
/// <param name="GateCharge">Largest total gate charge in coulomb.</param>
/// <param name="JunctionToCase">Thermal resistance junction to case.</param>
/// <param name="JunctionToAmbient">Thermal resistance junction to ambient without a heat sink.</param>
/// <param name="JunctionMax">Highest junction temperature.</param>
/// <param name="Package">Package.</param>
/// <param name="FieldsFromMemory">Columns of <c>transistors.csv</c> that were not read from a sheet; never use them for a pass verdict.</param>
/// <param name="Source">Origin; a row from memory is shown with a warning and never used for a pass verdict.</param>
/// <param name="Note">What to watch.</param>
public sealed record Transistor(
    string Type,
    TransistorKind Kind,
    TransistorPolarity Polarity,
    Voltage? VoltageMax,
    Current? CurrentMax,
    Power? Dissipation,
    string DissipationCondition,
    Frequency? TransitionFrequencyMin,
    Frequency? TransitionFrequencyTypical,
    string TransitionFrequencyCondition,
    double? CurrentGainMin,
    double? CurrentGainMax,
    SheetCapacitance? OutputCapacitance,
    SheetCapacitance? FeedbackCapacitance,
    SheetCapacitance? InputCapacitance,
    double? GateCharge,
    ThermalResistance? JunctionToCase,
    ThermalResistance? JunctionToAmbient,
    Temperature? JunctionMax,
    string Package,
    ImmutableArray<string> FieldsFromMemory,
    SourceRef Source,
    string Note)
{
    /// <summary>Transition frequency a verdict may rest on: the least one, else half the typical one; null where neither is stated.</summary>
    public Frequency? TransitionFrequencyForVerdict =>
        TransitionFrequencyMin ?? (TransitionFrequencyTypical is { } typical ? typical / 2 : null);

    /// <summary>Whether a named column of this row, or the whole row, was written down from memory.</summary>
    public bool IsFromMemory(string field) =>
        Source.Status == SourceStatus.FromMemory || FieldsFromMemory.Contains(field, StringComparer.Ordinal);
}
