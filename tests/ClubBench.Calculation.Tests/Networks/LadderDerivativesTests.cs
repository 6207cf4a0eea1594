using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Networks;

public class LadderDerivativesTests
{
    [Theory]
    [InlineData(1.0, 64.544)]
    [InlineData(7.1, 90.059)]
    [InlineData(8.0, 113.384)]
    public void GroupDelay_ChebyshevFive_MatchesDifferencesOfNodalAnalysis(double megahertz, double nanosecond) =>
        Assert.Equal(nanosecond, Derivatives(F7.ToLadder(), megahertz).GroupDelaySecond * 1e9, nanosecond * 1e-3);

    [Theory]
    [InlineData(7.3, -0.00196, 0.00121, 0.00579)]
    [InlineData(8.0, 0.00354, -0.00662, -0.01555)]
    [InlineData(14.2, -0.07316, -0.12635, -0.12500)]
    public void Sensitivities_ChebyshevFive_MatchDifferencesOfNodalAnalysis(double megahertz, double end, double coil, double middle)
    {
        var arms = Derivatives(F7.ToLadder(), megahertz).Sensitivities;

        // The figures are slopes of the gain (tests/Recomputed/ladder_stress_and_yield.py), the product tells slopes of the loss.
        Assert.Equal(-end, arms[0].LossPerPercentCapacitor!.Value.Db, 2e-4);
        Assert.Equal(-coil, arms[1].LossPerPercentCoil!.Value.Db, 2e-4);
        Assert.Equal(-middle, arms[2].LossPerPercentCapacitor!.Value.Db, 2e-4);
        Assert.Equal(-coil, arms[3].LossPerPercentCoil!.Value.Db, 2e-4);
        Assert.Equal(-end, arms[4].LossPerPercentCapacitor!.Value.Db, 2e-4);
    }

    [Fact]
    public void Sensitivities_TrapsAndLosses_MatchFiniteDifferences()
    {
        var ladder = TrapLadder;
        var arms = Derivatives(ladder, 11).Sensitivities;

        for (var k = 0; k < ladder.Elements.Length; k++)
        {
            Agree(arms[k].LossPerPercentCoil, ladder, k, (1, 0), (l, f) => l.Loss(f, FiftyOhm, FiftyOhm).Db);
            Agree(arms[k].LossPerPercentCapacitor, ladder, k, (0, 1), (l, f) => l.Loss(f, FiftyOhm, FiftyOhm).Db);
            Agree(arms[k].ReturnLossPerPercentCoil, ladder, k, (1, 0), (l, f) => l.ReturnLoss(f, FiftyOhm, FiftyOhm).Db);
            Agree(arms[k].ReturnLossPerPercentCapacitor, ladder, k, (0, 1), (l, f) => l.ReturnLoss(f, FiftyOhm, FiftyOhm).Db);
        }
    }

    [Fact]
    public void GroupDelay_TrapsAndLosses_MatchesThePhaseSlope()
    {
        var f = Frequency.FromMegahertz(11);
        double Phase(double factor) => TrapLadder.At(f * factor).S21(FiftyOhm, FiftyOhm).Phase;

        var slope = -(Phase(1 + 1e-6) - Phase(1 - 1e-6)) / (2e-6 * f.RadiansPerSecond);

        Assert.Equal(slope, Derivatives(TrapLadder, 11).GroupDelaySecond, Math.Abs(slope) * 1e-6);
    }

    private static Ladder TrapLadder => new(
    [
        LadderElement.ShuntTrap(Inductance.FromNanohenry(6), Capacitance.FromPicofarad(300), 100, 1000),
        LadderElement.SeriesTrap(Inductance.FromMicrohenry(0.9), Capacitance.FromPicofarad(62), 150, 1000),
        LadderElement.ShuntCapacitor(Capacitance.FromPicofarad(500), 1000),
        LadderElement.SeriesInductor(Inductance.FromMicrohenry(1), 150),
        LadderElement.ShuntCapacitor(Capacitance.FromPicofarad(250), 1000),
    ]);

    private static LadderDerivatives Derivatives(Ladder ladder, double megahertz) =>
        new(ladder, Frequency.FromMegahertz(megahertz), FiftyOhm, FiftyOhm);

    private static void Agree(Decibels? told, Ladder ladder, int k, (int Coil, int Capacitor) which, Func<Ladder, Frequency, double> value)
    {
        if (told is not { } slope) return;
        double At(double step) => value(
            new Ladder(ladder.Elements.SetItem(k, ladder.Elements[k].Scaled(1 + (which.Coil * step), 1 + (which.Capacitor * step)))),
            Frequency.FromMegahertz(11));

        Assert.Equal((At(1e-6) - At(-1e-6)) / 2e-6 / 100, slope.Db, 1e-7);
    }
}
