using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Advising;

/// <summary>What ClubBench thinks of a reading.</summary>
public enum ReadingVerdict
{
    /// <summary>No window to judge by: kept as a remark.</summary>
    Noted,

    /// <summary>Inside the window.</summary>
    Good,

    /// <summary>Inside, but the uncertainty reaches over the edge.</summary>
    NearEdge,

    /// <summary>Outside.</summary>
    Out,

    /// <summary>Hardly possible: a slip of unit or decimal point, or the wrong point.</summary>
    Doubtful,

    /// <summary>Stop: something may be hurt.</summary>
    Stop,
}

/// <summary>One step of a ladder of remedies, cheapest first.</summary>
/// <param name="Code">Text code.</param>
/// <param name="Figures">Figures for the text.</param>
public sealed record Step(string Code, IReadOnlyList<Figure> Figures);

/// <summary>What to do after a reading.</summary>
/// <param name="Verdict">The verdict.</param>
/// <param name="Ladder">Steps, cheapest first; empty when all is well.</param>
/// <param name="NextPoint">Point to read next; null when the stage is read.</param>
/// <param name="Because">The figures behind it.</param>
/// <param name="RuleId">Which rule spoke, so that the advice can be made again.</param>
public sealed record Advice(ReadingVerdict Verdict, IReadOnlyList<Step> Ladder, string? NextPoint, IReadOnlyList<Finding> Because, string RuleId);

/// <summary>Everything advice is made of.</summary>
/// <param name="Plan">The stage's plan.</param>
/// <param name="Fitted">What is on the board.</param>
/// <param name="Readings">All readings of this stage on this board, oldest first; the last is the one asked about.</param>
/// <param name="Instruments">Instruments by name.</param>
/// <param name="BatchAlert">Whether most boards are off to the same side at this point: then single boards are not told to rewind.</param>
public sealed record AdviceRequest(
    StagePlan Plan,
    AsBuilt Fitted,
    IReadOnlyList<Reading> Readings,
    IReadOnlyList<Instrument> Instruments,
    bool BatchAlert);
