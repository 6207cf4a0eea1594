using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Oscillators;

/// <summary>Kind of local oscillator to offer for a band.</summary>
public enum OscillatorKind
{
    /// <summary>Not decided.</summary>
    Unknown,

    /// <summary>One pulled crystal.</summary>
    OneCrystal,

    /// <summary>Two matched crystals in parallel.</summary>
    TwoCrystals,

    /// <summary>Pulled crystals stretched by a stable inductor, or two switched ranges.</summary>
    StretchedCrystals,

    /// <summary>Pulled crystal at a half or a third of the frequency, multiplied.</summary>
    MultipliedCrystal,

    /// <summary>Free-running coil and capacitor.</summary>
    FreeRunning,

    /// <summary>Premixed, or a digital clock generator.</summary>
    PremixOrDigital,
}

/// <summary>
/// Which oscillator to offer. Method: coverage ratio against what pulled crystals reach with a safe inductor.
/// Source: limits derived from typical crystals, order of preference common practice.
/// </summary>
public static class OscillatorChoice
{
    private const double HighestFundamentalMhz = 24;
    // "Up to 7 MHz" in the trade means up to the 40 m band.
    private const double HighestFreeRunningMhz = 7.3;

    /// <summary>Wanted width over middle frequency.</summary>
    public static double Coverage(FrequencyRange wanted) => wanted.WidthHertz / wanted.Middle.Hertz;

    /// <summary>The first kind that covers the wanted range; crystals below 4 MHz pull less.</summary>
    public static OscillatorKind For(FrequencyRange wanted)
    {
        var (coverage, mhz) = (Coverage(wanted), wanted.Middle.Megahertz);
        var shortfall = mhz < 4 ? 0.0004 : 0;
        if (mhz > HighestFundamentalMhz && coverage <= 0.0045) return OscillatorKind.MultipliedCrystal;
        if (coverage <= 0.0018 - shortfall) return OscillatorKind.OneCrystal;
        if (coverage <= 0.0023 - shortfall) return OscillatorKind.TwoCrystals;
        if (coverage <= 0.0045) return OscillatorKind.StretchedCrystals;
        return mhz <= HighestFreeRunningMhz ? OscillatorKind.FreeRunning : OscillatorKind.PremixOrDigital;
    }
}
