namespace ClubBench.Calculation.Crystals;

/// <summary>What can be wrong with, or unusual about, the parameters of a crystal.</summary>
public enum CrystalIssue
{
    /// <summary>Nothing to say.</summary>
    None,

    /// <summary>Refusal: figure of merit below 2, so the crystal is nowhere inductive and cannot work into a capacitive load.</summary>
    NeverInductive,

    /// <summary>Refusal: C0/Cm below what AT-cut quartz can have; a reading must be wrong.</summary>
    RatioBelowQuartzLimit,

    /// <summary>Warning: unloaded Q outside 5 000 to 300 000; look at the motional resistance again.</summary>
    UnusualQ,
}
