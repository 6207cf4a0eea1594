using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Windings;

/// <summary>A magnetic core of the trade's lists. Immutable.</summary>
public abstract record Core
{
    /// <summary>Designation as printed on the bag, such as "T50-2" or "FT37-43".</summary>
    public required string Designation { get; init; }

    /// <summary>Mix of the material, such as "2", "6" or "43".</summary>
    public required string Mix { get; init; }

    /// <summary>Initial permeability relative to vacuum.</summary>
    public required double InitialPermeability { get; init; }

    /// <summary>Inductance index (AL) for a winding spread over the whole core, low frequency.</summary>
    public required InductanceFactor InductanceFactor { get; init; }

    /// <summary>Relative tolerance of the inductance index (0.05 = 5 %).</summary>
    public required double InductanceFactorTolerance { get; init; }

    /// <summary>Frequencies where the material serves best in a tuned circuit.</summary>
    public required FrequencyRange BestRange { get; init; }

    /// <summary>Frequencies where it may still be used: tuned for iron powder, wideband for ferrite.</summary>
    public required FrequencyRange UsableRange { get; init; }

    /// <summary>Source of the inductance index.</summary>
    public required SourceRef Source { get; init; }

    /// <summary>What is worth knowing of this row; empty where there is nothing.</summary>
    public string Note { get; init; } = "";
}

/// <summary>A ring core. Immutable.</summary>
public abstract record ToroidCore : Core
{
    /// <summary>Outer diameter.</summary>
    public required Length OuterDiameter { get; init; }

    /// <summary>Diameter of the hole.</summary>
    public required Length InnerDiameter { get; init; }

    /// <summary>Height along the axis.</summary>
    public required Length Height { get; init; }

    /// <summary>Effective magnetic cross section.</summary>
    public required Area EffectiveArea { get; init; }

    /// <summary>Effective magnetic path length.</summary>
    public required Length PathLength { get; init; }

    /// <summary>
    /// Inductance index that size and permeability give: mu0 mu_i A/l. A list value outside 0.93 to 1.27 of it for iron powder (fringing) or
    /// 0.85 to 1.15 for ferrite may be a slipped decimal point. Source: derived.
    /// </summary>
    public InductanceFactor ExpectedInductanceFactor => InductanceFactor.FromNanohenryPerTurnSquared(
        1e9 * Copper.VacuumPermeability * InitialPermeability * EffectiveArea.SquareMetre / PathLength.Metre);

    /// <summary>Whether the stated index is plausible for size and permeability.</summary>
    public bool HasPlausibleInductanceFactor
    {
        get
        {
            var ratio = InductanceFactor.NanohenryPerTurnSquared / ExpectedInductanceFactor.NanohenryPerTurnSquared;
            return this is IronPowderCore ? ratio is >= 0.93 and <= 1.27 : ratio is >= 0.85 and <= 1.15;
        }
    }
}

/// <summary>An iron-powder ring: stable, low permeability, for tuned circuits and filters. Immutable.</summary>
public sealed record IronPowderCore : ToroidCore
{
    /// <summary>Paint of the ring, "face/back".</summary>
    public required string Colour { get; init; }

    /// <summary>Change of inductance with temperature in parts per million per kelvin; a tuned circuit moves by minus half of it.</summary>
    public required double TemperatureCoefficientPpmPerKelvin { get; init; }
}

/// <summary>A ferrite ring: high permeability, lossy and frequency dependent at HF, for chokes and wideband transformers. Immutable.</summary>
public sealed record FerriteCore : ToroidCore
{
    /// <summary>Index that another generation of lists prints for the same ring; null where lists agree.</summary>
    public InductanceFactor? OtherListInductanceFactor { get; init; }

    /// <summary>Maker's part number; empty where not stated.</summary>
    public string MakerPart { get; init; } = "";
}

/// <summary>A ferrite block with two holes; one pass through both is one turn. Immutable.</summary>
public sealed record BinocularCore : Core
{
    /// <summary>Width across both holes.</summary>
    public required Length Width { get; init; }

    /// <summary>Diameter of each hole.</summary>
    public required Length HoleDiameter { get; init; }

    /// <summary>Length along the holes.</summary>
    public required Length HoleLength { get; init; }

    /// <summary>Height across the holes.</summary>
    public required Length Height { get; init; }

    /// <summary>Index that another generation of lists prints; null where lists agree.</summary>
    public InductanceFactor? OtherListInductanceFactor { get; init; }
}
