using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>One setting of a pulled crystal oscillator.</summary>
/// <param name="Variable">Setting of the variable capacitor.</param>
/// <param name="Frequency">Frequency there.</param>
/// <param name="PullHertz">Distance from series resonance in Hz, positive above.</param>
/// <param name="Sensitivities">How the frequency answers to each element.</param>
/// <param name="InductorResonanceRatio">f_LC/f: loop resonance with the crystal replaced by C0, over the frequency; null without an inductor.</param>
/// <param name="CrystalResistance">Resistance of the crystals as the loop sees it; zero when the crystal states none.</param>
public sealed record PulledCrystalPoint(
    Capacitance Variable,
    Frequency Frequency,
    double PullHertz,
    LoopSensitivities Sensitivities,
    double? InductorResonanceRatio,
    Resistance CrystalResistance)
{
    /// <summary>
    /// Who rules the frequency. Method: motional share below 0.5, then |S_L| above 0.02 or share below 0.9, then |S_L| above 0.005 or
    /// f_LC/f below 1.3. Source: quantities derived, thresholds common practice.
    /// </summary>
    public CrystalControlState State => this switch
    {
        { Sensitivities.MotionalShare: < 0.5 } => CrystalControlState.InductorControlled,
        { Sensitivities.Inductor: < -0.02 } or { Sensitivities.MotionalShare: < 0.9 } => CrystalControlState.TakingOver,
        { Sensitivities.Inductor: < -0.005 } or { InductorResonanceRatio: < 1.3 } => CrystalControlState.Stretched,
        _ => CrystalControlState.CrystalControlled,
    };
}

/// <summary>The dial of a pulled crystal oscillator: the two ends, worst state included.</summary>
/// <param name="AtMaximum">End with the variable capacitor at its maximum: the lowest frequency.</param>
/// <param name="AtMinimum">End with the variable capacitor at its minimum: the highest frequency.</param>
public sealed record PulledCrystalRange(PulledCrystalPoint AtMaximum, PulledCrystalPoint AtMinimum)
{
    /// <summary>Lowest frequency.</summary>
    public Frequency Low => AtMaximum.Frequency;

    /// <summary>Highest frequency.</summary>
    public Frequency High => AtMinimum.Frequency;

    /// <summary>Low to high as a range.</summary>
    public FrequencyRange Frequencies => new(Low, High);

    /// <summary>Width in Hz.</summary>
    public double SpanHertz => High.Hertz - Low.Hertz;

    /// <summary>State at the low end, where the inductor rules most.</summary>
    public CrystalControlState State => AtMaximum.State;

    /// <summary>How much coarser the tuning is at the top than at the bottom of the dial, in Hz per pF over Hz per pF.</summary>
    public double SlopeRatio => AtMinimum.Sensitivities.SlopeHertzPerPicofarad / AtMaximum.Sensitivities.SlopeHertzPerPicofarad;
}
