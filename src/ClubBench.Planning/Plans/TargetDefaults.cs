using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Plans;

/// <summary>What a target is before anybody changes it.</summary>
public static class TargetDefaults
{
    /// <summary>The built-in set with one figure for all powers; the coordinator confirms or changes it.</summary>
    public const string LimitSetId = "fcc-97307d-new";

    /// <summary>Wish margin of harmonics (common practice).</summary>
    public static Decibels WishMargin { get; } = Decibels.FromDb(10);

    /// <summary>Audio pitch of telegraphy (common practice, 600 to 800 Hz).</summary>
    public static Frequency Pitch { get; } = Frequency.FromHertz(700);

    /// <summary>A target on a band: its telegraphy segment and calling frequency from the table. Null where the table has no such segment.</summary>
    public static Target? On(string bandName, Kit kit, ItuRegion region, NoiseSite site = NoiseSite.Residential)
    {
        if (AmateurBands.CwSegment(bandName, region)?.Range is not { } segment) return null;
        var reference = AmateurBands.QrpCwCentres(bandName, region).Select(c => (Frequency?)c.Range.Low).FirstOrDefault(f => f is { } spot && segment.Contains(spot)) ?? segment.Middle;
        return new Target(bandName, segment, reference, region, site, kit.OutputPower, Pitch, LimitSetFor(segment), null, WishMargin);
    }

    /// <summary>Above 30 MHz another paragraph of the same rules speaks.</summary>
    private static string LimitSetFor(FrequencyRange segment) => segment.High.Megahertz < 30 ? LimitSetId : "fcc-97307e";
}
