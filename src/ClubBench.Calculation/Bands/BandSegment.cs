using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Bands;

/// <summary>Region of the International Telecommunication Union.</summary>
public enum ItuRegion
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>Europe, Africa, the Middle East and northern Asia.</summary>
    Region1,

    /// <summary>The Americas.</summary>
    Region2,

    /// <summary>The rest of Asia, and Oceania.</summary>
    Region3,
}

/// <summary>What a run of frequencies is to amateurs. Only the first three are allocations; the others are habits.</summary>
public enum BandUse
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>Allocated with primary status.</summary>
    Primary,

    /// <summary>Allocated with secondary status.</summary>
    Secondary,

    /// <summary>Available in some countries only.</summary>
    National,

    /// <summary>Telegraphy segment of the band plan.</summary>
    CwSegment,

    /// <summary>Low-power telegraphy centre of activity, a spot frequency.</summary>
    QrpCwCentre,

    /// <summary>Low-power telephony centre of activity, a spot frequency.</summary>
    QrpSsbCentre,

    /// <summary>Telegraphy calling frequency, a spot frequency.</summary>
    CwCalling,
}

/// <summary>One row of the band table. Never a permission: the national table and the licence decide.</summary>
/// <param name="Band">Name by wavelength, such as "20 m".</param>
/// <param name="Region">Region it holds for.</param>
/// <param name="Use">Allocation or habit.</param>
/// <param name="Range">From lower to upper edge; both equal for a spot.</param>
/// <param name="Source">Where the row comes from; a status of from memory stays with it.</param>
/// <param name="Note">Conditions and remarks; may be empty.</param>
public sealed record BandSegment(string Band, ItuRegion Region, BandUse Use, FrequencyRange Range, SourceRef Source, string Note)
{
    /// <summary>Whether the edges were checked against their source.</summary>
    public bool IsChecked => Source.Status == SourceStatus.Published;
}

/// <summary>The whole of a band in a region: its adjoining allocations taken together.</summary>
/// <param name="Band">Name by wavelength.</param>
/// <param name="Region">Region it holds for.</param>
/// <param name="Range">Outer edges.</param>
/// <param name="Parts">The rows it is made of, from low to high.</param>
public sealed record BandAllocation(string Band, ItuRegion Region, FrequencyRange Range, IReadOnlyList<BandSegment> Parts)
{
    /// <summary>Whether every edge was checked against its source.</summary>
    public bool IsChecked => Parts.All(p => p.IsChecked);

    /// <summary>Whether any part has secondary status only.</summary>
    public bool IsSecondary => Parts.Any(p => p.Use == BandUse.Secondary);
}
