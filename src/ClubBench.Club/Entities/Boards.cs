namespace ClubBench.Club.Entities;

/// <summary>One builder's copy. It outlives nights and builders.</summary>
public sealed class Board : EditableRow
{
    public Guid GroupBuildId { get; init; }

    public Guid PlanId { get; init; }

    /// <summary>Number on the board, e.g. "Q01".</summary>
    public required string Tag { get; init; }

    /// <summary>Who builds it; null while nobody does.</summary>
    public Guid? BuilderId { get; set; }
}

/// <summary>How far a stage of a board has got.</summary>
public enum StageProgress
{
    NotStarted,
    BeingBuilt,
    Powered,
    Measured,
    Signed,
}

/// <summary>What a stage waits for.</summary>
public enum StageHold
{
    None,
    Mentor,
    Part,
}

/// <summary>Where a stage of a board stands now. How it got there is in its events.</summary>
public sealed class BoardStage : EditableRow
{
    public Guid BoardId { get; init; }

    public required string Stage { get; init; }

    public StageProgress Progress { get; set; }

    public StageHold Hold { get; set; }
}

/// <summary>What happened to a stage.</summary>
public enum StageEventKind
{
    Moved,
    Signed,
    Reopened,
}

/// <summary>One step of a stage's history. Append-only.</summary>
public sealed class StageEvent : JournalRow
{
    public Guid BoardId { get; init; }

    public required string Stage { get; init; }

    public StageEventKind Kind { get; init; }

    public StageProgress Progress { get; init; }

    public StageHold Hold { get; init; }

    public string Note { get; init; } = "";
}

/// <summary>A mentor's word that a stage of a board is done.</summary>
public sealed class StageSignOff : Row
{
    public Guid BoardId { get; init; }

    public required string Stage { get; init; }

    public Guid MentorId { get; init; }

    /// <summary>Card the stage was built by.</summary>
    public Guid? CardId { get; init; }

    public string Remark { get; init; } = "";

    public DateTime AtUtc { get; init; }

    /// <summary>When the stage was reopened; null while the word stands.</summary>
    public DateTime? LapsedUtc { get; set; }
}

/// <summary>A builder asks for a mentor.</summary>
public sealed class HelpCall : EditableRow
{
    public Guid BoardId { get; init; }

    public required string Stage { get; init; }

    public string Text { get; init; } = "";

    public DateTime CalledUtc { get; init; }

    public Guid CalledBy { get; init; }

    /// <summary>Mentor on the way; null while nobody is.</summary>
    public Guid? MentorId { get; set; }

    public DateTime? AnsweredUtc { get; set; }

    public DateTime? DoneUtc { get; set; }
}
