namespace ClubBench.Club.Entities;

/// <summary>A kit the club keeps, over all its revisions.</summary>
public sealed class StoredKit : EditableRow
{
    public required string Name { get; set; }

    public int NewestRevision { get; set; }
}

/// <summary>One revision of a kit: the kit file as it was taken in. Never changed.</summary>
public sealed class KitRevision : Row
{
    public Guid KitId { get; init; }

    public int Revision { get; init; }

    /// <summary>The kit in the kit file format.</summary>
    public required string Document { get; init; }

    public DateTime AtUtc { get; init; }

    public Guid By { get; init; }
}
