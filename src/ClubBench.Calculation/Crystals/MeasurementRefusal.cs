namespace ClubBench.Calculation.Crystals;

/// <summary>Why readings of a crystal give no parameters.</summary>
public enum MeasurementRefusal
{
    /// <summary>They do.</summary>
    None,

    /// <summary>Load frequencies must lie above series resonance and fall as the load grows.</summary>
    NotFalling,

    /// <summary>The curve must flatten as the load grows; the readings contradict each other.</summary>
    NotFlattening,

    /// <summary>The frequency must rise when a series capacitor is inserted.</summary>
    NotRising,

    /// <summary>Too few different load capacitors.</summary>
    TooFewLoads,

    /// <summary>The readings lead to parameters no crystal has.</summary>
    NoSuchCrystal,
}

/// <summary>A crystal with a known load and what the counter showed.</summary>
/// <param name="Load">Capacitance in series with the crystal, above zero.</param>
/// <param name="Frequency">Reading.</param>
public readonly record struct LoadedReading(Quantities.Capacitance Load, Quantities.Frequency Frequency);

/// <summary>Parameters from readings, or the reason why there are none.</summary>
/// <param name="Crystal">The crystal; its resistance is not stated. Null when refused.</param>
/// <param name="Refusal">None when there is a crystal.</param>
public sealed record MeasuredCrystal(CrystalParameters? Crystal, MeasurementRefusal Refusal);
