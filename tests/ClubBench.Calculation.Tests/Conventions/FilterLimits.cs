using ClubBench.Calculation.Choosing;
using ClubBench.Calculation.Elliptic;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Fitting;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Sweeps;
using CsCheck;

namespace ClubBench.Calculation.Tests.Conventions;

/// <summary>Filter methods give finite figures or refuse, whatever number they are given.</summary>
public class FilterLimits
{
    private static readonly Gen<double> Wild = Gen.OneOf(Gen.Double, Gen.Double[-10, 100], Gen.Const(0.0), Gen.Const(double.NaN), Gen.Const(double.PositiveInfinity), Gen.Const(double.Epsilon));

    private static readonly PassBandRipple TwentyDb = PassBandRipple.FromReflection(0.1);

    public static TheoryData<string> Methods => new(ByName.Keys);

    private static readonly Dictionary<string, Func<double, double, int, double>> ByName = new(StringComparer.Ordinal)
    {
        ["attenuation of a prototype"] = (x, y, n) => LowPassPrototype.Chebyshev(n, PassBandRipple.FromRipple(Decibels.FromDb(y))).Attenuation(x).Db,
        ["attenuation of Butterworth"] = (x, _, n) => LowPassPrototype.Butterworth(n).Attenuation(x).Db,
        ["loss estimate"] = (x, y, n) => LowPassPrototype.Butterworth(n).LossEstimate(x, y, y).Db,
        ["elliptic attenuation"] = (x, y, n) => EllipticApproximation.Of(n, TwentyDb, y).Attenuation(x).Db,
        ["elliptic from the stop-band edge"] = (x, _, n) => EllipticApproximation.FromStopBandEdge(n, TwentyDb, x).StopBandLoss.Db,
        ["elliptic ripple"] = (x, y, n) => EllipticSynthesis.Of(EllipticApproximation.Of(n, PassBandRipple.FromReflection(x), y)).Deviation.Db,
        ["elliptic filter"] = (x, y, n) => EllipticDesign.WithLowestNotchAt(new(n, TwentyDb, Frequency.FromHertz(x), Resistance.FromOhm(50)), Frequency.FromHertz(y)).Filter?.SmallestCoil.Henry ?? 0,
        ["notch placement"] = (x, _, n) => NotchPlacement.AngleDegreesFor(n, x) ?? 0,
        ["high-pass"] = (x, y, n) => new HighPassGuard(LowPassPrototype.Butterworth(n), Frequency.FromHertz(x), Resistance.FromOhm(50)).Attenuation(Frequency.FromHertz(y)).Db,
        ["high-pass choice"] = (x, y, n) => HighPassChoice.Of(Frequency.FromHertz(x), Frequency.FromHertz(y), Decibels.FromDb(10 * n), TwentyDb, Resistance.FromOhm(50)).LowestThatWorks?.Hertz ?? 0,
        ["edge"] = (x, y, _) => LowPassEdge.For(FrequencyRange.FromMegahertz(7, 7.3), x, y).Hertz,
        ["Q over frequency"] = (x, y, _) => new UnloadedQ(x, Frequency.FromMegahertz(7), y, Frequency.FromMegahertz(7)).Of(Frequency.FromHertz(Math.Abs(x))),
        ["turns too many"] = (x, _, n) => new FittedPart(0, true, x, 0.01, 0.1).SurplusTurns(n),
        ["one port at another reference"] = (x, y, _) =>
            SweepReference.To(new([new(Frequency.FromHertz(1), x)], Resistance.FromOhm(75), Resistance.FromOhm(75)), Resistance.FromOhm(y))?.Points[0].S11.Real ?? 0,
    };

    [Theory]
    [MemberData(nameof(Methods))]
    public void Method_WildNumbers_GivesAFiniteFigureOrRefuses(string method) =>
        Gen.Select(Wild, Wild, Gen.Int[-1, 12]).Sample(
            (x, y, n) =>
            {
                try
                {
                    return double.IsFinite(ByName[method](x, y, n));
                }
                catch (ArgumentException)
                {
                    return true;
                }
            },
            iter: 3000);
}
