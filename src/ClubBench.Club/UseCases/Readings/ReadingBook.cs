using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Planning;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Readings;

/// <summary>One value as it comes from a device.</summary>
/// <param name="BoardId">The board.</param>
/// <param name="Id">Made on the device, unique per board; sending it again is harmless.</param>
/// <param name="Point">Stable point id, e.g. "A5.L4.L".</param>
/// <param name="TypedText">What was typed.</param>
/// <param name="ValueSi">Value in the SI unit of the point; null to have the typed text read here.</param>
/// <param name="Instrument">Instrument by name; null makes it a remark.</param>
/// <param name="Note">A remark beside the value.</param>
/// <param name="Replaces">Id of the reading this one corrects; null for a new one.</param>
public sealed record RecordInput(Guid BoardId, Guid Id, string Point, string TypedText, double? ValueSi = null, string? Instrument = null, string Note = "", Guid? Replaces = null);

/// <summary>A stored reading with what ClubBench says to it.</summary>
/// <param name="Ordinal">Its place in the order of all readings.</param>
/// <param name="ValueSi">The value as stored.</param>
/// <param name="StageKind">Kind of its stage, whose words the advice uses.</param>
/// <param name="Advice">The advice.</param>
/// <param name="IsResend">Whether it had been stored before.</param>
public sealed record RecordedReading(long Ordinal, double ValueSi, string StageKind, Advice Advice, bool IsResend);

/// <summary>Takes readings in: checks, stores, advises, announces. Append-only.</summary>
public sealed class ReadingBook(PlanArchive archive)
{
    internal async Task<Outcome<RecordedReading>> RecordAsync(Work work, RecordInput input, CancellationToken cancellation)
    {
        var board = await work.BoardForWritingAsync(input.BoardId, cancellation);
        if (!board.Succeeded) return Outcome<RecordedReading>.Failure(board.Messages);
        var plan = await archive.InForceAsync(work.Db, board.Value.PlanId, cancellation);
        if (await work.Db.Readings.FirstOrDefaultAsync(r => r.BoardId == input.BoardId && r.Id == input.Id, cancellation) is { } first) return await AgainAsync(work, plan, first, input, cancellation);
        var checkedReading = await ReadingCheck.OfAsync(work, plan, input, cancellation);
        if (!checkedReading.Succeeded) return Outcome<RecordedReading>.Failure(checkedReading.Messages);
        var reading = checkedReading.Value;
        work.Db.Readings.Add(reading);
        await work.Db.SaveChangesAsync(cancellation);
        var advice = await AdviseAsync(work, board.Value, plan, reading, cancellation);
        work.Db.AdviceGiven.Add(Given(work, reading, advice));
        if (await work.StageAsync(reading.BoardId, reading.Stage, cancellation) is { Progress: StageProgress.NotStarted } stage) work.Move(stage, StageEventKind.Moved, StageProgress.BeingBuilt, stage.Hold);
        work.Announce(EventKind.ReadingTaken, reading.Id, reading.BoardId, reading.Stage);
        return Outcome<RecordedReading>.Success(new RecordedReading(reading.Ordinal, reading.ValueSi, plan.Plan.Stage(reading.Stage).After.Kind, advice, IsResend: false));
    }

    private static async Task<Outcome<RecordedReading>> AgainAsync(Work work, ArchivedPlan plan, StoredReading first, RecordInput input, CancellationToken cancellation)
    {
        var same = (first.Point, first.TypedText, first.Instrument, first.Note, first.Replaces) == (input.Point, input.TypedText, input.Instrument, input.Note, input.Replaces)
            && (input.ValueSi is null || input.ValueSi.Value.Equals(first.ValueSi));
        if (!same) return Outcome<RecordedReading>.Failure(FieldMessage.Error("id", "journal.id-used"));
        var given = await work.Db.AdviceGiven.SingleAsync(a => a.ReadingOrdinal == first.Ordinal, cancellation);
        return Outcome<RecordedReading>.Success(new RecordedReading(first.Ordinal, first.ValueSi, plan.Plan.Stage(first.Stage).After.Kind, StoredJson.Read<Advice>(given.AdviceJson), IsResend: true));
    }

    private static async Task<Advice> AdviseAsync(Work work, Board board, ArchivedPlan plan, StoredReading reading, CancellationToken cancellation)
    {
        var stage = plan.Plan.Stage(reading.Stage);
        var instruments = await work.Db.Instruments.AsNoTracking().ToListAsync(cancellation);
        var readings = await work.Db.Readings.AsNoTracking().Where(r => r.BoardId == board.Id && r.Stage == reading.Stage).OrderBy(r => r.Ordinal).ToListAsync(cancellation);
        var alert = stage.Expected.FirstOrDefault(e => e.Point == reading.Point) is { } expected
            && BatchAlert.Of(expected.Nominal, expected.LowSi, expected.HighSi, expected.Sides, await BatchReadings.ValuesAsync(work.Db, board.PlanId, reading.Point, instruments, cancellation)) != BatchSide.None;
        var request = new AdviceRequest(
            stage,
            await AsBuiltAsync(work, board.Id, reading.Stage, cancellation),
            [.. readings.Standing().Select(r => r.ToReading())],
            [.. instruments.Select(i => i.For(reading.Kind))],
            alert);
        return StageKindList.Get(stage.After.Kind).Advise(request);
    }

    private static async Task<AsBuilt> AsBuiltAsync(Work work, Guid boardId, string stage, CancellationToken cancellation)
    {
        var entries = await work.Db.Fitted.AsNoTracking().Where(f => f.BoardId == boardId && f.Stage == stage).ToListAsync(cancellation);
        var newest = entries.GroupBy(f => f.Designator, StringComparer.Ordinal).Select(g => g.MaxBy(f => f.Ordinal)!).ToList();
        return new AsBuilt(
            newest.Where(f => f.Turns is not null).ToDictionary(f => f.Designator, f => f.Turns!.Value, StringComparer.Ordinal),
            newest.Where(f => f.Type.Length > 0).ToDictionary(f => f.Designator, f => f.Type, StringComparer.Ordinal));
    }

    private static AdviceGiven Given(Work work, StoredReading reading, Advice advice) => new()
    {
        ReadingOrdinal = reading.Ordinal,
        BoardId = reading.BoardId,
        Stage = reading.Stage,
        Verdict = advice.Verdict,
        RuleId = advice.RuleId,
        AdviceJson = StoredJson.Write(advice),
        AtUtc = work.NowUtc,
        By = work.Actor.PersonId,
    };
}
