using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;

namespace ClubBench.Club.UseCases;

/// <summary>One run of a use case: who, when, and the club's rows.</summary>
/// <param name="Actor">Who runs it, with the role that counts.</param>
/// <param name="Db">The context of this run.</param>
/// <param name="NowUtc">Time of the run.</param>
public sealed record Work(Actor Actor, ClubContext Db, DateTime NowUtc)
{
    /// <summary>Writes down what changed, in the same transaction as the change.</summary>
    public void Announce(EventKind kind, Guid? subject = null, Guid? board = null, string stage = "") =>
        Db.Events.Add(new EventRow { Kind = kind, BoardId = board, Stage = stage, SubjectId = subject, AtUtc = NowUtc, By = Actor.PersonId });

    /// <summary>
    /// Compares a version a person saw with the stored one when this row is saved: if somebody saved in between, the write is refused as stale.
    /// Null skips the comparison.
    /// </summary>
    public void Expect(EditableRow row, Guid? seenVersion)
    {
        if (seenVersion is { } seen) Db.Entry(row).Property(r => r.Version).OriginalValue = seen;
    }

    /// <summary>The same run for a club that is only known now (sign-in).</summary>
    internal void Enter(Guid clubId) => Db.ClubId = clubId;
}
