namespace ClubBench.Planning.Figures;

/// <summary>What a number measures; decides how it is written and which unit its SI value carries.</summary>
public enum QuantityKind
{
    /// <summary>A pure number.</summary>
    Number,

    /// <summary>A ratio shown in per cent (SI value 0.05 is 5 %).</summary>
    Ratio,

    /// <summary>A count: turns, parts, boards.</summary>
    Count,

    /// <summary>Hertz.</summary>
    Frequency,

    /// <summary>A difference of frequencies in hertz, either sign.</summary>
    FrequencyShift,

    /// <summary>Henry.</summary>
    Inductance,

    /// <summary>Farad.</summary>
    Capacitance,

    /// <summary>Ohm.</summary>
    Resistance,

    /// <summary>Volt, direct or as the name says.</summary>
    Voltage,

    /// <summary>Volt peak to peak.</summary>
    PeakToPeakVoltage,

    /// <summary>Ampere.</summary>
    Current,

    /// <summary>Watt.</summary>
    Power,

    /// <summary>Level in dBm.</summary>
    PowerLevel,

    /// <summary>Gain, loss or margin in dB.</summary>
    Decibels,

    /// <summary>Level relative to the carrier in dBc.</summary>
    RelativeLevel,

    /// <summary>Degrees Celsius.</summary>
    Temperature,

    /// <summary>Kelvin.</summary>
    TemperatureRise,

    /// <summary>Metre.</summary>
    Length,

    /// <summary>Second.</summary>
    Duration,

    /// <summary>Tesla.</summary>
    FluxDensity,

    /// <summary>Inductance index in henry per turn squared.</summary>
    InductanceFactor,

    /// <summary>Degrees of arc.</summary>
    Angle,
}
