using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Components;

/// <summary>What a search for one or two parts may use.</summary>
/// <param name="Parts">Values that may be used, above zero, in one unit.</param>
/// <param name="Kind">How two parts act together.</param>
public sealed record PartSearch(IReadOnlyList<double> Parts, PairKind Kind)
{
    /// <summary>A single part this close (relative) is good enough and goes before every pair.</summary>
    public double SinglePartWindow { get; init; }

    /// <summary>Relative tolerance of the dominating part: a second part that does less is noise and is not offered. Default 1 %.</summary>
    public double PartTolerance { get; init; } = 0.01;

    /// <summary>Values lying in the drawer; among equally good ones these come first.</summary>
    public IReadOnlyCollection<double> InDrawer { get; init; } = [];
}

/// <summary>Searches a value among single parts and pairs. Source: common practice; exhaustive over the permitted parts.</summary>
public static class PartPairs
{
    // Errors that agree to this count as equal, so that the drawer decides and not the last bit.
    private const double SameError = 1e-6;

    /// <summary>
    /// The best single parts and pairs for a value above zero, best first: a single part inside its window, then the smaller error, then
    /// what lies in the drawer, then fewer different parts, then the smaller ratio. Empty only where no parts were permitted.
    /// </summary>
    public static IReadOnlyList<PartPair> For(double wanted, PartSearch search, int count = 5)
    {
        Guard.Positive(wanted, nameof(wanted));
        return
        [
            .. Candidates(wanted, search)
                .OrderByDescending(p => p.Smaller is null && Math.Abs(p.Error) <= search.SinglePartWindow + SameError)
                .ThenBy(p => Math.Round(Math.Abs(p.Error) / SameError))
                .ThenByDescending(p => IsInDrawer(p, search.InDrawer))
                .ThenBy(DifferentParts)
                .ThenBy(p => p.Larger / (p.Smaller ?? p.Larger))
                .Take(count),
        ];
    }

    private static IEnumerable<PartPair> Candidates(double wanted, PartSearch search) =>
        search.Parts.Select(a => new PartPair(a, null, search.Kind, wanted))
            .Concat(search.Parts.SelectMany(a => search.Parts.Where(b => b <= a).Select(b => new PartPair(a, b, search.Kind, wanted)))
                .Where(p => p.Smaller >= search.PartTolerance * Dominated(p)));

    // In a sum the small part must exceed the tolerance of the large one; in a harmonic pair b/(a+b) is what the large part contributes.
    private static double Dominated(PartPair p) => p.Kind == PairKind.Sum ? p.Larger : p.Larger + p.Smaller!.Value;

    private static bool IsInDrawer(PartPair p, IReadOnlyCollection<double> drawer) =>
        Holds(drawer, p.Larger) && (p.Smaller is not { } b || Holds(drawer, b));

    private static bool Holds(IReadOnlyCollection<double> drawer, double value) =>
        drawer.Any(d => Math.Abs(d - value) <= PreferredValues.SameValue * value);

    private static int DifferentParts(PartPair p) => p.Smaller is { } b && b != p.Larger ? 2 : 1;
}
