using System.Collections.Immutable;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Tables;

namespace ClubBench.Calculation.Emissions;

/// <summary>Why a limit set gives no figure.</summary>
public enum EmissionLimitRefusal
{
    /// <summary>It does give one.</summary>
    None,

    /// <summary>Nobody has entered the figures of the licence yet.</summary>
    SetIsEmpty,

    /// <summary>The set does not speak of this carrier frequency: choose another.</summary>
    CarrierOutsideSet,

    /// <summary>The set speaks of this carrier, but not at this power.</summary>
    PowerOutsideSet,

    /// <summary>The power is zero.</summary>
    PowerNotAboveZero,
}

/// <summary>Answer of a limit set: a figure with its rule, or the reason why there is none.</summary>
/// <param name="Attenuation">Wanted attenuation below the carrier; null on a refusal.</param>
/// <param name="Rule">The line that gave it, with source and trust; null on a refusal.</param>
/// <param name="Refusal">The reason; None when a figure is given.</param>
public sealed record EmissionLimitAnswer(Decibels? Attenuation, EmissionLimitRule? Rule, EmissionLimitRefusal Refusal)
{
    internal static EmissionLimitAnswer Refused(EmissionLimitRefusal reason) => new(null, null, reason);
}

/// <summary>A set of limits for unwanted emissions. The licence decides: built-in sets are starting points. Immutable, thread safe.</summary>
/// <param name="Id">Stable key.</param>
/// <param name="Name">Name as told.</param>
/// <param name="Authority">Who sets it; empty where unknown.</param>
/// <param name="Document">Where it is printed; empty where unknown.</param>
/// <param name="Edition">Edition or date; empty where unknown.</param>
/// <param name="Rules">Its lines; none in a set still to be filled in.</param>
public sealed record EmissionLimitSet(
    string Id, string Name, string Authority, string Document, string Edition, ImmutableArray<EmissionLimitRule> Rules)
{
    /// <summary>The set the coordinator fills in from the licence: empty, so that it never judges by accident.</summary>
    public static EmissionLimitSet NationalLicence { get; } = new("national-licence", "National licence", "", "", "", []);

    /// <summary>The built-in sets of <c>Tables/emission-limits.csv</c> by id, and the empty national licence last.</summary>
    public static ImmutableArray<EmissionLimitSet> All { get; } = [.. EmissionLimitTable.Read(), NationalLicence];

    /// <summary>The built-in set with this id, or null.</summary>
    public static EmissionLimitSet? Find(string id) => All.FirstOrDefault(s => string.Equals(s.Id, id, StringComparison.Ordinal));

    /// <summary>Wanted attenuation of every unwanted emission below a carrier of this power and frequency.</summary>
    /// <remarks>
    /// Method: the line of the set that covers carrier and power. Valid: emissions in the spurious domain; clicks and splatter near the carrier have other rules.
    /// Source: that of the line, with its trust.
    /// </remarks>
    /// <param name="power">Of the kind <see cref="EmissionLimitRule.Power"/> says.</param>
    /// <param name="carrier">Carrier frequency.</param>
    public EmissionLimitAnswer Required(Power power, Frequency carrier)
    {
        if (Rules.IsEmpty) return EmissionLimitAnswer.Refused(EmissionLimitRefusal.SetIsEmpty);
        if (power.Watt == 0) return EmissionLimitAnswer.Refused(EmissionLimitRefusal.PowerNotAboveZero);
        if (!Rules.Any(r => r.CoversCarrier(carrier))) return EmissionLimitAnswer.Refused(EmissionLimitRefusal.CarrierOutsideSet);
        return Rules.FirstOrDefault(r => r.Covers(power, carrier)) is { } rule
            ? new EmissionLimitAnswer(rule.Required(power), rule, EmissionLimitRefusal.None)
            : EmissionLimitAnswer.Refused(EmissionLimitRefusal.PowerOutsideSet);
    }
}
