using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Keying;

/// <summary>Speed of telegraphy. Immutable.</summary>
/// <remarks>
/// Method: necessary bandwidth = baud times 5 on fading circuits, 3 on steady ones; 48 elements a word for the designator, 50 for dot lengths.
/// Valid: 1 to 100 words a minute. Source: itu-r-sm1138; cfr-47-2, section 2.202(g) (the worked example from memory).
/// </remarks>
public readonly record struct TelegraphySpeed
{
    private TelegraphySpeed(double wordsPerMinute) => WordsPerMinute = wordsPerMinute;

    /// <summary>Words a minute.</summary>
    public double WordsPerMinute { get; }

    /// <summary>From words a minute, 1 to 100.</summary>
    public static TelegraphySpeed FromWordsPerMinute(double words) => new(Guard.Within(words, 1, 100, nameof(words)));

    /// <summary>Length of a dot, by the word of 50 elements.</summary>
    public Duration Dot => Duration.FromSecond(1.2 / WordsPerMinute);

    /// <summary>Speed in baud as the emission designator counts it, by the word of 48 elements.</summary>
    public double DesignatorBaud => 0.8 * WordsPerMinute;

    /// <summary>Necessary bandwidth in hertz.</summary>
    /// <param name="fading">Whether the circuit fades, as short waves do.</param>
    public double NecessaryBandwidthHertz(bool fading = true) => DesignatorBaud * (fading ? 5 : 3);
}
