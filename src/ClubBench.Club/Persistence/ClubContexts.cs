namespace ClubBench.Club.Persistence;

/// <summary>Opens a context for one club and one operation.</summary>
public sealed class ClubContexts(Func<ClubContext> create)
{
    /// <summary>A context that sees this club only. Dispose it after one operation.</summary>
    public ClubContext Open(Guid clubId)
    {
        var db = create();
        db.ClubId = clubId;
        return db;
    }
}
