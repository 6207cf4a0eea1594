using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Switching;
using CsCheck;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Switching;

public class DiodeSwitchTests
{
    private static readonly Gen<(DiodeSwitch Diode, Power Power, Frequency Frequency)> Switches = Gen.Select(
        Gen.Double[5, 100], Gen.Double[0.1, 10], Gen.Double[0.1, 20], Gen.Double[1, 60],
        (ma, us, watt, mhz) => (new DiodeSwitch(Current.FromMilliampere(ma), Duration.FromSecond(us * 1e-6)), Power.FromWatt(watt), Frequency.FromMegahertz(mhz)));

    [Fact]
    [Evidence(typeof(DiodeSwitch), EvidenceKind.IndependentRecomputation)]
    public void ChargeRatio_HalfCycleOfCurrentSummed_IsTheStoredChargeOverIt() =>
        Switches.Sample(
            s =>
            {
                const int Steps = 1000;
                var (peak, step) = (Math.Sqrt(2) * Math.Sqrt(s.Power.Watt / 50), 0.5 / s.Frequency.Hertz / Steps);
                var moved = Enumerable.Range(0, Steps).Sum(i => peak * Math.Sin(s.Frequency.RadiansPerSecond * (i + 0.5) * step) * step);
                return Math.Abs((s.Diode.ChargeRatio(s.Power, FiftyOhm, s.Frequency) / (s.Diode.Bias.Ampere * s.Diode.Lifetime.Second / moved)) - 1) < 1e-5;
            },
            iter: 50);

    [Fact]
    [Evidence(typeof(DiodeSwitch), EvidenceKind.Identity)]
    public void ChargeRatio_FourTimesThePowerOrTwiceTheFrequency_HalvesOrDoublesIt() =>
        Switches.Sample(s =>
        {
            var ratio = s.Diode.ChargeRatio(s.Power, FiftyOhm, s.Frequency);
            return Math.Abs((s.Diode.ChargeRatio(s.Power * 4, FiftyOhm, s.Frequency) / ratio) - 0.5) < 1e-9
                && Math.Abs((s.Diode.ChargeRatio(s.Power, FiftyOhm, s.Frequency * 2) / ratio) - 2) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(DiodeSwitch), EvidenceKind.RoundTrip)]
    public void CleanAbove_JudgedJustAboveAndBelow_IsTheEdge() =>
        Switches.Sample(s =>
        {
            var edge = s.Diode.CleanAbove(s.Power, FiftyOhm);
            return s.Diode.Judge(s.Power, FiftyOhm, edge * 1.0001) == DiodeSwitchVerdict.Clean && s.Diode.Judge(s.Power, FiftyOhm, edge * 0.9999) == DiodeSwitchVerdict.CheckHarmonics;
        });

    [Fact]
    [Evidence(typeof(DiodeSwitch), EvidenceKind.IndependentRecomputation)]
    public void OffIsolation_AnyDiode_IsTheLossOfItsCapacitanceByChainMatrix() =>
        Gen.Select(Gen.Double[0.1, 20], Gen.Double[1, 60], Gen.Double[10, 300]).Sample((pf, mhz, ohm) =>
        {
            var (c, f, line) = (Capacitance.FromPicofarad(pf), Frequency.FromMegahertz(mhz), Resistance.FromOhm(ohm));
            return Math.Abs(DiodeSwitch.OffIsolation(c, line, f).Db - LadderElement.SeriesCapacitor(c).At(f).Loss(line, line).Db) < 1e-9;
        });
}
