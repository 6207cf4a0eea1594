using ClubBench.Calculation.BandPass;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.CrystalFilters;

/// <summary>What a crystal filter shall do and with which crystals.</summary>
/// <param name="Prototype">Shape and number of crystals.</param>
/// <param name="Crystal">The crystals as measured, their mean; no resistance stated means lossless.</param>
/// <param name="Bandwidth3dB">Half-power bandwidth.</param>
public sealed record CrystalFilterTask(CrystalFilterPrototype Prototype, CrystalParameters Crystal, Frequency Bandwidth3dB)
{
    internal double SpacingHertz => Crystal.ParallelResonance.Hertz - Crystal.SeriesResonance.Hertz;
}

/// <summary>Why there is no such crystal filter.</summary>
public enum CrystalFilterRefusal
{
    /// <summary>There is.</summary>
    None,

    /// <summary>Wider than about a third of the distance from series to parallel resonance.</summary>
    TooWide,

    /// <summary>No design bandwidth gives the wanted one once C0 is in: wider couplings no longer widen the filter.</summary>
    NotReached,

    /// <summary>Loss makes it wider than wanted whatever the couplings: take crystals of higher Q or of a lower frequency.</summary>
    WidenedByLoss,
}

/// <summary>What is to be said with a crystal filter that works.</summary>
public enum CrystalFilterRemark
{
    /// <summary>C0 makes it narrower than designed by more than a trifle: design it corrected.</summary>
    NarrowedByStaticCapacitance,

    /// <summary>Beyond a tenth of the distance from series to parallel resonance the design formulas fail; only the analysis holds.</summary>
    BeyondDesignFormulas,

    /// <summary>Below 300 Hz with crystals above 6 MHz: crystals of 4 to 5 MHz lose less. Source: common practice.</summary>
    LowerCrystalsLoseLess,
}

/// <summary>A designed crystal filter, or why there is none and what would do.</summary>
/// <remarks>
/// Method: coupling capacitor Cm fs/(k BW); ends 2 pi BW Lm/q; a series capacitor in every mesh that has less elastance than the largest.
/// Valid: bandwidth up to a tenth of fp - fs as designed, up to 0.35 of it when corrected. C0 narrows the filter and steepens its upper skirt.
/// Source: dishal-1951 for synchronous tuning; derived.
/// </remarks>
/// <param name="Filter">The filter; null where refused.</param>
/// <param name="Refusal">The reason.</param>
/// <param name="Remarks">What is to be said with it.</param>
/// <param name="DesignBandwidth">Bandwidth the formulas were given; wider than wanted when corrected.</param>
/// <param name="WidestBandwidth">Widest that these crystals are accepted for; where the wanted one is not reached, the widest found.</param>
/// <param name="EstimatedLoss">4.343 sum(g) f0/(BW Qu), good to 0.3 dB up to 6 dB; null where the crystals state no resistance.</param>
public sealed record CrystalFilterDesign(
    CrystalFilter? Filter, CrystalFilterRefusal Refusal, IReadOnlyList<CrystalFilterRemark> Remarks, Frequency DesignBandwidth, Frequency WidestBandwidth, Decibels? EstimatedLoss)
{
    private const double WidestShare = 0.35;
    private const double FormulaShare = 0.1;
    private const double UncorrectedShare = 0.05;
    private const double Step = 1.2;

    /// <summary>Designs the filter by the formulas alone.</summary>
    public static CrystalFilterDesign Of(CrystalFilterTask task) => task.Bandwidth3dB.Hertz > WidestShare * task.SpacingHertz
        ? Result(task, null, CrystalFilterRefusal.TooWide, task.Bandwidth3dB)
        : Result(task, CrystalFilterParts.For(task, task.Bandwidth3dB), CrystalFilterRefusal.None, task.Bandwidth3dB);

    /// <summary>
    /// Designs the filter so that its analysed half-power bandwidth is the wanted one to 1e-5. Method: steps of 1.2 in the design bandwidth from half the wanted
    /// one, then halving. The analysed width saturates, with Butterworth at 0.3 of fp - fs for six crystals and 0.2 for eight: what lies beyond is
    /// not reached, and the widest found is told.
    /// </summary>
    public static CrystalFilterDesign Corrected(CrystalFilterTask task)
    {
        if (Of(task) is { Refusal: not CrystalFilterRefusal.None } refused) return refused;
        var (belowHz, widestHz) = (0.0, 0.0);
        for (var designHz = 0.5 * task.Bandwidth3dB.Hertz; designHz < task.SpacingHertz; designHz *= Step)
        {
            var widthHz = AnalysedHertz(task, designHz);
            widestHz = Math.Max(widestHz, widthHz);
            if (widthHz >= task.Bandwidth3dB.Hertz) return Between(task, belowHz, designHz) ?? WidenedByLoss(task);
            belowHz = designHz;
        }

        return widestHz > 0
            ? Result(task, null, CrystalFilterRefusal.NotReached, task.Bandwidth3dB) with { WidestBandwidth = Frequency.FromHertz(widestHz) }
            : WidenedByLoss(task);
    }

    // Null where the width jumps past the wanted one: loss then sets it, not the couplings.
    private static CrystalFilterDesign? Between(CrystalFilterTask task, double lowHz, double highHz)
    {
        var wantedHz = task.Bandwidth3dB.Hertz;
        var designHz = Bisection.TurningPoint(hz => AnalysedHertz(task, hz) >= wantedHz, Math.Max(lowHz, 1e-3 * highHz), highHz, 1e-6 * highHz);
        if (Math.Abs(AnalysedHertz(task, designHz) - wantedHz) > (1e-5 * wantedHz) + (4e-9 * task.Crystal.SeriesResonance.Hertz)) return null;
        var design = Frequency.FromHertz(designHz);
        return Result(task, CrystalFilterParts.For(task, design), CrystalFilterRefusal.None, design);
    }

    private static CrystalFilterDesign WidenedByLoss(CrystalFilterTask task) => Result(task, null, CrystalFilterRefusal.WidenedByLoss, task.Bandwidth3dB);

    // Zero where no pass-band is found.
    private static double AnalysedHertz(CrystalFilterTask task, double designHz)
    {
        var filter = CrystalFilterParts.For(task, Frequency.FromHertz(designHz));
        return BandPassResponse.Of(filter.Loss, filter.LoadedMiddle, task.Bandwidth3dB)?.Band.WidthHertz ?? 0;
    }

    private static CrystalFilterDesign Result(CrystalFilterTask task, CrystalFilter? filter, CrystalFilterRefusal refusal, Frequency design) => new(
        filter,
        refusal,
        filter is null ? [] : [.. RemarksOf(task)],
        design,
        Frequency.FromHertz(WidestShare * task.SpacingHertz),
        task.Crystal.UnloadedQ is { } q ? Decibels.FromDb(10 / Math.Log(10) * task.Prototype.ElementSum * (task.Crystal.SeriesResonance / task.Bandwidth3dB) / q) : null);

    private static IEnumerable<CrystalFilterRemark> RemarksOf(CrystalFilterTask task)
    {
        if (task.Bandwidth3dB.Hertz > UncorrectedShare * task.SpacingHertz) yield return CrystalFilterRemark.NarrowedByStaticCapacitance;
        if (task.Bandwidth3dB.Hertz > FormulaShare * task.SpacingHertz) yield return CrystalFilterRemark.BeyondDesignFormulas;
        if (task.Bandwidth3dB.Hertz < 300 && task.Crystal.SeriesResonance.Megahertz > 6) yield return CrystalFilterRemark.LowerCrystalsLoseLess;
    }
}
