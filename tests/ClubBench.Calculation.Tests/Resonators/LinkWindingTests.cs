using System.Numerics;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using CsCheck;

namespace ClubBench.Calculation.Tests.Resonators;

public class LinkWindingTests
{
    private static readonly Gen<(double Ohm, double Mhz, InductanceFactor Index)> Cases =
        Gen.Select(Gen.Double[5, 500], Gen.Double[1, 60], Gen.Double[1, 100], (ohm, mhz, nh) => (ohm, mhz, InductanceFactor.FromNanohenryPerTurnSquared(nh)));

    [Fact]
    [Evidence(typeof(LinkWinding), EvidenceKind.ClosedFormLimit)]
    public void ExactTurns_ExternalQOfOne_HaveTheReactanceOfTheResistance()
    {
        var (f, index) = (Frequency.FromMegahertz(7.1), InductanceFactor.FromNanohenryPerTurnSquared(4.9));

        var turns = LinkWinding.ExactTurns(Resistance.FromOhm(50), 1, f, index);

        Assert.Equal(50, f.RadiansPerSecond * 4.9e-9 * turns * turns, 9);
    }

    [Fact]
    [Evidence(typeof(LinkWinding), EvidenceKind.RoundTrip)]
    public void ExactTurns_OfTheExternalQOfWholeTurns_AreThoseTurns() =>
        Gen.Select(Cases, Gen.Int[1, 30]).Sample((c, turns) =>
        {
            var (r, f) = (Resistance.FromOhm(c.Ohm), Frequency.FromMegahertz(c.Mhz));
            return Math.Abs(LinkWinding.ExactTurns(r, LinkWinding.ExternalQ(r, turns, f, c.Index), f, c.Index) - turns) < 1e-9;
        });

    [Fact]
    [Evidence(typeof(LinkWinding), EvidenceKind.Identity)]
    public void ExternalQ_TwiceTheTurns_IsAQuarterAndNeighboursEncloseTheWantedOne() =>
        Gen.Select(Cases, Gen.Double[1, 200]).Sample((c, wanted) =>
        {
            var (r, f) = (Resistance.FromOhm(c.Ohm), Frequency.FromMegahertz(c.Mhz));
            var links = LinkWinding.WholeTurns(r, wanted, f, c.Index);
            return Math.Abs((LinkWinding.ExternalQ(r, 6, f, c.Index) / LinkWinding.ExternalQ(r, 3, f, c.Index)) - 0.25) < 1e-12
                && links.Min(l => l.ExternalQ) <= wanted * (1 + 1e-9) && (links.Count == 1 || links.Max(l => l.ExternalQ) >= wanted * (1 - 1e-9));
        });

    [Fact]
    [Evidence(typeof(LinkWinding), EvidenceKind.IndependentRecomputation)]
    public void ExternalQ_TwoCoupledCoilsByMeshEquations_DoesNotDependOnTheResonator() =>
        Gen.Select(Cases, Gen.Int[1, 8], Gen.Int[10, 60]).Sample((c, link, coil) =>
        {
            // All flux in common: the voltage of the resonator's coil with a resistance across the link, over its current.
            var (f, nh) = (Frequency.FromMegahertz(c.Mhz), c.Index.NanohenryPerTurnSquared);
            var (own, mutual, other) = (W(coil * coil), W(coil * link), W(link * link));
            var z = new Complex(0, own) + (mutual * mutual / new Complex(c.Ohm, other));
            var externalQ = 1 / ((1 / z).Real * own);
            return Math.Abs((LinkWinding.ExternalQ(Resistance.FromOhm(c.Ohm), link, f, c.Index) / externalQ) - 1) < 1e-6;

            double W(double turnsProduct) => f.RadiansPerSecond * nh * 1e-9 * turnsProduct;
        });
}
