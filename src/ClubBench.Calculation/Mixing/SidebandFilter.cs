using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>What a filter with its carrier beside it does for single sideband. Immutable.</summary>
/// <remarks>
/// Method: the filter's analysed loss at the carrier, over the wanted and over the opposite sideband, against its least loss in the wanted one.
/// Valid: one carrier, the sideband as it is at the filter.
/// Source: derived; 40 dB wanted of each is common practice.
/// </remarks>
/// <param name="Carrier">Carrier oscillator.</param>
/// <param name="CarrierAttenuation">What the filter takes off the carrier.</param>
/// <param name="CarrierSuppression">That and the balance of the modulator together.</param>
/// <param name="OppositeSideband">Least that it takes off the opposite sideband, over the audio.</param>
/// <param name="PassBandDroop">Most that it takes off the wanted sideband, over the audio.</param>
public sealed record SidebandFilter(Frequency Carrier, Decibels CarrierAttenuation, Decibels CarrierSuppression, Decibels OppositeSideband, Decibels PassBandDroop)
{
    private const int Points = 101;

    /// <summary>Carrier and opposite sideband shall be this far down. Source: common practice.</summary>
    public static Decibels Wanted { get; } = Decibels.FromDb(40);

    /// <summary>Usual width of a filter for speech. Source: common practice.</summary>
    public static FrequencyRange UsualBandwidth { get; } = new(Frequency.FromHertz(2100), Frequency.FromHertz(2700));

    /// <summary>Whether carrier and opposite sideband are both far enough down.</summary>
    public bool Suffices => CarrierSuppression >= Wanted && OppositeSideband >= Wanted;

    /// <summary>Judges a carrier beside a filter.</summary>
    /// <param name="loss">Loss of the filter at a frequency.</param>
    /// <param name="carrier">Carrier oscillator, above the audio in frequency.</param>
    /// <param name="atFilter">Sideband at the filter; must be stated.</param>
    /// <param name="audio">Audio passed.</param>
    /// <param name="balance">What the balanced modulator takes off the carrier, zero or above.</param>
    public static SidebandFilter Of(Func<Frequency, Decibels> loss, Frequency carrier, Sideband atFilter, FrequencyRange audio, Decibels balance)
    {
        Guard.NotNegative(balance.Db, nameof(balance));
        var side = Sign(atFilter);
        var wanted = Losses(side);
        var least = wanted.Min();
        var onCarrier = loss(carrier) - least;
        return new(carrier, onCarrier, onCarrier + balance, Losses(-side).Min() - least, wanted.Max() - least);

        List<Decibels> Losses(int sign) => [.. audio.Points(Points).Select(a => loss(Frequency.FromHertz(carrier.Hertz + (sign * a.Hertz))))];
    }

    /// <summary>
    /// The carrier nearest to a filter that still leaves carrier and opposite sideband far enough down, searched from the edge of the pass-band
    /// outwards by up to the upper audio edge; null where there is none. Nearer keeps more of the low tones. Method: steps of 10 Hz.
    /// </summary>
    public static SidebandFilter? Nearest(Func<Frequency, Decibels> loss, FrequencyRange passBand, Sideband atFilter, FrequencyRange audio, Decibels balance)
    {
        var side = Sign(atFilter);
        var edge = side > 0 ? passBand.Low : passBand.High;
        return Enumerable.Range(0, (int)(audio.High.Hertz / 10) + 1)
            .Select(i => Of(loss, Frequency.FromHertz(edge.Hertz - (side * i * 10.0)), atFilter, audio, balance))
            .FirstOrDefault(f => f.Suffices);
    }

    private static int Sign(Sideband atFilter) => atFilter switch
    {
        Sideband.Upper => 1,
        Sideband.Lower => -1,
        _ => throw new ArgumentOutOfRangeException(nameof(atFilter), atFilter, "The sideband must be stated."),
    };
}
