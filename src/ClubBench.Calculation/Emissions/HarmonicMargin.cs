using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Emissions;

/// <summary>A figure with its standard uncertainty (one standard deviation).</summary>
/// <param name="Value">The figure.</param>
/// <param name="StandardUncertainty">One standard deviation, 0 or above.</param>
public sealed record UncertainLevel(Decibels Value, Decibels StandardUncertainty);

/// <summary>What a margin says.</summary>
public enum HarmonicVerdict
{
    /// <summary>Not judged.</summary>
    Unknown,

    /// <summary>Planning: expected to meet the limit. Measure before going on the air all the same.</summary>
    ExpectedToMeet,

    /// <summary>Planning: too close to tell.</summary>
    TooCloseToTell,

    /// <summary>Planning: expected to miss the limit.</summary>
    ExpectedToMiss,

    /// <summary>On the air: measured and clear of the limit by the whole uncertainty.</summary>
    Cleared,

    /// <summary>On the air: not cleared.</summary>
    Held,
}

/// <summary>One harmonic at the antenna against its limit. Immutable.</summary>
/// <remarks>
/// Method: level = raw level - (filter loss at the harmonic - filter loss at the carrier); margin = -level - limit;
/// uncertainties add as squares.
/// Valid: the filter figure assumes matched ends; a stage is no 50 ohm source at its harmonics, which the filter uncertainty stands for.
/// Source: derived; the uncertainties are common practice.
/// </remarks>
/// <param name="Level">Level relative to the carrier, negative, with its uncertainty.</param>
/// <param name="Limit">Wanted attenuation below the carrier, positive.</param>
public sealed record HarmonicMargin(UncertainLevel Level, Decibels Limit)
{
    /// <summary>Standard uncertainty of a filter figure while the stage's impedance at harmonics is unknown.</summary>
    public static readonly Decibels FilterUncertainty = Decibels.FromDb(3);

    /// <summary>Standard uncertainty of a level measured with a detector or analyser.</summary>
    public static readonly Decibels AnalyserUncertainty = Decibels.FromDb(2);

    /// <summary>Standard uncertainty of a level compared on a receiver against a step attenuator.</summary>
    public static readonly Decibels ReceiverUncertainty = Decibels.FromDb(3);

    /// <summary>How far the level lies below the limit; negative above it.</summary>
    public Decibels Margin => -Level.Value - Limit;

    /// <summary>Judgement while planning: one standard uncertainty on either side.</summary>
    public HarmonicVerdict Planning =>
        Margin >= Level.StandardUncertainty ? HarmonicVerdict.ExpectedToMeet
        : Margin <= -Level.StandardUncertainty ? HarmonicVerdict.ExpectedToMiss
        : HarmonicVerdict.TooCloseToTell;

    /// <summary>Judgement of a measured level: cleared only if the margin reaches the expanded uncertainty, twice the standard one (about 95 %).</summary>
    public HarmonicVerdict OnAir => Margin >= Level.StandardUncertainty * 2 ? HarmonicVerdict.Cleared : HarmonicVerdict.Held;

    /// <summary>Level at the antenna of a harmonic whose level ahead of the filter is known.</summary>
    /// <param name="raw">Level ahead of the filter relative to the carrier, negative, with its uncertainty.</param>
    /// <param name="carrierLoss">Filter loss at the carrier.</param>
    /// <param name="harmonicLoss">Filter loss at the harmonic.</param>
    /// <param name="filterUncertainty">Standard uncertainty of the filter figure.</param>
    public static UncertainLevel BehindFilter(UncertainLevel raw, Decibels carrierLoss, Decibels harmonicLoss, Decibels filterUncertainty) =>
        new(raw.Value - (harmonicLoss - carrierLoss), RootSumOfSquares(raw.StandardUncertainty, filterUncertainty));

    /// <summary>Attenuation a filter needs at the harmonic, above its loss at the carrier: limit plus wanted margin plus the (negative) raw level.</summary>
    public static Decibels AttenuationNeeded(Decibels raw, Decibels limit, Decibels wantedMargin) => limit + wantedMargin + raw;

    internal static Decibels RootSumOfSquares(Decibels a, Decibels b) => Decibels.FromDb(Math.Sqrt((a.Db * a.Db) + (b.Db * b.Db)));
}
