using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Noise;

/// <summary>
/// What a lossy antenna costs on receive: it lowers signal and external noise alike, so it counts only beside the receiver's own noise.
/// Method: (Rr + Rloss)/Rr. Source: derived.
/// </summary>
public static class AntennaEfficiency
{
    /// <summary>Loss from radiation resistance (above zero) and loss resistance, zero or above. Add it to the noise figure before judging a preamplifier.</summary>
    public static Decibels Loss(Resistance radiation, Resistance loss) =>
        Decibels.FromPowerRatio((Guard.Positive(radiation.Ohm, nameof(radiation)) + loss.Ohm) / radiation.Ohm);

    /// <summary>
    /// External noise power at the antenna terminals in a bandwidth (Hz, above zero): kT0B and the external noise figure.
    /// </summary>
    public static PowerLevel NoisePower(Decibels external, double bandwidthHertz) => Cascade.MinimumDiscernibleSignal(external, bandwidthHertz);
}
