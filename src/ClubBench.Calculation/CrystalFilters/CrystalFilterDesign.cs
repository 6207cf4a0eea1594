using ClubBench.Calculation.Crystals;
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

    /// <summary>No design bandwidth gives the wanted one once C0 and loss are in.</summary>
    NotReached,
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
/// <param name="WidestBandwidth">Widest that these crystals are accepted for.</param>
/// <param name="EstimatedLoss">4.343 sum(g) f0/(BW Qu), good to 0.3 dB up to 6 dB; null where the crystals state no resistance.</param>
public sealed record CrystalFilterDesign(
    CrystalFilter? Filter, CrystalFilterRefusal Refusal, IReadOnlyList<CrystalFilterRemark> Remarks, Frequency DesignBandwidth, Frequency WidestBandwidth, Decibels? EstimatedLoss)
{
    private const double WidestShare = 0.35;
    private const double FormulaShare = 0.1;
    private const double UncorrectedShare = 0.05;
    private const int MostCorrections = 60;

    /// <summary>Designs the filter by the formulas alone.</summary>
    public static CrystalFilterDesign Of(CrystalFilterTask task) => task.Bandwidth3dB.Hertz > WidestShare * task.SpacingHertz
        ? Result(task, null, CrystalFilterRefusal.TooWide, task.Bandwidth3dB)
        : Result(task, CrystalFilterParts.For(task, task.Bandwidth3dB), CrystalFilterRefusal.None, task.Bandwidth3dB);

    /// <summary>
    /// Designs the filter so that its analysed half-power bandwidth is the wanted one to 1e-6. Method: the design bandwidth scaled by wanted over
    /// analysed until they agree.
    /// </summary>
    public static CrystalFilterDesign Corrected(CrystalFilterTask task)
    {
        if (Of(task) is { Refusal: not CrystalFilterRefusal.None } refused) return refused;
        var design = task.Bandwidth3dB;
        for (var i = 0; i < MostCorrections && design.Hertz < task.SpacingHertz; i++)
        {
            var filter = CrystalFilterParts.For(task, design);
            if (CrystalFilterResponse.Of(filter, task.Bandwidth3dB) is not { } response) break;
            var correction = task.Bandwidth3dB.Hertz / response.Width3dBHertz;
            if (Math.Abs(correction - 1) < 1e-6) return Result(task, filter, CrystalFilterRefusal.None, design);
            design *= correction;
        }

        return Result(task, null, CrystalFilterRefusal.NotReached, design);
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
