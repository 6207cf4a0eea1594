using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Club.UseCases.Plans;
using ClubBench.Club.UseCases.Readings;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Boards;

/// <summary>Everything stored about one board, stage by stage.</summary>
internal sealed class BenchStages
{
    private ILookup<string, StoredReading> _readings = null!;
    private ILookup<string, FittedEntry> _fitted = null!;
    private Dictionary<long, Advice> _advice = null!;
    private Dictionary<string, BoardStage> _progress = null!;
    private Dictionary<string, BenchSignOff> _signOffs = null!;
    private Dictionary<string, HelpCall> _calls = null!;
    private HashSet<Guid> _standing = null!;

    private BenchStages()
    {
    }

    /// <summary>The stages of a board in the order they are brought up; stages the kit does not list there come last.</summary>
    public static async Task<IReadOnlyList<BenchStage>> OfAsync(ClubContext db, Board board, ArchivedPlan plan, CancellationToken cancellation)
    {
        var stored = await ReadAsync(db, board, cancellation);
        var cards = (await db.CardsAsync(plan, cancellation)).ToDictionary(c => c.Row.Stage, StringComparer.Ordinal);
        return [.. BringUp.Order(plan.Plan).Where(s => stored._progress.ContainsKey(s.Stage)).Select(s => stored.Stage(s, cards[s.Stage].Row, cards[s.Stage].Content))];
    }

    private static async Task<BenchStages> ReadAsync(ClubContext db, Board board, CancellationToken cancellation)
    {
        var readings = await db.Readings.Where(r => r.BoardId == board.Id).OrderBy(r => r.Ordinal).ToListAsync(cancellation);
        var calls = await db.HelpCalls.Where(c => c.BoardId == board.Id && c.DoneUtc == null).OrderBy(c => c.CalledUtc).ToListAsync(cancellation);
        return new BenchStages
        {
            _readings = readings.ToLookup(r => r.Stage, StringComparer.Ordinal),
            _standing = [.. readings.Standing().Select(r => r.Id)],
            _fitted = (await db.Fitted.Where(f => f.BoardId == board.Id).OrderBy(f => f.Ordinal).ToListAsync(cancellation)).ToLookup(f => f.Stage, StringComparer.Ordinal),
            _advice = (await db.AdviceGiven.Where(a => a.BoardId == board.Id).ToListAsync(cancellation)).ToDictionary(a => a.ReadingOrdinal, a => StoredJson.Read<Advice>(a.AdviceJson)),
            _progress = await db.BoardStages.Where(s => s.BoardId == board.Id).ToDictionaryAsync(s => s.Stage, StringComparer.Ordinal, cancellation),
            _signOffs = await SignOffsAsync(db, board, cancellation),
            _calls = calls.GroupBy(c => c.Stage, StringComparer.Ordinal).ToDictionary(g => g.Key, g => g.First(), StringComparer.Ordinal),
        };
    }

    private static async Task<Dictionary<string, BenchSignOff>> SignOffsAsync(ClubContext db, Board board, CancellationToken cancellation)
    {
        var words = await (from word in db.SignOffs
                           join mentor in db.People on word.MentorId equals mentor.Id
                           where word.BoardId == board.Id && word.LapsedUtc == null
                           select new { word.Stage, mentor.DisplayName, word.Remark, word.AtUtc }).ToListAsync(cancellation);
        return words.ToDictionary(w => w.Stage, w => new BenchSignOff(w.DisplayName, w.Remark, w.AtUtc), StringComparer.Ordinal);
    }

    private BenchStage Stage(StagePlan stage, Card card, CardContent content)
    {
        var progress = _progress[stage.Stage];
        return new BenchStage(
            stage.Stage,
            stage.After.Kind,
            stage.Action,
            progress.Progress,
            progress.Hold,
            progress.Version,
            card.Id,
            card.Number,
            content,
            stage.Expected,
            [.. _readings[stage.Stage].Select(Reading)],
            [.. _fitted[stage.Stage].GroupBy(f => f.Designator, StringComparer.Ordinal).Select(g => g.Last()).Select(f => new BenchFitted(f.Designator, f.Turns, f.Type, f.Lot, f.AtUtc))],
            _signOffs.GetValueOrDefault(stage.Stage),
            _calls.GetValueOrDefault(stage.Stage) is { } call ? new BenchCall(call.Id, call.CalledUtc, call.AnsweredUtc is not null) : null);
    }

    private BenchReading Reading(StoredReading r) =>
        new(r.Ordinal, r.Id, r.Point, r.Kind, r.ValueSi, r.TypedText, r.Instrument, r.Note, r.Replaces, !_standing.Contains(r.Id), r.AtUtc, _advice[r.Ordinal]);
}
