using ClubBench.Club.Changes;

namespace ClubBench.Club.Entities;

/// <summary>What changed, for everybody who watches. Written in the same transaction as the change.</summary>
public sealed class EventRow : JournalRow
{
    public EventKind Kind { get; init; }

    public Guid? BoardId { get; init; }

    public string Stage { get; init; } = "";

    public Guid? SubjectId { get; init; }
}

/// <summary>A link that signs a person in, or lets somebody join a night. Only the hash is kept.</summary>
public sealed class SignInLink : Row
{
    public required string TokenHash { get; init; }

    /// <summary>Whom it signs in; null lets somebody join by name.</summary>
    public Guid? PersonId { get; init; }

    /// <summary>Night it is good for; null for no particular night.</summary>
    public Guid? NightId { get; init; }

    public DateTime ExpiresUtc { get; init; }

    /// <summary>How often it may still be used; null for any number until it expires.</summary>
    public int? UsesLeft { get; set; }
}

/// <summary>A bearer token of the programming interface. Only the hash is kept.</summary>
public sealed class ApiToken : Row
{
    public required string Name { get; init; }

    public required string TokenHash { get; init; }

    public Guid PersonId { get; init; }

    public DateTime MadeUtc { get; init; }

    public DateTime? RevokedUtc { get; set; }
}

/// <summary>The token of the first start. It belongs to no club: there is none yet.</summary>
public sealed class SetUpToken
{
    public Guid Id { get; init; } = Guid.NewGuid();

    public required string TokenHash { get; init; }

    public DateTime ExpiresUtc { get; init; }

    public DateTime? UsedUtc { get; set; }
}
