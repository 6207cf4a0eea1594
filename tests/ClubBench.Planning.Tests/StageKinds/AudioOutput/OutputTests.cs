using ClubBench.Planning.Kits;
using ClubBench.Planning.Tests.Builders;
using BoardPlaces = ClubBench.Planning.Tests.Builders.Places;

namespace ClubBench.Planning.Tests.StageKinds.AudioOutput;

public class OutputTests
{
    private static readonly StageDocument Kit = Quern.Stage("A10");

    [Theory]
    [InlineData("R25", "output.supply-not-decoupled")]
    [InlineData("C29", "output.not-damped")]
    public void Judge_PartForgotten_IsFound(string designator, string code) =>
        Assert.Equal(code, Assert.Single(Quern.Judge(Quern.Without(Kit, designator), BoardPlaces.ThirtyMetres)).Code);

    [Fact]
    public void Judge_SmallOutputCapacitor_IsFound() =>
        Assert.Equal("output.thin", Assert.Single(Quern.Judge(Quern.With(Kit, "C28", PartValue.Capacitance, 10e-6), BoardPlaces.ThirtyMetres)).Code);

    [Fact]
    public void Expect_IdleCurrent_IsFourToEightMilliampere()
    {
        var reading = Assert.Single(Quern.KindOf(Kit).Expect(Kit, Quern.KindOf(Kit).Model(Kit, BoardPlaces.ThirtyMetres), BoardPlaces.ThirtyMetres));

        Assert.Equal((4e-3, 8e-3), (reading.LowSi, reading.HighSi));
    }
}
