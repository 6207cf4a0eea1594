using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Noise;

/// <summary>What ends the range of strengths a receiver copes with.</summary>
public enum RangeLimit
{
    /// <summary>Nothing is stated that could.</summary>
    Unknown,

    /// <summary>Third-order products of two strong signals.</summary>
    Intermodulation,

    /// <summary>One strong signal that compresses the chain.</summary>
    Blocking,

    /// <summary>Noise of the oscillator mixed in by one strong signal.</summary>
    ReciprocalMixing,
}

/// <summary>How far above the weakest signal the strongest may be. Immutable.</summary>
/// <remarks>
/// Method: (2/3)(IIP3 - MDS); 1 dB compression less MDS; -L - 10 log10(B). The smallest counts.
/// Valid: strong signals outside the filter that sets the bandwidth, at the distance the oscillator noise is stated for.
/// Source: derived; friis-1944 for the noise figure.
/// </remarks>
/// <param name="MinimumSignal">Minimum discernible signal in the bandwidth.</param>
/// <param name="Intermodulation">Free of third-order products; null where no stage states an intercept.</param>
/// <param name="Blocking">Up to 1 dB compression; null where that is not stated.</param>
/// <param name="ReciprocalMixing">Up to oscillator noise as strong as the receiver's; null where that is not stated.</param>
public sealed record DynamicRange(PowerLevel MinimumSignal, Decibels? Intermodulation, Decibels? Blocking, Decibels? ReciprocalMixing)
{
    /// <summary>Smallest of the ranges stated; null where none is.</summary>
    public Decibels? Smallest => Ranges().Select(r => (Decibels?)r.Range).Min();

    /// <summary>What sets the smallest.</summary>
    public RangeLimit Limit => Ranges().OrderBy(r => r.Range).Select(r => r.Limit).FirstOrDefault();

    /// <summary>Range of a chain, antenna first.</summary>
    /// <param name="stages">Stages, at least one.</param>
    /// <param name="bandwidthHertz">Noise bandwidth, Hz, above zero.</param>
    /// <param name="compression">Level at the antenna that compresses the chain by 1 dB; null where not known.</param>
    /// <param name="phaseNoiseDbcPerHertz">Oscillator noise at the distance of the strong signal, dBc/Hz, below zero; null where not known.</param>
    public static DynamicRange Of(IReadOnlyList<ReceiverStage> stages, double bandwidthHertz, PowerLevel? compression = null, double? phaseNoiseDbcPerHertz = null)
    {
        var minimum = Cascade.MinimumDiscernibleSignal(Cascade.NoiseFigure(stages), bandwidthHertz);
        return new(
            minimum,
            Cascade.InputIntercept(stages) is { } intercept ? Cascade.SpuriousFreeRange(intercept, minimum) : null,
            compression - minimum,
            phaseNoiseDbcPerHertz is { } noise ? Cascade.ReciprocalMixingRange(noise, bandwidthHertz) : null);
    }

    /// <summary>
    /// Compression by 1 dB of a stage that only its third-order curvature bends: 9.64 dB below the input intercept. Valid: a rough start where no
    /// compression is stated; real stages lie 8 to 15 dB below. Source: derived.
    /// </summary>
    public static PowerLevel CompressionFromIntercept(PowerLevel inputIntercept) =>
        inputIntercept + Decibels.FromPowerRatio(1 - Decibels.FromDb(-1).AmplitudeRatio);

    private IEnumerable<(Decibels Range, RangeLimit Limit)> Ranges()
    {
        if (Intermodulation is { } i) yield return (i, RangeLimit.Intermodulation);
        if (Blocking is { } b) yield return (b, RangeLimit.Blocking);
        if (ReciprocalMixing is { } r) yield return (r, RangeLimit.ReciprocalMixing);
    }
}
