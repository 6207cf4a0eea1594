using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Mixing;

/// <summary>A crystal-controlled converter in front of a set that tunes another band.</summary>
/// <param name="Side">How the crystal lies: below the signal, above it (inverts, dial backwards), or added to it.</param>
/// <param name="Crystal">Crystal from the drawer.</param>
/// <param name="AtBandLow">Dial of the old set at the lower end of the new band.</param>
/// <param name="AtBandHigh">Dial of the old set at the upper end of the new band.</param>
/// <param name="Image">Image of the middle of the new band.</param>
public sealed record ConverterScheme(InjectionSide Side, Frequency Crystal, Frequency AtBandLow, Frequency AtBandHigh, Frequency? Image)
{
    /// <summary>Whether an upper sideband comes out as a lower one.</summary>
    public bool InvertsSpectrum => Side == InjectionSide.HighSide;

    /// <summary>Whether the old dial falls as the signal rises.</summary>
    public bool DialRunsBackwards => AtBandHigh < AtBandLow;
}

/// <summary>Converters from a drawer of crystals that bring a whole new band onto an old dial, the best first.</summary>
/// <remarks>
/// Method: dial = signal - X, X - signal or signal + X; dropped where a harmonic up to the fifth of the crystal falls into the new band or onto the dial.
/// Order: forward tuning first, then the image further away by ratio. Source: derived; the order is common practice.
/// </remarks>
public static class ConverterSearch
{
    private static readonly InjectionSide[] Sides = [InjectionSide.LowSide, InjectionSide.HighSide, InjectionSide.SumToIntermediate];

    /// <summary>Converters for a band; empty where no crystal does it.</summary>
    public static IReadOnlyList<ConverterScheme> Of(FrequencyRange band, FrequencyRange dial, IReadOnlyList<Frequency> stock) =>
    [
        .. from crystal in stock
           from side in Sides
           let scheme = At(side, crystal, band)
           where scheme is not null && dial.Contains(scheme.AtBandLow) && dial.Contains(scheme.AtBandHigh)
           where CrystalHarmonics.In(band, crystal) is null && CrystalHarmonics.In(OnDial(scheme), crystal) is null
           orderby scheme.DialRunsBackwards, scheme.Image is { } image ? -Math.Abs(Math.Log(image / band.Middle)) : double.MinValue
           select scheme,
    ];

    private static FrequencyRange OnDial(ConverterScheme scheme) =>
        scheme.DialRunsBackwards ? new(scheme.AtBandHigh, scheme.AtBandLow) : new(scheme.AtBandLow, scheme.AtBandHigh);

    private static ConverterScheme? At(InjectionSide side, Frequency crystal, FrequencyRange band) =>
        (Dial(side, crystal, band.Low), Dial(side, crystal, band.High), Dial(side, crystal, band.Middle)) is ({ } low, { } high, { } middle)
            ? new(side, crystal, low, high, new FrequencyScheme(side, middle).ImageOf(band.Middle))
            : null;

    private static Frequency? Dial(InjectionSide side, Frequency crystal, Frequency signal)
    {
        var hertz = side switch
        {
            InjectionSide.LowSide => signal.Hertz - crystal.Hertz,
            InjectionSide.HighSide => crystal.Hertz - signal.Hertz,
            _ => signal.Hertz + crystal.Hertz,
        };
        return hertz > 0 ? Frequency.FromHertz(hertz) : null;
    }
}
