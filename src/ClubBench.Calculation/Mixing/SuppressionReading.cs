using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>Signal on which a suppression is read.</summary>
public enum SuppressionSignal
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>Single sideband, one tone: the sideband is the whole envelope.</summary>
    SingleSidebandOneTone,

    /// <summary>Single sideband, two equal tones: each lies 6.02 dB below the peak of the envelope.</summary>
    SingleSidebandTwoTone,

    /// <summary>Double sideband, one tone: each sideband lies 6.02 dB below the peak of the envelope.</summary>
    DoubleSideband,
}

/// <summary>
/// Suppression of a carrier below one line of the spectrum and below the peak envelope power: say which. Method: two equal lines add to twice the amplitude.
/// Source: derived; itu-r-sm329 for the spurious domain, from memory.
/// </summary>
public static class SuppressionReading
{
    private static readonly Decibels TwoLines = Decibels.FromAmplitudeRatio(2);

    /// <summary>Suppression below the peak envelope power from one read below one sideband or tone.</summary>
    public static Decibels BelowPeakEnvelope(Decibels belowOneLine, SuppressionSignal signal) => belowOneLine + Offset(signal);

    /// <summary>Suppression below one sideband or tone from one read below the peak envelope power.</summary>
    public static Decibels BelowOneLine(Decibels belowPeakEnvelope, SuppressionSignal signal) => belowPeakEnvelope - Offset(signal);

    /// <summary>
    /// Distance in Hz from the middle of the emission at which the spurious domain begins below 30 MHz: 2.5 times the necessary bandwidth (1 Hz to 1 GHz), at least 10 kHz.
    /// </summary>
    public static double SpuriousDomainFromHertz(double necessaryBandwidthHertz) =>
        Math.Max(10_000, 2.5 * Guard.Within(necessaryBandwidthHertz, 1, 1e9, nameof(necessaryBandwidthHertz)));

    private static Decibels Offset(SuppressionSignal signal) => signal switch
    {
        SuppressionSignal.SingleSidebandOneTone => Decibels.Zero,
        SuppressionSignal.SingleSidebandTwoTone or SuppressionSignal.DoubleSideband => TwoLines,
        _ => throw new ArgumentOutOfRangeException(nameof(signal), signal, "The signal must be stated."),
    };
}
