using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>Why no series inductor gives the wanted span.</summary>
public enum SpanShortfall
{
    /// <summary>The span is reached.</summary>
    None,

    /// <summary>The inductor takes over before the span is reached.</summary>
    InductorTakesOver,

    /// <summary>Even without an inductor the span is wider than wanted.</summary>
    AlreadyWider,
}

/// <summary>A series inductor for a wanted span, or the nearest attempt with the reason.</summary>
/// <param name="Inductance">The inductor.</param>
/// <param name="Range">The dial with it.</param>
/// <param name="Shortfall">None when the span is met.</param>
public sealed record InductanceForSpan(Inductance Inductance, PulledCrystalRange Range, SpanShortfall Shortfall)
{
    /// <summary>Whether the span is met.</summary>
    public bool IsFound => Shortfall == SpanShortfall.None;
}

/// <summary>One inductor that can be bought, and the dial it gives.</summary>
/// <param name="Inductance">Nominal value.</param>
/// <param name="Range">The dial with it.</param>
/// <param name="CoveredHertz">How much of the wanted segment the dial covers, Hz.</param>
/// <param name="LiesInside">Whether the whole dial stays within the permitted band.</param>
public sealed record InductorCandidate(Inductance Inductance, PulledCrystalRange Range, double CoveredHertz, bool LiesInside);

/// <summary>Choosing the series inductor of a pulled crystal oscillator. Source: derived; thresholds of the states are common practice.</summary>
public static class PulledCrystalDesign
{
    private const double FirstH = 1e-6;
    private const double Step = 1.3;

    /// <summary>Moulded chokes of the E12 series from 1 to 330 uH. Source: iec-60063.</summary>
    public static IReadOnlyList<Inductance> MouldedChokes { get; } =
        [.. PreferredValues.Between(1, 330, ESeries.E12).Select(Inductance.FromMicrohenry)];

    /// <summary>
    /// The inductor that gives a span in Hz (above zero) with the capacitors and crystals of <paramref name="loop"/>, whose own inductor is
    /// ignored. Method: widening steps of 1.3 from 1 uH, then halving; the span grows with the inductor until it takes over.
    /// Throws when the loop is refused even without an inductor.
    /// </summary>
    public static InductanceForSpan ForSpan(PulledCrystalLoop loop, double spanHertz)
    {
        Guard.Positive(spanHertz, nameof(spanHertz));
        if (SpanHertz(0) >= spanHertz) return Result(0, SpanShortfall.AlreadyWider);
        var (low, high) = (0.0, FirstH);
        while (Usable(loop, high) && SpanHertz(high) < spanHertz) (low, high) = (high, high * Step);

        var found = Bisection.TurningPoint(h => !Usable(loop, h) || SpanHertz(h) >= spanHertz, low, high, high * 1e-9);
        return Usable(loop, found) && SpanHertz(found) >= spanHertz * (1 - 1e-6)
            ? Result(found, SpanShortfall.None)
            : Result(found * (1 - 1e-6), SpanShortfall.InductorTakesOver);

        double SpanHertz(double henry) => loop.WithInductance(Inductance.FromHenry(henry)).Range().SpanHertz;

        InductanceForSpan Result(double henry, SpanShortfall shortfall)
        {
            var inductance = Inductance.FromHenry(henry);
            return new InductanceForSpan(inductance, loop.WithInductance(inductance).Range(), shortfall);
        }
    }

    /// <summary>
    /// Largest inductor that still leaves the crystal in control at the maximum of the variable capacitor:
    /// both |S_L| up to 0.005 and f_LC/f from 1.3. Practically zero when even the smallest inductor is too much or the loop is refused.
    /// </summary>
    public static Inductance LargestSafe(PulledCrystalLoop loop)
    {
        var (low, high) = (0.0, FirstH);
        while (IsSafe(loop, high)) (low, high) = (high, high * Step);
        return Inductance.FromHenry(Bisection.TurningPoint(h => !IsSafe(loop, h), low, high, high * 1e-9));
    }

    /// <summary>
    /// What each available inductor gives: those with a usable dial, best first. Order: inside the band, then state, then how much of
    /// <paramref name="wanted"/> is covered, then the smaller inductor.
    /// </summary>
    public static IReadOnlyList<InductorCandidate> Candidates(
        PulledCrystalLoop loop, IEnumerable<Inductance> available, FrequencyRange wanted, FrequencyRange band) =>
        [.. available
            .Where(l => Usable(loop, l.Henry))
            .Select(l => Candidate(l, loop.WithInductance(l).Range(), wanted, band))
            .OrderByDescending(c => c.LiesInside)
            .ThenBy(c => c.Range.State > CrystalControlState.Stretched)
            .ThenByDescending(c => c.CoveredHertz)
            .ThenBy(c => c.Inductance)];

    /// <summary>The inductor that keeps the percentage range on another frequency with the same capacitors: L (f_old/f_new)^2.</summary>
    public static Inductance Scaled(Inductance old, Frequency from, Frequency to) => old * (from / to * (from / to));

    private static InductorCandidate Candidate(Inductance inductance, PulledCrystalRange range, FrequencyRange wanted, FrequencyRange band)
    {
        var covered = Math.Min(range.High.Hertz, wanted.High.Hertz) - Math.Max(range.Low.Hertz, wanted.Low.Hertz);
        return new InductorCandidate(inductance, range, Math.Max(0, covered), band.Contains(range.Low) && band.Contains(range.High));
    }

    private static bool IsSafe(PulledCrystalLoop loop, double henry) =>
        StateWith(loop, henry) == CrystalControlState.CrystalControlled;

    private static bool Usable(PulledCrystalLoop loop, double henry) =>
        StateWith(loop, henry) is not (CrystalControlState.Unknown or CrystalControlState.InductorControlled);

    private static CrystalControlState StateWith(PulledCrystalLoop loop, double henry)
    {
        var changed = loop.WithInductance(Inductance.FromHenry(henry));
        return changed.Refusal() == LoopRefusal.None ? changed.StateAt(changed.VariableMaximum) : CrystalControlState.Unknown;
    }
}
