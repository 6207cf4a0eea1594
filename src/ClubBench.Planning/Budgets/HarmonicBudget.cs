using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Budgets;

/// <summary>Harmonics in the antenna: raw level of the stage that makes them, less what the filters behind take away, against the limit set.
/// The planning verdict uses one standard uncertainty; even its pass means "measure before going on the air".
/// Source: filters-and-transmitter method 5.3 (derived), raw levels common practice.</summary>
public sealed class HarmonicBudget : IChainBudget
{
    private static readonly int[] Orders = [2, 3, 4, 5];

    /// <summary>A 50 ohm sum does not hold at the harmonics: one standard uncertainty of the filter's attenuation there (common practice).</summary>
    private const double FilterUncertaintyDb = 3;

    /// <inheritdoc/>
    public string Id => "harmonics";

    /// <inheritdoc/>
    public IEnumerable<Demand> Ask(string stage, Chain chain)
    {
        if (Maker(chain) is not { } maker || !chain.Paths.Transmit.After(maker).Contains(stage, StringComparer.Ordinal) || chain.Facet<IPasses>(stage) is null) yield break;
        foreach (var order in Orders)
            foreach (var f in Ends(chain).Select(f => f.Harmonic(order)))
            {
                if (Limit(chain) is not { } limit) continue;
                var (raw, _) = chain.Facet<IMakesHarmonics>(maker)!.Harmonic(order);
                var needed = Decibels.FromDb(Math.Max(limit.Db + raw.Db, 0));
                yield return new Demand(DemandCodes.HarmonicAttenuation, f, Figure.Of("needed", needed), Id);
                yield return new Demand(DemandCodes.HarmonicAttenuationWish, f, Figure.Of("wished", needed + chain.Conditions.WishMargin), Id);
            }
    }

    /// <inheritdoc/>
    public Budget Check(Chain chain)
    {
        if (Maker(chain) is not { } maker) return new Budget(Id, [], []);
        var rows = Orders.Select(o => Row(o, maker, chain)).OfType<HarmonicRow>().ToList();
        var filter = chain.Paths.Transmit.After(maker).LastOrDefault(s => chain.Facet<IPasses>(s) is not null) ?? maker;
        return new Budget(Id, [.. rows.Select(r => new BudgetLine(filter, r.Figures))], [.. Findings(rows, filter)]);
    }

    private static HarmonicRow? Row(int order, string maker, Chain chain)
    {
        var (raw, uRaw) = chain.Facet<IMakesHarmonics>(maker)!.Harmonic(order);
        var worst = Ends(chain).Select(f => (F: f, Taken: Taken(f, order, maker, chain))).MinBy(x => x.Taken.Db);
        if (Limit(chain) is not { } limit) return null;
        return new HarmonicRow(order, worst.F.Harmonic(order), raw - worst.Taken, limit, Math.Sqrt((uRaw.Db * uRaw.Db) + (FilterUncertaintyDb * FilterUncertaintyDb)));
    }

    /// <summary>What all passive stages behind the maker take from a harmonic beyond what they take from the carrier.</summary>
    private static Decibels Taken(Frequency carrier, int order, string maker, Chain chain) =>
        chain.Paths.Transmit.After(maker).Select(chain.Facet<IPasses>).OfType<IPasses>()
            .Aggregate(Decibels.Zero, (sum, p) => sum + (Loss(p, carrier.Harmonic(order)) - Loss(p, carrier)));

    private static Decibels Loss(IPasses passive, Frequency f) => passive.At(f).Loss(Resistance.FromOhm(50), Resistance.FromOhm(50));

    private static string? Maker(Chain chain) => chain.Paths.Transmit.Stages.LastOrDefault(s => chain.Facet<IMakesHarmonics>(s) is not null);

    private static IEnumerable<Frequency> Ends(Chain chain) => [chain.Conditions.Band.Low, chain.Conditions.Band.High];

    private static Decibels? Limit(Chain chain) =>
        chain.Conditions.WantedPower is { } power ? chain.Conditions.Limits.Required(power, chain.Conditions.Reference).Attenuation : null;

    private static IEnumerable<Finding> Findings(IReadOnlyList<HarmonicRow> rows, string filter)
    {
        if (rows.Count == 0) yield break;
        var worst = rows.MinBy(r => r.MarginDb)!;
        yield return worst.MarginDb <= -worst.StandardUncertaintyDb
            ? new Finding("budget.harmonics-fail", Severity.Fault, filter, null, worst.Figures, StageAction.Change, OpenItemCodes.Harmonics)
            : worst.MarginDb < worst.StandardUncertaintyDb
                ? new Finding("budget.harmonics-measure", Severity.Warning, filter, null, worst.Figures, StageAction.Check)
                : new Finding("budget.harmonics-pass", Severity.Note, filter, null, worst.Figures, StageAction.Keep);
    }

    private sealed record HarmonicRow(int Order, Frequency At, Decibels Level, Decibels Limit, double StandardUncertaintyDb)
    {
        public double MarginDb => -Level.Db - Limit.Db;

        public IReadOnlyList<Figure> Figures =>
        [
            Figure.Of("order", QuantityKind.Count, Order),
            Figure.Of("at", At),
            new Figure("level", QuantityKind.RelativeLevel, Level.Db, 2 * StandardUncertaintyDb),
            Figure.Of("limit", Limit),
            new Figure("margin", QuantityKind.Decibels, MarginDb, 2 * StandardUncertaintyDb),
        ];
    }
}
