using ClubBench.Planning.Kits;
using ClubBench.Planning.Tests.Builders;
using BoardPlaces = ClubBench.Planning.Tests.Builders.Places;

namespace ClubBench.Planning.Tests.StageKinds.AudioBandPass;

public class BandPassTests
{
    private static readonly StageDocument Kit = Quern.Stage("A9");

    [Theory]
    [InlineData("centre", 701, 0.5)]
    [InlineData("section-q", 3.97, 0.005)]
    [InlineData("section-gain", 1.45, 0.005)]
    [InlineData("preamplifier-gain", 26.85, 0.01)]
    public void Figures_OwnBand_AreThoseOfThePapers(string figure, double expected, double tolerance) =>
        Assert.Equal(expected, Quern.Figure(Kit, figure, BoardPlaces.ThirtyMetres), tolerance);

    [Theory]
    [InlineData(600, "band-pass.off-pitch")]
    [InlineData(740, null)]
    public void Judge_Pitch_ToldWhereTheFilterIsOff(double pitch, string? expected) =>
        Assert.Equal(expected, Quern.Judge(Kit, BoardPlaces.On(10.111, 10.124, 10.1175, pitch)).SingleOrDefault()?.Code);

    [Fact]
    public void Judge_CapacitorsMixedUp_IsFound() =>
        Assert.Contains(Quern.Judge(Quern.With(Kit, "C25", PartValue.Capacitance, 22e-9), BoardPlaces.ThirtyMetres), f => f.Code == "band-pass.capacitors-differ");
}
