using System.Collections.Immutable;

namespace ClubBench.Calculation.Filters;

/// <summary>Candidates of every place of a ladder as plain values, nearest the source first.</summary>
internal sealed class CandidatePlaces
{
    private readonly LowPassDesign _design;
    private readonly ImmutableArray<ImmutableArray<CapacitorChoice>> _capacitors;
    private readonly ImmutableArray<ImmutableArray<CoilChoice>> _coils;
    private readonly bool _symmetric;

    private CandidatePlaces(
        LowPassDesign design, ImmutableArray<ImmutableArray<CapacitorChoice>> capacitors, ImmutableArray<ImmutableArray<CoilChoice>> coils, bool symmetric)
    {
        (_design, _capacitors, _coils, _symmetric) = (design, capacitors, coils, symmetric);
        Values = [.. Enumerable.Range(0, design.Order).Select(k => design.IsCapacitor(k)
            ? capacitors[k / 2].Select(c => c.Value.Farad).ToArray()
            : coils[k / 2].Select(l => l.Value.Henry).ToArray())];
    }

    /// <summary>Farad or henry of every candidate, by place.</summary>
    public ImmutableArray<double[]> Values { get; }

    /// <summary>Combinations these candidates allow.</summary>
    public long Combinations => Free.Aggregate(1L, (product, k) => checked(product * Values[k].Length));

    /// <summary>First place without a candidate, or null.</summary>
    public int? FirstEmpty => Enumerable.Range(0, Values.Length).Where(k => Values[k].Length == 0).Select(k => (int?)k).FirstOrDefault();

    // Mirrored places follow their partners where equal parts are wanted.
    private IEnumerable<int> Free => Enumerable.Range(0, _symmetric ? (Values.Length + 1) / 2 : Values.Length);

    public static CandidatePlaces Of(LowPassSearchInput input)
    {
        if (input.Symmetric && input.Exact.Order % 2 == 0) throw new ArgumentException("Only a filter of odd order mirrors itself.", nameof(input));
        return new(input.Exact, [.. input.Capacitors.Select(c => c.ToImmutableArray())], [.. input.Coils.Select(l => l.ToImmutableArray())], input.Symmetric);
    }

    /// <summary>Leaves out the candidates farthest from the exact values until the combinations fit; itself where they do already.</summary>
    public CandidatePlaces ThinnedTo(long most)
    {
        if (Combinations <= Math.Max(1, most)) return this;
        var capacitors = _capacitors;
        for (var keep = capacitors.Max(c => c.Length) - 1; keep >= 1; keep--)
        {
            capacitors = [.. _capacitors.Select((c, k) => Nearest(c, k, keep))];
            var thinned = new CandidatePlaces(_design, capacitors, _coils, _symmetric);
            if (thinned.Combinations <= most) return thinned;
        }

        return new CandidatePlaces(_design, capacitors, _coils, _symmetric);
    }

    /// <summary>The parts behind one choice per place.</summary>
    public (IReadOnlyList<CapacitorChoice> Capacitors, IReadOnlyList<CoilChoice> Coils) Parts(int[] choice)
    {
        var places = Enumerable.Range(0, Values.Length).ToList();
        return (
            [.. places.Where(_design.IsCapacitor).Select(k => _capacitors[k / 2][choice[k]])],
            [.. places.Where(k => !_design.IsCapacitor(k)).Select(k => _coils[k / 2][choice[k]])]);
    }

    private ImmutableArray<CapacitorChoice> Nearest(ImmutableArray<CapacitorChoice> choices, int place, int keep) =>
        [.. choices.OrderBy(c => Math.Abs(Math.Log(c.Value / _design.Capacitors[place]))).Take(keep).OrderBy(c => c.Value)];
}
