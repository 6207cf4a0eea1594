using ClubBench.Calculation.Bands;
using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Plans;

/// <summary>What holds for a whole chain.</summary>
/// <param name="Band">Segment in use.</param>
/// <param name="Reference">Frequency the club meets on.</param>
/// <param name="DesignFrequency">Middle of the kit's own band.</param>
/// <param name="WantedPower">Output wanted at the antenna; null for a receiver.</param>
/// <param name="Pitch">Audio pitch.</param>
/// <param name="Site">Noise category of the site.</param>
/// <param name="Limits">Emission limit set.</param>
/// <param name="WishMargin">Margin that ranks alternatives.</param>
/// <param name="Learnt">What readings taught.</param>
public sealed record ChainConditions(
    FrequencyRange Band,
    Frequency Reference,
    Frequency DesignFrequency,
    Power? WantedPower,
    Frequency Pitch,
    NoiseSite Site,
    EmissionLimitSet Limits,
    Decibels WishMargin,
    LearntValues Learnt)
{
    /// <summary>The kit where the papers say it works: for the back-check.</summary>
    public static ChainConditions OwnBand(Kit kit, LearntValues learnt) => new(
        kit.Band,
        MeetingPoint(kit.Band),
        kit.Band.Middle,
        kit.OutputPower,
        UsualPitch,
        NoiseSite.Residential,
        EmissionLimitSet.Find(TargetDefaults.LimitSetId) ?? EmissionLimitSet.NationalLicence,
        TargetDefaults.WishMargin,
        learnt);

    /// <summary>The kit where a plan moves it.</summary>
    public static ChainConditions On(Target target, Kit kit, LearntValues learnt) => new(
        target.Segment,
        target.Reference,
        kit.Band.Middle,
        target.WantedPower,
        target.Pitch,
        target.Site,
        EmissionLimitSet.Find(target.LimitSetId) ?? EmissionLimitSet.NationalLicence,
        target.WishMargin,
        learnt);

    private static Frequency UsualPitch => TargetDefaults.Pitch;

    /// <summary>A calling frequency of the table inside the band, or its middle.</summary>
    private static Frequency MeetingPoint(FrequencyRange band) =>
        AmateurBands.All.Where(r => r.Use is BandUse.QrpCwCentre or BandUse.CwCalling && band.Contains(r.Range.Low)).Select(r => (Frequency?)r.Range.Low).FirstOrDefault() ?? band.Middle;
}
