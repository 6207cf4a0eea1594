using ClubBench.Planning.Kits;

namespace ClubBench.Planning.Plans;

/// <summary>What differs between two versions of a stage.</summary>
public static class PartChanges
{
    /// <summary>Every part that differs in type or values, in the order of the new document; parts that leave come last.</summary>
    public static IReadOnlyList<PartChange> Between(StageDocument before, StageDocument after)
    {
        var old = before.Parts.ToDictionary(p => p.Designator, StringComparer.Ordinal);
        var changed = after.Parts.Where(p => !Same(old.GetValueOrDefault(p.Designator), p)).Select(p => new PartChange(p.Designator, old.GetValueOrDefault(p.Designator), p));
        var gone = before.Parts.Where(p => after.Parts.All(a => a.Designator != p.Designator)).Select(p => new PartChange(p.Designator, p, null));
        return [.. changed, .. gone];
    }

    /// <summary>Whether two parts are the same thing to buy and fit. Figures that only describe (Q, learnt index) do not count.</summary>
    public static bool Same(Part? a, Part? b) =>
        a is not null && b is not null && a.Type == b.Type && Identifying(a).SequenceEqual(Identifying(b));

    private static IEnumerable<(string, double)> Identifying(Part part) =>
        part.ValuesSi.Where(v => v.Key is not (PartValue.UnloadedQ or PartValue.InductanceFactor or PartValue.SelfCapacitance) && !(v.Key == PartValue.Inductance && part.Value(PartValue.Turns) is not null))
            .Select(v => (v.Key, v.Value)).OrderBy(v => v.Key, StringComparer.Ordinal);
}
