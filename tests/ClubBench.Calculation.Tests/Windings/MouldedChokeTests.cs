using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;

namespace ClubBench.Calculation.Tests.Windings;

public class MouldedChokeTests
{
    [Theory]
    [InlineData(1, 150)]
    [InlineData(10, 40)]
    [InlineData(100, 8)]
    [InlineData(1000, 2.5)]
    public void TypicalSelfResonance_ListedValues_AreReturned(double microhenry, double mhz) =>
        Assert.Equal(mhz, MouldedChoke.TypicalSelfResonance(Inductance.FromMicrohenry(microhenry))!.Value.Megahertz, 9);

    [Fact]
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
}
