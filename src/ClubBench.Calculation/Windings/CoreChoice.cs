using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Windings;

/// <summary>How well a core's material suits a tuned circuit at a frequency.</summary>
public enum TunedFit
{
    /// <summary>Inside its best range.</summary>
    Good,

    /// <summary>Iron powder outside its best range: lower Q, to be measured.</summary>
    OutsideBestRange,

    /// <summary>Not for a tuned circuit here: too lossy or beyond its usable range.</summary>
    Unsuitable,
}

/// <summary>Which cores suit a frequency in a tuned circuit. Source: ranges of the core tables; common practice.</summary>
public static class CoreChoice
{
    /// <summary>Judges a core. A ferrite outside its range for tuned circuits is unsuitable: its losses rise steeply.</summary>
    public static TunedFit Judge(Core core, Frequency frequency)
    {
        if (core.BestRange.Contains(frequency)) return TunedFit.Good;
        return core is IronPowderCore && core.UsableRange.Contains(frequency) ? TunedFit.OutsideBestRange : TunedFit.Unsuitable;
    }

    /// <summary>The most Q that the material of a ferrite allows at a frequency, mu'/mu''; null where its permeability is not known there.</summary>
    public static double? MaterialQ(Core core, Frequency frequency) =>
        core is IronPowderCore ? null : FerritePermeability.At(core.Mix, frequency)?.Quality;

    /// <summary>
    /// Rings of iron powder that take a winding for an inductance in one layer of a wire at a frequency inside their best range, the best use of
    /// the layer (60 to 90 %) and the smallest error of whole turns first. Empty where none does.
    /// </summary>
    public static IReadOnlyList<ToroidWinding> Windings(Inductance wanted, Frequency frequency, Wire wire) =>
    [
        .. Cores.IronPowder.Where(c => Judge(c, frequency) == TunedFit.Good)
            .Select(c => (Choice: TurnsChoice.For(c.InductanceFactor, wanted), Core: c))
            .Select(x => (x.Choice, Winding: new ToroidWinding(x.Core, x.Choice.Best.Turns, wire)))
            .Where(x => x.Winding.Fits)
            .OrderByDescending(x => x.Winding.Fill is >= 0.6 and <= 0.9)
            .ThenBy(x => Math.Abs(x.Choice.Best.Error))
            .Select(x => x.Winding),
    ];
}
