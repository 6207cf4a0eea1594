using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Planning.Budgets;

/// <summary>Local-oscillator voltage at every mixer, against the window the mixer wants. Method: voltage divider of source and port impedance.</summary>
public sealed class OscillatorLevelBudget : IChainBudget
{
    /// <inheritdoc/>
    public string Id => "oscillator-level";

    /// <inheritdoc/>
    public IEnumerable<Demand> Ask(string stage, Chain chain)
    {
        foreach (var branch in chain.Paths.Oscillators.Where(b => b.Path.Steps[^1].Stage == stage))
            if (chain.Facet<IMixes>(branch.Mixer) is { } mixer)
            {
                yield return new Demand(DemandCodes.OscillatorLevelLow, chain.Conditions.Reference, Figure.Of("low", QuantityKind.PeakToPeakVoltage, mixer.Window.Low.Volt), Id);
                yield return new Demand(DemandCodes.OscillatorLevelHigh, chain.Conditions.Reference, Figure.Of("high", QuantityKind.PeakToPeakVoltage, mixer.Window.High.Volt), Id);
            }
    }

    /// <inheritdoc/>
    public Budget Check(Chain chain)
    {
        var rows = chain.Paths.Oscillators.Select(b => (Branch: b, Level: Level(b, chain))).Where(r => r.Level is not null).ToList();
        return new Budget(
            Id,
            [.. rows.Select(r => new BudgetLine(r.Branch.Mixer, LineOf(r.Branch, r.Level!.Value, chain)))],
            [.. rows.SelectMany(r => Findings(r.Branch, r.Level!.Value, chain))]);
    }

    private static Voltage? Level(OscillatorBranch branch, Chain chain)
    {
        var last = branch.Path.Steps[^1];
        if (chain.Facet<IDrivesMixer>(last.Stage) is not { } driver || chain.Facet<IMixes>(branch.Mixer) is null) return null;
        var (open, source) = driver.Drive(last.To, chain.Conditions.Reference);
        var load = chain.Facet<IPresents>(branch.Mixer)?.Impedance(branch.Port, chain.Conditions.Reference) ?? Complex.Infinity;
        return Complex.IsFinite(load) ? open * Complex.Abs(load / (load + source)) : open;
    }

    private static IReadOnlyList<Figure> LineOf(OscillatorBranch branch, Voltage level, Chain chain)
    {
        var (low, high) = chain.Facet<IMixes>(branch.Mixer)!.Window;
        return
        [
            Figure.Of("level", QuantityKind.PeakToPeakVoltage, level.Volt),
            Figure.Of("low", QuantityKind.PeakToPeakVoltage, low.Volt),
            Figure.Of("high", QuantityKind.PeakToPeakVoltage, high.Volt),
        ];
    }

    private static IEnumerable<Finding> Findings(OscillatorBranch branch, Voltage level, Chain chain)
    {
        var (low, high) = chain.Facet<IMixes>(branch.Mixer)!.Window;
        var source = branch.Path.Steps[^1].Stage;
        if (level < low) yield return new Finding("budget.oscillator-level-low", Severity.Warning, source, null, LineOf(branch, level, chain), StageAction.Change, OpenItemCodes.OscillatorLevel);
        if (level > high) yield return new Finding("budget.oscillator-level-high", Severity.Warning, source, null, LineOf(branch, level, chain), StageAction.Change, OpenItemCodes.OscillatorLevel);
    }
}
