using ClubBench.Planning.Budgets;
using ClubBench.Planning.Cards;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Plans;

/// <summary>Makes plans. Pure: the same inputs give the same plan.</summary>
public static class Planner
{
    /// <summary>Version of the calculations; part of every plan's inputs.</summary>
    public const string CalculationVersion = "1";

    /// <summary>Plans a move. Throws where the kit names unknown stage kinds or misses required parts: kit files with such faults are refused on reading.</summary>
    public static Plan Plan(PlanInputs inputs)
    {
        var move = new Move(inputs);
        return new Plan(inputs, [.. move.Decisions.Select(d => StagePlanOf(d, move))], move.Budgets, move.OpenItems, move.Judgement);
    }

    private static StagePlan StagePlanOf(StageDecision decision, Move move)
    {
        var (stage, chain) = (decision.Stage, move.Planned);
        var kind = chain.KindOf(stage);
        var (after, model, surroundings) = (chain.Kit.Stage(stage), chain.Model(stage), chain.SurroundingsOf(stage));
        var demands = ChainBudgets.Ask(stage, chain);
        var comparison = new StageComparison(decision.Before, move.Kept.Model(stage), after, model, surroundings, demands);
        var expected = kind.Expect(after, model, surroundings);
        var drawing = kind.Draw(decision.Before, decision.Taken is null ? null : after);
        var action = move.ActionOf(stage);
        IReadOnlyList<Finding> rethink = decision.RethinkBecause is { } because ? [because] : [];
        var why = rethink.Concat(decision.KeptFindings).Where(f => f.AtLeast >= StageAction.Check).OrderByDescending(f => f.AtLeast).ThenByDescending(f => f.Severity).ToList();
        var changes = PartChanges.Between(decision.Before, after);
        var plots = kind.Plots(comparison);
        var card = CardBuilder.Build(new CardInput(kind, decision.Before, after, changes, action, why.FirstOrDefault(), drawing, expected, kind.Notes(after, surroundings), decision.Taken, decision.Alternatives, plots));
        return new StagePlan(
            stage,
            action,
            decision.Taken?.Id ?? Choice.Keep,
            decision.Before,
            after,
            changes,
            decision.Alternatives,
            why,
            move.Findings(stage),
            model.Figures,
            decision.KeptFigures,
            expected,
            kind.Yield(after, surroundings, demands, move.Inputs.Seed),
            drawing,
            plots,
            card);
    }
}
