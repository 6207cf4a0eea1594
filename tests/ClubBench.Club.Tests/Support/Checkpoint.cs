using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Infrastructure;

namespace ClubBench.Club.Tests.Support;

internal static class Checkpoint
{
    /// <summary>Brings everything from the write-ahead log into the file, so that the file alone can be copied.</summary>
    public static Task OpenCheckpointAsync(this DatabaseFacade database) => database.ExecuteSqlRawAsync("PRAGMA wal_checkpoint(TRUNCATE)");
}
