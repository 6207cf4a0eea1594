using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Audio;

/// <summary>Voltage gain a receiver needs from antenna to headphones. Source: derived.</summary>
public static class GainBudget
{
    /// <summary>
    /// Gain from a signal level at the antenna (power in <paramref name="antenna"/>, above zero) to an RMS voltage at the headphones, above zero.
    /// </summary>
    public static Decibels Required(PowerLevel signal, Resistance antenna, Voltage outputRms)
    {
        var inputRms = Math.Sqrt(signal.ToPower().Watt * Guard.Positive(antenna.Ohm, nameof(antenna)));
        return Decibels.FromAmplitudeRatio(Guard.Positive(outputRms.Volt, nameof(outputRms)) / inputRms);
    }

    /// <summary>
    /// More gain for equal loudness of the band noise on another frequency: man-made noise falls by 27.7 dB per decade, so a move upwards asks
    /// for that much more. Negative downwards. Source: itu-r-p372, slope of the man-made noise.
    /// </summary>
    public static Decibels ExtraFor(Frequency from, Frequency to) => Decibels.FromDb(27.7 * Math.Log10(to / from));

    /// <summary>
    /// What is left of a margin of gain after a move: zero or above, and nothing in the audio chain has to change. The margin is the gain there is at most
    /// less the gain the band noise needs now.
    /// </summary>
    public static Decibels MarginAfter(Decibels margin, Frequency from, Frequency to) => margin - ExtraFor(from, to);
}
