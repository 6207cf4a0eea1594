using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.StageKinds;
using ClubBench.Planning.Tests.Builders;
using BoardPlaces = ClubBench.Planning.Tests.Builders.Places;

namespace ClubBench.Planning.Tests.StageKinds.GilbertProductDetector;

public class DetectorTests
{
    private static readonly StageDocument Kit = Quern.Stage("A8");

    [Fact]
    public void Impedance_SignalInput_IsThreeKilohmBesideThreePicofarad()
    {
        var model = (IPresents)Quern.KindOf(Kit).Model(Kit, BoardPlaces.ThirtyMetres);

        var admittance = 1 / model.Impedance("signal", Frequency.FromMegahertz(10));

        Assert.Equal(1.0 / 3000, admittance.Real, 1e-9);
        Assert.Equal(2 * Math.PI * 10e6 * 3e-12, admittance.Imaginary, 1e-9);
    }

    [Fact]
    public void Figures_FromMemory_AreMarkedSo() =>
        Assert.Equal(Provenance.FromMemory, Quern.KindOf(Kit).Model(Kit, BoardPlaces.ThirtyMetres).Figures.Single(f => f.Name == "noise-figure").From);

    [Fact]
    public void Figures_OscillatorLevelOfThePapers_IsNotGiven() =>
        Assert.DoesNotContain(Quern.KindOf(Kit).Model(Kit, BoardPlaces.ThirtyMetres).Figures, f => f.Name == "oscillator-level");

    [Theory]
    [InlineData("ZD2", "voltageV", 9.1, "detector.supply-outside")]
    [InlineData("C21", "capacitanceF", 100e-12, "detector.bypass-small")]
    public void Judge_PlantedFault_IsFound(string part, string value, double si, string code) =>
        Assert.Equal(code, Assert.Single(Quern.Judge(Quern.With(Kit, part, value, si), BoardPlaces.ThirtyMetres)).Code);
}
