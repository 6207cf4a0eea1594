using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>What to write on an order for crystals, and the dial it guarantees. All from one batch, spares included in the quantity.</summary>
/// <param name="Crystal">The crystal wanted; its Cm is the least that will do, its Rm the most.</param>
/// <param name="Marked">Frequency to order at <paramref name="Load"/>.</param>
/// <param name="Load">Load capacitance the frequency is stated for.</param>
/// <param name="TolerancePpm">Tolerance at 25 degrees Celsius, ppm; 20..30 is economical.</param>
/// <param name="Nominal">Dial with a crystal exactly on frequency.</param>
public sealed record CrystalOrder(CrystalParameters Crystal, Frequency Marked, Capacitance Load, double TolerancePpm, PulledCrystalRange Nominal)
{
    private const double GuardHertz = 1000;

    /// <summary>Highest frequency that every crystal within tolerance reaches.</summary>
    public Frequency GuaranteedHigh => Nominal.High * (1 - (TolerancePpm * 1e-6));

    /// <summary>Lowest frequency that every crystal within tolerance reaches.</summary>
    public Frequency GuaranteedLow => Nominal.Low * (1 + (TolerancePpm * 1e-6));

    /// <summary>Span that every crystal within tolerance covers, Hz; negative when there is none.</summary>
    public double GuaranteedSpanHertz => GuaranteedHigh.Hertz - GuaranteedLow.Hertz;

    /// <summary>Furthest frequencies a crystal within tolerance can reach; these must stay inside the band.</summary>
    public FrequencyRange WorstReach => new(Nominal.Low * (1 - (TolerancePpm * 1e-6)), Nominal.High * (1 + (TolerancePpm * 1e-6)));

    /// <summary>
    /// Whether every crystal within tolerance keeps the dial inside a band, with 1 kHz to spare at its lower edge. Source: common practice.
    /// </summary>
    public bool KeepsInside(FrequencyRange band) => WorstReach.Low.Hertz >= band.Low.Hertz + GuardHertz && WorstReach.High <= band.High;

    /// <summary>
    /// The order that puts the top of the dial on a frequency. <paramref name="loop"/> gives every part and the crystal's Cm, C0 and Rm (its
    /// series resonance is ignored); <paramref name="load"/> above zero; <paramref name="tolerancePpm"/> zero or above. Null when no series resonance within
    /// 10 % of the wanted top reaches it, or the loop found is refused. Method: bisection on the series resonance.
    /// </summary>
    public static CrystalOrder? ForTop(Frequency top, PulledCrystalLoop loop, Capacitance load, double tolerancePpm)
    {
        Guard.NotNegative(tolerancePpm, nameof(tolerancePpm));
        var (low, high) = (0.9 * top.Hertz, 1.1 * top.Hertz);
        if (IsPast(low) || !IsPast(high)) return null;
        var found = With(Bisection.TurningPoint(IsPast, low, high, 1e-6));
        if (found.Refusal() != LoopRefusal.None) return null;
        return new CrystalOrder(found.Crystal, found.Crystal.LoadedFrequency(load), load, tolerancePpm, found.Range());

        bool IsPast(double seriesHz) =>
            With(seriesHz) is var l && (l.RefusalAt(l.VariableMinimum) != LoopRefusal.None || l.FrequencyAt(l.VariableMinimum) > top);

        PulledCrystalLoop With(double seriesHz) => loop with { Crystal = loop.Crystal with { SeriesResonance = Frequency.FromHertz(seriesHz) } };
    }
}
