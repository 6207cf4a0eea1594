using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Noise;

/// <summary>One stage of a receiver for noise and intermodulation.</summary>
/// <param name="Gain">Gain, negative for a loss.</param>
/// <param name="NoiseFigure">Noise figure, 0 dB or above.</param>
/// <param name="InputIntercept">Third-order input intercept; null for a stage that does not distort.</param>
public sealed record ReceiverStage(Decibels Gain, Decibels NoiseFigure, PowerLevel? InputIntercept = null)
{
    /// <summary>
    /// A pad, filter or line with a loss (0 dB or above) at a temperature: F = 1 + (L - 1) T/T0. At 290 K the noise figure is the loss.
    /// </summary>
    public static ReceiverStage Loss(Decibels loss, Temperature temperature)
    {
        var ratio = Decibels.FromDb(Guard.NotNegative(loss.Db, nameof(loss))).PowerRatio;
        return new ReceiverStage(-loss, Decibels.FromPowerRatio(1 + ((ratio - 1) * temperature.Kelvin / Cascade.ReferenceTemperatureKelvin)));
    }
}

/// <summary>Stages in a row, antenna first. Source: friis-1944; intercepts combine in phase (worst case, derived).</summary>
public static class Cascade
{
    /// <summary>Reference temperature T0 of noise figures, 290 K by definition.</summary>
    public const double ReferenceTemperatureKelvin = 290;

    // Exact since 2019. Source: si-2019.
    private const double BoltzmannJoulePerKelvin = 1.380649e-23;

    /// <summary>Noise figure of the chain: F1 + (F2 - 1)/G1 + ... Needs at least one stage.</summary>
    public static Decibels NoiseFigure(IReadOnlyList<ReceiverStage> stages)
    {
        Guard.Within(stages.Count, 1, 1000, nameof(stages));
        var (factor, gain) = (1.0, 1.0);
        foreach (var stage in stages)
        {
            factor += (stage.NoiseFigure.PowerRatio - 1) / gain;
            gain *= stage.Gain.PowerRatio;
        }
        return Decibels.FromPowerRatio(factor);
    }

    /// <summary>Gain of the chain.</summary>
    public static Decibels Gain(IReadOnlyList<ReceiverStage> stages) => stages.Aggregate(Decibels.Zero, (sum, s) => sum + s.Gain);

    /// <summary>Third-order input intercept of the chain, or null when no stage states one. Method: reciprocal powers add, 1/IP = sum g/IP_i.</summary>
    public static PowerLevel? InputIntercept(IReadOnlyList<ReceiverStage> stages)
    {
        var (reciprocal, gain) = (0.0, 1.0);
        foreach (var stage in stages)
        {
            if (stage.InputIntercept is { } intercept) reciprocal += gain / intercept.ToPower().Milliwatt;
            gain *= stage.Gain.PowerRatio;
        }
        return reciprocal > 0 ? Power.FromMilliwatt(1 / reciprocal).ToLevel() : null;
    }

    /// <summary>
    /// Minimum discernible signal, equal to the noise: kT0 B F. <paramref name="bandwidthHertz"/> is the noise bandwidth, above zero.
    /// Use the single-sideband noise figure, for direct conversion too.
    /// </summary>
    public static PowerLevel MinimumDiscernibleSignal(Decibels noiseFigure, double bandwidthHertz) =>
        Power.FromWatt(BoltzmannJoulePerKelvin * ReferenceTemperatureKelvin * Guard.Positive(bandwidthHertz, nameof(bandwidthHertz))).ToLevel() + noiseFigure;

    /// <summary>Spurious-free dynamic range of third order, (2/3)(IIP3 - MDS).</summary>
    public static Decibels SpuriousFreeRange(PowerLevel inputIntercept, PowerLevel minimumSignal) => (inputIntercept - minimumSignal) * (2.0 / 3);

    /// <summary>
    /// Range limited by reciprocal mixing, -L - 10 log10(B): <paramref name="phaseNoiseDbcPerHertz"/> is the oscillator noise at the distance
    /// of the strong signal, below zero.
    /// </summary>
    public static Decibels ReciprocalMixingRange(double phaseNoiseDbcPerHertz, double bandwidthHertz) =>
        Decibels.FromDb(-phaseNoiseDbcPerHertz - (10 * Math.Log10(Guard.Positive(bandwidthHertz, nameof(bandwidthHertz)))));
}
