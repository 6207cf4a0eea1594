using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Emissions;

/// <summary>Which power of the transmitter a limit is stated for.</summary>
public enum LimitPower
{
    /// <summary>Not stated.</summary>
    Unknown,

    /// <summary>Peak envelope power; for telegraphy the key-down power.</summary>
    PeakEnvelope,

    /// <summary>Mean power of the fundamental.</summary>
    Mean,
}

/// <summary>One line of a limit set: what is wanted for a range of carriers and powers. Immutable.</summary>
/// <remarks>
/// Wanted = max(fixed attenuation, attenuation down to the absolute level), but no more than the cap and no further down than the floor.
/// </remarks>
/// <param name="CarrierMin">Lowest carrier, included.</param>
/// <param name="CarrierMax">Highest carrier, not included.</param>
/// <param name="PowerMin">Lowest power, included.</param>
/// <param name="PowerMax">Upper end of the power, not included; null without end.</param>
/// <param name="Attenuation">Fixed attenuation below the carrier, or null.</param>
/// <param name="EmissionMax">Absolute level an emission may reach, or null.</param>
/// <param name="AttenuationCap">Attenuation beyond which nothing is asked, or null.</param>
/// <param name="EmissionFloor">Absolute level below which nothing is asked, or null.</param>
/// <param name="Power">Power the limit is stated for.</param>
/// <param name="Source">Origin and the trust it deserves.</param>
public sealed record EmissionLimitRule(
    Frequency CarrierMin,
    Frequency CarrierMax,
    Power PowerMin,
    Power? PowerMax,
    Decibels? Attenuation,
    PowerLevel? EmissionMax,
    Decibels? AttenuationCap,
    PowerLevel? EmissionFloor,
    LimitPower Power,
    SourceRef Source)
{
    /// <summary>Whether the line speaks of this carrier.</summary>
    public bool CoversCarrier(Frequency carrier) => carrier >= CarrierMin && carrier < CarrierMax;

    /// <summary>Whether the line speaks of this carrier and power.</summary>
    public bool Covers(Power power, Frequency carrier) =>
        CoversCarrier(carrier) && power >= PowerMin && (PowerMax is not { } max || power < max);

    /// <summary>Wanted attenuation below a carrier of this power, above zero.</summary>
    public Decibels Required(Power power)
    {
        var level = power.ToLevel();
        var asked = new[] { Attenuation, EmissionMax is { } max ? level - max : null }.Max() ?? Decibels.Zero;
        var relief = new[] { AttenuationCap, EmissionFloor is { } floor ? level - floor : null }.Where(d => d is not null).Min();
        return relief is { } most && most < asked ? most : asked;
    }
}
