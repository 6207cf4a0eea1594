using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;
using MathNet.Numerics.Statistics;

namespace ClubBench.Calculation.Crystals;

/// <summary>What the crystals of many boards have in common. Immutable.</summary>
/// <remarks>
/// Method: medians of fs, Cm, C0 and Rm; crystals of the tenth and ninetieth percentile of Cm with the other figures at their medians
/// (percentiles unbiased towards the median).
/// Valid: crystals of one order; five or more for the percentiles to mean anything. Source: derived (order statistics).
/// </remarks>
/// <param name="Middle">The median crystal: choose the inductor for it.</param>
/// <param name="WeakPulling">Cm at the tenth percentile: the narrowest dial nine out of ten boards exceed.</param>
/// <param name="StrongPulling">Cm at the ninetieth percentile: the one whose inductor takes over first.</param>
/// <param name="SeriesDeviationHertz">Robust standard deviation of fs, Hz.</param>
public sealed record CrystalPool(CrystalParameters Middle, CrystalParameters WeakPulling, CrystalParameters StrongPulling, double SeriesDeviationHertz)
{
    /// <summary>Pools the crystals of at least one board, all of one kind and overtone.</summary>
    public static CrystalPool Of(IReadOnlyList<CrystalParameters> boards)
    {
        Guard.Within(boards.Count, 1, 100_000, nameof(boards));
        var motional = boards.Select(b => b.MotionalCapacitance.Farad).ToList();
        var middle = boards[0] with
        {
            SeriesResonance = Frequency.FromHertz(Of(boards, b => b.SeriesResonance.Hertz)),
            MotionalCapacitance = Capacitance.FromFarad(Median.Of(motional)),
            StaticCapacitance = Capacitance.FromFarad(Of(boards, b => b.StaticCapacitance.Farad)),
            MotionalResistance = Resistance.FromOhm(Of(boards, b => b.MotionalResistance.Ohm)),
        };
        return new(
            middle,
            middle with { MotionalCapacitance = Capacitance.FromFarad(motional.Percentile(10)) },
            middle with { MotionalCapacitance = Capacitance.FromFarad(motional.Percentile(90)) },
            Median.AbsoluteDeviation([.. boards.Select(b => b.SeriesResonance.Hertz)]));
    }

    private static double Of(IReadOnlyList<CrystalParameters> boards, Func<CrystalParameters, double> figure) => Median.Of([.. boards.Select(figure)]);
}
