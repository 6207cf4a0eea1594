using System.Globalization;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Text;

namespace ClubBench.Planning.Cards;

/// <summary>Parts that may go in instead of the planned ones, and what moves most with them.</summary>
/// <param name="Changes">From the planned parts to those that may stand in for them.</param>
/// <param name="Effect">The figure that moves most, with the substitutes fitted.</param>
public sealed record Substitute(IReadOnlyList<PartChange> Changes, Figure Effect)
{
    /// <summary>More than this is another plan, not a substitute.</summary>
    private const int MostSorts = 2;

    /// <summary>
    /// The best of the other alternatives that meets all demands, fits its places, and differs from the taken one in one or two sorts of parts, none of
    /// them a winding: a coil is wound by its own card. Null where there is none.
    /// </summary>
    public static Substitute? Of(StageDescription description, Alternative? taken, IReadOnlyList<Alternative> alternatives) => taken is null ? null :
        alternatives.Where(a => a.Id != taken.Id && a.FitsPlaces && a.WorstMargin.Si >= 0).Select(a => Between(description, taken, a)).FirstOrDefault(s => s is not null);

    private static Substitute? Between(StageDescription description, Alternative taken, Alternative other)
    {
        var changes = PartChanges.Between(taken.After, other.After);
        var stays = changes.All(c => c is { Before: not null, After: not null } && description.Role(c.After.Role)?.Class is not (PartClass.Winding or null));
        if (!stays || changes.Count == 0 || Sorts(changes).Count > MostSorts) return null;
        var effect = other.Figures.Select(f => (Figure: f, Moved: Moved(taken.Figures.FirstOrDefault(t => t.Name == f.Name), f))).MaxBy(f => f.Moved);
        return effect.Moved > 0 ? new Substitute(changes, effect.Figure) : null;
    }

    /// <summary>Changes of equal parts to equal parts, together.</summary>
    internal static IReadOnlyList<IReadOnlyList<PartChange>> Sorts(IReadOnlyList<PartChange> changes) =>
        [.. changes.Aggregate(new List<List<PartChange>>(), (sorts, change) =>
        {
            if (sorts.Find(s => PartChanges.Same(s[0].Before, change.Before) && PartChanges.Same(s[0].After, change.After)) is { } sort) sort.Add(change);
            else sorts.Add([change]);
            return sorts;
        })];

    /// <summary>By how much a figure moves, relative; nothing where it is written the same or only counts pieces.</summary>
    private static double Moved(Figure? from, Figure to) =>
        from is null || to.Kind == QuantityKind.Count || Written(from) == Written(to) ? 0 : Math.Abs(to.Si - from.Si) / Math.Max(Math.Abs(from.Si), Math.Abs(to.Si));

    private static string Written(Figure figure) => QuantityText.Format(figure, CultureInfo.InvariantCulture);
}
