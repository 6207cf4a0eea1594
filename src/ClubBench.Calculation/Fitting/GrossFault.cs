using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Fitting;

/// <summary>What is badly wrong with a part.</summary>
public enum GrossFaultKind
{
    /// <summary>Nothing.</summary>
    None,

    /// <summary>Not soldered, broken or missing.</summary>
    Open,

    /// <summary>Shorted.</summary>
    Shorted,

    /// <summary>Of two capacitors in parallel only the first is there.</summary>
    OnlyFirstOfPair,

    /// <summary>Of two capacitors in parallel only the second is there.</summary>
    OnlySecondOfPair,
}

/// <summary>One explanation of a sweep: a gross fault of one part, or none.</summary>
/// <param name="Kind">What is wrong.</param>
/// <param name="Arm">Arm of the ladder, from 0; -1 for none.</param>
/// <param name="IsCoil">Coil or capacitor of that arm.</param>
/// <param name="Rms">Root mean square of what it leaves unexplained, per complex value.</param>
public sealed record GrossFault(GrossFaultKind Kind, int Arm, bool IsCoil, double Rms)
{
    internal static GrossFault Nothing => new(GrossFaultKind.None, -1, false, 0);
}

/// <summary>Two capacitors in parallel in one arm.</summary>
/// <param name="Arm">Arm of the ladder, from 0.</param>
/// <param name="First">One part, above zero.</param>
/// <param name="Second">The other, above zero.</param>
public sealed record ParallelPair(int Arm, Capacitance First, Capacitance Second);

/// <summary>Every explanation by a short, an open or half a pair, likeliest first.</summary>
/// <remarks>
/// Method: the sweep of the nominal filter with each fault in turn, against what was measured; the sound filter is one of the explanations.
/// Valid: named where the next explanation leaves three times as much; parts up to 5 % off do not hide a fault.
/// Source: derived.
/// </remarks>
/// <param name="Explanations">Smallest residual first.</param>
public sealed record GrossFaultSearch(IReadOnlyList<GrossFault> Explanations)
{
    private const double ClearlyWorse = 3;

    /// <summary>The fault, where it explains the sweep clearly better than anything else; null otherwise.</summary>
    public GrossFault? Named =>
        Explanations[0] is { Kind: not GrossFaultKind.None } best && Explanations[1].Rms > ClearlyWorse * best.Rms ? best : null;

    /// <summary>Weighs every explanation.</summary>
    public static GrossFaultSearch Of(SweepFitInput input, IReadOnlyList<ParallelPair> pairs)
    {
        foreach (var part in pairs.SelectMany(p => new[] { p.First, p.Second })) Guard.Positive(part.Farad, nameof(pairs));
        var hypotheses = input.Nominal.Elements.SelectMany(OfArm)
            .Concat(pairs.SelectMany(p => new[] { GrossFaultKind.OnlyFirstOfPair, GrossFaultKind.OnlySecondOfPair }.Select(kind => new GrossFault(kind, p.Arm, false, 0))))
            .Prepend(GrossFault.Nothing);
        return new([.. hypotheses.Select(h => h with { Rms = new FaultyLadder(input, pairs, h).Rms() }).OrderBy(h => h.Rms)]);
    }

    private static IEnumerable<GrossFault> OfArm(LadderElement arm, int k) =>
        from isCoil in new[] { true, false }
        where isCoil ? arm.HasCoil : arm.HasCapacitor
        from kind in new[] { GrossFaultKind.Open, GrossFaultKind.Shorted }
        select new GrossFault(kind, k, isCoil, 0);
}
