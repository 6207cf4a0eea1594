using ClubBench.Calculation.Bands;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.Tests.KitAcceptance;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Tests.Text;

/// <summary>Whatever a page labels or explains has words: figures of stages, choices, sums and checks, what went into them, and the methods behind.</summary>
public class FigureLabelTests
{
    private static readonly Lazy<IReadOnlyList<Labelled>> All = new(() => [.. Everything()]);

    /// <summary>A figure with the kind of stage whose words it may use.</summary>
    private sealed record Labelled(string? Kind, Figure Figure);

    [Fact]
    public void Figures_OfTheBackCheckAndOfPlansToEveryBand_HaveLabels() =>
        NoneAreLeft(All.Value.Where(l => !Phrases.Has("figure." + l.Figure.Name, l.Kind)).Select(l => $"{l.Kind} figure.{l.Figure.Name}"));

    [Fact]
    public void Methods_OfTheBackCheckAndOfPlansToEveryBand_HaveWords() =>
        NoneAreLeft(All.Value.Where(l => l.Figure.Working is { } w && !Phrases.Has("method." + w.MethodId, l.Kind)).Select(l => $"{l.Kind} method.{l.Figure.Working!.MethodId} {string.Join(" ", l.Figure.Working.Inputs.Select(i => i.Name))} | {l.Figure.Working.Source}"));

    [Fact]
    public void Walk_OfTheBackCheckAndOfPlans_ReachesInputsOfWorkings() =>
        Assert.Contains(All.Value, l => l.Figure.Working is { } w && w.Inputs.All(i => All.Value.Any(o => o.Figure.Name == i.Name)));

    private static IEnumerable<Labelled> Everything() =>
        OfCheck(BackCheck.Of(KitA.Kit, LearntValues.None)).Concat(AmateurBands.Names
            .Select(b => TargetDefaults.On(b, KitA.Kit, ItuRegion.Region1)).OfType<Target>()
            .SelectMany(t => OfPlan(Planner.Plan(new PlanInputs(KitA.Kit, t, [], DemoKits.DrawerStock, LearntValues.None, SearchEffort.Quick, 1, Planner.CalculationVersion)))))
            .SelectMany(WithInputs);

    private static IEnumerable<Labelled> OfCheck(BackCheck check) =>
        check.Stages.SelectMany(s => s.Rows.Select(r => r.Computed).Concat(Explained(s.Findings)).Select(f => Of(s.Stage, f)))
            .Concat(check.Budgets.SelectMany(OfBudget));

    private static IEnumerable<Labelled> OfPlan(Plan plan) =>
        plan.Stages.SelectMany(OfStage)
            .Concat(plan.Budgets.SelectMany(OfBudget))
            .Concat(plan.Judgement.Reasons.SelectMany(r => Explained([r]).Select(f => Of(r.Stage, f))));

    private static IEnumerable<Labelled> OfStage(StagePlan stage) =>
        stage.Figures.Concat(stage.KeptFigures)
            .Concat(stage.Alternatives.SelectMany(a => a.Figures.Append(a.WorstMargin).Concat(Explained(a.Consequences))))
            .Concat(Explained(stage.Findings)).Concat(Explained(stage.WhyChanged))
            .Concat(stage.Yield is { } y ? y.Requirements.Concat(y.Tolerances) : [])
            .Select(f => Of(stage.Stage, f));

    private static IEnumerable<Labelled> OfBudget(Planning.Budgets.Budget budget) =>
        budget.Lines.SelectMany(l => l.Figures.Select(f => Of(l.Stage, f)))
            .Concat(budget.Findings.SelectMany(finding => Explained([finding]).Select(f => Of(finding.Stage, f))));

    /// <summary>Figures of a finding stand in its sentence; only those with a working get a label, above the working.</summary>
    private static IEnumerable<Figure> Explained(IEnumerable<Finding> findings) => findings.SelectMany(f => f.Figures).Where(f => f.Working is not null);

    private static IEnumerable<Labelled> WithInputs(Labelled l) =>
        [l, .. l.Figure.Working?.Inputs.SelectMany(i => WithInputs(l with { Figure = i })) ?? []];

    private static Labelled Of(string stage, Figure figure) => new(KitA.Kit.Stages.FirstOrDefault(s => s.Key == stage)?.Kind, figure);

    private static void NoneAreLeft(IEnumerable<string> faults)
    {
        var all = string.Join("\n", faults.Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal));
        Assert.True(all.Length == 0, all);
    }
}
