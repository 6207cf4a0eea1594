namespace ClubBench.Calculation.Noise;

/// <summary>Category of a site by its man-made noise.</summary>
public enum NoiseSite
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>City.</summary>
    City,

    /// <summary>Residential; the usual choice for a club in a town.</summary>
    Residential,

    /// <summary>Rural.</summary>
    Rural,

    /// <summary>Quiet rural; a formula for 0.3 to 30 MHz.</summary>
    QuietRural,
}

/// <summary>Hour for which noise is counted.</summary>
public enum NoiseHour
{
    /// <summary>Median of the hours.</summary>
    Median,

    /// <summary>Lower decile of the man-made noise: the hour a weak signal is heard best, and the planning value.</summary>
    Quiet,
}
