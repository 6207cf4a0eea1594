using ClubBench.Calculation.CrystalFilters;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.CrystalFilters;

/// <summary>Whatever crystal and width are asked for, the answer is a number, a refusal or nothing.</summary>
public class CrystalFilterWildTests
{
    private static readonly Gen<CrystalFilterTask> Any = Gen.Select(Gen.Int[2, 12], Gen.Double[-1, 8], Gen.Double[-3, 4], Gen.Double[-1, 3], Gen.Double[-2, 4], Gen.Double[-1, 6]).Select((n, mhz, cmFf, c0Pf, rm, width) =>
        new CrystalFilterTask(
            CrystalFilterPrototype.EqualCapacitor(n),
            new(Frequency.FromMegahertz(Math.Pow(10, mhz)), Capacitance.FromFarad(1e-15 * Math.Pow(10, cmFf)), Capacitance.FromPicofarad(Math.Pow(10, c0Pf)), Resistance.FromOhm(Math.Pow(10, rm))),
            Frequency.FromHertz(Math.Pow(10, width))));

    [Fact]
    public void Design_AnyTask_IsMadeOrRefused() => Any.Sample(task =>
    {
        var design = CrystalFilterDesign.Of(task);
        return (design.Filter is null) == (design.Refusal != CrystalFilterRefusal.None) && (design.Filter is null || double.IsFinite(design.Filter.Loss(task.Crystal.SeriesResonance).Db));
    });

    [Fact]
    public void Response_AnyTask_IsFiniteOrNone() => Any.Sample(
        task =>
        {
            if (CrystalFilterDesign.Of(task).Filter is not { } filter || CrystalFilterResponse.Of(filter, task.Bandwidth3dB) is not { } response) return true;
            return response.Loss.Db >= 0 && response.Ripple.Db >= 0 && response.Width3dBHertz > 0 && response.Band6dB.WidthHertz >= response.Width3dBHertz
                && response.ShapeFactor is null or >= 1;
        },
        iter: 60);

    [Fact]
    public void ZeroPhaseResonance_AnyCrystal_IsAboveSeriesResonanceOrNotGiven() => Any.Sample(task =>
        task.Crystal.ZeroPhaseResonance is not { } zero || (zero >= task.Crystal.SeriesResonance && zero <= task.Crystal.ParallelResonance * (1 + 1e-12)));

    [Fact]
    public void Impedance_AnyCrystalAndFrequency_IsFinite() => Gen.Select(Any, Gen.Double[-6, 6]).Sample((task, decades) =>
    {
        var impedance = task.Crystal.Impedance(task.Crystal.SeriesResonance * Math.Pow(10, decades));
        return double.IsFinite(impedance.Real) && double.IsFinite(impedance.Imaginary);
    });
}
