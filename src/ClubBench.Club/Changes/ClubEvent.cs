namespace ClubBench.Club.Changes;

/// <summary>What sort of thing changed.</summary>
public enum EventKind
{
    ClubChanged,
    KitsChanged,
    PlansChanged,
    BoardsChanged,
    NightChanged,
    StoresChanged,
    Fitted,
    ReadingTaken,
    StageMoved,
    SignedOff,
    Reopened,
    HelpCalled,
    HelpAnswered,
}

/// <summary>One change of a club, for watchers: enough to know what to read again, no more.</summary>
/// <param name="Ordinal">Place in the order of all changes.</param>
/// <param name="Kind">What sort of change.</param>
/// <param name="BoardId">Board concerned, or null.</param>
/// <param name="Stage">Stage concerned, or empty.</param>
/// <param name="SubjectId">The row that changed, or null.</param>
public sealed record ClubEvent(long Ordinal, EventKind Kind, Guid? BoardId, string Stage, Guid? SubjectId);
