using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using ClubBench.Planning.StageKinds;

namespace ClubBench.Club.Entities;

/// <summary>An instrument of the club. A known offset is subtracted visibly; the raw reading is kept.</summary>
public sealed class ClubInstrument : EditableRow
{
    public required string Name { get; init; }

    public InstrumentClass Class { get; init; }

    /// <summary>Expanded (k = 2), relative.</summary>
    public double UncertaintyRelative { get; set; }

    /// <summary>Expanded (k = 2), absolute; added.</summary>
    public double UncertaintySi { get; set; }

    /// <summary>Known fixture offset; subtracted.</summary>
    public double OffsetSi { get; set; }

    /// <summary>What the offset and the absolute uncertainty are measured in; they count for readings of this kind only.</summary>
    public QuantityKind OffsetKind { get; set; }

    public string Post { get; set; } = "";

    public DateOnly? CheckedOn { get; set; }

    /// <summary>The record as it counts for readings of a kind.</summary>
    public Instrument For(QuantityKind kind) =>
        new(Name, Class, UncertaintyRelative, kind == OffsetKind ? UncertaintySi : 0, kind == OffsetKind ? OffsetSi : 0);
}

/// <summary>A lot of parts in the club's drawers.</summary>
public sealed class StockLot : EditableRow
{
    public PartClass Class { get; init; }

    public required string Type { get; init; }

    /// <summary>Main value (capacitance, inductance, marked frequency, wire diameter); null for cores and devices.</summary>
    public double? ValueSi { get; init; }

    /// <summary>Pieces; metres for wire.</summary>
    public double QuantityPieces { get; set; }

    public string Lot { get; init; } = "";

    /// <summary>Whether it may go into a tuned place.</summary>
    public bool MayBeTuned { get; init; } = true;

    public string Place { get; set; } = "";

    /// <summary>What was measured of the lot, by the names of part values, as JSON; null for nothing.</summary>
    public string? MeasuredJson { get; set; }
}
