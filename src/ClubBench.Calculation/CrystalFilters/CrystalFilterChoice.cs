using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.CrystalFilters;

/// <summary>Shape of a crystal filter.</summary>
public enum CrystalFilterShape
{
    /// <summary>Not decided.</summary>
    Unknown,

    /// <summary>One capacitor value, forgiving.</summary>
    EqualCapacitor,

    /// <summary>Equal ripple of 0.1 to 0.5 dB, steep; wants matched crystals.</summary>
    Chebyshev,

    /// <summary>Least ringing, more loss.</summary>
    Butterworth,
}

/// <summary>Which shape to build. Method: by width, knowledge of the crystals and taste. Source: common practice.</summary>
public static class CrystalFilterChoice
{
    private const double WidestForTelegraphyHz = 800;

    /// <summary>
    /// The shape for a bandwidth: least ringing where that is asked for; equal capacitors up to 800 Hz and for crystals whose spread is unknown;
    /// equal ripple for matched crystals in a wider filter.
    /// </summary>
    public static CrystalFilterShape For(Frequency bandwidth, bool crystalsMatched, bool leastRinging = false) =>
        leastRinging ? CrystalFilterShape.Butterworth
        : !crystalsMatched || bandwidth.Hertz <= WidestForTelegraphyHz ? CrystalFilterShape.EqualCapacitor
        : CrystalFilterShape.Chebyshev;
}
