using System.Globalization;
using ClubBench.Club.Changes;
using ClubBench.Club.Entities;
using ClubBench.Planning;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Plans;
using Microsoft.EntityFrameworkCore;

namespace ClubBench.Club.UseCases.Plans;

/// <summary>Where a plan is after a change.</summary>
public sealed record PlanReference(Guid PlanId, int Revision, Guid Version);

/// <summary>Computes plans and stores their revisions with cards and expected readings.</summary>
internal static class PlanRevisions
{
    /// <summary>Seed of every yield: fixed, so that the same plan prints the same number again.</summary>
    private const ulong Seed = 20;

    /// <summary>What a plan of the club is made of.</summary>
    public static async Task<PlanInputs> InputsAsync(this Work work, ClubBench.Planning.Kits.Kit kit, Target target, IReadOnlyList<Choice> choices, CancellationToken cancellation) =>
        new(kit, target, choices, await work.Db.ShelfAsync(cancellation), LearntValues.None, SearchEffort.Quick, Seed, Planner.CalculationVersion);

    /// <summary>What is wrong with a target or choices; empty when nothing is.</summary>
    public static IEnumerable<FieldMessage> Check(Target target, IReadOnlyList<Choice> choices, ClubBench.Planning.Kits.Kit kit)
    {
        if (!target.Segment.Contains(target.Reference)) yield return FieldMessage.Error("target.reference", "target.reference-outside");
        for (var i = 0; i < choices.Count; i++)
        {
            var path = string.Create(CultureInfo.InvariantCulture, $"choices[{i}]");
            if (kit.Stages.All(s => s.Key != choices[i].Stage)) yield return FieldMessage.Error($"{path}.stage", "choice.stage-unknown", ("stage", choices[i].Stage));
            if (choices[i].AlternativeId == Choice.Accept && string.IsNullOrWhiteSpace(choices[i].Reason)) yield return FieldMessage.Error($"{path}.reason", "choice.reason-needed");
        }
    }

    /// <summary>Stores a computed plan as the next revision.</summary>
    public static async Task StoreRevisionAsync(this Work work, StoredPlan row, Plan plan, CancellationToken cancellation)
    {
        var json = StoredJson.Write(plan);
        row.NewestRevision++;
        row.BandName = plan.Inputs.Target.BandName;
        work.Db.PlanRevisions.Add(new PlanRevision
        {
            PlanId = row.Id,
            Revision = row.NewestRevision,
            KitRevision = plan.Inputs.Kit.Revision,
            InputsJson = StoredJson.Write(plan.Inputs),
            OutputsJson = json,
            CalculationVersion = plan.Inputs.CalculationVersion,
            Hash = StoredJson.HashOf(json),
            OpenItems = plan.OpenItems.Count,
            Judgement = plan.Judgement.Verdict,
            AtUtc = work.NowUtc,
            By = work.Actor.PersonId,
        });
        work.StoreExpected(row, plan);
        foreach (var stage in plan.Stages) await work.StoreCardAsync(row, stage.Card, cancellation);
        work.Announce(EventKind.PlansChanged, row.Id);
    }

    private static void StoreExpected(this Work work, StoredPlan row, Plan plan) =>
        work.Db.ExpectedReadings.AddRange(plan.Stages.SelectMany(s => s.Expected).DistinctBy(e => e.Point, StringComparer.Ordinal).Select(e => new ExpectedReadingRow
        {
            PlanId = row.Id,
            PlanRevision = row.NewestRevision,
            Stage = e.Stage,
            Point = e.Point,
            Kind = e.Kind,
            NominalSi = e.Nominal,
            LowSi = e.LowSi,
            HighSi = e.HighSi,
            Sides = e.Sides,
        }));

    /// <summary>Only content that changed makes a new card; the number counts these changes.</summary>
    private static async Task StoreCardAsync(this Work work, StoredPlan row, CardContent content, CancellationToken cancellation)
    {
        var json = StoredJson.Write(content);
        var hash = StoredJson.HashOf(json);
        var newest = await work.Db.Cards.Where(c => c.PlanId == row.Id && c.Stage == content.Stage).OrderByDescending(c => c.Number).FirstOrDefaultAsync(cancellation);
        if (newest?.ContentHash == hash) return;
        work.Db.Cards.Add(new Card
        {
            PlanId = row.Id,
            Stage = content.Stage,
            Number = (newest?.Number ?? 0) + 1,
            ContentHash = hash,
            ContentJson = json,
            FirstPlanRevision = row.NewestRevision,
        });
    }
}
