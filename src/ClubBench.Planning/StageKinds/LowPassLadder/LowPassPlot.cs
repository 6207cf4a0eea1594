using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>Response old, new and limit, as gain in dB over a logarithmic frequency axis.</summary>
internal static class LowPassPlot
{
    private const int Points = 161;
    private const double FloorDb = -80;

    public static Plot Of(StageComparison c)
    {
        var (old, new_) = ((LowPassModel)c.BeforeModel, (LowPassModel)c.AfterModel);
        var band = c.Surroundings.Band;
        var (low, high) = (band.Low.Hertz / 3.5, band.High.Hertz * 4.5);
        var second = band.Low.Harmonic(2);
        var changed = !ReferenceEquals(c.Before, c.After);
        return new Plot(
            "plot.response",
            QuantityKind.Frequency,
            true,
            QuantityKind.Decibels,
            FloorDb,
            5,
            changed ? [CurveOf("plot.old", CurveStyle.Old, old, low, high), CurveOf("plot.new", CurveStyle.New, new_, low, high)] : [CurveOf("plot.kept", CurveStyle.New, new_, low, high)],
            [.. LimitOf(DemandCodes.HarmonicAttenuation, "plot.limit", false), .. LimitOf(DemandCodes.HarmonicAttenuationWish, "plot.wish", true)],
            [
                new PlotMark(c.Surroundings.Reference.Hertz, -new_.Loss.Db, "plot.at-carrier"),
                new PlotMark(second.Hertz, -new_.LossAt(second).Db, "plot.at-second-harmonic"),
            ]);

        IEnumerable<LimitLine> LimitOf(string code, string label, bool wish) =>
            c.Demands.Where(d => d.Code == code && d.Wanted.Si > 0).OrderByDescending(d => d.Wanted.Si).Take(1)
                .Select(d => new LimitLine(label, second.Hertz, high, -d.Wanted.Si - new_.Loss.Db, ForbiddenAbove: true, wish));
    }

    private static Curve CurveOf(string label, CurveStyle style, LowPassModel model, double lowHz, double highHz)
    {
        var x = Enumerable.Range(0, Points).Select(i => lowHz * Math.Pow(highHz / lowHz, (double)i / (Points - 1))).ToList();
        var y = x.Select(f => -model.LossAt(Frequency.FromHertz(f)).Db).ToList();
        var shown = y.FindIndex(v => v < FloorDb) is >= 0 and var cut ? cut : y.Count;
        return new Curve(label, style, x[..shown], y[..shown]);
    }
}
