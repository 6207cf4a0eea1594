using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>Side of the carrier the speech is on.</summary>
public enum Sideband
{
    /// <summary>Not stated, or both.</summary>
    Unknown,

    /// <summary>Above the carrier.</summary>
    Upper,

    /// <summary>Below the carrier.</summary>
    Lower,
}

/// <summary>Single and double sideband by numbers. Source: derived; which sideband is usual on a band is common practice.</summary>
public static class Sidebands
{
    /// <summary>Usual sideband of a frequency: upper from 10 MHz and on 5 MHz, lower below.</summary>
    public static Sideband Usual(Frequency signal) =>
        signal.Megahertz is >= 10 or (>= 5 and < 6) ? Sideband.Upper : Sideband.Lower;

    /// <summary>The sideband at the intermediate frequency: swapped when the scheme inverts.</summary>
    public static Sideband AtIntermediate(Sideband signal, FrequencyScheme scheme) => (signal, scheme.InvertsSpectrum) switch
    {
        (Sideband.Upper, true) => Sideband.Lower,
        (Sideband.Lower, true) => Sideband.Upper,
        _ => signal,
    };

    /// <summary>
    /// Carrier frequency beside a filter centred at <paramref name="filterCentre"/>: below it by half the sum of the audio edges for upper sideband there,
    /// above it for lower. The sideband must be stated.
    /// </summary>
    public static Frequency CarrierFor(Sideband atIntermediate, Frequency filterCentre, FrequencyRange audio) => atIntermediate switch
    {
        Sideband.Upper => Frequency.FromHertz(filterCentre.Hertz - audio.Middle.Hertz),
        Sideband.Lower => Frequency.FromHertz(filterCentre.Hertz + audio.Middle.Hertz),
        _ => throw new ArgumentOutOfRangeException(nameof(atIntermediate), atIntermediate, "The sideband must be stated."),
    };

    /// <summary>
    /// How far the carrier oscillator has to move when a set goes from one scheme to another and keeps its filter, Hz, either sign: the sum of the
    /// audio edges where one of the two inverts, zero otherwise. The sidebands on the air must be stated.
    /// </summary>
    public static double CarrierMoveHertz(Sideband signalBefore, FrequencyScheme before, Sideband signalAfter, FrequencyScheme after, FrequencyRange audio)
    {
        // Any filter centre gives the same difference.
        var filter = Frequency.FromMegahertz(9);
        return CarrierFor(AtIntermediate(signalAfter, after), filter, audio).Hertz - CarrierFor(AtIntermediate(signalBefore, before), filter, audio).Hertz;
    }

    /// <summary>
    /// Suppression of the unwanted sideband by phasing, from the ratio of the two amplitudes (above zero) and the error of the phase in degrees.
    /// Null when both are perfect: the suppression is then without limit.
    /// </summary>
    public static Decibels? PhasingSuppression(double amplitudeRatio, double phaseErrorDegrees)
    {
        var a = Guard.Positive(amplitudeRatio, nameof(amplitudeRatio));
        var cosine = Math.Cos(phaseErrorDegrees * Math.PI / 180);
        var left = 1 - (2 * a * cosine) + (a * a);
        return left > 0 ? Decibels.FromPowerRatio((1 + (2 * a * cosine) + (a * a)) / left) : null;
    }

    /// <summary>Mean power of double sideband without carrier, one tone: half the peak envelope power.</summary>
    public static Power DoubleSidebandMean(Power peakEnvelope) => peakEnvelope / 2;

    /// <summary>Power of one sideband of double sideband without carrier, one tone: a quarter of the peak envelope power.</summary>
    public static Power OneOfTwoSidebands(Power peakEnvelope) => peakEnvelope / 4;

    /// <summary>
    /// Carriers that keep the whole emission and the carrier itself inside a band; null where the band is too narrow. An unknown sideband means both, which
    /// take the upper audio edge on either side.
    /// </summary>
    public static FrequencyRange? CarriersWithin(FrequencyRange band, Sideband sideband, FrequencyRange audio)
    {
        var low = band.Low.Hertz + (sideband == Sideband.Upper ? 0 : audio.High.Hertz);
        var high = band.High.Hertz - (sideband == Sideband.Lower ? 0 : audio.High.Hertz);
        return high > 0 && high >= low ? new FrequencyRange(Frequency.FromHertz(low), Frequency.FromHertz(high)) : null;
    }

    /// <summary>Necessary bandwidth in Hz: twice the upper audio edge for both sidebands, the width of the audio for one.</summary>
    public static double NecessaryBandwidthHertz(FrequencyRange audio, bool doubleSideband) =>
        doubleSideband ? 2 * audio.High.Hertz : audio.WidthHertz;
}
