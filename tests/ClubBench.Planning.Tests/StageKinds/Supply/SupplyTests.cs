using ClubBench.Planning.Cards;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Tests.Builders;
using BoardPlaces = ClubBench.Planning.Tests.Builders.Places;

namespace ClubBench.Planning.Tests.StageKinds.Supply;

public class SupplyTests
{
    private static readonly StageDocument Kit = Quern.Stage("A12");

    [Theory]
    [InlineData(0.25, "supply.fuse-too-small")]
    [InlineData(5, "supply.fuse-too-large")]
    [InlineData(1, null)]
    public void Judge_Fuse_IsHeldAgainstTheCurrent(double ampere, string? expected) =>
        Assert.Equal(expected, Quern.Judge(Quern.With(Kit, "F1", PartValue.RatedCurrent, ampere), BoardPlaces.ThirtyMetres).SingleOrDefault()?.Code);

    [Fact]
    public void Judge_LowBattery_LeavesTheRegulatorLittle() =>
        Assert.Contains(Quern.Judge(Kit, BoardPlaces.On(10.111, 10.124, 10.1175, supplyV: 9.6)), f => f.Code == "supply.little-headroom");

    [Fact]
    public void Expect_Regulator_WithinThreePerCent()
    {
        var reading = Assert.Single(Quern.KindOf(Kit).Expect(Kit, Quern.KindOf(Kit).Model(Kit, BoardPlaces.ThirtyMetres), BoardPlaces.ThirtyMetres));

        Assert.Equal(8 * 0.97, reading.LowSi, 1e-9);
        Assert.Equal(8 * 1.03, reading.HighSi, 1e-9);
    }

    [Fact]
    public void Notes_Cautions_NameFuseAndPolarity() =>
        Assert.Equal(["caution.polarity", "caution.fuse-at-source", "caution.lithium-pack"], Quern.KindOf(Kit).Notes(Kit, BoardPlaces.ThirtyMetres).CautionsAt(CardStep.BeforePower).Select(c => c.Code));
}
