using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Oscillators;

/// <summary>Oscillators the tests of this folder share.</summary>
internal static class PulledCrystals
{
    public static FeedbackPair KitAPair { get; } = new(Pf(150), Pf(150));

    public static PulledCrystalLoop KitA30 { get; } = KitA(10.12, 20, 4.5, 10);

    public static PulledCrystalLoop KitA20 { get; } = KitA(14.06, 22, 4.8, 6.8);

    /// <summary>10..100 pF variable capacitor, 100 pF oscillator, nothing else.</summary>
    public static PulledCrystalLoop Plain(double fsMhz, double cmFf, double c0Pf, double seriesUh) => new(
        new CrystalParameters(Frequency.FromMegahertz(fsMhz), Capacitance.FromFarad(cmFf * 1e-15), Pf(c0Pf), Resistance.FromOhm(20)),
        Pf(10), Pf(100), Inductance.FromMicrohenry(seriesUh), Pf(100));

    public static PulledCrystalLoop Plain(ReferenceRow row) => Plain(
        row.Number("fs_hz") * 1e-6, row.Number("cm_ff"), row.Number("c0_pf"), row.Has("series_uh") ? row.Number("series_uh") : 0);

    /// <summary>Demonstration kit A: a pair of crystals marked at 30 pF, 12..150 pF, feedback pair of 150 pF each.</summary>
    public static PulledCrystalLoop KitA(double markedMhz, double cmFf, double c0Pf, double seriesUh) => new(
        CrystalParameters.FromMarkedFrequency(Frequency.FromMegahertz(markedMhz), Pf(30), Capacitance.FromFarad(cmFf * 1e-15), Pf(c0Pf), default),
        Pf(12), Pf(150), Inductance.FromMicrohenry(seriesUh), KitAPair.OscillatorCapacitance)
    {
        CrystalCount = 2,
        InductorSelfCapacitance = Pf(1.5),
    };

    public static Capacitance Pf(double picofarad) => Capacitance.FromPicofarad(picofarad);
}
