using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Sweeps;

/// <summary>What is wrong with a line of a sweep file.</summary>
public enum TouchstoneFault
{
    /// <summary>No line holds data.</summary>
    NoRows,

    /// <summary>Neither the name of the file nor a keyword tells one or two ports.</summary>
    PortsUnknown,

    /// <summary>Data without an option line before it: its units are unknown.</summary>
    OptionLineMissing,

    /// <summary>A word of the option line is unknown.</summary>
    UnknownOption,

    /// <summary>A reference resistance is missing or not above zero.</summary>
    BadReference,

    /// <summary>Hybrid parameters need two ports.</summary>
    ParametersNeedTwoPorts,

    /// <summary>A version other than 2.0 and 2.1, or a keyword in a file without a version.</summary>
    UnknownVersion,

    /// <summary>A keyword is unknown.</summary>
    UnknownKeyword,

    /// <summary>The value of a keyword cannot be used.</summary>
    BadKeywordValue,

    /// <summary>A keyword that is needed is missing.</summary>
    KeywordMissing,

    /// <summary>Text where none belongs.</summary>
    UnexpectedText,

    /// <summary>A word is no finite number.</summary>
    NotANumber,

    /// <summary>Decimal points and decimal commas in one file.</summary>
    MixedDecimalSigns,

    /// <summary>Too many or too few numbers in a row.</summary>
    WrongNumberCount,

    /// <summary>A frequency is zero, below zero, or beyond measure.</summary>
    FrequencyNotAboveZero,

    /// <summary>A frequency is not above the one before.</summary>
    FrequencyNotIncreasing,

    /// <summary>The values are no network that can be measured.</summary>
    ImpossibleValues,

    /// <summary>The number of rows is not the one announced.</summary>
    WrongRowCount,
}

/// <summary>A fault with its place.</summary>
/// <param name="Line">Line of the file, from 1.</param>
/// <param name="Fault">What is wrong.</param>
/// <param name="Found">What stands there; may be empty.</param>
/// <param name="Expected">What was expected; may be empty.</param>
public sealed record TouchstoneIssue(int Line, TouchstoneFault Fault, string Found = "", string Expected = "");

/// <summary>What is to be said about a sweep that was read.</summary>
public enum TouchstoneRemark
{
    /// <summary>The file has decimal commas.</summary>
    DecimalCommas,

    /// <summary>S12 and S22 are zero throughout: not measured.</summary>
    ReverseNotMeasured,

    /// <summary>A block of noise figures was skipped.</summary>
    NoiseSkipped,

    /// <summary>More comes out than goes in: repeat the through calibration. Not for an amplifier.</summary>
    ShowsGain,
}

/// <summary>A sweep file as read.</summary>
/// <param name="Sweep">The sweep in the references of the file; null where the file has faults.</param>
/// <param name="Issues">Faults in the order of the lines, at most 100; empty where there is a sweep.</param>
/// <param name="Remarks">What is to be said with it.</param>
/// <param name="Gain">Most that comes out over what goes in; null without a sweep.</param>
public sealed record TouchstoneResult(Sweep? Sweep, IReadOnlyList<TouchstoneIssue> Issues, IReadOnlyList<TouchstoneRemark> Remarks, Decibels? Gain);
