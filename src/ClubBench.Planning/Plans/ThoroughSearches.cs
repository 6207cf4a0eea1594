using ClubBench.Planning.Budgets;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Plans;

/// <summary>Thorough search of one stage of a plan: a job beside the planner. Its result becomes a choice that is frozen in the plan.</summary>
public static class ThoroughSearches
{
    /// <summary>Searches; best first. Throws <see cref="OperationCanceledException"/> when cancelled.</summary>
    /// <param name="inputs">The plan's inputs.</param>
    /// <param name="stage">Stage key.</param>
    /// <param name="progress">How far it is, 0 to 1; null for nobody watching.</param>
    /// <param name="cancellation">Stops it.</param>
    public static IReadOnlyList<Alternative> Run(PlanInputs inputs, string stage, IProgress<double>? progress, CancellationToken cancellation)
    {
        var move = new Move(inputs);
        var search = new ThoroughSearch(
            inputs.Kit.Stage(stage),
            move.Own.SurroundingsOf(stage),
            move.Planned.SurroundingsOf(stage),
            ChainBudgets.Ask(stage, move.Planned),
            inputs.Shelf,
            inputs.Seed);
        return move.Planned.KindOf(stage).SearchThoroughly(search, progress, cancellation);
    }

    /// <summary>The choice that freezes a found alternative in a plan.</summary>
    public static Choice Freeze(string stage, Alternative found, string by) => new(stage, found.Id, found.After, null, by);
}
