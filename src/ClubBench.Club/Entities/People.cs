using ClubBench.Club.Access;

namespace ClubBench.Club.Entities;

/// <summary>A club: the tenant everything belongs to. Its own club id is its id.</summary>
public sealed class RadioClub : EditableRow
{
    public required string Name { get; set; }

    /// <summary>Zone times are shown in (IANA name).</summary>
    public string TimeZone { get; set; } = "Etc/UTC";

    public DateTime FoundedUtc { get; init; }
}

/// <summary>A person; only what the build needs.</summary>
public sealed class Person : EditableRow
{
    public required string DisplayName { get; set; }

    /// <summary>Under age: never named on shared views.</summary>
    public bool IsJunior { get; set; }

    /// <summary>Hash of the password; null for people who come in by link or code.</summary>
    public string? PasswordHash { get; set; }
}

/// <summary>What a person is in the club.</summary>
public sealed class Membership : EditableRow
{
    public Guid PersonId { get; init; }

    public Role Role { get; set; }

    public DateTime SinceUtc { get; init; }

    public DateTime? EndedUtc { get; set; }
}
