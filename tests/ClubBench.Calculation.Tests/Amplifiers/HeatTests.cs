using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Amplifiers;

public class HeatTests
{
    private static readonly Heat Path = new(ThermalResistance.FromKelvinPerWatt(2.1), ThermalResistance.FromKelvinPerWatt(0.5), ThermalResistance.FromKelvinPerWatt(12));

    [Fact]
    public void Junction_PublishedCase_Is88Point67Celsius() =>
        Assert.Equal(88.67, Path.Junction(Heat.BoxAir, Power.FromWatt(3.333)).Celsius, 0.01);

    [Fact]
    public void MostWithoutSink_SmallPlasticCase_Is430Milliwatt() =>
        Assert.Equal(0.425, Heat.MostWithoutSink(ThermalResistance.FromKelvinPerWatt(200), Temperature.FromCelsius(150), Heat.BoxAir).Watt, 1e-9);

    [Fact]
    public void LargestSink_Reached_HoldsTheJunctionAtTheLimit()
    {
        var limit = Temperature.FromCelsius(125);

        var sink = Path.LargestSink(limit, Heat.BoxAir, Power.FromWatt(3.333));

        Assert.Equal(125, (Path with { SinkToAir = sink!.Value }).Junction(Heat.BoxAir, Power.FromWatt(3.333)).Celsius, 1e-9);
    }

    [Fact]
    public void LargestSink_TooMuchHeat_IsNull() =>
        Assert.Null(Path.LargestSink(Temperature.FromCelsius(125), Heat.BoxAir, Power.FromWatt(40)));

    [Theory]
    [InlineData(25, 10)]
    [InlineData(87.5, 5)]
    [InlineData(150, 0)]
    public void Derated_CaseTemperature_FallsInAStraightLine(double celsius, double watt) =>
        Assert.Equal(watt, Heat.Derated(Power.FromWatt(10), Temperature.FromCelsius(25), Temperature.FromCelsius(150), Temperature.FromCelsius(celsius)).Watt, 1e-9);
}
