using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Amplifiers;

public class MatchingNetworkTests
{
    private static readonly Frequency F = Frequency.FromMegahertz(7.1);
    private static readonly Resistance High = Resistance.FromOhm(50);
    private static readonly Resistance Low = Resistance.FromOhm(12.5);

    [Fact]
    [Evidence(typeof(MatchingNetwork), EvidenceKind.RoundTrip)]
    public void L_FiftyToTwelve_MatchesWorkedParts()
    {
        var network = MatchingNetwork.L(High, Low, F);

        Assert.Equal(1.73205, network.SourceQ, 1e-5);
        Parts(network, ("C", 776.52), ("L", 0.485325));
        Matches(network);
        Matches(MatchingNetwork.L(Low, High, F));
    }

    [Fact]
    [Evidence(typeof(MatchingNetwork), EvidenceKind.RoundTrip)]
    public void TryPi_QThree_MatchesWorkedParts()
    {
        Assert.True(MatchingNetwork.TryPi(High, Low, F, 3, out var network));

        Parts(network!, ("C", 1344.97), ("L", 0.473513), ("C", 2196.33));
        Matches(network!);
    }

    [Fact]
    [Evidence(typeof(MatchingNetwork), EvidenceKind.RoundTrip)]
    public void TryTee_QThree_MatchesWorkedParts()
    {
        Assert.True(MatchingNetwork.TryTee(Low, High, F, 3, out var network));

        Parts(network!, ("L", 0.840607), ("C", 757.62), ("L", 1.37271));
        Matches(network!);
    }

    [Theory]
    [Evidence(typeof(MatchingNetwork), EvidenceKind.IndependentRecomputation)]
    [InlineData(2, 11.8, 22.6, 0.11)]
    [InlineData(3, 19.7, 31.5, 0.18)]
    [InlineData(5, 26.0, 38.0, 0.31)]
    [InlineData(8, 30.7, 42.8, 0.50)]
    public void TryPi_DrivenFromTheLowSide_GivesTheWorkedHarmonicLoss(double q, double secondDb, double thirdDb, double lossDb)
    {
        Assert.True(MatchingNetwork.TryPi(High, Low, F, q, out var network));
        var reversed = new Ladder(network!.Ladder.Elements.Reverse());

        Assert.Equal(secondDb, reversed.Loss(F.Harmonic(2), Low, High).Db, 0.05);
        Assert.Equal(thirdDb, reversed.Loss(F.Harmonic(3), Low, High).Db, 0.05);

        var coil = network.Ladder.Elements[1].Inductance!.Value;
        var lossy = new Ladder(network.Ladder.Elements.SetItem(1, LadderElement.SeriesInductor(coil, 100)));
        Assert.Equal(lossDb, lossy.Loss(F, High, Low).Db, 0.01);
        Assert.Equal(lossDb, network.EstimatedLoss(100).Db, 0.1 * lossDb);
    }

    [Fact]
    [Evidence(typeof(MatchingNetwork), EvidenceKind.ClosedFormLimit)]
    public void TryPi_QBelowTheSmallest_IsRefused()
    {
        Assert.Equal(4.36, MatchingNetwork.SmallestQ(Resistance.FromOhm(200), Resistance.FromOhm(10)), 0.005);
        Assert.False(MatchingNetwork.TryPi(Resistance.FromOhm(200), Resistance.FromOhm(10), F, 3, out _));
        Assert.True(MatchingNetwork.TryPi(Resistance.FromOhm(200), Resistance.FromOhm(10), F, 4.4, out _));
    }

    [Fact]
    public void TryPi_Stress_MatchesWorkedFigures()
    {
        Assert.True(MatchingNetwork.TryPi(High, Low, F, 3, out var network));

        var stress = LadderStress.Of(network!.Ladder, F, Power.FromWatt(5), High, Low.Ohm);

        Assert.Equal(1.414, stress.Arms[1].Current.Ampere, 0.001);
        Assert.Equal(22.4, stress.Arms[0].Voltage.Volt, 0.05);
        Assert.Equal(11.2, stress.Arms[2].Voltage.Volt, 0.05);
    }

    private static void Matches(MatchingNetwork network)
    {
        var z = network.Ladder.At(F).InputImpedance(network.Load.Ohm);

        Assert.Equal(network.Source.Ohm, z.Real, 1e-9);
        Assert.Equal(0, z.Imaginary, 1e-9);
    }

    private static void Parts(MatchingNetwork network, params (string Kind, double Value)[] expected)
    {
        foreach (var (part, arm) in expected.Zip(network.Ladder.Elements))
            Assert.Equal(part.Value, part.Kind == "C" ? arm.Capacitance!.Value.Picofarad : arm.Inductance!.Value.Microhenry, part.Value * 1e-4);
    }
}
