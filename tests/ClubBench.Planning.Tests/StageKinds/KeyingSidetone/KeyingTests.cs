using ClubBench.Planning.Kits;
using ClubBench.Planning.Tests.Builders;
using BoardPlaces = ClubBench.Planning.Tests.Builders.Places;

namespace ClubBench.Planning.Tests.StageKinds.KeyingSidetone;

public class KeyingTests
{
    private static readonly StageDocument Kit = Quern.Stage("A11");

    [Fact]
    public void Figures_Sidetone_IsThatOfThePapers() => Assert.Equal(690, Quern.Figure(Kit, "sidetone", BoardPlaces.ThirtyMetres), 5.0);

    [Fact]
    public void Judge_PitchElsewhere_SidetoneIsOff() =>
        Assert.Equal("keying.sidetone-off-pitch", Assert.Single(Quern.Judge(Kit, BoardPlaces.On(10.111, 10.124, 10.1175, 620))).Code);

    [Fact]
    public void Judge_HardEdge_IsFound() =>
        Assert.Contains(Quern.Judge(Kit.WithSetting("riseTimeS", 1e-3), BoardPlaces.ThirtyMetres), f => f.Code == "keying.rise-outside");

    [Fact]
    public void Judge_ShapingCapacitorTooSmall_DisagreesWithThePapers() =>
        Assert.Equal("keying.parts-disagree", Assert.Single(Quern.Judge(Quern.With(Kit, "C32", PartValue.Capacitance, 100e-9), BoardPlaces.ThirtyMetres)).Code);

    [Fact]
    public void Expect_WithoutTimer_ReadsTheEdgeOnly()
    {
        var silent = Quern.Without(Kit, "C33");

        Assert.Equal("A11.rise-time", Assert.Single(Quern.KindOf(Kit).Expect(silent, Quern.KindOf(Kit).Model(silent, BoardPlaces.ThirtyMetres), BoardPlaces.ThirtyMetres)).Point);
    }
}
