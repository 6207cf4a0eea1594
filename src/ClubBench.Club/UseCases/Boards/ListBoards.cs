using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>Asks for boards.</summary>
/// <param name="GroupBuildId">Of one group build; null for all.</param>
/// <param name="OwnOnly">Only the boards of whoever asks.</param>
public sealed record ListBoardsInput(Guid? GroupBuildId = null, bool OwnOnly = false);

/// <summary>Boards by tag.</summary>
public sealed class ListBoards(ClubStore store) : Query<ListBoardsInput, IReadOnlyList<BoardSummary>>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<IReadOnlyList<BoardSummary>>> Handle(Work work, ListBoardsInput input, CancellationToken cancellation)
    {
        var person = work.Actor.PersonId;
        return Success(await BoardSummaries.OfAsync(
            work.Db,
            b => (input.GroupBuildId == null || b.GroupBuildId == input.GroupBuildId) && (!input.OwnOnly || b.BuilderId == person),
            cancellation));
    }
}
