using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using CsCheck;

namespace ClubBench.Calculation.Tests.Resonators;

public class CapacitiveDividerTests
{
    private static readonly Frequency F = Frequency.FromMegahertz(7.1);

    [Fact]
    [Evidence(typeof(CapacitiveDivider), EvidenceKind.ClosedFormLimit)]
    public void AtTop_ResistanceFarAboveTheReactance_IsTheSquareOfTheCapacitanceRatio()
    {
        var top = new CapacitiveDivider(Capacitance.FromPicofarad(100), Capacitance.FromPicofarad(400)).AtTop(Resistance.FromOhm(1e7), F);

        Assert.Equal(25, top.Resistance.Ohm / 1e7, 1e-6);
        Assert.Equal(80, top.Capacitance.Picofarad, 1e-4);
    }

    [Fact]
    [Evidence(typeof(CapacitiveDivider), EvidenceKind.Identity)]
    public void AtTop_FrequencyAndCapacitorsScaledAgainstEachOther_KeepsTheResistance() =>
        Gen.Select(Gen.Double[5, 500], Gen.Double[5, 2000], Gen.Double[10, 1000], Gen.Double[0.2, 5]).Sample((c1, c2, ohm, k) =>
        {
            var (plain, scaled) = (Divider(c1, c2).AtTop(Resistance.FromOhm(ohm), F), Divider(c1 / k, c2 / k).AtTop(Resistance.FromOhm(ohm), F * k));
            return Math.Abs((scaled.Resistance / plain.Resistance) - 1) < 1e-9 && Math.Abs((k * scaled.Capacitance / plain.Capacitance) - 1) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(CapacitiveDivider), EvidenceKind.RoundTrip)]
    public void SeriesCapacitor_ReadAsADividerWithoutItsLowerPart_GivesWhatWasWanted() =>
        Gen.Select(Gen.Double[10, 500], Gen.Double[1.05, 100]).Sample((ohm, step) =>
        {
            var (series, parallel) = CapacitiveDivider.SeriesCapacitor(Resistance.FromOhm(ohm), Resistance.FromOhm(ohm * step), F)!.Value;
            var top = new CapacitiveDivider(series, default).AtTop(Resistance.FromOhm(ohm), F);
            return Math.Abs((top.Resistance.Ohm / (ohm * step)) - 1) < 1e-9 && Math.Abs((top.Capacitance / parallel) - 1) < 1e-9;
        });

    private static CapacitiveDivider Divider(double top, double bottom) => new(Capacitance.FromPicofarad(top), Capacitance.FromPicofarad(bottom));
}
