using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Broadband;

public class CurrentTransformerTests
{
    private static readonly FerriteWinding Choke = new(Cores.Find("FT37-43")!, 10);

    private static readonly Gen<CurrentTransformer> Transformers = Gen.Select(
        Gen.Int[1, 40], Gen.Double[10, 200], Gen.Double[25, 100], (n, burden, line) => new CurrentTransformer(n, Resistance.FromOhm(burden), Resistance.FromOhm(line)));

    [Fact]
    [Evidence(typeof(CurrentTransformer), EvidenceKind.ClosedFormLimit)]
    public void CurrentTransformer_TenTurns_MatchesTheWorkedExample()
    {
        var transformer = new CurrentTransformer(10, Resistance.FromOhm(50), Resistance.FromOhm(50));

        Assert.Equal(1.5811, transformer.BurdenRms(Power.FromWatt(5)).Volt, 0.0001);
        Assert.Equal(0.5, transformer.Inserted.Ohm, 12);
        Assert.Equal(0.0433, transformer.Loss.Db, 0.0001);
        Assert.Equal(-20, transformer.Coupling.Db, 9);
        Assert.True(transformer.IsEnough(Choke.Impedance(Frequency.FromMegahertz(3.5))!.Value));
        Assert.False(transformer.IsEnough(new(0, 499)));
    }

    [Fact]
    [Evidence(typeof(CurrentTransformer), EvidenceKind.Identity)]
    public void BurdenRms_AnyTransformer_IsTheCoupledPower() =>
        Transformers.Sample(t =>
        {
            var volt = t.BurdenRms(Power.FromWatt(5)).Volt;
            return Math.Abs((volt * volt / t.Burden.Ohm / (5 * t.Coupling.PowerRatio)) - 1) < 1e-12;
        });

    [Fact]
    [Evidence(typeof(CurrentTransformer), EvidenceKind.IndependentRecomputation)]
    public void Loss_AnyTransformer_IsThatOfItsResistanceInTheLineByChainMatrix() =>
        Transformers.Sample(t => Math.Abs(t.Loss.Db - TwoPort.Series(t.Burden.Ohm / (t.Turns * t.Turns)).Loss(t.Line, t.Line).Db) < 1e-9);
}
