using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Filters;

/// <summary>Lists the parts a search may try in one place.</summary>
public static class LowPassCandidates
{
    /// <summary>Single parts, and on wish pairs in parallel, within a window around the exact value; sorted by value.</summary>
    /// <remarks>
    /// Method: of equal sums the single part stays, then the pair of more equal halves.
    /// Valid: any list of stocked values. Source: common practice; a window below 12 % can hide the optimum, which often moves all values together.
    /// </remarks>
    /// <param name="exact">Value wanted, above zero.</param>
    /// <param name="values">Values of single parts, each with its stock rank.</param>
    /// <param name="window">Half width of the window as a part of the exact value, above 0 to 0.5.</param>
    /// <param name="pairs">Whether two parts in parallel may be used.</param>
    /// <param name="smallestShare">Least share of the larger part the smaller one must have, 0 to 1: below the tolerance of the large part a small one does nothing.</param>
    public static IReadOnlyList<CapacitorChoice> Capacitors(
        Capacitance exact, IEnumerable<(Capacitance Value, int StockRank)> values, double window, bool pairs, double smallestShare = 0)
    {
        Guard.Positive(exact.Farad, nameof(exact));
        Guard.Within(Guard.Positive(window, nameof(window)), 0, 0.5, nameof(window));
        var parts = values.OrderBy(v => v.Value).ToList();
        var singles = parts.Where(p => IsNear(p.Value)).Select(p => new CapacitorChoice(p.Value, null, p.StockRank));
        var both = pairs ? singles.Concat(Pairs(parts, IsNear).Where(c => c.Second / c.First >= smallestShare)) : singles;
        return [.. both
            .GroupBy(c => Math.Round(c.Value.Picofarad, 4))
            .Select(g => g.OrderBy(c => c.Parts).ThenBy(c => c.StockRank).ThenBy(c => c.First).First())
            .OrderBy(c => c.Value)];

        // A part on the edge of the window is inside, whatever the last bit of the quotient says.
        bool IsNear(Capacitance value) => Math.Abs((value / exact) - 1) <= window + PreferredValues.SameValue;
    }

    /// <summary>Whole turns around the exact value: the two neighbours, and two each side below ten turns, where one turn is a coarse step.</summary>
    /// <param name="inductanceOf">Inductance of a whole number of turns on the chosen core, growing with the turns.</param>
    /// <param name="exactTurns">Turns, not whole, that would give the exact value, above zero.</param>
    public static IReadOnlyList<CoilChoice> Coils(Func<int, Inductance> inductanceOf, double exactTurns)
    {
        var floor = (int)Math.Floor(Guard.Positive(exactTurns, nameof(exactTurns)));
        var (low, high) = floor < 10 ? (floor - 2, floor + 2) : (floor, floor + 1);
        return [.. Enumerable.Range(Math.Max(1, low), high - Math.Max(1, low) + 1).Select(n => new CoilChoice(n, inductanceOf(n)))];
    }

    /// <summary>The same for an inductance above zero on a core of known inductance index.</summary>
    public static IReadOnlyList<CoilChoice> Coils(Inductance exact, InductanceFactor factor) =>
        Coils(n => factor.Of(n), Math.Sqrt(exact.Nanohenry / factor.NanohenryPerTurnSquared));

    private static IEnumerable<CapacitorChoice> Pairs(List<(Capacitance Value, int StockRank)> parts, Func<Capacitance, bool> isNear)
    {
        for (var i = 0; i < parts.Count; i++)
            for (var k = 0; k <= i; k++)
                if (isNear(parts[i].Value + parts[k].Value)) yield return new CapacitorChoice(parts[i].Value, parts[k].Value, Math.Max(parts[i].StockRank, parts[k].StockRank));
    }
}
