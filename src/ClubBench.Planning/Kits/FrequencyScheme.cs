namespace ClubBench.Planning.Kits;

/// <summary>How the frequencies of a rig come about.</summary>
public enum SchemeKind
{
    /// <summary>The oscillator runs on the signal frequency.</summary>
    DirectConversion,

    /// <summary>Receiver with an intermediate frequency.</summary>
    Superhet,

    /// <summary>Transmitter (or transceiver) that mixes a carrier up to the signal frequency.</summary>
    MixingTransmitter,
}

/// <summary>Where the oscillator lies relative to the signal.</summary>
public enum MixingSide
{
    /// <summary>Oscillator equals the signal frequency.</summary>
    Same,

    /// <summary>Oscillator above: IF = LO - RF.</summary>
    High,

    /// <summary>Oscillator below: IF = RF - LO.</summary>
    Low,

    /// <summary>Sum: IF = RF + LO.</summary>
    Sum,
}

/// <summary>One mixer of the rig: who drives it, on which side, and what comes out.</summary>
/// <param name="Mixer">Key of the mixing stage.</param>
/// <param name="Oscillator">Key of the stage that generates its oscillator.</param>
/// <param name="Side">Which side the oscillator is on.</param>
/// <param name="IntermediateFrequencyHz">Intermediate (or carrier) frequency; null for direct conversion.</param>
public sealed record Conversion(string Mixer, string Oscillator, MixingSide Side, double? IntermediateFrequencyHz = null);

/// <summary>The frequency scheme of a kit.</summary>
/// <param name="Kind">Its kind.</param>
/// <param name="Conversions">Every mixer, in the order of the signal.</param>
public sealed record FrequencyScheme(SchemeKind Kind, IReadOnlyList<Conversion> Conversions);
