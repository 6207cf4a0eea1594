using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Advising;

/// <summary>Advice on a winding's inductance: the one turn rule (resonators and windings 6.3) with what is really on the board.</summary>
internal static class WindingAdvice
{
    public static Advice Give(AdviceRequest request, ExpectedReading expected, CorrectedReading reading, string? next)
    {
        var winding = expected.Winding!;
        var turns = request.Fitted.Turns.GetValueOrDefault(winding.Designator, winding.Turns);
        var result = WindingAdjustment.For(new WindingReading(turns, reading.Si / expected.Nominal, Math.Min(reading.ExpandedUncertaintySi / reading.Si, 0.9))
        {
            Acceptable = Acceptable(expected),
            Trim = winding.Trim,
            Limits = new AdjustmentLimits(winding.SpreadMost, winding.SqueezeMost),
        });
        var judged = WindowJudgement.Of(expected, reading).Verdict;
        var figures = AllFigures(expected, reading, result, turns);
        if (judged == ReadingVerdict.Good && result.Action is WindingAction.None or WindingAction.Trim or WindingAction.Remeasure)
            return new Advice(ReadingVerdict.Good, [], next, [], "one-turn-rule");
        if (judged == ReadingVerdict.NearEdge && result.Action == WindingAction.None)
            return new Advice(ReadingVerdict.NearEdge, [new Step("advice.near-edge", figures)], next, [], "one-turn-rule");
        if (request.BatchAlert) return new Advice(judged, [new Step("advice.batch-off", figures)], next, [], "batch");
        return new Advice(judged, Ladder(result, figures), expected.Point, [], "one-turn-rule");
    }

    /// <summary>The window's half width: inside it nothing needs doing.</summary>
    private static double Acceptable(ExpectedReading expected) =>
        Math.Min((expected.HighSi / expected.Nominal) - 1, 1 - (expected.LowSi / expected.Nominal));

    private static IReadOnlyList<Step> Ladder(WindingAdjustment result, IReadOnlyList<Figure> figures) => result.Action switch
    {
        WindingAction.Trim => [new Step("advice.trim", figures)],
        WindingAction.Remeasure => [new Step("advice.remeasure", figures)],
        WindingAction.Spread => [new Step("advice.spread", figures), new Step("advice.read-again", figures)],
        WindingAction.Squeeze => [new Step("advice.squeeze", figures), new Step("advice.read-again", figures)],
        WindingAction.Remove => [new Step("advice.count-passes", figures), new Step(result.IsFirm ? "advice.remove-turns" : "advice.remove-turns-first", figures), new Step("advice.read-again", figures)],
        WindingAction.Add => [new Step("advice.count-passes", figures), new Step(result.IsFirm ? "advice.add-turns" : "advice.add-turns-first", figures), new Step("advice.read-again", figures)],
        WindingAction.Rewind => [new Step("advice.count-passes", figures), new Step("advice.rewind", figures), new Step("advice.read-again", figures)],
        WindingAction.ChangeCapacitor => [new Step("advice.count-passes", figures), new Step("advice.turn-too-coarse", figures)],
        _ => [],
    };

    private static IReadOnlyList<Figure> AllFigures(ExpectedReading expected, CorrectedReading reading, WindingAdjustment result, int turns) =>
    [
        .. ReadingFigures.Of(expected, reading),
        Figure.Of("turns", QuantityKind.Count, turns),
        Figure.Of("first", QuantityKind.Count, Math.Abs(result.FirstStep)),
        Figure.Of("in-all", QuantityKind.Count, Math.Abs(result.TurnChange)),
        Figure.Of("one-turn", QuantityKind.Ratio, 2.0 / turns),
    ];
}
