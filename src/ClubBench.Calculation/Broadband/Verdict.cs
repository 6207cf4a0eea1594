namespace ClubBench.Calculation.Broadband;

/// <summary>What to do with a broadband part at another frequency.</summary>
public enum Verdict
{
    /// <summary>It serves as it is.</summary>
    Leave,

    /// <summary>It may serve: measure.</summary>
    Check,

    /// <summary>It does not serve: other turns, another core or another value.</summary>
    Change,
}
