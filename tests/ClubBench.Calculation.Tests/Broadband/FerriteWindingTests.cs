using System.Numerics;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Broadband;

public class FerriteWindingTests
{
    private static readonly FerriteWinding Choke = new(Cores.Find("FT37-43")!, 10);

    public static TheoryData<ReferenceRow> Impedances => ReferenceTable.Theory("ferrite-impedance");

    [Theory]
    [MemberData(nameof(Impedances))]
    [Evidence(typeof(FerriteWinding), EvidenceKind.IndependentRecomputation)]
    public void Impedance_FerriteChoke_MatchesTheTable(ReferenceRow row)
    {
        var winding = new FerriteWinding(Cores.Find(row["core"])!, (int)row.Number("turns"));
        var z = winding.Impedance(Frequency.FromMegahertz(row.Number("frequency_mhz")), Capacitance.FromPicofarad(row.Number("parallel_pf")))!.Value;

        Assert.Equal(1, z.Real / row.Number("real_ohm"), row.Number("tolerance_relative"));
        Assert.Equal(1, z.Imaginary / row.Number("imaginary_ohm"), row.Number("tolerance_relative"));
    }

    [Theory]
    [InlineData(3.5, 538, 770)]
    [InlineData(7, 835, 1539)]
    [InlineData(10, 992, 2199)]
    [InlineData(14, 1105, 3079)]
    public void Impedance_FromPermeability_IsFarBelowTheIndexAlone(double mhz, double ohm, double fromIndex)
    {
        var f = Frequency.FromMegahertz(mhz);

        Assert.Equal(ohm, Complex.Abs(Choke.Impedance(f)!.Value), 0.51);
        Assert.Equal(fromIndex, Choke.ReactanceFromIndex(f).Ohm, 0.6);
    }

    [Fact]
    public void Impedance_PublishedOneTurnCore_MatchesThePublishedOhms()
    {
        // One turn on a core of 1075 nH: 0.5 + j6 ohm at 1 MHz, 24 + j24 ohm at 14 MHz.
        var core = (FerriteCore)Cores.Find("FT37-43")! with { InductanceFactor = InductanceFactor.FromNanohenryPerTurnSquared(1075) };
        var one = new FerriteWinding(core, 1);

        Assert.Equal(6, one.Impedance(Frequency.FromMegahertz(1))!.Value.Imaginary, 0.05);
        Assert.Equal(0.5, one.Impedance(Frequency.FromMegahertz(1))!.Value.Real, 0.05);
        Assert.Equal(24, one.Impedance(Frequency.FromMegahertz(14))!.Value.Imaginary, 0.05);
        Assert.Equal(24, one.Impedance(Frequency.FromMegahertz(14))!.Value.Real, 0.05);
    }

    [Fact]
    public void Impedance_OutsideTheTable_IsNotStated()
    {
        Assert.Null(Choke.Impedance(Frequency.FromMegahertz(144)));
        Assert.Null(new FerriteWinding(Cores.Find("FT37-77")!, 10).Impedance(Frequency.FromMegahertz(7)));
        Assert.NotNull(Choke.Impedance(Frequency.FromMegahertz(100)));
    }

    [Fact]
    [Evidence(typeof(FerriteWinding), EvidenceKind.ClosedFormLimit)]
    public void Impedance_IronPowder_IsThatOfTheIndex()
    {
        var (winding, f) = (new FerriteWinding(Cores.Find("T50-2")!, 33), Frequency.FromMegahertz(7.1));

        Assert.Equal(winding.ReactanceFromIndex(f).Ohm, winding.Impedance(f)!.Value.Imaginary, 9);
        Assert.Equal(0, winding.Impedance(f)!.Value.Real);
    }

    [Fact]
    [Evidence(typeof(FerritePermeability), EvidenceKind.Identity)]
    public void PermeabilityAt_BetweenTwoPoints_LiesBetweenThem() =>
        Gen.Double[0.1, 100].Sample(mhz =>
        {
            var mu = FerritePermeability.At("43", Frequency.FromMegahertz(mhz))!.Value;
            return mu.Inductive is >= 35 and <= 800 && mu.Lossy is >= 5 and <= 275 + 1e-9;
        });

    [Fact]
    [Evidence(typeof(FerriteWinding), EvidenceKind.Identity)]
    public void Impedance_TwiceTheTurns_IsFourTimes() =>
        Gen.Select(Gen.Int[1, 30], Gen.Double[0.2, 90]).Sample((turns, mhz) =>
        {
            var (f, winding) = (Frequency.FromMegahertz(mhz), Choke with { Turns = turns });
            return Complex.Abs(((winding with { Turns = 2 * turns }).Impedance(f)!.Value / winding.Impedance(f)!.Value) - 4) < 1e-9;
        });

    [Theory]
    [InlineData("43", 3.5, 500, 250)]
    [InlineData("43", 0.1, 800, 5)]
    [InlineData("43", 100, 35, 75)]
    [InlineData("61", 10, 127, 2)]
    [Evidence(typeof(FerritePermeability), EvidenceKind.ClosedFormLimit)]
    public void PermeabilityAt_ListedPoint_IsTheListedPair(string mix, double mhz, double inductive, double lossy)
    {
        var mu = FerritePermeability.At(mix, Frequency.FromMegahertz(mhz))!.Value;

        Assert.Equal(inductive, mu.Inductive, 9);
        Assert.Equal(lossy, mu.Lossy, 9);
    }

    [Fact]
    [Evidence(typeof(FerritePermeability), EvidenceKind.IndependentRecomputation)]
    public void PermeabilityAt_BetweenTwoPoints_IsWhatRepeatedGeometricMeansReach() =>
        Gen.Double[3.5, 5].Sample(mhz =>
        {
            var (low, high) = ((Mhz: 3.5, Mu: 500.0, Loss: 250.0), (Mhz: 5.0, Mu: 420.0, Loss: 275.0));
            for (var i = 0; i < 60; i++)
            {
                var middle = (Mhz: Math.Sqrt(low.Mhz * high.Mhz), Mu: Math.Sqrt(low.Mu * high.Mu), Loss: Math.Sqrt(low.Loss * high.Loss));
                (low, high) = middle.Mhz > mhz ? (low, middle) : (middle, high);
            }

            var mu = FerritePermeability.At("43", Frequency.FromMegahertz(mhz))!.Value;
            return Math.Abs((mu.Inductive / low.Mu) - 1) < 1e-9 && Math.Abs((mu.Lossy / low.Loss) - 1) < 1e-9;
        });
}
