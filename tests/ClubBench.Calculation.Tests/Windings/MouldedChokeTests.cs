using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using CsCheck;

namespace ClubBench.Calculation.Tests.Windings;

public class MouldedChokeTests
{
    [Theory]
    [InlineData(1, 150)]
    [InlineData(10, 40)]
    [InlineData(100, 8)]
    [InlineData(1000, 2.5)]
    [Evidence(typeof(MouldedChoke), EvidenceKind.ClosedFormLimit)]
    public void TypicalSelfResonance_ListedValues_AreReturned(double microhenry, double mhz) =>
        Assert.Equal(mhz, MouldedChoke.TypicalSelfResonance(Inductance.FromMicrohenry(microhenry))!.Value.Megahertz, 9);

    [Fact]
    [Evidence(typeof(MouldedChoke), EvidenceKind.Identity)]
    public void TypicalSelfResonance_GrowingInductance_Falls()
    {
        var ladder = new[] { 1, 2.2, 6.8, 15, 33, 220, 1000 }.Select(uh => MouldedChoke.TypicalSelfResonance(Inductance.FromMicrohenry(uh))!.Value.Megahertz).ToList();

        Assert.Equal(ladder.OrderDescending(), ladder);
    }

    [Fact]
    public void TypicalSelfResonance_OutsideTheList_IsNotStated() =>
        Assert.Null(MouldedChoke.TypicalSelfResonance(Inductance.FromMicrohenry(4700)));

    [Fact]
    public void Serves_TenMicrohenryAt30Metres_IsAResonatorButNotAt10Metres()
    {
        var srf = Frequency.FromMegahertz(40);

        Assert.True(MouldedChoke.Serves(srf, Frequency.FromMegahertz(10.1), ChokeUse.Resonator));
        Assert.False(MouldedChoke.Serves(srf, Frequency.FromMegahertz(28), ChokeUse.Resonator));
        Assert.True(MouldedChoke.Serves(srf, Frequency.FromMegahertz(24), ChokeUse.Choke));
    }

    [Fact]
    public void Nearest_WantedInductance_IsAMemberOfE12()
    {
        Assert.Equal(6.8, MouldedChoke.Nearest(Inductance.FromMicrohenry(7)).Microhenry, 9);
        Assert.Equal((30, 60), ((int)Math.Round(MouldedChoke.Quality.Low), (int)Math.Round(MouldedChoke.Quality.High)));
    }

    [Fact]
    [Evidence(typeof(MouldedChoke), EvidenceKind.ClosedFormLimit)]
    public void TypicalSelfResonance_GeometricMeanOfTwoListedValues_IsTheGeometricMean() =>
        Assert.Equal(Math.Sqrt(150 * 40), MouldedChoke.TypicalSelfResonance(Inductance.FromMicrohenry(Math.Sqrt(10)))!.Value.Megahertz, 1e-3);

    [Fact]
    [Evidence(typeof(MouldedChoke), EvidenceKind.IndependentRecomputation)]
    public void Nearest_EveryMemberTried_HasTheSmallestRatio()
    {
        double[] twelve = [1, 1.2, 1.5, 1.8, 2.2, 2.7, 3.3, 3.9, 4.7, 5.6, 6.8, 8.2];
        double[] microhenry = [.. from decade in new[] { 0.1, 1, 10, 100, 1000 } from v in twelve select v * decade];

        Gen.Double[0.2, 5000].Sample(uh =>
            Math.Abs((MouldedChoke.Nearest(Inductance.FromMicrohenry(uh)).Microhenry / microhenry.MinBy(m => Math.Max(m / uh, uh / m))) - 1) < 1e-9);
    }

    [Fact]
    [Evidence(typeof(MouldedChoke), EvidenceKind.ClosedFormLimit)]
    public void Serves_ThreeTimesAndOneAndAHalfTimes_AreTheLimits()
    {
        var f = Frequency.FromMegahertz(10);

        Assert.True(MouldedChoke.Serves(f * 3, f, ChokeUse.Resonator) && MouldedChoke.Serves(f * 1.5, f, ChokeUse.Choke));
        Assert.False(MouldedChoke.Serves(f * 2.99, f, ChokeUse.Resonator) || MouldedChoke.Serves(f * 1.49, f, ChokeUse.Choke));
    }
}
