using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Budgets;

/// <summary>All budgets of a chain.</summary>
public static class ChainBudgets
{
    /// <summary>Every budget, in the order they are shown.</summary>
    public static IReadOnlyList<IChainBudget> All { get; } = [new DriveBudget(), new HarmonicBudget(), new OscillatorLevelBudget(), new NoiseBudget(), new HeatBudget()];

    /// <summary>Everything the chain as it stands asks of one stage.</summary>
    public static IReadOnlyList<Demand> Ask(string stage, Chain chain) => [.. All.SelectMany(b => b.Ask(stage, chain))];

    /// <summary>Every sum over the finished chain.</summary>
    public static IReadOnlyList<Budget> Check(Chain chain) => [.. All.Select(b => b.Check(chain)).Where(b => b.Lines.Count > 0)];
}
