using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>How the oscillator lies to signal and intermediate frequency.</summary>
public enum InjectionSide
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>Oscillator on the signal itself; no intermediate frequency.</summary>
    DirectConversion,

    /// <summary>Oscillator above the signal: LO = RF + IF. The only one that inverts the spectrum.</summary>
    HighSide,

    /// <summary>Oscillator below the signal: LO = RF - IF.</summary>
    LowSide,

    /// <summary>Oscillator and signal add up to the intermediate frequency: LO = IF - RF. The dial runs backwards.</summary>
    SumToIntermediate,
}

/// <summary>
/// Frequency plan of one conversion, receive or transmit. Immutable. Source: derived; only IF = LO - RF inverts a spectrum.
/// </summary>
/// <param name="Side">How the oscillator lies.</param>
/// <param name="Intermediate">Intermediate frequency; null exactly for direct conversion.</param>
public sealed record FrequencyScheme(InjectionSide Side, Frequency? Intermediate)
{
    /// <summary>Oscillator on the signal.</summary>
    public static FrequencyScheme DirectConversion { get; } = new(InjectionSide.DirectConversion, null);

    /// <summary>Intermediate frequency; null exactly for direct conversion.</summary>
    public Frequency? Intermediate { get; init; } = Intermediate.HasValue == (Side is not (InjectionSide.DirectConversion or InjectionSide.Unknown))
        ? Intermediate
        : throw new ArgumentException("A scheme states an intermediate frequency, direct conversion does not.", nameof(Intermediate));

    /// <summary>Whether an upper sideband at the signal comes out as a lower sideband at the intermediate frequency.</summary>
    public bool InvertsSpectrum => Side == InjectionSide.HighSide;

    /// <summary>Whether the signal frequency falls as the oscillator rises.</summary>
    public bool DialRunsBackwards => Side == InjectionSide.SumToIntermediate;

    /// <summary>Oscillator for a signal, or null when this side would give zero or a negative frequency.</summary>
    public Frequency? OscillatorFor(Frequency signal) => Positive(Side switch
    {
        InjectionSide.HighSide => signal.Hertz + IntermediateHz,
        InjectionSide.LowSide => signal.Hertz - IntermediateHz,
        InjectionSide.SumToIntermediate => IntermediateHz - signal.Hertz,
        _ => signal.Hertz,
    });

    /// <summary>Signal for an oscillator frequency, or null when there is none.</summary>
    public Frequency? SignalFor(Frequency oscillator) => Positive(Side switch
    {
        InjectionSide.HighSide => oscillator.Hertz - IntermediateHz,
        InjectionSide.LowSide => oscillator.Hertz + IntermediateHz,
        InjectionSide.SumToIntermediate => IntermediateHz - oscillator.Hertz,
        _ => oscillator.Hertz,
    });

    /// <summary>
    /// The other signal the mixer turns into the intermediate frequency; null where there is none apart from the audio image (direct conversion).
    /// </summary>
    public Frequency? ImageOf(Frequency signal) => Side switch
    {
        InjectionSide.HighSide => Positive(signal.Hertz + (2 * IntermediateHz)),
        InjectionSide.LowSide => Positive(Math.Abs(signal.Hertz - (2 * IntermediateHz))),
        InjectionSide.SumToIntermediate => Positive((2 * IntermediateHz) - signal.Hertz),
        _ => null,
    };

    /// <summary>Oscillator range for a band, or null when an end would be zero or negative.</summary>
    public FrequencyRange? OscillatorFor(FrequencyRange band) =>
        (OscillatorFor(band.Low), OscillatorFor(band.High)) is ({ } a, { } b) ? new FrequencyRange(a < b ? a : b, a < b ? b : a) : null;

    /// <summary>
    /// What a band has against it with this scheme: image within 25 % of the signal, intermediate frequency (or its double or half) within 5 % of
    /// the band, oscillator equal to the intermediate frequency, no oscillator. Limits: common practice.
    /// </summary>
    public IReadOnlyList<SchemeIssue> IssuesOver(FrequencyRange band)
    {
        var issues = new List<SchemeIssue>();
        if (OscillatorFor(band) is not { } oscillator) return [SchemeIssue.NoOscillator];
        if (Intermediate is not { } intermediate) return issues;
        if (oscillator.Contains(intermediate)) issues.Add(SchemeIssue.OscillatorEqualsIntermediate);
        if (new[] { band.Low, band.High }.Any(f => ImageOf(f) is { } image && Math.Abs((image / f) - 1) < 0.25)) issues.Add(SchemeIssue.ImageTooClose);
        var near = new FrequencyRange(band.Low * 0.95, band.High * 1.05);
        if (near.Contains(intermediate)) issues.Add(SchemeIssue.IntermediateInBand);
        if (band.Contains(intermediate * 2) || band.Contains(intermediate / 2)) issues.Add(SchemeIssue.IntermediateHarmonicInBand);
        return issues;
    }

    private double IntermediateHz => Intermediate!.Value.Hertz;

    private static Frequency? Positive(double hertz) => hertz > 0 ? Frequency.FromHertz(hertz) : null;
}

/// <summary>What speaks against a frequency scheme on a band.</summary>
public enum SchemeIssue
{
    /// <summary>Nothing.</summary>
    None,

    /// <summary>Refusal: the oscillator would be at zero or a negative frequency.</summary>
    NoOscillator,

    /// <summary>Refusal: the oscillator equals the intermediate frequency inside the band.</summary>
    OscillatorEqualsIntermediate,

    /// <summary>Warning: the image lies within a quarter of the signal frequency; the front end cannot remove it.</summary>
    ImageTooClose,

    /// <summary>Warning: the intermediate frequency lies in or within 5 % of the band and breaks through.</summary>
    IntermediateInBand,

    /// <summary>Warning: twice or half the intermediate frequency lies in the band.</summary>
    IntermediateHarmonicInBand,
}
