using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;
using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.LinearAlgebra.Double;
using MathNet.Numerics.Optimization;

namespace ClubBench.Calculation.Oscillators;

/// <summary>A crystal fitted to readings.</summary>
/// <param name="Crystal">Fitted crystal, its resistance not stated; null when refused.</param>
/// <param name="RmsResidualHertz">Root mean square of the residuals, Hz.</param>
/// <param name="DegreesOfFreedom">Readings less fitted parameters.</param>
/// <param name="ResidualsHertz">Reading less model, one per reading in the order given.</param>
/// <param name="StandardErrorOfMotional">Relative standard error (k = 1) of Cm; null without degrees of freedom.</param>
/// <param name="Refusal">None when there is a fit.</param>
public sealed record FittedCrystal(
    CrystalParameters? Crystal,
    double RmsResidualHertz,
    int DegreesOfFreedom,
    IReadOnlyList<double> ResidualsHertz,
    double? StandardErrorOfMotional,
    MeasurementRefusal Refusal)
{
    private const double SuspectDeviations = 4;
    private const double SuspectHertz = 20;

    /// <summary>
    /// Places of readings to be taken again: more than 20 Hz and four robust standard deviations off. A root mean square would not do: among few readings
    /// one cannot exceed it fourfold, however wrong it is. Source: common practice.
    /// </summary>
    public IReadOnlyList<int> SuspectReadings()
    {
        if (ResidualsHertz.Count == 0) return [];
        var limit = Math.Max(SuspectHertz, SuspectDeviations * Median.AbsoluteDeviation([.. ResidualsHertz]));
        return [.. Enumerable.Range(0, ResidualsHertz.Count).Where(i => Math.Abs(ResidualsHertz[i]) > limit)];
    }
}

/// <summary>
/// Least-squares fit of a crystal to frequency readings. Method: Levenberg-Marquardt on residuals in hertz, best of several starts.
/// Valid: three readings at least; C0 and Cm hang together, so give C0 when the capacitors spread less than 3:1. Source: derived.
/// </summary>
public static class CrystalFit
{
    private static readonly double[] StartsFf = [5, 12, 25, 60];

    /// <summary>Crystal on known load capacitors, all three parameters fitted.</summary>
    public static FittedCrystal FromLoads(IReadOnlyList<LoadedReading> readings) => Refuse(readings) ?? Best(
        readings,
        StartsFf.Select(ff => new[] { Math.Log(SpreadHertz(readings)), Math.Log(ff), Math.Log(5.0) }),
        p => Crystal(LowestHz(readings) - Math.Exp(p[0]), p[1], p[2]),
        Loaded);

    /// <summary>Crystal on known load capacitors with C0 from a bridge.</summary>
    public static FittedCrystal FromLoads(IReadOnlyList<LoadedReading> readings, Capacitance staticCapacitance) => Refuse(readings) ?? Best(
        readings,
        StartsFf.Select(ff => new[] { Math.Log(SpreadHertz(readings)), Math.Log(ff) }),
        p => Crystal(LowestHz(readings) - Math.Exp(p[0]), p[1], Math.Log(staticCapacitance.Picofarad)),
        Loaded);

    /// <summary>
    /// Crystal in a pulled oscillator: readings against settings of the variable capacitor (<see cref="LoadedReading.Load"/>). The loop gives
    /// every part and the crystal's C0; its fs and Cm are what is fitted.
    /// </summary>
    public static FittedCrystal FromOscillator(IReadOnlyList<LoadedReading> readings, PulledCrystalLoop loop) => Refuse(readings) ?? Best(
        readings,
        StartsFf.Select(ff => new[] { 0.5, Math.Log(ff) }),
        p => Crystal(LowestHz(readings) + (p[0] * SpreadHertz(readings)), p[1], Math.Log(loop.Crystal.StaticCapacitance.Picofarad)),
        (crystal, variable) => Pulled(loop with { Crystal = crystal }, variable));

    private static double Loaded(CrystalParameters crystal, Capacitance load) => crystal.LoadedFrequency(load).Hertz;

    // A start can wander where the loop has no frequency; the series resonance keeps the misfit finite and large.
    private static double Pulled(PulledCrystalLoop loop, Capacitance variable) =>
        loop.RefusalAt(variable) == LoopRefusal.None ? loop.FrequencyAt(variable).Hertz : loop.Crystal.SeriesResonance.Hertz;

    private static FittedCrystal Best(
        IReadOnlyList<LoadedReading> readings,
        IEnumerable<double[]> starts,
        Func<Vector<double>, CrystalParameters> crystalOf,
        Func<CrystalParameters, Capacitance, double> frequencyHz)
    {
        var referenceHz = LowestHz(readings);
        var observed = DenseVector.OfEnumerable(readings.Select(r => r.Frequency.Hertz - referenceHz));
        var settings = DenseVector.OfEnumerable(readings.Select(r => r.Load.Farad));
        var best = starts.Select(s => Minimise(s)).MinBy(r => Misfit(r.MinimizingPoint))!;

        var crystal = crystalOf(best.MinimizingPoint);
        double[] residuals = [.. readings.Select(r => r.Frequency.Hertz - frequencyHz(crystal, r.Load))];
        var degrees = readings.Count - best.MinimizingPoint.Count;
        var rms = Math.Sqrt(residuals.Sum(r => r * r) / readings.Count);
        return new FittedCrystal(crystal, rms, degrees, residuals, degrees > 0 ? best.StandardErrors[1] : null, MeasurementRefusal.None);

        NonlinearMinimizationResult Minimise(double[] start) => new LevenbergMarquardtMinimizer(maximumIterations: 2000).FindMinimum(
            ObjectiveFunction.NonlinearModel((p, x) => Model(p, x), settings, observed), DenseVector.OfArray(start));

        Vector<double> Model(Vector<double> p, Vector<double> x) =>
            x.Map(f => frequencyHz(crystalOf(p), Capacitance.FromFarad(f)) - referenceHz);

        double Misfit(Vector<double> p) => (Model(p, settings) - observed).L2Norm();
    }

    private static FittedCrystal? Refuse(IReadOnlyList<LoadedReading> readings)
    {
        var sorted = readings.OrderBy(r => r.Load).ToList();
        if (sorted.Select(r => r.Load).Distinct().Count() < 3) return Refused(MeasurementRefusal.TooFewLoads);
        return sorted.Zip(sorted.Skip(1)).Any(p => p.Second.Load > p.First.Load && p.Second.Frequency >= p.First.Frequency)
            ? Refused(MeasurementRefusal.NotFalling)
            : null;

        static FittedCrystal Refused(MeasurementRefusal why) => new(null, 0, 0, [], null, why);
    }

    private static double LowestHz(IReadOnlyList<LoadedReading> readings) => readings.Min(r => r.Frequency.Hertz);

    private static double SpreadHertz(IReadOnlyList<LoadedReading> readings) => readings.Max(r => r.Frequency.Hertz) - LowestHz(readings);

    // Bounded so that a wild step still names a crystal.
    private static CrystalParameters Crystal(double seriesHz, double lnMotionalFf, double lnStaticPf) => new(
        Frequency.FromHertz(Math.Max(1, seriesHz)),
        Capacitance.FromFarad(1e-15 * Math.Exp(Math.Clamp(lnMotionalFf, -10, 15))),
        Capacitance.FromPicofarad(Math.Exp(Math.Clamp(lnStaticPf, -10, 10))),
        default);
}
