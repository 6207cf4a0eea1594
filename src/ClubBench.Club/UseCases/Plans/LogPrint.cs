using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Cards were printed.</summary>
/// <param name="CardIds">The cards.</param>
/// <param name="BoardId">Board they are for; null for no particular one.</param>
/// <param name="Copies">Copies of each.</param>
public sealed record LogPrintInput(IReadOnlyList<Guid> CardIds, Guid? BoardId = null, int Copies = 1);

/// <summary>Writes down which cards went to paper, so that a replaced one can be called back.</summary>
public sealed class LogPrint(ClubStore store) : Command<LogPrintInput, Done>(store)
{
    private const int MostCopies = 200;

    /// <inheritdoc/>
    public override Right Required => Right.Print;

    /// <inheritdoc/>
    protected override async Task<Outcome<Done>> Handle(Work work, LogPrintInput input, CancellationToken cancellation)
    {
        if (input.Copies is < 1 or > MostCopies) return Failure("copies", "print.copies-range");
        if (await work.Db.Cards.CountAsync(c => input.CardIds.Contains(c.Id), cancellation) != input.CardIds.Distinct().Count()) return NotFound("cardIds");
        if (input.BoardId is { } board && !await work.Db.Boards.AnyAsync(b => b.Id == board, cancellation)) return NotFound("boardId");
        work.Db.PrintLog.AddRange(input.CardIds.Distinct().Select(c => new PrintLogEntry { CardId = c, BoardId = input.BoardId, Copies = input.Copies, AtUtc = work.NowUtc, By = work.Actor.PersonId }));
        return Success(default);
    }
}
