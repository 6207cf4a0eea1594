using ClubBench.Club.Persistence;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Room;

/// <summary>The queue of calls.</summary>
internal static class RoomCalls
{
    /// <summary>Calls that are not done, longest wait first.</summary>
    public static async Task<IReadOnlyList<RoomCall>> OfAsync(ClubContext db, Guid groupBuildId, CancellationToken cancellation) =>
        await (from call in db.HelpCalls
               join board in db.Boards on call.BoardId equals board.Id
               join mentor in db.People on call.MentorId equals mentor.Id into mentors
               from mentor in mentors.DefaultIfEmpty()
               where board.GroupBuildId == groupBuildId && call.DoneUtc == null
               orderby call.CalledUtc, board.Tag
               select new RoomCall(call.Id, board.Id, board.Tag, call.Stage, call.Text, call.CalledUtc, mentor == null ? null : mentor.DisplayName, call.Version)).ToListAsync(cancellation);
}
