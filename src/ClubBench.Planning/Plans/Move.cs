using ClubBench.Planning.Budgets;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Plans;

/// <summary>A kit moved to a target: every stage decided from load to source, then the chain checked forwards. No iteration.</summary>
internal sealed class Move
{
    private readonly Dictionary<string, StageDecision> _decisions = new(StringComparer.Ordinal);
    private readonly Dictionary<string, IReadOnlyList<Finding>> _findings = new(StringComparer.Ordinal);

    public Move(PlanInputs inputs)
    {
        Inputs = inputs;
        Own = new Chain(inputs.Kit, ChainConditions.OwnBand(inputs.Kit, inputs.Learnt));
        Kept = new Chain(inputs.Kit, ChainConditions.On(inputs.Target, inputs.Kit, inputs.Learnt));
        Planned = Kept;
        foreach (var stage in Kept.LoadToSource)
        {
            var decision = _decisions[stage] = StageDecision.Of(stage, Own, Planned, inputs);
            if (decision.Taken is not null) Planned = Planned.With(decision.After);
        }

        Budgets = ChainBudgets.Check(Planned);
        foreach (var stage in Planned.LoadToSource)
            _findings[stage] = [.. StageFindings(stage), .. Budgets.SelectMany(b => b.Findings).Where(f => f.Stage == stage)];
        OpenItems = Plans.OpenItems.Of(this);
        Judgement = MoveJudgement.Of(this);
    }

    public PlanInputs Inputs { get; }

    /// <summary>The kit on its own band.</summary>
    public Chain Own { get; }

    /// <summary>The kit unchanged on the target.</summary>
    public Chain Kept { get; }

    /// <summary>The kit as planned on the target.</summary>
    public Chain Planned { get; }

    public IReadOnlyList<Budget> Budgets { get; }

    public IReadOnlyList<OpenItem> OpenItems { get; }

    public Judgement Judgement { get; }

    /// <summary>Decisions in the kit's order.</summary>
    public IEnumerable<StageDecision> Decisions => Inputs.Kit.Stages.Select(s => _decisions[s.Key]);

    public StageDecision Decision(string stage) => _decisions[stage];

    /// <summary>What the planned stage and the budgets still have to say of a stage.</summary>
    public IReadOnlyList<Finding> Findings(string stage) => _findings[stage];

    /// <summary>What the plan says of a stage.</summary>
    public StageAction ActionOf(string stage) => Decision(stage) switch
    {
        { IsRethink: true } => StageAction.Rethink,
        { Taken: not null } => StageAction.Change,
        var d => d.KeptFindings.Concat(Findings(stage)).Any(f => f.AtLeast >= StageAction.Check) ? StageAction.Check : StageAction.Keep,
    };

    private IReadOnlyList<Finding> StageFindings(string stage) =>
        KindOf(stage).Judge(Planned.Kit.Stage(stage), Planned.Model(stage), Planned.SurroundingsOf(stage), ChainBudgets.Ask(stage, Planned));

    private IStageKind KindOf(string stage) => Planned.KindOf(stage);
}
