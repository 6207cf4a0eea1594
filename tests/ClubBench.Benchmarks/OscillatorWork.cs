using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Benchmarks;

/// <summary>A pulled crystal oscillator: its range, and the coil for a wanted span.</summary>
internal static class OscillatorWork
{
    private static readonly PulledCrystalLoop Loop = new(
        CrystalParameters.FromMarkedFrequency(
            Frequency.FromMegahertz(14.06), Capacitance.FromPicofarad(30), Capacitance.FromFarad(22e-15), Capacitance.FromPicofarad(4.8), default),
        Capacitance.FromPicofarad(12),
        Capacitance.FromPicofarad(150),
        Inductance.FromMicrohenry(6.8),
        new FeedbackPair(Capacitance.FromPicofarad(150), Capacitance.FromPicofarad(150)).OscillatorCapacitance)
    {
        CrystalCount = 2,
        InductorSelfCapacitance = Capacitance.FromPicofarad(1.5),
    };

    public static IEnumerable<Workload> All =>
    [
        new("pulled-oscillator-range", 5, () => Loop.Range()),
        new("pulled-oscillator-coil-for-span", 20, () => PulledCrystalDesign.ForSpan(Loop, 15_000)),
    ];
}
