using ClubBench.Calculation.Components;
using ClubBench.Calculation.Filters;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Filters;

public class LowPassCandidatesTests
{
    private static readonly double[] Picofarads = [.. PreferredValues.Between(10, 1000, ESeries.E12)];

    [Fact]
    [Evidence(typeof(LowPassCandidates), EvidenceKind.IndependentRecomputation)]
    public void Capacitors_EverySumTriedInTwoLoops_AreTheSameValues() =>
        Gen.Select(Gen.Double[30, 800], Gen.Double[0.01, 0.2]).Sample((exact, window) =>
        {
            var sums = new SortedSet<long>();
            foreach (var a in Picofarads.Append(0))
            {
                foreach (var b in Picofarads)
                    if (Math.Abs(a + b - exact) <= (window + 1e-9) * exact) sums.Add((long)Math.Round((a + b) * 1000));
            }

            return sums.SequenceEqual(Candidates(exact, window, pairs: true).Select(c => (long)Math.Round(c.Value.Picofarad * 1000)));
        });

    [Theory]
    [InlineData(100, 0.1, 110)]
    [InlineData(100, 0.12, 112)]
    [InlineData(100, 0.1, 90)]
    public void Capacitors_PartOnTheEdgeOfTheWindow_IsInside(double exact, double window, double part) =>
        Assert.Single(LowPassCandidates.Capacitors(Capacitance.FromPicofarad(exact), [(Capacitance.FromPicofarad(part), 0)], window, pairs: false));

    [Fact]
    [Evidence(typeof(LowPassCandidates), EvidenceKind.Identity)]
    public void Capacitors_WiderWindowOrPairs_KeepEveryNarrowerCandidate() =>
        Gen.Select(Gen.Double[30, 800], Gen.Double[0.01, 0.1], Gen.Double[1, 4]).Sample((exact, window, wider) =>
        {
            var narrow = Candidates(exact, window, pairs: false);
            return narrow.All(c => Math.Abs((c.Value.Picofarad / exact) - 1) <= window + 1.1e-9)
                && !narrow.Except(Candidates(exact, window * wider, pairs: false)).Any() && !narrow.Except(Candidates(exact, window, pairs: true)).Any();
        });

    [Fact]
    [Evidence(typeof(LowPassCandidates), EvidenceKind.ClosedFormLimit)]
    public void Coils_HalfATurnBetween_AreTheNeighboursAndTwoEachSideBelowTen()
    {
        var index = InductanceFactor.FromNanohenryPerTurnSquared(3);

        Assert.Equal([16, 17], LowPassCandidates.Coils(Inductance.FromNanohenry(3 * 16.5 * 16.5), index).Select(c => c.Turns));
        Assert.Equal([2, 3, 4, 5, 6], LowPassCandidates.Coils(Inductance.FromNanohenry(3 * 4.5 * 4.5), index).Select(c => c.Turns));
        Assert.Equal([1, 2, 3], LowPassCandidates.Coils(Inductance.FromNanohenry(3 * 1.5 * 1.5), index).Select(c => c.Turns));
    }

    [Fact]
    [Evidence(typeof(LowPassCandidates), EvidenceKind.Identity)]
    public void Coils_AnyInductance_EncloseItAndHaveTheInductanceOfTheirTurns() =>
        Gen.Select(Gen.Double[50, 20_000], Gen.Double[1, 10]).Sample((nh, factor) =>
        {
            var coils = LowPassCandidates.Coils(Inductance.FromNanohenry(nh), InductanceFactor.FromNanohenryPerTurnSquared(factor));
            return coils.Max(c => c.Value.Nanohenry) >= nh * (1 - 1e-9) && (coils[0].Turns == 1 || coils[0].Value.Nanohenry <= nh * (1 + 1e-9))
                && coils.All(c => Math.Abs((c.Value.Nanohenry / (factor * c.Turns * c.Turns)) - 1) < 1e-9);
        });

    private static IReadOnlyList<CapacitorChoice> Candidates(double exact, double window, bool pairs) =>
        LowPassCandidates.Capacitors(Capacitance.FromPicofarad(exact), Picofarads.Select(v => (Capacitance.FromPicofarad(v), 0)), window, pairs);
}
