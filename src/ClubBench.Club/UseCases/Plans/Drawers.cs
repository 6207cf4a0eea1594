using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>The club's drawers as the planner sees them.</summary>
internal static class Drawers
{
    public static async Task<Shelf> ShelfAsync(this ClubContext db, CancellationToken cancellation) =>
        new([.. (await db.StockLots.OrderBy(l => l.Class).ThenBy(l => l.Type).ThenBy(l => l.ValueSi).ThenBy(l => l.Lot).ToListAsync(cancellation)).Select(Line)]);

    private static StockLine Line(StockLot l) =>
        new(l.Class, l.Type, l.ValueSi, l.QuantityPieces, l.Lot, l.MayBeTuned, l.MeasuredJson is { } json ? StoredJson.Read<Dictionary<string, double>>(json) : null);
}
