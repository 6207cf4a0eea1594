using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Quantities;

public class QuantityTests
{
    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(0)]
    [InlineData(-1)]
    public void FrequencyFromHertz_NotAPositiveNumber_Throws(double hertz) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Frequency.FromHertz(hertz));

    [Fact]
    public void Units_BothWays_ReturnTheSameNumber()
    {
        Assert.Equal(7.03, Frequency.FromMegahertz(7.03).Megahertz, 12);
        Assert.Equal(7030, Frequency.FromMegahertz(7.03).Kilohertz, 9);
        Assert.Equal(270, Capacitance.FromPicofarad(270).Picofarad, 9);
        Assert.Equal(0.675, Inductance.FromNanohenry(675).Microhenry, 12);
        Assert.Equal(4.9, InductanceFactor.FromMicrohenryPer100Turns(49).NanohenryPerTurnSquared, 12);
    }

    [Fact]
    public void PowerLevel_MinusPowerLevel_IsAGain() =>
        Assert.Equal(Decibels.FromDb(11.7).Db, (PowerLevel.FromDbm(30.7) - PowerLevel.FromDbm(19.0)).Db, 12);

    [Fact]
    public void PowerToLevel_OneWatt_Is30Dbm() => Assert.Equal(30, Power.FromWatt(1).ToLevel().Dbm, 12);

    [Fact]
    public void InductanceFactorOf_Turns_GrowsWithTheSquare() =>
        Assert.Equal(0.675, InductanceFactor.FromNanohenryPerTurnSquared(3).Of(15).Microhenry, 12);

    [Fact]
    public void QuantityTypes_All_AreReadonlyStructsWithoutPublicConstructors()
    {
        var offenders = typeof(Frequency).Assembly.GetTypes()
            .Where(t => t is { IsPublic: true, IsValueType: true, IsEnum: false } && t.Namespace == typeof(Frequency).Namespace)
            .Where(t => t != typeof(FrequencyRange))
            .Where(t => !t.IsDefined(typeof(System.Runtime.CompilerServices.IsReadOnlyAttribute), false) || t.GetConstructors().Length > 0);

        Assert.Empty(offenders);
    }
}
