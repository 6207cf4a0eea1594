using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;

namespace ClubBench.Calculation.Tests.Windings;

public class FluxDensityTests
{
    private static readonly ToroidCore Choke = Cores.FindToroid("FT37-43")!;

    public static TheoryData<ReferenceRow> Limits => ReferenceTable.Theory("flux-limit");

    [Theory]
    [MemberData(nameof(Limits))]
    public void GuideLimit_BetweenPoints_IsLogarithmic(ReferenceRow row) =>
        Assert.Equal(row.Number("limit_gauss"), FluxDensity.GuideLimit(Frequency.FromMegahertz(row.Number("frequency_mhz"))).Gauss, 0.051);

    [Theory]
    [InlineData(0.1, 500)]
    [InlineData(1, 150)]
    [InlineData(14, 42)]
    [InlineData(28, 30)]
    [InlineData(0.05, 500)]
    [Evidence(typeof(FluxDensity), EvidenceKind.ClosedFormLimit)]
    public void GuideLimit_AtListedPoints_IsTheListedValue(double mhz, double gauss) =>
        Assert.Equal(gauss, FluxDensity.GuideLimit(Frequency.FromMegahertz(mhz)).Gauss, 9);

    [Fact]
    public void Alternating_SeriesCoil_MatchesTheUsualGaussForm()
    {
        // 15.8 V, 7.1 MHz, 16 turns, 0.112 cm2: E 1e8/(4.44 f N A) = 27.97 G.
        var flux = FluxDensity.Alternating(Voltage.FromVolt(15.8), Frequency.FromMegahertz(7.1), 16, Area.FromSquareCentimetre(0.112));

        Assert.Equal(27.97, flux.Gauss, 0.03);
        Assert.Equal(CoreLoad.Good, FluxDensity.Judge(flux, Frequency.FromMegahertz(7.1)));
    }

    [Fact]
    public void Alternating_EightTurnsOnASmallFerrite_IsRefused()
    {
        var f = Frequency.FromMegahertz(3.6);
        var flux = FluxDensity.Alternating(Voltage.FromVolt(22.4), f, 8, Choke.EffectiveArea);

        Assert.Equal(230, flux.Gauss, 0.5);
        Assert.Equal(CoreLoad.Refuse, FluxDensity.Judge(flux, f));
    }

    [Fact]
    [Evidence(typeof(FluxDensity), EvidenceKind.Identity)]
    public void Alternating_TwiceTheTurns_HalvesTheFlux()
    {
        var (e, f, a) = (Voltage.FromVolt(10), Frequency.FromMegahertz(7), Area.FromSquareCentimetre(0.1));

        Assert.Equal(2, FluxDensity.Alternating(e, f, 5, a) / FluxDensity.Alternating(e, f, 10, a), 12);
    }

    [Fact]
    public void Bias_CollectorChokeOfTheInventedKit_IsToBeChecked()
    {
        var current = Current.FromAmpere(0.164);

        Assert.Equal(767, FluxDensity.Bias(Choke, 10, current).Gauss, 0.5);
        Assert.Equal(0.26, FluxDensity.BiasShare(Choke, 10, current)!.Value, 0.005);
        Assert.Equal(CoreLoad.Check, FluxDensity.JudgeBias(FluxDensity.BiasShare(Choke, 10, current)!.Value));
    }

    [Fact]
    public void Bias_HalfAnAmpere_SaturatesTheChoke()
    {
        Assert.Equal(2338, FluxDensity.Bias(Choke, 10, Current.FromAmpere(0.5)).Gauss, 0.5);
        Assert.Equal(CoreLoad.Refuse, FluxDensity.JudgeBias(FluxDensity.BiasShare(Choke, 10, Current.FromAmpere(0.5))!.Value));
    }

    [Fact]
    public void BiasShare_MixWithoutAListedValue_IsNotStated() => Assert.Null(FluxDensity.BiasShare(Cores.FindToroid("T50-2")!, 10, Current.FromAmpere(1)));

    [Fact]
    [Evidence(typeof(FluxDensity), EvidenceKind.Identity)]
    public void Bias_FluxOfTheInductance_AgreesWithLIOverNA()
    {
        // B = L I/(N A) with the index that size and permeability give.
        var inductance = Choke.ExpectedInductanceFactor.Of(10);

        Assert.Equal(inductance.Henry * 0.164 / (10 * Choke.EffectiveArea.SquareMetre), FluxDensity.Bias(Choke, 10, Current.FromAmpere(0.164)).Tesla, 1e-9);
    }

    [Fact]
    [Evidence(typeof(FluxDensity), EvidenceKind.ClosedFormLimit)]
    public void TemperatureRise_OneMilliwattPerSquareCentimetre_IsOneKelvin()
    {
        var core = Cores.FindToroid("T50-2")!;
        var power = Power.FromMilliwatt(FluxDensity.Surface(core).SquareCentimetre);

        Assert.Equal(1, FluxDensity.TemperatureRise(core, power).Kelvin, 9);
    }

    [Fact]
    [Evidence(typeof(FluxDensity), EvidenceKind.IndependentRecomputation)]
    public void Alternating_SineSummedOverHalfACycle_IsHalfTheSwing()
    {
        const int Steps = 2000;
        var (f, area, turns) = (Frequency.FromMegahertz(7.1), Area.FromSquareCentimetre(0.112), 16);
        var step = 0.5 / f.Hertz / Steps;

        var swing = Enumerable.Range(0, Steps).Sum(i => Math.Sqrt(2) * 15.8 * Math.Sin(f.RadiansPerSecond * (i + 0.5) * step) * step) / (turns * area.SquareMetre);

        Assert.Equal(1, FluxDensity.Alternating(Voltage.FromVolt(15.8), f, turns, area).Tesla / (swing / 2), 1e-6);
    }

    [Fact]
    [Evidence(typeof(FluxDensity), EvidenceKind.Identity)]
    public void GuideLimit_GrowingFrequency_NeverRises()
    {
        double[] limits = [.. Enumerable.Range(0, 100).Select(i => FluxDensity.GuideLimit(Frequency.FromMegahertz(0.1 * Math.Pow(1.07, i))).Gauss)];

        Assert.Equal(limits.OrderDescending(), limits);
    }
}
