using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>What a wrong code leads to: after too many, every open night gets a new one, so that guessing never adds up.</summary>
public sealed class WrongCodes(FailureWindows failures, IChangeFeed feed)
{
    /// <summary>Notes a wrong code; changes the codes when there were too many. The change stands although the try itself failed.</summary>
    internal async Task NoteAsync(Work work, CancellationToken cancellation)
    {
        failures.Codes.Note();
        if (!failures.Codes.IsFull) return;
        failures.Codes.Clear();
        var nights = await work.Db.Nights.IgnoreQueryFilters().Where(n => n.State == NightState.Open).ToListAsync(cancellation);
        foreach (var night in nights)
        {
            work.Enter(night.ClubId);
            night.JoinCode = Secrets.NewSpokenCode();
            work.Announce(EventKind.NightChanged, night.Id);
            await work.Db.SaveChangesAsync(cancellation);
        }

        await work.Db.Database.CommitTransactionAsync(cancellation);
        foreach (var club in nights.Select(n => n.ClubId).Distinct()) feed.Wake(club);
    }
}
