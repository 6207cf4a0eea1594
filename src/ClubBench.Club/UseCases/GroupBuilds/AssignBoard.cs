using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.GroupBuilds;

/// <summary>A board finds its builder, or loses one.</summary>
/// <param name="BoardId">The board.</param>
/// <param name="PersonId">The builder; null leaves the board without one.</param>
/// <param name="SeenVersion">Version the person saw; null skips the comparison.</param>
public sealed record AssignBoardInput(Guid BoardId, Guid? PersonId, Guid? SeenVersion = null);

/// <summary>Says who builds a board.</summary>
public sealed class AssignBoard(ClubStore store) : Command<AssignBoardInput, Done>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.RunNights;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, AssignBoardInput input, CancellationToken cancellation)
    {
        if (await work.Db.Boards.FirstOrDefaultAsync(b => b.Id == input.BoardId, cancellation) is not { } board) return NotFound("boardId");
        if (input.PersonId is { } person && !await work.Db.People.AnyAsync(p => p.Id == person, cancellation)) return NotFound("personId");
        work.Expect(board, input.SeenVersion);
        board.BuilderId = input.PersonId;
        work.Announce(EventKind.BoardsChanged, board.Id, board.Id);
        return Success(default);
    }
}
