using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Crystals;

public class CrystalsByOtherWaysTests
{
    private static readonly Gen<CrystalParameters[]> Boards =
        Gen.Select(Gen.Double[0, 500], Gen.Double[10, 30], Gen.Double[3, 6], Gen.Double[10, 60]).Select((off, cm, c0, rm) => Quartz(7_030_000 + off, cm, c0, rm)).Array[3, 25];

    [Fact]
    [Evidence(typeof(CrystalPool), EvidenceKind.IndependentRecomputation)]
    public void Pool_BoardsSortedByHand_HasTheirMiddleAndTenths() => Boards.Sample(boards =>
    {
        var pool = CrystalPool.Of(boards);
        double[] hertz = [.. boards.Select(b => b.SeriesResonance.Hertz)];
        var (fs, cm) = (AtRank(hertz, 0.5), boards.Select(b => b.MotionalCapacitance.Farad * 1e15).ToArray());

        Assert.Equal(fs, pool.Middle.SeriesResonance.Hertz, 1e-6);
        Assert.Equal(AtRank([.. boards.Select(b => b.MotionalResistance.Ohm)], 0.5), pool.Middle.MotionalResistance.Ohm, 1e-9);
        Assert.Equal(AtRank(cm, 0.1), pool.WeakPulling.MotionalCapacitance.Farad * 1e15, 1e-9);
        Assert.Equal(AtRank(cm, 0.9), pool.StrongPulling.MotionalCapacitance.Farad * 1e15, 1e-9);
        Assert.Equal(1.4826 * AtRank([.. hertz.Select(h => Math.Abs(h - fs))], 0.5), pool.SeriesDeviationHertz, 1e-2);
    });

    [Fact]
    [Evidence(typeof(CrystalPool), EvidenceKind.Identity)]
    public void Pool_BoardsInReverse_IsTheSame() => Boards.Sample(boards => Assert.Equal(CrystalPool.Of(boards), CrystalPool.Of([.. boards.Reverse()])));

    [Fact]
    [Evidence(typeof(CrystalStability), EvidenceKind.IndependentRecomputation)]
    public void Reach_EverySignOfEveryErrorTriedOut_IsTheOutermostOfThem() => Gen.Double[0, 100].Array[3].Sample(ppm =>
    {
        int[] signs = [-1, 1];
        var tried = (from a in signs from b in signs from c in signs select 14.06e6 * (1 + (((a * ppm[0]) + (b * ppm[1]) + (c * ppm[2])) * 1e-6))).ToList();

        var reach = new CrystalStability(ppm[0], ppm[1], ppm[2]).Reach(Frequency.FromMegahertz(14.06));

        Assert.Equal(tried.Min(), reach.Low.Hertz, 1e-6);
        Assert.Equal(tried.Max(), reach.High.Hertz, 1e-6);
    });

    [Fact]
    [Evidence(typeof(CrystalStability), EvidenceKind.Identity)]
    public void Reach_MultipliedFrequency_IsMultipliedAlong() => Gen.Select(Gen.Double[1, 20], Gen.Int[2, 5]).Sample((mhz, n) =>
    {
        var (once, multiplied) = (CrystalStability.Economical.Reach(Frequency.FromMegahertz(mhz)), CrystalStability.Economical.Reach(Frequency.FromMegahertz(mhz * n)));
        Assert.Equal(n * once.WidthHertz, multiplied.WidthHertz, 1e-3);
    });

    [Fact]
    [Evidence(typeof(CeramicResonators), EvidenceKind.IndependentRecomputation)]
    public void Ceramic_PlacesOfTheResonancesAndReactanceOfTheArm_TellTheSame() => Gen.Select(Gen.Double[1, 10], Gen.Double[5, 60], Gen.Double[1, 100]).Sample((cm, c0, rm) =>
    {
        var resonator = Quartz(3.92e6, cm * 1000, c0, rm);
        var apart = resonator.ParallelResonance / resonator.SeriesResonance;
        var quality = resonator.SeriesResonance.RadiansPerSecond * resonator.MotionalInductance.Henry / rm;

        // On the very edge either may round to the other side.
        if (new[] { (apart * apart) - 1.1, (apart * apart) - 1.25, (quality / 500) - 1, (quality / 2000) - 1 }.Any(d => Math.Abs(d) < 1e-9)) return;
        Assert.Equal(apart >= Math.Sqrt(1.1) && apart <= Math.Sqrt(1.25) && quality is >= 500 and <= 2000, CeramicResonators.IsPlausible(resonator));
    });

