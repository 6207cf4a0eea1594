using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Budgets;

/// <summary>Heat of every stage that dissipates, key down without pause (boards are tuned that way). Method: thermal resistances in a row, 40 degrees Celsius inside a box (common practice).</summary>
public sealed class HeatBudget : IChainBudget
{
    private static readonly Temperature InsideABox = Temperature.FromCelsius(40);

    /// <inheritdoc/>
    public string Id => "heat";

    /// <inheritdoc/>
    public IEnumerable<Demand> Ask(string stage, Chain chain) => [];

    /// <inheritdoc/>
    public Budget Check(Chain chain)
    {
        var hot = chain.Paths.Transmit.Stages.Where(s => chain.Facet<IGetsHot>(s) is not null).ToList();
        return new Budget(Id, [.. hot.Select(s => new BudgetLine(s, LineOf(s, chain)))], [.. hot.SelectMany(s => Findings(s, chain))]);
    }

    private static IReadOnlyList<Figure> LineOf(string stage, Chain chain)
    {
        var model = chain.Facet<IGetsHot>(stage)!;
        var dissipation = model.Dissipation(chain.Conditions.Reference);
        var (junction, limit) = model.Heat(dissipation, InsideABox);
        return [Figure.Of("dissipation", dissipation), Figure.Of("junction", junction), Figure.Of("limit", limit)];
    }

    private static IEnumerable<Finding> Findings(string stage, Chain chain)
    {
        var model = chain.Facet<IGetsHot>(stage)!;
        var (junction, limit) = model.Heat(model.Dissipation(chain.Conditions.Reference), InsideABox);
        if (junction.Celsius > limit.Celsius)
            yield return new Finding("budget.too-hot", Severity.Fault, stage, null, LineOf(stage, chain), StageAction.Change, OpenItemCodes.Heat);
    }
}
