namespace ClubBench.Planning.Advising;

/// <summary>A reading held against its window.</summary>
/// <param name="Verdict">Good, near the edge, out or doubtful.</param>
/// <param name="LikelySi">For a doubtful reading: the value it probably was, when a slip of the decimal point or unit explains it.</param>
public sealed record WindowJudgement(ReadingVerdict Verdict, double? LikelySi = null)
{
    /// <summary>Factors of a slipped decimal point or unit prefix.</summary>
    private static readonly double[] Slips = [10, 0.1, 100, 0.01, 1000, 1e-3, 1e6, 1e-6];

    /// <summary>Judges. Near the edge: inside, but the expanded uncertainty reaches over an end that counts, and by more than half of it.</summary>
    public static WindowJudgement Of(ExpectedReading expected, CorrectedReading reading)
    {
        var below = expected.Sides != WindowSides.AtMost;
        var above = expected.Sides != WindowSides.AtLeast;
        var isOut = (below && reading.Si < expected.LowSi) || (above && reading.Si > expected.HighSi);
        if (isOut && Slip(expected, reading.Si) is { } likely) return new(ReadingVerdict.Doubtful, likely);
        if (isOut) return new(ReadingVerdict.Out);
        var edge = 0.5 * reading.ExpandedUncertaintySi;
        var near = (below && reading.Si - edge < expected.LowSi) || (above && reading.Si + edge > expected.HighSi);
        return new(near && edge < 0.5 * Width(expected) ? ReadingVerdict.NearEdge : ReadingVerdict.Good);
    }

    private static double Width(ExpectedReading e) => e.Sides == WindowSides.Both ? e.HighSi - e.LowSi : double.MaxValue;

    /// <summary>A value ten, hundred or thousand times off that would land inside a two-sided window is probably a slip. Levels and gains in dB do not slip that way.</summary>
    private static double? Slip(ExpectedReading expected, double si)
    {
        if (expected.Sides != WindowSides.Both || expected.Kind is Figures.QuantityKind.Decibels or Figures.QuantityKind.PowerLevel or Figures.QuantityKind.RelativeLevel) return null;
        foreach (var factor in Slips)
            if (si * factor >= expected.LowSi - (0.5 * Width(expected)) && si * factor <= expected.HighSi + (0.5 * Width(expected))) return si * factor;
        return null;
    }
}
