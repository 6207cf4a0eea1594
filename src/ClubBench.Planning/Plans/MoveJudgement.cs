using ClubBench.Planning.Figures;

namespace ClubBench.Planning.Plans;

/// <summary>Whether a move is worth the evenings. The effort is a sum of what makes moves hard (weights: common practice):
/// parts to change, octaves moved with the way up counting double, decibels of missing drive, open items, circuits to rethink.</summary>
internal static class MoveJudgement
{
    private const double PerPart = 1;
    private const double PerOctaveDown = 4;
    private const double PerOctaveUp = 8;
    private const double PerMissingDb = 3;
    private const double PerOpenItem = 4;
    private const double PerRethink = 30;

    public static Judgement Of(Move move)
    {
        var parts = move.Decisions.Sum(d => PartChanges.Between(d.Before, d.After).Count);
        var octaves = Math.Log2(move.Inputs.Target.Reference.Hertz / move.Inputs.Kit.Band.Middle.Hertz);
        var missing = move.Budgets.SelectMany(b => b.Findings).SelectMany(f => f.Figures).Where(f => f.Name == "missing").Select(f => f.Si).DefaultIfEmpty(0).Max();
        var open = move.OpenItems.Where(i => i.Code is not (OpenItemCodes.LimitConfirmation or OpenItemCodes.Rethink)).ToList();
        var rethink = move.Decisions.Where(d => d.IsRethink).ToList();
        var effort = (PerPart * parts) + (octaves > 0 ? PerOctaveUp * octaves : -PerOctaveDown * octaves) + (PerMissingDb * missing) + (PerOpenItem * open.Count) + (PerRethink * rethink.Count);
        return new Judgement(VerdictOf(missing, open.Count, rethink.Count, octaves), effort, Reasons(move, parts, octaves, missing, open, rethink));
    }

    private static Verdict VerdictOf(double missingDb, int open, int rethink, double octaves) =>
        rethink > 0 || missingDb > 6 ? Verdict.LeaveIt
        : open > 0 || missingDb > 1 || octaves > 1.1 ? Verdict.WithCare
        : Verdict.WorthIt;

    private static IReadOnlyList<Finding> Reasons(Move move, int parts, double octaves, double missingDb, List<OpenItem> open, List<StageDecision> rethink)
    {
        var reasons = new List<Finding>();
        reasons.AddRange(rethink.Select(d => Reason("judgement.rethink", Severity.Fault, d.Stage)));
        if (missingDb > 1) reasons.Add(Reason("judgement.missing-power", Severity.Warning, "", Figure.Of("missing", QuantityKind.Decibels, missingDb)));
        if (open.Count > 0) reasons.Add(Reason("judgement.open-items", Severity.Warning, "", Figure.Of("count", QuantityKind.Count, open.Count)));
        reasons.Add(Reason(Direction(octaves), Severity.Note, "", Figure.Of("ratio", QuantityKind.Number, Math.Pow(2, Math.Abs(octaves)))));
        reasons.Add(Reason(parts == 0 ? "judgement.nothing-changes" : "judgement.parts", Severity.Note, "", Figure.Of("count", QuantityKind.Count, parts)));
        return reasons;
    }

    /// <summary>A small move down is the easy case: gain rises and parts grow. A large move up is the hard one.</summary>
    private static string Direction(double octaves) => octaves switch
    {
        < -0.75 => "judgement.large-move-down",
        < -0.02 => "judgement.small-move-down",
        <= 0.02 => "judgement.same-band",
        <= 0.75 => "judgement.small-move-up",
        _ => "judgement.large-move-up",
    };

    private static Finding Reason(string code, Severity severity, string stage, params IReadOnlyList<Figure> figures) => new(code, severity, stage, null, figures, StageAction.Keep);
}
