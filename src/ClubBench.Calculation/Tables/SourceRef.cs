namespace ClubBench.Calculation.Tables;

/// <summary>How far a figure may be trusted as to where it comes from.</summary>
public enum SourceStatus
{
    /// <summary>Nothing is known about the origin.</summary>
    Unknown,

    /// <summary>Printed in a standard, law, data sheet or book that was read.</summary>
    Published,

    /// <summary>Derived from first principles here and checked a second way.</summary>
    Derived,

    /// <summary>Common practice of the trade, a rule of thumb.</summary>
    CommonPractice,

    /// <summary>Published somewhere, written down from memory: check against the source.</summary>
    FromMemory,
}

/// <summary>Where a figure or method comes from: an id of <c>sources.csv</c>, the place in it, and the trust it deserves.</summary>
/// <param name="SourceId">Key of a row of <c>sources.csv</c>.</param>
/// <param name="Locator">Clause, table, equation or page; empty where the source has none.</param>
/// <param name="Status">Trust it deserves.</param>
public sealed record SourceRef(string SourceId, string Locator, SourceStatus Status)
{
    /// <summary>Common practice of the trade, with an optional remark on where.</summary>
    public static SourceRef CommonPractice(string locator = "") => new("common-practice", locator, SourceStatus.CommonPractice);

    /// <summary>Derived here from first principles and checked a second way.</summary>
    public static SourceRef Derived(string locator = "") => new("derived", locator, SourceStatus.Derived);
}
