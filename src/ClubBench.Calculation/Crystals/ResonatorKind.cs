namespace ClubBench.Calculation.Crystals;

/// <summary>What a two-terminal resonator is made of; decides which plausibility limits hold for it.</summary>
public enum ResonatorKind
{
    /// <summary>AT-cut quartz plate.</summary>
    Quartz,

    /// <summary>Ceramic resonator: the same circuit, a far smaller capacitance ratio and Q.</summary>
    Ceramic,
}
