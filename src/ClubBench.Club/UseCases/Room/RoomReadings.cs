using ClubBench.Club.Persistence;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Room;

/// <summary>The newest readings of a room.</summary>
internal static class RoomReadings
{
    /// <summary>How many are shown.</summary>
    private const int Most = 4;

    /// <summary>Newest first, each with what was said to it.</summary>
    public static async Task<IReadOnlyList<RoomReading>> OfAsync(ClubContext db, Guid groupBuildId, CancellationToken cancellation) =>
        await (from reading in db.Readings
               join board in db.Boards on reading.BoardId equals board.Id
               join advice in db.AdviceGiven on reading.Ordinal equals advice.ReadingOrdinal
               where board.GroupBuildId == groupBuildId
               orderby reading.Ordinal descending
               select new RoomReading(reading.Ordinal, board.Tag, reading.Stage, reading.Point, reading.Kind, reading.ValueSi, advice.Verdict)).Take(Most).ToListAsync(cancellation);
}
