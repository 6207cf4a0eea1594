using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Crystals;

/// <summary>How well two methods agree on the motional capacitance of one crystal.</summary>
public enum MeasurementAgreement
{
    /// <summary>Not compared.</summary>
    Unknown,

    /// <summary>Within 5 %.</summary>
    Good,

    /// <summary>Within 10 %: measure a third crystal.</summary>
    Fair,

    /// <summary>Beyond 10 %: suspect the stray capacitance of the fixture.</summary>
    SuspectFixture,
}

/// <summary>
/// Comparison of methods. Load capacitors and a counter give Cm and C0 but not Rm; a sweep gives Lm and Rm but wants steps of a hertz: do both on three crystals of
/// a batch. Method: difference over mean. Source: common practice.
/// </summary>
public static class MeasurementComparison
{
    /// <summary>Judges two figures of the same crystal, both above zero.</summary>
    public static MeasurementAgreement Of(Capacitance first, Capacitance second)
    {
        var (a, b) = (Guard.Positive(first.Farad, nameof(first)), Guard.Positive(second.Farad, nameof(second)));
        return (Math.Abs(a - b) / (0.5 * (a + b))) switch
        {
            <= 0.05 => MeasurementAgreement.Good,
            <= 0.10 => MeasurementAgreement.Fair,
            _ => MeasurementAgreement.SuspectFixture,
        };
    }
}
