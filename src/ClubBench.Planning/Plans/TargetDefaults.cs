using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Plans;

/// <summary>What a target is before anybody changes it.</summary>
public static class TargetDefaults
{
    /// <summary>The built-in set with one figure for all powers; the coordinator confirms or changes it.</summary>
    public const string LimitSetId = "us-47cfr97-307d";

    /// <summary>Wish margin of harmonics (common practice).</summary>
    public static Decibels WishMargin { get; } = Decibels.FromDb(10);

    /// <summary>Audio pitch of telegraphy (common practice, 600 to 800 Hz).</summary>
    public static Frequency Pitch { get; } = Frequency.FromHertz(700);

    /// <summary>A target on a band: its telegraphy segment and calling frequency from the table. Null where the table has no such segment.</summary>
    public static Target? On(string bandName, Kit kit, int region, NoiseSite site = NoiseSite.Residential)
    {
        if (AmateurBands.TelegraphySegment(bandName, region) is not { } segment) return null;
        var reference = AmateurBands.LowPowerTelegraphyCentre(bandName, region) ?? segment.Middle;
        return new Target(bandName, segment, reference, region, site, kit.OutputPower, Pitch, LimitSetId, null, WishMargin);
    }
}
