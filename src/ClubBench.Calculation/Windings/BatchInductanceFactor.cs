using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Statistics;

namespace ClubBench.Calculation.Windings;

/// <summary>A winding measured on one board.</summary>
/// <param name="Board">Name of the board.</param>
/// <param name="Inductance">Measured inductance, above zero.</param>
/// <param name="Turns">Turns said to be on it, one or more.</param>
public sealed record WoundBoard(string Board, Inductance Inductance, int Turns);

/// <summary>A board that does not fit the others.</summary>
/// <param name="Board">The reading.</param>
/// <param name="LikelyTurns">Whole number of turns that would make it fit; null where none does (other core or a measuring error).</param>
public sealed record UnfitBoard(WoundBoard Board, int? LikelyTurns);

/// <summary>
/// What several boards say about the inductance index of one lot of cores. Readings further than three robust deviations from the median are left
/// out and, where a miscounted turn explains them, say so. Method: median and median absolute deviation, mean of the rest, Student's t.
/// Valid: three boards or more for learning. Source: gum-2008, 4.2 and G.3; the limit of three deviations is common practice. Immutable.
/// </summary>
public sealed record BatchInductanceFactor
{
    private const int FewestToLearnFrom = 3;
    private const double OutlierDeviations = 3;

    private BatchInductanceFactor(IReadOnlyList<WoundBoard> used, IReadOnlyList<UnfitBoard> unfit, double systematicUncertainty)
    {
        (Used, Unfit) = (used, unfit);
        var indices = used.Select(Index).ToArray();
        var mean = indices.Average();
        Mean = InductanceFactor.FromNanohenryPerTurnSquared(mean);
        Deviation = used.Count < 2 ? 0 : Math.Sqrt(indices.Sum(i => (i - mean) * (i - mean)) / (used.Count - 1));
        var systematic = systematicUncertainty * mean;
        StandardUncertainty = Math.Sqrt((Deviation * Deviation / used.Count) + (systematic * systematic));
    }

    /// <summary>Boards the mean was taken from.</summary>
    public IReadOnlyList<WoundBoard> Used { get; }

    /// <summary>Boards left out.</summary>
    public IReadOnlyList<UnfitBoard> Unfit { get; }

    /// <summary>Inductance index of the lot.</summary>
    public InductanceFactor Mean { get; }

    /// <summary>Standard deviation from board to board in nH per turn squared; zero for one board.</summary>
    public double Deviation { get; }

    /// <summary>Standard uncertainty of the mean in nH per turn squared, instrument included.</summary>
    public double StandardUncertainty { get; }

    /// <summary>Whether there are enough boards to change a plan by.</summary>
    public bool CanBeLearntFrom => Used.Count >= FewestToLearnFrom;

    /// <summary>Expanded uncertainty (95 %) of the mean in nH per turn squared; null with fewer than two boards.</summary>
    public double? ExpandedUncertainty => Used.Count < 2 ? null : StudentT.Factor95(Used.Count) * StandardUncertainty;

    /// <summary>Relative tolerance to plan the next board of this lot with: the larger of expanded uncertainty and two deviations; null as above.</summary>
    public double? RelativeTolerance => ExpandedUncertainty is { } u ? Math.Max(u, 2 * Deviation) / Mean.NanohenryPerTurnSquared : null;

    /// <summary>Learns from at least one board.</summary>
    /// <param name="boards">The readings.</param>
    /// <param name="readingUncertainty">Relative standard uncertainty of one reading: below it nothing is called an outlier.</param>
    /// <param name="systematicUncertainty">Relative standard uncertainty common to all readings (capacitor, meter).</param>
    public static BatchInductanceFactor From(IReadOnlyList<WoundBoard> boards, double readingUncertainty, double systematicUncertainty)
    {
        Guard.Within(boards.Count, 1, 10_000, nameof(boards));
        foreach (var b in boards) Guard.Within(b.Turns, 1, 10_000, nameof(b.Turns));
        var indices = boards.Select(Index).ToArray();
        var middle = Median.Of(indices);
        var limit = OutlierDeviations * Math.Max(Median.AbsoluteDeviation(indices), readingUncertainty * middle);
        return new(
            [.. boards.Where(b => Math.Abs(Index(b) - middle) <= limit)],
            [.. boards.Where(b => Math.Abs(Index(b) - middle) > limit).Select(b => new UnfitBoard(b, LikelyTurns(b, middle, limit)))],
            systematicUncertainty);
    }

    /// <summary>
    /// Iron-powder cores of the same size whose listed index fits this lot within twice its tolerance, when the stated core does not; empty where it
    /// does. More than one entry means that the colour of the ring must decide.
    /// </summary>
    public IReadOnlyList<IronPowderCore> OtherMixes(IronPowderCore stated) =>
        Fits(stated) ? [] : [.. Cores.IronPowder.Where(c => c.OuterDiameter == stated.OuterDiameter && c != stated && Fits(c))];

    private bool Fits(ToroidCore core) =>
        Math.Abs((Mean.NanohenryPerTurnSquared / core.InductanceFactor.NanohenryPerTurnSquared) - 1) <= 2 * core.InductanceFactorTolerance;

    private static double Index(WoundBoard b) => b.Inductance.Nanohenry / ((double)b.Turns * b.Turns);

    private static int? LikelyTurns(WoundBoard b, double middle, double limit)
    {
        var turns = (int)Math.Round(Math.Sqrt(b.Inductance.Nanohenry / middle));
        return turns >= 1 && turns != b.Turns && Math.Abs(Index(b with { Turns = turns }) - middle) <= limit ? turns : null;
    }
}
