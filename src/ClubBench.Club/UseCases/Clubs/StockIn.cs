using ClubBench.Club.Access;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning;
using ClubBench.Planning.Kits;
using ClubBench.Planning.StageKinds;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Clubs;

/// <summary>Parts come into the drawers, or leave them.</summary>
/// <param name="Class">Sort of part.</param>
/// <param name="Type">Dielectric, core, device or holder.</param>
/// <param name="ValueSi">Main value; null for cores and devices.</param>
/// <param name="QuantityPieces">Pieces that come in (metres for wire); negative takes out.</param>
/// <param name="Lot">Name of the lot, empty for none.</param>
/// <param name="MayBeTuned">Whether it may go into a tuned place.</param>
/// <param name="Place">Drawer.</param>
/// <param name="MeasuredSi">What was measured of the lot, by the names of part values; null leaves it as it was.</param>
public sealed record StockInInput(
    PartClass Class, string Type, double? ValueSi, double QuantityPieces, string Lot = "", bool MayBeTuned = true, string Place = "", IReadOnlyDictionary<string, double>? MeasuredSi = null);

/// <summary>Books parts into the lot they belong to.</summary>
public sealed class StockIn(ClubStore store) : Command<StockInInput, Guid>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.KeepClub;

    /// <inheritdoc/>
    protected override async Task<Outcome<Guid>> Handle(Work work, StockInInput input, CancellationToken cancellation)
    {
        var messages = Check(input).ToList();
        if (messages.Count > 0) return Failure(messages);
        var lot = await work.Db.StockLots.FirstOrDefaultAsync(
            l => l.Class == input.Class && l.Type == input.Type && l.ValueSi == input.ValueSi && l.Lot == input.Lot && l.MayBeTuned == input.MayBeTuned,
            cancellation) ?? New(work, input);
        if (lot.QuantityPieces + input.QuantityPieces < 0) return Failure("quantityPieces", "stock.not-enough");
        lot.QuantityPieces += input.QuantityPieces;
        if (input.MeasuredSi is { Count: > 0 } measured) lot.MeasuredJson = StoredJson.Write(measured);
        work.Announce(EventKind.StoresChanged, lot.Id);
        return Success(lot.Id);
    }

    private static StockLot New(Work work, StockInInput input)
    {
        var lot = new StockLot { Class = input.Class, Type = input.Type, ValueSi = input.ValueSi, Lot = input.Lot, MayBeTuned = input.MayBeTuned, Place = input.Place };
        work.Db.StockLots.Add(lot);
        return lot;
    }

    private static IEnumerable<FieldMessage> Check(StockInInput input)
    {
        if (string.IsNullOrWhiteSpace(input.Type)) yield return FieldMessage.Error("type", "field.needed");
        if (input.ValueSi is { } value && !(double.IsFinite(value) && value > 0)) yield return FieldMessage.Error("valueSi", "field.not-positive");
        if (!double.IsFinite(input.QuantityPieces)) yield return FieldMessage.Error("quantityPieces", "field.not-a-number");
        foreach (var (name, si) in input.MeasuredSi ?? new Dictionary<string, double>())
            if (!PartValue.All.Contains(name) || !double.IsFinite(si) || si < 0) yield return FieldMessage.Error($"measured.{name}", "field.not-positive");
    }
}
