using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Crystals;

public class CrystalImpedanceTests
{
    private static readonly CrystalParameters FortyMetres = Quartz(7.03, 18, 4.5, 20);

    private static readonly Gen<CrystalParameters> Any = Gen.Select(Gen.Double[3, 25], Gen.Double[5, 28], Gen.Double[3, 7], Gen.Double[5, 60]).Select(Quartz);

    [Fact]
    [Evidence(typeof(CrystalParameters), EvidenceKind.Identity)]
    public void ZeroPhaseResonance_AnyCrystal_IsWhereTheReactanceVanishes() => Any.Sample(crystal =>
    {
        var impedance = crystal.Impedance(crystal.ZeroPhaseResonance!.Value);
        return Math.Abs(impedance.Imaginary) < 1e-3 * impedance.Real && impedance.Real > crystal.MotionalResistance.Ohm;
    });

    [Fact]
    public void ZeroPhaseResonance_LittleLoss_IsTheFirstOrderShift() => Any.Sample(crystal =>
    {
        var firstOrder = crystal.SeriesResonance.Hertz / (2 * crystal.UnloadedQ!.Value * crystal.FigureOfMerit!.Value);
        return Math.Abs(crystal.ZeroPhaseResonance!.Value.Hertz - crystal.SeriesResonance.Hertz - firstOrder) < (firstOrder * 0.05) + 1e-6;
    });

    [Fact]
    public void ZeroPhaseResonance_NowhereInductiveOrResistanceNotStated_IsNotGiven()
    {
        Assert.Null((FortyMetres with { MotionalResistance = Resistance.FromOhm(3000) }).ZeroPhaseResonance);
        Assert.Null((FortyMetres with { MotionalResistance = default }).ZeroPhaseResonance);
        Assert.NotNull(FortyMetres.ZeroPhaseResonance);
    }

    [Fact]
    public void Impedance_AtSeriesResonance_IsNearlyTheMotionalResistance() =>
        Assert.Equal(20, FortyMetres.Impedance(FortyMetres.SeriesResonance).Magnitude, 0.01);

    [Fact]
    [Evidence(typeof(CrystalParameters), EvidenceKind.ClosedFormLimit)]
    public void Impedance_FarBelow_IsThatOfBothCapacitances() => Any.Sample(crystal =>
    {
        var f = Frequency.FromHertz(1000);
        var both = (crystal.StaticCapacitance + crystal.MotionalCapacitance).Farad;
        return Math.Abs((-crystal.Impedance(f).Imaginary * f.RadiansPerSecond * both) - 1) < 1e-6;
    });

    [Fact]
    public void FrequencyWithNetLoad_Capacitor_IsTheLoadedFrequency() =>
        Assert.Equal(FortyMetres.LoadedFrequency(Capacitance.FromPicofarad(30)).Hertz, FortyMetres.FrequencyWithNetLoad(30)!.Value.Hertz, 1e-6);

    [Fact]
    public void FrequencyWithNetLoad_Inductor_PullsBelowSeriesResonanceAndCancelsTheReactance() => Gen.Double[-200, -8].Sample(load =>
    {
        var lossless = FortyMetres with { MotionalResistance = default };
        var f = lossless.FrequencyWithNetLoad(load)!.Value;
        var reactance = -1 / (f.RadiansPerSecond * load * 1e-12);
        return f < lossless.SeriesResonance && Math.Abs((lossless.Impedance(f).Imaginary / reactance) + 1) < 1e-5;
    });

    [Theory]
    [InlineData(-4.5, false)]
    [InlineData(-4.67, false)]
    [InlineData(-4.69, true)]
    [InlineData(0, true)]
    public void FrequencyWithNetLoad_LoadThatCancelsC0_IsRefused(double picofarad, bool given)
    {
        Assert.Equal(-4.68, FortyMetres.WeakestInductiveLoadPicofarad, 1e-9);
        Assert.Equal(given, FortyMetres.FrequencyWithNetLoad(picofarad) is not null);
    }

    [Fact]
    [Evidence(typeof(CrystalParameters), EvidenceKind.RoundTrip)]
    public void FromResonances_AnyCrystal_ComesBack() => Any.Sample(crystal =>
    {
        var back = CrystalParameters.FromResonances(crystal.SeriesResonance, crystal.ParallelResonance, crystal.MotionalCapacitance, crystal.MotionalResistance)!;
        return Math.Abs((back.StaticCapacitance / crystal.StaticCapacitance) - 1) < 1e-9;
    });

    [Fact]
    public void FromResonances_ParallelBelowSeries_IsRefused() =>
        Assert.Null(CrystalParameters.FromResonances(Frequency.FromMegahertz(7), Frequency.FromMegahertz(6.99), Capacitance.FromFarad(18e-15), default));

    private static CrystalParameters Quartz(double mhz, double cmFf, double c0Pf, double rmOhm) =>
        new(Frequency.FromMegahertz(mhz), Capacitance.FromFarad(cmFf * 1e-15), Capacitance.FromPicofarad(c0Pf), Resistance.FromOhm(rmOhm));
}
