using ClubBench.Calculation.Amplifiers;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Amplifiers;

public class HeatTests
{
    private static readonly Heat Path = new(ThermalResistance.FromKelvinPerWatt(2.1), ThermalResistance.FromKelvinPerWatt(0.5), ThermalResistance.FromKelvinPerWatt(12));

    [Fact]
    [Evidence(typeof(Heat), EvidenceKind.ClosedFormLimit)]
    public void Junction_WorkedCase_Is88Point67Celsius() =>
        Assert.Equal(88.67, Path.Junction(Heat.BoxAir, Power.FromWatt(3.333)).Celsius, 0.01);

    [Fact]
    public void MostWithoutSink_SmallPlasticCase_Is430Milliwatt() =>
        Assert.Equal(0.425, Heat.MostWithoutSink(ThermalResistance.FromKelvinPerWatt(200), Temperature.FromCelsius(150), Heat.BoxAir).Watt, 1e-9);

    [Fact]
    [Evidence(typeof(Heat), EvidenceKind.RoundTrip)]
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
    [Evidence(typeof(Heat), EvidenceKind.ClosedFormLimit)]
    [InlineData(25, 10)]
    [InlineData(87.5, 5)]
    [InlineData(150, 0)]
    public void Derated_CaseTemperature_FallsInAStraightLine(double celsius, double watt) =>
        Assert.Equal(watt, Heat.Derated(Power.FromWatt(10), Temperature.FromCelsius(25), Temperature.FromCelsius(150), Temperature.FromCelsius(celsius)).Watt, 1e-9);

    [Fact]
    [Evidence(typeof(Heat), EvidenceKind.RoundTrip)]
    public void MostWithoutSink_Applied_KeepsExactlyTheReserve()
    {
        var (junctionToAir, most) = (ThermalResistance.FromKelvinPerWatt(125), Temperature.FromCelsius(150));

        var heat = Heat.MostWithoutSink(junctionToAir, most, Heat.BoxAir);

        Assert.Equal(most.Celsius - Heat.Reserve.Kelvin, Heat.JunctionFor(junctionToAir, Heat.BoxAir, heat).Celsius, 1e-9);
    }

    [Fact]
    [Evidence(typeof(Heat), EvidenceKind.Identity)]
    public void Junction_TwoSourcesOfHeat_AddTheirRises() => Gen.Select(Gen.Double[0, 5], Gen.Double[0, 5], Gen.Double[-20, 60]).Sample((a, b, celsius) =>
    {
        var air = Temperature.FromCelsius(celsius);
        double Rise(double watt) => Path.Junction(air, Power.FromWatt(watt)).Celsius - celsius;
        Assert.Equal(Rise(a) + Rise(b), Rise(a + b), 1e-9);
    });
}
