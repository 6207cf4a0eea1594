using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>How an oscillator drives a mixer port.</summary>
public enum MixerDrive
{
    /// <summary>Not judged.</summary>
    Unknown,

    /// <summary>More than 3 dB short: loss, noise and distortion rise.</summary>
    UnderDriven,

    /// <summary>Within 3 dB of what the mixer wants.</summary>
    Right,

    /// <summary>More than 3 dB over: leakage and diode noise rise.</summary>
    OverDriven,
}

/// <summary>
/// Oscillator levels. Measure into a resistor in place of the mixer port: diodes clip, so the voltage across a running mixer says nothing.
/// Source: derived (sine wave); the 3 dB window is common practice.
/// </summary>
public static class OscillatorLevel
{
    /// <summary>Level of a sine wave from its peak-to-peak voltage (above zero) across a load (above zero).</summary>
    public static PowerLevel FromPeakToPeak(Voltage peakToPeak, Resistance load)
    {
        var volt = Guard.Positive(peakToPeak.Volt, nameof(peakToPeak));
        return Power.FromWatt(volt * volt / (8 * Guard.Positive(load.Ohm, nameof(load)))).ToLevel();
    }

    /// <summary>Peak-to-peak voltage of a sine wave of this level across a load.</summary>
    public static Voltage PeakToPeak(PowerLevel level, Resistance load) => Voltage.FromVolt(Math.Sqrt(8 * level.ToPower().Watt * load.Ohm));

    /// <summary>Judges the level at a mixer port against what the mixer wants.</summary>
    public static MixerDrive Judge(PowerLevel atPort, PowerLevel wanted) => (atPort - wanted).Db switch
    {
        < -3 => MixerDrive.UnderDriven,
        > 3 => MixerDrive.OverDriven,
        _ => MixerDrive.Right,
    };

    /// <summary>
    /// Oscillator power that reaches the antenna of a set without an isolating stage: level less isolation less other loss.
    /// Isolation above zero; compare with the limit of the applicable emission rule.
    /// </summary>
    public static PowerLevel AtAntenna(PowerLevel oscillator, Decibels isolation, Decibels otherLoss)
    {
        Guard.Positive(isolation.Db, nameof(isolation));
        return oscillator - isolation - otherLoss;
    }
}
