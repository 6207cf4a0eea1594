namespace ClubBench.Club.Entities;

/// <summary>A stored row. Every row belongs to a club; no query crosses clubs.</summary>
public interface IClubRow
{
    /// <summary>The club it belongs to.</summary>
    Guid ClubId { get; set; }
}

/// <summary>A row with an identity.</summary>
public abstract class Row : IClubRow
{
    public Guid Id { get; init; } = Guid.NewGuid();

    public Guid ClubId { get; set; }
}

/// <summary>A row people edit. The version is set by the application on every save, so that a stale write is noticed on every provider.</summary>
public abstract class EditableRow : Row
{
    public Guid Version { get; set; }
}

/// <summary>A row that is only ever appended. The ordinal is given by the server: order never relies on a clock.</summary>
public abstract class JournalRow : IClubRow
{
    public long Ordinal { get; init; }

    public Guid ClubId { get; set; }

    public DateTime AtUtc { get; init; }

    /// <summary>The person who did it.</summary>
    public Guid By { get; init; }
}
