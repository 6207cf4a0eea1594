using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Resonators;

/// <summary>A link of whole turns and the external Q it gives.</summary>
/// <param name="Turns">Turns of the link.</param>
/// <param name="ExternalQ">External Q with ideal coupling.</param>
public sealed record LinkTurns(int Turns, double ExternalQ);

/// <summary>
/// A link (or tap from the cold end) that couples a resistance to a toroid resonator. The turns follow from the wanted external Q, the
/// resistance and the core, and not from L, C or reactance of the resonator.
/// Valid: coupling coefficient near 1; on iron powder a short link couples 0.6 to 0.9 and the real Q is up to twice as high (common practice).
/// Source: derived.
/// </summary>
public static class LinkWinding
{
    /// <summary>A link is coarse where no whole number of turns comes this close to the wanted external Q. Source: common practice.</summary>
    public const double ClosestUseful = 0.30;

    /// <summary>Exact, not whole, turns: sqrt(R/(Qe w AL)).</summary>
    public static double ExactTurns(Resistance resistance, double externalQ, Frequency frequency, InductanceFactor index) =>
        Math.Sqrt(resistance.Ohm / (Guard.Positive(externalQ, nameof(externalQ)) * OneTurnReactance(frequency, index).Ohm));

    /// <summary>External Q that whole turns (one or more) of a link give: R/(w AL n^2).</summary>
    public static double ExternalQ(Resistance resistance, int turns, Frequency frequency, InductanceFactor index) =>
        resistance.Ohm / (OneTurnReactance(frequency, index).Ohm * turns * Guard.Within(turns, 1, 1000, nameof(turns)));

    /// <summary>The whole numbers of turns on both sides of the exact one, the closer external Q (as a ratio) first; one entry below one turn.</summary>
    public static IReadOnlyList<LinkTurns> WholeTurns(Resistance resistance, double externalQ, Frequency frequency, InductanceFactor index)
    {
        var below = (int)Math.Floor(ExactTurns(resistance, externalQ, frequency, index));
        return
        [
            .. new[] { below, below + 1 }.Where(n => n >= 1)
                .Select(n => new LinkTurns(n, ExternalQ(resistance, n, frequency, index)))
                .OrderBy(l => Math.Abs(Math.Log(l.ExternalQ / externalQ))),
        ];
    }

    private static Resistance OneTurnReactance(Frequency frequency, InductanceFactor index) =>
        TunedCircuit.Reactance(index.Of(1), frequency);
}
