using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Budgets;

/// <summary>Power along the transmit path: asks backwards from the wanted output, checks forwards from the oscillator.
/// Method: losses of passive stages in 50 ohm, drive and limits of amplifying stages as their models say.</summary>
public sealed class DriveBudget : IChainBudget
{
    /// <summary>Up to this much missing at the antenna nobody hears (common practice: a sixth of an S step); beyond it the item stays open.</summary>
    private const double HardlyHeardDb = 1.0;

    /// <summary>A passive stage that loses more than this has its own finding; the stages before it are not asked to make up for it.</summary>
    private static readonly Decibels MostAskedFor = Decibels.FromDb(1);

    /// <inheritdoc/>
    public string Id => "drive";

    /// <inheritdoc/>
    public IEnumerable<Demand> Ask(string stage, Chain chain)
    {
        if (chain.Conditions.WantedPower is not { } wanted || !chain.Paths.Transmit.Contains(stage) || chain.Facet<IAmplifies>(stage) is null) yield break;
        var at = chain.Conditions.Reference;
        var power = chain.Paths.Transmit.After(stage).Reverse().Aggregate(wanted, (p, next) => NeededBefore(next, p, chain, at));
        yield return new Demand(DemandCodes.OutputPower, at, Figure.Of("wanted", power), Id);
    }

    /// <inheritdoc/>
    public Budget Check(Chain chain)
    {
        if (chain.Conditions.WantedPower is not { } wanted || chain.Paths.Transmit.Steps.Count == 0) return new Budget(Id, [], []);
        var at = chain.Conditions.Reference;
        var lines = new List<BudgetLine>();
        Power? given = null;
        foreach (var stage in chain.Paths.Transmit.Stages)
        {
            given = GivenBehind(stage, given, chain, at);
            if (given is { } p) lines.Add(new BudgetLine(stage, LineOf(stage, p, chain, at)));
        }

        return new Budget(Id, lines, given is { } output ? Findings(output, wanted, chain) : []);
    }

    private static Power NeededBefore(string stage, Power behind, Chain chain, Frequency at) =>
        chain.Facet<IAmplifies>(stage) is { } amplifier ? amplifier.DriveFor(behind, at)
        : chain.Facet<IPasses>(stage) is { } passive ? behind * Least(LossOf(passive, at), MostAskedFor).PowerRatio
        : behind;

    private static Power? GivenBehind(string stage, Power? before, Chain chain, Frequency at)
    {
        if (chain.Facet<IAmplifies>(stage) is { } amplifier)
            return before is not { } drive || drive.Watt <= 0 ? amplifier.MostOutput(at) : Least(amplifier.MostOutput(at), drive * ShareOfDrive(amplifier, at));
        if (chain.Facet<IGenerates>(stage) is { } source) return source.Available;
        return chain.Facet<IPasses>(stage) is { } passive && before is { } p ? p / LossOf(passive, at).PowerRatio : before;
    }

    /// <summary>Output per drive where the stage is driven short of its limit.</summary>
    private static double ShareOfDrive(IAmplifies amplifier, Frequency at)
    {
        var most = amplifier.MostOutput(at);
        var drive = amplifier.DriveFor(most, at);
        return drive.Watt > 0 ? most / drive : amplifier.Gain(at).PowerRatio;
    }

    private static Power Least(Power a, Power b) => a < b ? a : b;

    private static Decibels Least(Decibels a, Decibels b) => a < b ? a : b;

    private static Decibels LossOf(IPasses passive, Frequency at) => passive.At(at).Loss(Resistance.FromOhm(50), Resistance.FromOhm(50));

    private IReadOnlyList<Figure> LineOf(string stage, Power given, Chain chain, Frequency at)
    {
        var asked = Ask(stage, chain).Select(d => d.Wanted with { Name = "wanted" }).FirstOrDefault();
        var line = new List<Figure> { Figure.Of("given", given) };
        if (asked is null) return line;
        line.Add(asked);
        if (given.Watt > 0 && asked.Si > 0) line.Add(Figure.Of("margin", Decibels.FromPowerRatio(given.Watt / asked.Si)));
        if (chain.Facet<IAmplifies>(stage) is { } amplifier) line.Add(Figure.Of("gain", amplifier.Gain(at)));
        return line;
    }

    private static IReadOnlyList<Finding> Findings(Power output, Power wanted, Chain chain)
    {
        if (output.Watt <= 0) return [];
        var missing = -Decibels.FromPowerRatio(output / wanted).Db;
        IReadOnlyList<Figure> figures = [Figure.Of("output", output), Figure.Of("wanted", wanted), Figure.Of("missing", QuantityKind.Decibels, Math.Max(missing, 0))];
        var last = chain.Paths.Transmit.Stages.LastOrDefault(s => chain.Facet<IAmplifies>(s) is not null) ?? "";
        return missing switch
        {
            > HardlyHeardDb => [new Finding("budget.drive-short", Severity.Warning, last, null, figures, StageAction.Check, OpenItemCodes.DeviceGain)],
            > 0.05 => [new Finding("budget.drive-little-short", Severity.Note, last, null, figures, StageAction.Check)],
            _ => [],
        };
    }
}
