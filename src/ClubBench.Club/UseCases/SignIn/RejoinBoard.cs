using ClubBench.Club.Access;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.SignIn;

/// <summary>A builder comes back with the board in hand.</summary>
/// <param name="Code">Code spoken in the room.</param>
/// <param name="BoardTag">Number on the board.</param>
public sealed record RejoinBoardInput(string Code, string BoardTag);

/// <summary>Lets a builder back in to the same board.</summary>
public sealed class RejoinBoard(ClubStore store, WrongCodes wrongCodes) : Command<RejoinBoardInput, Actor>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.ComeIn;

    /// <inheritdoc/>
    protected override async Task<Outcome<Actor>> Handle(Work work, RejoinBoardInput input, CancellationToken cancellation)
    {
        if (await Joining.NightOfAsync(work, input.Code, cancellation) is not { } night)
        {
            await wrongCodes.NoteAsync(work, cancellation);
            return Failure("code", "join.code-unknown");
        }

        var tag = input.BoardTag.Trim().ToUpperInvariant();
        var board = await work.Db.Boards.FirstOrDefaultAsync(b => b.GroupBuildId == night.GroupBuildId && b.Tag == tag, cancellation);
        if (board is null) return Failure("boardTag", "join.board-unknown", ("tag", tag));
        return board.BuilderId is { } builder ? await Joining.KnownAsync(work, night.Id, builder, cancellation) : Failure("boardTag", "join.board-free", ("tag", tag));
    }
}
