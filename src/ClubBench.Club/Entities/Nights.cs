namespace ClubBench.Club.Entities;

/// <summary>The season's undertaking: a kit, its plans, boards and nights.</summary>
public sealed class GroupBuild : EditableRow
{
    public required string Name { get; set; }

    public Guid KitId { get; init; }

    public DateTime StartedUtc { get; init; }
}

/// <summary>How far a night has got.</summary>
public enum NightState
{
    Planned,
    Open,
    Closed,
}

/// <summary>One evening of a group build.</summary>
public sealed class Night : EditableRow
{
    public Guid GroupBuildId { get; init; }

    public required string Title { get; set; }

    public DateOnly Date { get; set; }

    public string Goals { get; set; } = "";

    public NightState State { get; set; }

    public DateTime? OpenedUtc { get; set; }

    public DateTime? ClosedUtc { get; set; }

    /// <summary>Code spoken in the room; null while the night is not open.</summary>
    public string? JoinCode { get; set; }
}

/// <summary>A person who came.</summary>
public sealed class Attendance : Row
{
    public Guid NightId { get; init; }

    public Guid PersonId { get; init; }

    public DateTime CameUtc { get; init; }
}
