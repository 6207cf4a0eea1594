using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;

namespace ClubBench.Web.Bench;

/// <summary>A unit of the switch beside the entry.</summary>
/// <param name="Text">As written.</param>
/// <param name="Factor">SI value of one of it.</param>
public sealed record BenchUnit(string Text, double Factor);

/// <summary>A spelling the device understands.</summary>
public sealed record BenchSpelling(string Spelling, double Factor);

/// <summary>Which units a builder may switch between and type, from the same list the server reads by.</summary>
public static class BenchUnits
{
    /// <summary>The unit the expected value is written in, and its next smaller neighbour (or larger, where there is none).</summary>
    public static IReadOnlyList<BenchUnit> Switch(QuantityKind kind, double nominalSi)
    {
        var written = QuantityUnits.Of(kind).Where(u => u.From is not null).ToList();
        var natural = written.FindIndex(u => u.Symbol == QuantityText.Split(kind, nominalSi).Unit);
        var neighbour = natural > 0 ? natural - 1 : natural + 1;
        return [.. new[] { natural, neighbour }.Where(i => i >= 0 && i < written.Count).Select(i => new BenchUnit(written[i].Symbol, written[i].Si))];
    }

    /// <summary>Everything understood: the spellings of the units, and for parts' values the prefix alone ("734n").</summary>
    public static IReadOnlyList<BenchSpelling> Spellings(QuantityKind kind) =>
    [
        .. QuantityUnits.Of(kind).SelectMany(u => u.Spellings.Select(s => new BenchSpelling(s, u.Si)).Concat(PrefixAlone(kind, u)))
            .Where(s => s.Spelling.Length > 0).DistinctBy(s => s.Spelling),
    ];

    private static IEnumerable<BenchSpelling> PrefixAlone(QuantityKind kind, QuantityUnit unit)
    {
        // No part is marked in the units of very small values.
        if (kind is not (QuantityKind.Inductance or QuantityKind.Capacitance or QuantityKind.Resistance) || unit.Below > 0) return [];
        if (unit.Exponent == 0) return kind == QuantityKind.Resistance ? [new BenchSpelling("R", unit.Si)] : [];
        return [new BenchSpelling(unit.Spellings[0][..1], unit.Si)];
    }
}
