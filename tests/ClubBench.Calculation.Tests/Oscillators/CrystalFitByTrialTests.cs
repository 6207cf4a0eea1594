using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class CrystalFitByTrialTests
{
    private static readonly (double Pf, double Hertz)[] Readings =
        [(12, 10_121_830), (22, 10_119_607), (33, 10_118_516), (47, 10_117_790), (68, 10_117_213), (100, 10_116_787), (150, 10_116_466)];

    [Fact]
    [Evidence(typeof(CrystalFit), EvidenceKind.IndependentRecomputation)]
    public void FromLoads_CrystalsAroundTheFitTriedOut_AllMissTheReadingsFurther()
    {
        var crystal = Fit(Readings).Crystal!;
        var (fs, cm, c0) = (crystal.SeriesResonance.Hertz, crystal.MotionalCapacitance.Picofarad, crystal.StaticCapacitance.Picofarad);
        double Misfit(double f, double m, double s) => Readings.Sum(r => Math.Pow(r.Hertz - (f * Math.Sqrt(1 + (m / (s + r.Pf)))), 2));
        int[] steps = [-1, 0, 1];
        var around = from i in steps from j in steps from k in steps where (i, j, k) != (0, 0, 0)
                     select Misfit(fs + (0.5 * i), cm * (1 + (1e-3 * j)), c0 * (1 + (2e-3 * k)));

        Assert.All(around, misfit => Assert.True(misfit > Misfit(fs, cm, c0)));
        Assert.Equal(Math.Sqrt(Misfit(fs, cm, c0) / Readings.Length), Fit(Readings).RmsResidualHertz, 1e-5);
    }

    [Fact]
    [Evidence(typeof(CrystalFit), EvidenceKind.Identity)]
    public void FromLoads_ReadingsInReverse_GiveTheSameCrystalAndResidualsInReverse()
    {
        var (fit, reversed) = (Fit(Readings), Fit([.. Readings.Reverse()]));

        Assert.Equal(fit.Crystal!.SeriesResonance.Hertz, reversed.Crystal!.SeriesResonance.Hertz, 0.01);
        Assert.Equal(fit.Crystal.MotionalCapacitance.Farad, reversed.Crystal.MotionalCapacitance.Farad, 1e-19);
        Assert.All(fit.ResidualsHertz.Zip(reversed.ResidualsHertz.Reverse()), r => Assert.Equal(r.First, r.Second, 0.01));
    }

    private static FittedCrystal Fit((double Pf, double Hertz)[] readings) =>
        CrystalFit.FromLoads([.. readings.Select(r => new LoadedReading(Pf(r.Pf), Frequency.FromHertz(r.Hertz)))]);
}
