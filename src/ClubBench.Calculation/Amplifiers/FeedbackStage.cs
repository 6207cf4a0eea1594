using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Amplifiers;

/// <summary>A stage whose impedances are fixed by a resistor from collector to base and one in the emitter. Immutable.</summary>
/// <remarks>
/// Method: ideal transistor of large current gain with total emitter resistance 1/gm + unbypassed resistor.
/// Valid: transition frequency at least 3 Rs/Re times the frequency for about 1 dB; beyond, compute with <see cref="Devices.HybridPi"/>.
/// Source: derived.
/// </remarks>
/// <param name="Feedback">Resistor from collector to base.</param>
/// <param name="Emitter">Total emitter resistance, 1/gm included.</param>
/// <param name="Source">Driving resistance, equal to the input resistance.</param>
/// <param name="Load">Collector load.</param>
public sealed record FeedbackStage(Resistance Feedback, Resistance Emitter, Resistance Source, Resistance Load)
{
    /// <summary>Sizes the feedback resistor so that the input matches the source; false where none above the emitter resistance does.</summary>
    public static bool TryCreate(Resistance emitter, Resistance source, Resistance load, out FeedbackStage? stage)
    {
        var re = Guard.Positive(emitter.Ohm, nameof(emitter));
        var feedback = Guard.Positive(source.Ohm, nameof(source)) + (source.Ohm * load.Ohm / re) - load.Ohm;
        stage = feedback > re ? new FeedbackStage(Resistance.FromOhm(feedback), emitter, source, load) : null;
        return stage is not null;
    }

    /// <summary>Voltage gain, negative because the stage inverts.</summary>
    public double VoltageGain => Load.Ohm * (Emitter.Ohm - Feedback.Ohm) / (Emitter.Ohm * (Load.Ohm + Feedback.Ohm));

    /// <summary>Power gain at the matched input.</summary>
    public Decibels Gain => Decibels.FromPowerRatio(VoltageGain * VoltageGain * Source.Ohm / Load.Ohm);

    /// <summary>Resistance seen at the collector.</summary>
    public Resistance OutputResistance => Resistance.FromOhm(Emitter.Ohm * (Source.Ohm + Feedback.Ohm) / (Emitter.Ohm + Source.Ohm));
}
