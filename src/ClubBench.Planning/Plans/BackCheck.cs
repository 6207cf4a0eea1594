using ClubBench.Planning.Budgets;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Plans;

/// <summary>How a computed figure compares with the papers.</summary>
public enum CheckVerdict
{
    /// <summary>The papers say nothing.</summary>
    NotGiven,

    /// <summary>Agrees.</summary>
    Agrees,

    /// <summary>Close: a rounding or an estimate explains it.</summary>
    Close,

    /// <summary>Differs: look for a misprint.</summary>
    Differs,
}

/// <summary>One row of a back-check.</summary>
/// <param name="Name">Figure name.</param>
/// <param name="Designator">Part concerned; null for a figure of the stage.</param>
/// <param name="Stated">What the papers say; null where they do not.</param>
/// <param name="Computed">What comes out.</param>
/// <param name="OffBy">Computed less stated, in the figure's unit (dB for gains); null where nothing is stated.</param>
/// <param name="Verdict">The comparison.</param>
public sealed record CheckRow(string Name, string? Designator, Figure? Stated, Figure Computed, Figure? OffBy, CheckVerdict Verdict);

/// <summary>One stage of a back-check.</summary>
/// <param name="Stage">Stage key.</param>
/// <param name="Verdict">Worst of its rows that compare, not given where none does.</param>
/// <param name="Rows">Rows.</param>
/// <param name="Findings">What the stage has to say on its own band.</param>
public sealed record StageCheck(string Stage, CheckVerdict Verdict, IReadOnlyList<CheckRow> Rows, IReadOnlyList<Finding> Findings);

/// <summary>A kit computed on its own band, to catch misprints and learn the designer's margins before anything is moved.</summary>
/// <param name="Kit">The kit.</param>
/// <param name="Paths">Its traced paths.</param>
/// <param name="Stages">Stage by stage, kit order.</param>
/// <param name="Budgets">The chain's sums on its own band.</param>
public sealed record BackCheck(Kit Kit, SignalPaths Paths, IReadOnlyList<StageCheck> Stages, IReadOnlyList<Budget> Budgets)
{
    /// <summary>Checks a kit.</summary>
    public static BackCheck Of(Kit kit, LearntValues learnt)
    {
        var chain = new Chain(kit, ChainConditions.OwnBand(kit, learnt));
        var budgets = ChainBudgets.Check(chain);
        return new BackCheck(kit, chain.Paths, [.. kit.Stages.Select(s => StageOf(s, chain, budgets))], budgets);
    }

    private static StageCheck StageOf(StageDocument stage, Chain chain, IReadOnlyList<Budget> budgets)
    {
        var model = chain.Model(stage.Key);
        var rows = model.Figures.Select(f => CheckComparison.Row(f, null, StatedOf(stage, f))).Concat(CheckComparison.Windings(stage, chain.KindOf(stage.Key).Description)).ToList();
        var findings = chain.KindOf(stage.Key).Judge(stage, model, chain.SurroundingsOf(stage.Key), ChainBudgets.Ask(stage.Key, chain))
            .Concat(budgets.SelectMany(b => b.Findings).Where(f => f.Stage == stage.Key)).ToList();
        return new StageCheck(stage.Key, Worst(rows, findings), rows, findings);
    }

    private static Figure? StatedOf(StageDocument stage, Figure computed) =>
        stage.StatedSi.TryGetValue(computed.Name, out var si) ? Figure.Stated(computed.Name, computed.Kind, si) with { Digits = computed.Digits } : null;

    private static CheckVerdict Worst(List<CheckRow> rows, List<Finding> findings) =>
        findings.Any(f => f.AtLeast >= StageAction.Change) ? CheckVerdict.Differs : rows.Select(r => r.Verdict).DefaultIfEmpty(CheckVerdict.NotGiven).Max();
}
