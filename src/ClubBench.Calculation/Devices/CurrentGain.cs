using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Devices;

/// <summary>Whether a bipolar transistor suits a frequency.</summary>
public enum FrequencySuitability
{
    /// <summary>No transition frequency is stated.</summary>
    Unknown,

    /// <summary>At least ten times the frequency: comfortable.</summary>
    Comfortable,

    /// <summary>Five to ten times: usable with less gain.</summary>
    LessGain,

    /// <summary>Three to five times: only as a low-gain final stage with measured parts.</summary>
    LowGainFinalOnly,

    /// <summary>Below three times: not suitable.</summary>
    Unsuitable,
}

/// <summary>Small-signal current gain of a bipolar transistor against frequency: one pole. Immutable.</summary>
/// <remarks>
/// Method: |hfe| = hfe0 / sqrt(1 + (hfe0 f / fT)^2).
/// Valid: up to about fT / 3, at the current the transition frequency is stated for; it drops at high current.
/// Source: derived (single pole); the suitability steps are common practice.
/// </remarks>
public readonly record struct CurrentGain
{
    /// <summary>From the gain at low frequency (1 or above) and the transition frequency.</summary>
    public CurrentGain(double lowFrequency, Frequency transition)
    {
        LowFrequency = Guard.Within(lowFrequency, 1, 1e5, nameof(lowFrequency));
        Transition = transition;
    }

    /// <summary>Gain at low frequency, a ratio of currents.</summary>
    public double LowFrequency { get; }

    /// <summary>Frequency where the gain has fallen to about 1.</summary>
    public Frequency Transition { get; }

    /// <summary>Size of the current gain at a frequency.</summary>
    public double At(Frequency f)
    {
        var x = LowFrequency * (f / Transition);
        return LowFrequency / Math.Sqrt(1 + (x * x));
    }

    /// <summary>Change of the current gain from one frequency to another, negative when it falls.</summary>
    public Decibels Change(Frequency from, Frequency to) => Decibels.FromAmplitudeRatio(At(to) / At(from));

    /// <summary>Judges the ratio of transition frequency to operating frequency; give the least one, or half the typical one.</summary>
    public static FrequencySuitability Suitability(Frequency? transition, Frequency f) => (transition is { } ft ? ft / f : (double?)null) switch
    {
        null => FrequencySuitability.Unknown,
        >= 10 => FrequencySuitability.Comfortable,
        >= 5 => FrequencySuitability.LessGain,
        >= 3 => FrequencySuitability.LowGainFinalOnly,
        _ => FrequencySuitability.Unsuitable,
    };

    /// <summary>Whether a device is so fast (above fifty times the frequency) that its base wants a stopper of 10 to 47 ohm or a bead. Common practice.</summary>
    public static bool NeedsBaseStopper(Frequency transition, Frequency f) => transition / f > 50;
}
