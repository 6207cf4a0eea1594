using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Networks;

public class LadderDerivativesTests
{
    public static TheoryData<ReferenceRow> Delays => ReferenceTable.Theory("group_delay");

    public static TheoryData<ReferenceRow> Slopes => ReferenceTable.Theory("ladder_sensitivity");

    [Theory]
    [MemberData(nameof(Delays))]
    public void GroupDelay_ChebyshevFive_MatchesDifferencesOfNodalAnalysis(ReferenceRow row) => Assert.Equal(
        row.Number("delay_ns"),
        Derivatives(F7.ToLadder(), row.Number("frequency_mhz")).GroupDelaySecond * 1e9,
        row.Number("delay_ns") * row.Number("relative_tolerance"));

    [Theory]
    [MemberData(nameof(Slopes))]
    public void Sensitivities_ChebyshevFive_MatchDifferencesOfNodalAnalysis(ReferenceRow row)
    {
        var arms = Derivatives(F7.ToLadder(), row.Number("frequency_mhz")).Sensitivities;

        // The figures are slopes of the gain, the product tells slopes of the loss.
        Assert.All(
            row.Numbers("gain_per_percent_db").Zip(arms),
            x => Assert.Equal(-x.First, (x.Second.LossPerPercentCoil ?? x.Second.LossPerPercentCapacitor)!.Value.Db, row.Number("tolerance")));
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
