using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Measuring;

/// <summary>Two equal tones through a linear stage: peak envelope, average, and the two ways to state a product. Immutable.</summary>
/// <remarks>Method: at the crest the amplitudes add. Valid: equal tones. Source: derived.</remarks>
/// <param name="PeakEnvelope">Power at the crest of the envelope.</param>
public sealed record TwoTone(Power PeakEnvelope)
{
    /// <summary>How far one tone lies below the peak envelope power.</summary>
    public static readonly Decibels ToneBelowPeak = Decibels.FromPowerRatio(4);

    /// <summary>From the peak voltage at the crest across a load above zero.</summary>
    public static TwoTone FromCrest(Voltage peak, Resistance load) => new(RfVoltage.FromPeakToPeak(peak * 2, load));

    /// <summary>Average power: half the peak envelope power.</summary>
    public Power Average => PeakEnvelope / 2;

    /// <summary>Power of each tone.</summary>
    public Power EachTone => PeakEnvelope / 4;

    /// <summary>A product stated below one tone, stated below the peak envelope power instead: 6.02 dB more.</summary>
    public static Decibels BelowPeak(Decibels belowOneTone) => belowOneTone + ToneBelowPeak;
}
