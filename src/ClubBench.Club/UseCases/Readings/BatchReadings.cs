using ClubBench.Club.Entities;
using ClubBench.Club.Persistence;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Readings;

/// <summary>A point at which every measured board is off to the same side.</summary>
public sealed record PointAlert(Guid PlanId, string BandName, string Point, QuantityKind Kind, int Boards, BatchSide Side);

/// <summary>What all boards of a plan read.</summary>
internal static class BatchReadings
{
    /// <summary>The newest standing reading of each board at a point, known offsets subtracted. Remarks do not count.</summary>
    public static async Task<IReadOnlyList<double>> ValuesAsync(ClubContext db, Guid planId, string point, IReadOnlyList<ClubInstrument> instruments, CancellationToken cancellation)
    {
        var boards = db.Boards.Where(b => b.PlanId == planId).Select(b => b.Id);
        var readings = await db.Readings.AsNoTracking().Where(r => r.Point == point && boards.Contains(r.BoardId)).ToListAsync(cancellation);
        return NewestPerBoard(readings, instruments);
    }

    /// <summary>Every alert of the given plans.</summary>
    public static async Task<IReadOnlyList<PointAlert>> AlertsAsync(ClubContext db, IReadOnlyList<StoredPlan> plans, CancellationToken cancellation)
    {
        var instruments = await db.Instruments.AsNoTracking().ToListAsync(cancellation);
        var alerts = new List<PointAlert>();
        foreach (var plan in plans)
        {
            var boards = db.Boards.Where(b => b.PlanId == plan.Id).Select(b => b.Id);
            var byPoint = (await db.Readings.AsNoTracking().Where(r => boards.Contains(r.BoardId)).ToListAsync(cancellation)).ToLookup(r => r.Point, StringComparer.Ordinal);
            var revision = plan.RevisionInForce;
            foreach (var expected in await db.ExpectedReadings.AsNoTracking().Where(e => e.PlanId == plan.Id && e.PlanRevision == revision).OrderBy(e => e.Point).ToListAsync(cancellation))
            {
                var values = NewestPerBoard(byPoint[expected.Point], instruments);
                var side = BatchAlert.Of(expected.NominalSi, expected.LowSi, expected.HighSi, expected.Sides, values);
                if (side != BatchSide.None) alerts.Add(new PointAlert(plan.Id, plan.BandName, expected.Point, expected.Kind, values.Count, side));
            }
        }

        return alerts;
    }

    /// <summary>Readings that no other one replaces.</summary>
    public static IEnumerable<StoredReading> Standing(this IReadOnlyCollection<StoredReading> readings)
    {
        var replaced = readings.Where(r => r.Replaces is not null).Select(r => (r.BoardId, r.Replaces!.Value)).ToHashSet();
        return readings.Where(r => !replaced.Contains((r.BoardId, r.Id)));
    }

    /// <summary>A stored reading as advice sees it.</summary>
    public static Reading ToReading(this StoredReading r) => new(r.Point, r.Kind, r.ValueSi, r.TypedText, r.Instrument, r.Ordinal);

    private static List<double> NewestPerBoard(IEnumerable<StoredReading> readings, IReadOnlyList<ClubInstrument> instruments) =>
        [.. readings.ToList().Standing().Where(r => r.Instrument is not null).GroupBy(r => r.BoardId).Select(g => Corrected(g.MaxBy(r => r.Ordinal)!, instruments))];

    private static double Corrected(StoredReading reading, IReadOnlyList<ClubInstrument> instruments) =>
        CorrectedReading.Of(reading.ToReading(), [.. instruments.Select(i => i.For(reading.Kind))]).Si;
}
