using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Budgets;

/// <summary>One line of a sum along the chain.</summary>
/// <param name="Stage">Stage key.</param>
/// <param name="Figures">What stands there: wanted, given, margin.</param>
public sealed record BudgetLine(string Stage, IReadOnlyList<Figure> Figures);

/// <summary>A sum along the chain.</summary>
/// <param name="Id">Budget id: drive, harmonics, noise, oscillator-level, heat.</param>
/// <param name="Lines">Stage by stage.</param>
/// <param name="Findings">What it has to say.</param>
public sealed record Budget(string Id, IReadOnlyList<BudgetLine> Lines, IReadOnlyList<Finding> Findings);

/// <summary>Sums along the signal path: asks backwards, checks forwards.</summary>
public interface IChainBudget
{
    /// <summary>Budget id, also the <c>AskedBy</c> of its demands.</summary>
    string Id { get; }

    /// <summary>What the chain as it stands asks of one stage.</summary>
    IEnumerable<Demand> Ask(string stage, Chain chain);

    /// <summary>The sum over the finished chain.</summary>
    Budget Check(Chain chain);
}
