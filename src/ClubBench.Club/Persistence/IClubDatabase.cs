namespace ClubBench.Club.Persistence;

/// <summary>The database as a whole.</summary>
public interface IClubDatabase
{
    /// <summary>Brings the database up to date and checks that saved means saved. Throws when it is not: the start is refused.</summary>
    Task PrepareAsync(CancellationToken cancellation = default);
}
