using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>
/// Colpitts circuit for an overtone crystal: a coil across the emitter capacitor keeps it from running on the fundamental. Without it an overtone crystal
/// runs near a third or a fifth of its marked frequency. Immutable.
/// </summary>
/// <remarks>
/// Method: coil and C2 are inductive below their resonance, where the negative resistance turns over; above it C2 acts as C2 (1 - (f0/f)^2).
/// Valid: coil of high Q, its self-resonance far above. Source: derived.
/// </remarks>
/// <param name="Pair">Feedback capacitors.</param>
/// <param name="AcrossEmitter">Coil across C2, above zero.</param>
public sealed record OvertoneOscillator(FeedbackPair Pair, Inductance AcrossEmitter)
{
    /// <summary>Where coil and C2 resonate: oscillation is possible above only.</summary>
    public Frequency TrapResonance => Resonators.TunedCircuit.ResonantFrequency(AcrossEmitter, Pair.EmitterGround);

    /// <summary>
    /// Coil for an overtone (odd, 3 or above) of a frequency: resonance halfway, by ratio, between it and the next lower odd mode.
    /// </summary>
    public static OvertoneOscillator For(FeedbackPair pair, Frequency onOvertone, int overtone)
    {
        if (overtone < 3 || overtone % 2 == 0) throw new ArgumentOutOfRangeException(nameof(overtone), overtone, "An overtone is an odd number from 3 on.");
        var halfway = onOvertone * Math.Sqrt((overtone - 2.0) / overtone);
        return new(pair, Resonators.TunedCircuit.InductanceFor(pair.EmitterGround, halfway));
    }

    /// <summary>The pair as it acts at a frequency: C2 less what the coil takes of it; null at and below the resonance of the trap.</summary>
    public FeedbackPair? EffectiveAt(Frequency frequency)
    {
        var share = 1 - (TrapResonance / frequency * (TrapResonance / frequency));
        return share > 0 ? Pair with { EmitterGround = Pair.EmitterGround * share } : null;
    }

    /// <summary>
    /// Negative resistance at a frequency; null where the circuit cannot oscillate. <paramref name="transconductanceSiemens"/> at the working current, above zero.
    /// </summary>
    public Resistance? NegativeResistance(double transconductanceSiemens, Frequency frequency) =>
        EffectiveAt(frequency)?.NegativeResistance(transconductanceSiemens, frequency);
}