    [Fact]
    [Evidence(typeof(CeramicResonators), EvidenceKind.Identity)]
    public void CeramicDrift_TwoRisesOneAfterTheOther_AddUpEitherWay() => Gen.Select(Gen.Double[0, 40], Gen.Double[0, 40]).Sample((a, b) =>
    {
        double Drift(double kelvin) => CeramicResonators.LargestDriftHertz(Frequency.FromMegahertz(3.92), TemperatureRise.FromKelvin(kelvin));
        Assert.Equal(Drift(a) + Drift(b), Drift(a + b), 1e-6);
        Assert.Equal(Drift(a), Drift(-a), 1e-9);
    });

    [Fact]
    [Evidence(typeof(MeasurementComparison), EvidenceKind.Identity)]
    public void Comparison_BothScaledOrExchanged_IsTheSame() => Gen.Select(Gen.Double[5, 30], Gen.Double[0.8, 1.25]).Sample((ff, ratio) =>
    {
        var judged = Compare(ff, ff * ratio);
        Assert.Equal(judged, Compare(ff * ratio, ff));
        Assert.Equal(judged, Compare(4 * ff, 4 * (ff * ratio)));
    });

    [Theory]
    [Evidence(typeof(MeasurementComparison), EvidenceKind.RoundTrip)]
    [InlineData(0, MeasurementAgreement.Good)]
    [InlineData(5, MeasurementAgreement.SuspectFixture)]
    public void Comparison_CrystalReadInAFixtureWithStray_TellsTheFixture(double strayPf, MeasurementAgreement expected)
    {
        var (crystal, inFixture) = (Quartz(8_998_500, 17, 4.2, 12), Quartz(8_998_500, 17, 4.2 + strayPf, 12));
        var (oscillator, series) = (Capacitance.FromPicofarad(235), Capacitance.FromPicofarad(33));

        var read = MotionalMeasurement.FromOscillatorShift(
            inFixture.LoadedFrequency(oscillator), inFixture.LoadedFrequency(Capacitance.FromPicofarad(235.0 * 33 / 268)), series, oscillator, crystal.StaticCapacitance).Crystal!;

        Assert.Equal(expected, MeasurementComparison.Of(crystal.MotionalCapacitance, read.MotionalCapacitance));
    }

    [Theory]
    [Evidence(typeof(QuartzPlate), EvidenceKind.IndependentRecomputation)]
    [InlineData(5, 6)]
    [InlineData(10, 5)]
    public void Plate_SoundAndFieldInQuartz_GiveItsThicknessAndCapacitance(double mhz, double electrodeMm)
    {
        // Stiffness 29.24 GPa of the AT cut, density 2649 kg/m3, permittivity 4.54: from memory. Half a wave of shear fits into the plate.
        var thickness = Math.Sqrt(29.24e9 / 2649) / (2 * mhz * 1e6);
        var farad = 4.54 * 8.8542e-12 * Math.PI * Math.Pow(electrodeMm * 0.5e-3, 2) / thickness;

        var plate = new QuartzPlate(Frequency.FromMegahertz(mhz), Length.FromMillimetre(electrodeMm));

        Assert.Equal(1, plate.Thickness.Metre / thickness, 0.005);
        Assert.Equal(1, plate.ElectrodeCapacitance.Farad / farad, 0.01);
    }

    private static MeasurementAgreement Compare(double firstFf, double secondFf) =>
        MeasurementComparison.Of(Capacitance.FromFarad(firstFf * 1e-15), Capacitance.FromFarad(secondFf * 1e-15));

    // The value a share of the way through the sorted ones, unbiased towards the median: rank (n + 1/3) p + 1/3.
    private static double AtRank(double[] values, double share)
    {
        var sorted = values.Order().ToList();
        var rank = Math.Clamp(((sorted.Count + (1.0 / 3)) * share) + (1.0 / 3), 1, sorted.Count);
        var below = (int)Math.Floor(rank + 1e-9);
        return sorted[below - 1] + ((rank - below) * (sorted[Math.Min(below, sorted.Count - 1)] - sorted[below - 1]));
    }

    private static CrystalParameters Quartz(double hertz, double cmFf, double c0Pf, double rmOhm) =>
        new(Frequency.FromHertz(hertz), Capacitance.FromFarad(cmFf * 1e-15), Capacitance.FromPicofarad(c0Pf), Resistance.FromOhm(rmOhm));
}
