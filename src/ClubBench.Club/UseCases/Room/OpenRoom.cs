using ClubBench.Club.Access;
using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Boards;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Club.UseCases.Readings;
using ClubBench.Planning;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Room;

/// <summary>Opens the room of a night.</summary>
public sealed record OpenRoomInput(Guid NightId);

/// <summary>A column: a stage and its kind.</summary>
public sealed record RoomStage(string Key, string Kind);

/// <summary>One stage of one board.</summary>
/// <param name="LastVerdict">What was said to the newest reading; null where there is none.</param>
public sealed record RoomCell(string Stage, StageAction Action, StageProgress Progress, StageHold Hold, ReadingVerdict? LastVerdict);

/// <summary>One board: tag only, no name, because the room is projected.</summary>
public sealed record RoomBoard(Guid Id, string Tag, Guid PlanId, string BandName, bool IsPresent, IReadOnlyList<RoomCell> Cells);

/// <summary>A call that waits.</summary>
/// <param name="Mentor">Mentor on the way; null while nobody is.</param>
public sealed record RoomCall(Guid Id, Guid BoardId, string Tag, string Stage, string Text, DateTime CalledUtc, string? Mentor, Guid Version);

/// <summary>A reading, by the tag of its board.</summary>
public sealed record RoomReading(long Ordinal, string Tag, string Stage, string Point, QuantityKind Kind, double ValueSi, ReadingVerdict Verdict);

/// <summary>A shared instrument.</summary>
public sealed record RoomInstrument(string Name, InstrumentClass Class, string Post);

/// <summary>A plan in the room.</summary>
public sealed record RoomPlan(Guid Id, string Name, string BandName, int Revision, int Boards);

/// <summary>The room as it stands.</summary>
/// <param name="Stages">Columns: every stage of the plans, in the order they are brought up.</param>
/// <param name="Help">Calls, longest wait first.</param>
/// <param name="LastReadings">The newest readings, newest first.</param>
/// <param name="JoinCode">Code to be spoken; null for builders, and unless the night is open.</param>
/// <param name="UpToOrdinal">Newest change this picture contains; ask the change feed for what comes after.</param>
public sealed record RoomPicture(
    Guid NightId,
    string Title,
    DateOnly Date,
    NightState State,
    DateTime? OpenedUtc,
    string? JoinCode,
    IReadOnlyList<RoomPlan> Plans,
    IReadOnlyList<RoomStage> Stages,
    IReadOnlyList<RoomBoard> Boards,
    IReadOnlyList<RoomCall> Help,
    IReadOnlyList<RoomReading> LastReadings,
    IReadOnlyList<RoomInstrument> Instruments,
    IReadOnlyList<PointAlert> Alerts,
    DateTime NowUtc,
    long UpToOrdinal);

/// <summary>The coordinator's live picture: boards by stages, who waits, what the batch says.</summary>
public sealed class OpenRoom(ClubStore store, PlanArchive archive) : Query<OpenRoomInput, RoomPicture>(store)
{
    /// <inheritdoc/>
    public override Right Required => Right.See;

    /// <inheritdoc/>
    protected override async Task<Outcome<RoomPicture>> Handle(Work work, OpenRoomInput input, CancellationToken cancellation)
    {
        var db = work.Db;
        if (await db.Nights.FirstOrDefaultAsync(n => n.Id == input.NightId, cancellation) is not { } night) return NotFound("nightId");
        var newest = await db.Events.MaxAsync(e => (long?)e.Ordinal, cancellation) ?? 0;
        var boards = await db.Boards.Where(b => b.GroupBuildId == night.GroupBuildId).OrderBy(b => b.Tag).ToListAsync(cancellation);
        var plans = new List<ArchivedPlan>();
        foreach (var planId in boards.Select(b => b.PlanId).Distinct()) plans.Add(await archive.InForceAsync(db, planId, cancellation));
        var instruments = await db.Instruments.OrderBy(i => i.Name).Select(i => new RoomInstrument(i.Name, i.Class, i.Post)).ToListAsync(cancellation);
        return Success(new RoomPicture(
            night.Id,
            night.Title,
            night.Date,
            night.State,
            night.OpenedUtc,
            work.Actor.Role > Role.Builder ? night.JoinCode : null,
            [.. plans.Select(p => new RoomPlan(p.Row.Id, p.Row.Name, p.Row.BandName, p.Revision, boards.Count(b => b.PlanId == p.Row.Id)))],
            [.. plans.SelectMany(p => BringUp.Order(p.Plan)).DistinctBy(s => s.Stage, StringComparer.Ordinal).Select(s => new RoomStage(s.Stage, s.After.Kind))],
            await RoomBoards.OfAsync(db, night, boards, plans, cancellation),
            await RoomCalls.OfAsync(db, night.GroupBuildId, cancellation),
            await RoomReadings.OfAsync(db, night.GroupBuildId, cancellation),
            instruments,
            await BatchReadings.AlertsAsync(db, [.. plans.Select(p => p.Row)], cancellation),
            work.NowUtc,
            newest));
    }
}
