using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>Something was put on a board.</summary>
/// <param name="Id">Made on the device, unique per board; sending it again is harmless.</param>
/// <param name="BoardId">The board.</param>
/// <param name="Stage">Stage key.</param>
/// <param name="Designator">Place on the board.</param>
/// <param name="Turns">Turns wound; null where it is no winding.</param>
/// <param name="Type">Type fitted where it differs from the plan; empty for as planned.</param>
/// <param name="Lot">Lot it came from; empty for unknown.</param>
public sealed record RecordFittedInput(Guid Id, Guid BoardId, string Stage, string Designator, int? Turns = null, string Type = "", string Lot = "");

/// <summary>Writes down what was really fitted. Append-only: the newest entry of a place counts.</summary>
public sealed class RecordFitted(ClubStore store) : Command<RecordFittedInput, Guid>(store)
{
    private const int MostTurns = 500;

    /// <inheritdoc/>
    public override Right Required => Right.Build;

    /// <inheritdoc/>
    protected override async Task<Outcome<Guid>> Handle(Work work, RecordFittedInput input, CancellationToken cancellation)
    {
        var board = await work.BoardForWritingAsync(input.BoardId, cancellation);
        if (!board.Succeeded) return Failure(board.Messages);
        if (await work.Db.Fitted.FirstOrDefaultAsync(f => f.BoardId == input.BoardId && f.Id == input.Id, cancellation) is { } first)
            return SameBody(first, input) ? Success(first.Id) : Failure("id", "journal.id-used");
        if (await work.StageAsync(input.BoardId, input.Stage, cancellation) is null) return NotFound("stage");
        if (string.IsNullOrWhiteSpace(input.Designator)) return Failure("designator", "field.needed");
        if (input.Turns is < 1 or > MostTurns) return Failure("turns", "fitted.turns-range");
        work.Db.Fitted.Add(Entry(work, input));
        work.Announce(EventKind.Fitted, input.Id, input.BoardId, input.Stage);
        return Success(input.Id);
    }

    private static FittedEntry Entry(Work work, RecordFittedInput input) => new()
    {
        Id = input.Id,
        BoardId = input.BoardId,
        Stage = input.Stage,
        Designator = input.Designator,
        Turns = input.Turns,
        Type = input.Type,
        Lot = input.Lot,
        AtUtc = work.NowUtc,
        By = work.Actor.PersonId,
    };

    private static bool SameBody(FittedEntry first, RecordFittedInput input) =>
        (first.Stage, first.Designator, first.Turns, first.Type, first.Lot) == (input.Stage, input.Designator, input.Turns, input.Type, input.Lot);
}
