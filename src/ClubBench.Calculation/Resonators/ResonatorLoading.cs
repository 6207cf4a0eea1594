using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Resonators;

/// <summary>What source, load and losses make of a parallel resonant circuit. All resistances stand at its top. Immutable.</summary>
/// <param name="Resonance">Resonant frequency.</param>
/// <param name="Reactance">Reactance of the coil at resonance, above zero.</param>
/// <param name="UnloadedQ">Q of the circuit by itself, above zero.</param>
/// <param name="Source">Source resistance transformed to the top, above zero.</param>
/// <param name="Load">Load resistance transformed to the top, above zero.</param>
public sealed record ResonatorLoading(Frequency Resonance, Resistance Reactance, double UnloadedQ, Resistance Source, Resistance Load)
{
    /// <summary>Loaded Q: 1/(G X), G = 1/Rs + 1/Rl + 1/(Qu X). Source: derived.</summary>
    public double LoadedQ => 1 / (ConductanceSiemens * Reactance.Ohm);

    /// <summary>Bandwidth between the 3 dB points, f0/QL.</summary>
    public Frequency Bandwidth3dB => Resonance / LoadedQ;

    /// <summary>Transducer loss at resonance, zero or above: -10 log10(4/(Rs Rl G^2)). Source: derived.</summary>
    public Decibels InsertionLoss =>
        -Decibels.FromPowerRatio(4 / (Source.Ohm * Load.Ohm * ConductanceSiemens * ConductanceSiemens));

    private double ConductanceSiemens => (1 / Source.Ohm) + (1 / Load.Ohm) + (1 / (UnloadedQ * Reactance.Ohm));

    /// <summary>
    /// Loss of a circuit matched on both sides: -20 log10(1 - QL/Qu). False where the loaded Q reaches the coil's own, which no coupling gives;
    /// the loss is then zero and says nothing.
    /// </summary>
    public static bool TryMatchedLoss(double loadedQ, double unloadedQ, out Decibels loss)
    {
        var share = Guard.Positive(loadedQ, nameof(loadedQ)) / Guard.Positive(unloadedQ, nameof(unloadedQ));
        loss = share < 1 ? -Decibels.FromAmplitudeRatio(1 - share) : Decibels.Zero;
        return share < 1;
    }

    /// <summary>
    /// Unloaded Q out of a measured 3 dB bandwidth and insertion loss, matched on both sides: QL/(1 - 10^(-IL/20)).
    /// The loss must be above 0 dB.
    /// </summary>
    public static double UnloadedQFrom(Frequency resonance, Frequency bandwidth3dB, Decibels loss)
    {
        Guard.Positive(loss.Db, nameof(loss));
        return resonance / bandwidth3dB / (1 - (-loss).AmplitudeRatio);
    }
}
