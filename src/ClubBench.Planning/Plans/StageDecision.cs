using ClubBench.Planning.Budgets;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Plans;

/// <summary>What was decided for one stage, and from what.</summary>
/// <param name="Stage">Stage key.</param>
/// <param name="Before">The kit's stage.</param>
/// <param name="KeptFindings">What the kept stage had to say on the target, among the already decided stages behind it.</param>
/// <param name="KeptFigures">Its figures there.</param>
/// <param name="Alternatives">What would do, best first.</param>
/// <param name="Taken">The alternative taken; null keeps the stage.</param>
/// <param name="Choice">What a person chose; null where the planner decided.</param>
internal sealed record StageDecision(
    string Stage,
    StageDocument Before,
    IReadOnlyList<Finding> KeptFindings,
    IReadOnlyList<Figure> KeptFigures,
    IReadOnlyList<Alternative> Alternatives,
    Alternative? Taken,
    Choice? Choice)
{
    public StageDocument After => Taken?.After ?? Before;

    public StageAction KeptAction => KeptFindings.Count == 0 ? StageAction.Keep : KeptFindings.Max(f => f.AtLeast);

    /// <summary>Nothing within reach would do, and nobody insisted on keeping it.</summary>
    public bool IsRethink => Taken is null && KeptAction >= StageAction.Change && Choice?.AlternativeId != Choice.Keep;

    /// <summary>Why nothing would do, and what would; null unless it is a rethink.</summary>
    public Finding? RethinkBecause { get; private init; }

    /// <summary>Decides one stage of a chain whose stages behind it are decided.</summary>
    public static StageDecision Of(string stage, Chain own, Chain target, PlanInputs inputs)
    {
        var kind = target.KindOf(stage);
        var document = target.Kit.Stage(stage);
        var surroundings = target.SurroundingsOf(stage);
        var demands = ChainBudgets.Ask(stage, target);
        var model = target.Model(stage);
        var kept = kind.Judge(document, model, surroundings, demands);
        var choice = inputs.Choices.LastOrDefault(c => c.Stage == stage);
        var mayChange = kept.Any(f => f.AtLeast >= StageAction.Check) || choice is not null;
        var alternatives = mayChange ? kind.Convert(document, own.SurroundingsOf(stage), surroundings, demands, inputs.Shelf) : [];
        var decision = new StageDecision(stage, document, kept, model.Figures, alternatives, null, choice);
        var taken = decision with { Taken = decision.Take() };
        return taken.IsRethink ? taken with { RethinkBecause = kind.Rethink(document, surroundings) } : taken;
    }

    private Alternative? Take() => Choice switch
    {
        { Override: { } manual } => Manual(manual),
        { AlternativeId: Choice.Keep } => null,
        { } c when Alternatives.FirstOrDefault(a => a.Id == c.AlternativeId) is { } chosen => chosen,
        _ => KeptAction >= StageAction.Change ? Alternatives.FirstOrDefault() : null,
    };

    /// <summary>Parts a person chose by hand: taken as they are; the findings of the finished chain say what they bring.</summary>
    private Alternative Manual(StageDocument manual) =>
        new("by-hand", manual, PartChanges.Between(Before, manual), [], [], new Figure("worst-margin", QuantityKind.Decibels, 0, From: Provenance.Unknown), true, true);
}
