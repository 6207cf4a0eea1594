using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Noise;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Plans;

/// <summary>One cell: what a band would take of a stage.</summary>
/// <param name="Stage">Stage key.</param>
/// <param name="Action">The action.</param>
/// <param name="Because">The weightiest finding; null for a plain keep.</param>
/// <param name="Changes">How many parts change.</param>
public sealed record SurveyCell(string Stage, StageAction Action, Finding? Because, int Changes);

/// <summary>One column: a whole band.</summary>
/// <param name="Target">The target it was computed for.</param>
/// <param name="IsOwnBand">Whether it is the kit's own band.</param>
/// <param name="Cells">One per stage, kit order.</param>
/// <param name="Judgement">Whether it is worth it.</param>
/// <param name="OpenItems">What would stay open.</param>
public sealed record SurveyColumn(Target Target, bool IsOwnBand, IReadOnlyList<SurveyCell> Cells, Judgement Judgement, IReadOnlyList<OpenItem> OpenItems);

/// <summary>Every band for one kit, at a glance.</summary>
/// <param name="Kit">The kit.</param>
/// <param name="Columns">Bands from the longest wave to the shortest.</param>
public sealed record BandSurvey(Kit Kit, IReadOnlyList<SurveyColumn> Columns)
{
    /// <summary>Surveys all bands of a region that have a telegraphy segment.</summary>
    public static BandSurvey Of(Kit kit, Shelf shelf, LearntValues learnt, ItuRegion region, NoiseSite site)
    {
        var targets = AmateurBands.Names.Select(b => TargetDefaults.On(b, kit, region, site)).OfType<Target>();
        return new BandSurvey(kit, [.. targets.Select(t => Column(kit, t, shelf, learnt))]);
    }

    private static SurveyColumn Column(Kit kit, Target target, Shelf shelf, LearntValues learnt)
    {
        var own = target.Segment.Low <= kit.Band.High && kit.Band.Low <= target.Segment.High;
        var move = new Move(new PlanInputs(kit, own ? target with { Segment = kit.Band } : target, [], shelf, learnt, SearchEffort.Quick, 0, Planner.CalculationVersion));
        return new SurveyColumn(target, own, [.. move.Decisions.Select(d => Cell(d, move))], move.Judgement, move.OpenItems);
    }

    private static SurveyCell Cell(StageDecision decision, Move move)
    {
        var action = move.ActionOf(decision.Stage);
        var because = decision.RethinkBecause ?? decision.KeptFindings.Concat(move.Findings(decision.Stage)).Where(f => f.AtLeast > StageAction.Keep).OrderByDescending(f => f.AtLeast).ThenByDescending(f => f.Severity).FirstOrDefault();
        return new SurveyCell(decision.Stage, action, because, PartChanges.Between(decision.Before, decision.After).Count);
    }
}
