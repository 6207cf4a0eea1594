namespace ClubBench.Club.Access;

/// <summary>Who runs a use case.</summary>
/// <param name="PersonId">The person; empty for a visitor or the host.</param>
/// <param name="ClubId">The person's club; every query stays inside it.</param>
/// <param name="Role">Role claimed; the stored membership is asked on every run and the lesser of both counts.</param>
/// <param name="DisplayName">Name shown.</param>
/// <param name="BoardTags">Boards the person builds.</param>
/// <param name="NightId">Night the person joined by code or link; the rights end with it. Null for people who signed in as themselves.</param>
public sealed record Actor(Guid PersonId, Guid ClubId, Role Role, string DisplayName, IReadOnlyList<string> BoardTags, Guid? NightId = null)
{
    /// <summary>Somebody who is not signed in.</summary>
    public static Actor Visitor { get; } = new(Guid.Empty, Guid.Empty, Role.Visitor, "", []);

    /// <summary>The program itself.</summary>
    public static Actor Host { get; } = new(Guid.Empty, Guid.Empty, Role.Host, "", []);
}
