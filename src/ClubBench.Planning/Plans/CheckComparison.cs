using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Plans;

/// <summary>Compares computed figures with stated ones. Limits: common practice, by quantity.</summary>
internal static class CheckComparison
{
    public static CheckRow Row(Figure computed, string? designator, Figure? stated)
    {
        if (stated is null) return new CheckRow(computed.Name, designator, null, computed, null, CheckVerdict.NotGiven);
        var off = Difference(computed.Si, stated.Si);
        var kind = computed.Kind == QuantityKind.Frequency ? QuantityKind.FrequencyShift : computed.Kind;
        return new CheckRow(computed.Name, designator, stated, computed, Figure.Of(computed.Name, kind, off), VerdictOf(computed.Kind, off, stated.Si));
    }

    /// <summary>Turns and core of each winding against the inductance the papers print beside them.</summary>
    public static IEnumerable<CheckRow> Windings(StageDocument stage, StageDescription description) =>
        from part in stage.Parts
        where description.Role(part.Role)?.Class == PartClass.Winding
        let stated = part.Value(PartValue.Inductance)
        let winding = Parts.WindingPart.Of(part, LearntValues.None)
        where winding is not null
        select Row(winding.Figure(), part.Designator, stated is { } h ? Figure.Stated("inductance", QuantityKind.Inductance, h) : null);

    /// <summary>What the last bits of two equal figures leave is no difference.</summary>
    private static double Difference(double computed, double stated) => Math.Abs(computed - stated) <= 1e-12 * Math.Abs(stated) ? 0 : computed - stated;

    private static CheckVerdict VerdictOf(QuantityKind kind, double off, double stated)
    {
        var (agrees, close) = Limits(kind);
        var distance = kind is QuantityKind.Decibels or QuantityKind.RelativeLevel or QuantityKind.PowerLevel ? Math.Abs(off) : stated == 0 ? Math.Abs(off) : Math.Abs(off / stated);
        return distance <= agrees ? CheckVerdict.Agrees : distance <= close ? CheckVerdict.Close : CheckVerdict.Differs;
    }

    private static (double Agrees, double Close) Limits(QuantityKind kind) => kind switch
    {
        QuantityKind.Frequency => (2e-4, 2e-3),
        QuantityKind.Decibels or QuantityKind.RelativeLevel or QuantityKind.PowerLevel => (1, 3),
        QuantityKind.Inductance or QuantityKind.Capacitance => (0.03, 0.10),
        _ => (0.05, 0.20),
    };
}
