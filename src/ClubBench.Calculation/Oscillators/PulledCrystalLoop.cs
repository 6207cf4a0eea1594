using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>
/// A crystal oscillator pulled by a series inductor and a variable capacitor, with every stray. Immutable.
/// Method: zero of the loop reactance, bracketed between 0.2 fs and fp where it rises without a pole.
/// Valid: lossless elements; the loss shifts a HF oscillator by less than its tolerance. Source: derived (Foster's reactance theorem),
/// checked by the nodal determinant in Recomputed/pulled_crystal_loop.py.
/// </summary>
/// <param name="Crystal">One of the crystals.</param>
/// <param name="VariableMinimum">Smallest value of the variable capacitor, above zero.</param>
/// <param name="VariableMaximum">Largest value; must exceed the smallest.</param>
/// <param name="SeriesInductance">Inductor in series, zero for none.</param>
/// <param name="OscillatorCapacitance">What the sustaining circuit shows at its crystal terminal, above zero: see <see cref="FeedbackPair"/>.</param>
public sealed record PulledCrystalLoop(
    CrystalParameters Crystal, Capacitance VariableMinimum, Capacitance VariableMaximum, Inductance SeriesInductance, Capacitance OscillatorCapacitance)
{
    private const double FrequencyToleranceHz = 1e-6;

    /// <summary>Equal crystals in parallel, 1..8.</summary>
    public int CrystalCount { get; init => field = Guard.Within(value, 1, 8, nameof(CrystalCount)); } = 1;

    /// <summary>Holder and socket capacitance across all crystals together.</summary>
    public Capacitance HolderCapacitance { get; init; }

    /// <summary>Self-capacitance of the series inductor.</summary>
    public Capacitance InductorSelfCapacitance { get; init; }

    /// <summary>Stray from the junction of crystal and inductor to ground.</summary>
    public Capacitance NodeStray { get; init; }

    /// <summary>Stray across the variable capacitor that its stated values leave out.</summary>
    public Capacitance StrayAcrossVariable { get; init; }

    /// <summary>Why this loop has no usable frequency at a setting of the variable capacitor, or None.</summary>
    public LoopRefusal RefusalAt(Capacitance variable)
    {
        var reactance = Reactance(variable);
        var parallelHz = reactance.ParallelResonanceHz;
        if (VariableMaximum <= VariableMinimum) return LoopRefusal.VariableHasNoSwing;
        if (reactance.SelfResonanceHz <= 1.05 * parallelHz) return LoopRefusal.InductorAboveSelfResonance;
        if (reactance.NodeResonanceHz <= parallelHz) return LoopRefusal.NodeStrayResonance;
        return reactance.Sum(LowerBracketHz) > 0 ? LoopRefusal.InductorFarTooLarge : LoopRefusal.None;
    }

    /// <summary>Why this loop cannot be used over its whole dial, or None. The largest capacitance is the worst setting.</summary>
    public LoopRefusal Refusal() =>
        RefusalAt(VariableMaximum) is var atMaximum and not LoopRefusal.None ? atMaximum : RefusalAt(VariableMinimum);

    /// <summary>Frequency at a setting of the variable capacitor, to 1e-6 Hz. Throws when the loop is refused there: ask <see cref="RefusalAt"/> first.</summary>
    public Frequency FrequencyAt(Capacitance variable)
    {
        if (RefusalAt(variable) is var refusal and not LoopRefusal.None)
            throw new InvalidOperationException($"The oscillator loop has no usable frequency: {refusal}.");
        var reactance = Reactance(variable);
        var upperHz = reactance.ParallelResonanceHz * (1 - 1e-13);
        return Frequency.FromHertz(Bisection.TurningPoint(f => reactance.Sum(f) > 0, LowerBracketHz, upperHz, FrequencyToleranceHz));
    }

    /// <summary>Frequency, sensitivities and state at a setting of the variable capacitor. Throws when the loop is refused there.</summary>
    public PulledCrystalPoint PointAt(Capacitance variable)
    {
        var frequency = FrequencyAt(variable);
        var reactance = Reactance(variable);
        return new PulledCrystalPoint(
            variable,
            frequency,
            frequency.Hertz - Crystal.SeriesResonance.Hertz,
            LoopSensitivities.From(reactance.EnergyAt(frequency.Hertz), frequency, variable, variable + StrayAcrossVariable),
            reactance.InductorResonanceHz / frequency.Hertz,
            Crystal.MotionalResistance * (reactance.ResistanceFactor(frequency.Hertz) / CrystalCount));
    }

    /// <summary>Sensitivities at a setting of the variable capacitor. Throws when the loop is refused there.</summary>
    public LoopSensitivities SensitivitiesAt(Capacitance variable) => PointAt(variable).Sensitivities;

    /// <summary>State at a setting of the variable capacitor. Throws when the loop is refused there.</summary>
    public CrystalControlState StateAt(Capacitance variable) => PointAt(variable).State;

    /// <summary>Both ends of the dial. Throws when the loop is refused: ask <see cref="Refusal"/> first.</summary>
    public PulledCrystalRange Range() => new(PointAt(VariableMaximum), PointAt(VariableMinimum));

    /// <summary>Same loop with another series inductor.</summary>
    public PulledCrystalLoop WithInductance(Inductance inductance) => this with { SeriesInductance = inductance };

    private double LowerBracketHz => 0.2 * Crystal.SeriesResonance.Hertz;

    private LoopReactance Reactance(Capacitance variable)
    {
        Guard.Positive(variable.Farad + StrayAcrossVariable.Farad, nameof(variable));
        Guard.Positive(OscillatorCapacitance.Farad, nameof(OscillatorCapacitance));
        return new LoopReactance(this, variable.Farad);
    }
}
