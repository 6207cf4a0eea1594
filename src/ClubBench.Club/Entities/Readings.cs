using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;

namespace ClubBench.Club.Entities;

/// <summary>What was really put on a board. Append-only: the newest entry of a designator counts.</summary>
public sealed class FittedEntry : JournalRow
{
    /// <summary>Made on the device, unique per club and board.</summary>
    public Guid Id { get; init; }

    public Guid BoardId { get; init; }

    public required string Stage { get; init; }

    public required string Designator { get; init; }

    /// <summary>Turns wound; null where it is no winding.</summary>
    public int? Turns { get; init; }

    /// <summary>Type fitted where it differs from the plan; empty for as planned.</summary>
    public string Type { get; init; } = "";

    /// <summary>Lot it came from; empty for unknown.</summary>
    public string Lot { get; init; } = "";
}

/// <summary>One measured value. Append-only: a correction is a new reading that names what it replaces.</summary>
public sealed class StoredReading : JournalRow
{
    /// <summary>Made on the device, unique per club and board.</summary>
    public Guid Id { get; init; }

    public Guid BoardId { get; init; }

    public required string Stage { get; init; }

    /// <summary>Stable point id, e.g. "A5.L4.L".</summary>
    public required string Point { get; init; }

    public QuantityKind Kind { get; init; }

    /// <summary>As read, in the SI unit of its kind (dB and dBm for gains and levels).</summary>
    public double ValueSi { get; init; }

    public required string TypedText { get; init; }

    /// <summary>Instrument by name; null makes the reading a remark.</summary>
    public string? Instrument { get; init; }

    public string Note { get; init; } = "";

    /// <summary>Id of the reading this one corrects.</summary>
    public Guid? Replaces { get; init; }

    /// <summary>Plan revision in force when it was taken.</summary>
    public int PlanRevision { get; init; }
}

/// <summary>What ClubBench said after a reading. Kept as given.</summary>
public sealed class AdviceGiven : JournalRow
{
    public long ReadingOrdinal { get; init; }

    public Guid BoardId { get; init; }

    public required string Stage { get; init; }

    public ReadingVerdict Verdict { get; init; }

    public required string RuleId { get; init; }

    public required string AdviceJson { get; init; }
}
