using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class FreeRunningTests
{
    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("free-running");

    [Theory]
    [Evidence(typeof(FreeRunning), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(Bandspread), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(TemperatureBudget), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Rows))]
    public void FreeRunning_ReferenceRow_GivesThePrintedFigure(ReferenceRow row) =>
        Assert.Equal(row.Number("expected"), Figure(row), row.Number("tolerance"));

    [Fact]
    [Evidence(typeof(Bandspread), EvidenceKind.RoundTrip)]
    public void Bandspread_AppliedToItsRange_ReachesBothEnds()
    {
        var range = FrequencyRange.FromMegahertz(3.5, 3.58);

        var spread = Bandspread.For(range, Pf(12), Pf(55))!;

        Assert.Equal(3.5, TunedCircuit.ResonantFrequency(spread.Coil, spread.Fixed + Pf(55)).Megahertz, 1e-9);
        Assert.Equal(3.58, TunedCircuit.ResonantFrequency(spread.Coil, spread.Fixed + Pf(12)).Megahertz, 1e-9);
    }

    [Fact]
    public void Bandspread_SwingTooSmall_HasNoSolution() =>
        Assert.Null(Bandspread.For(FrequencyRange.FromMegahertz(3.5, 7), Pf(12), Pf(40)));

    [Fact]
    public void BandspreadBehind_SeriesCapacitor_ShrinksTheSwing()
    {
        var (minimum, maximum) = Bandspread.Behind(Pf(82), Pf(10), Pf(140));

        Assert.Equal(8.913, minimum.Picofarad, 0.001);
        Assert.Equal(51.712, maximum.Picofarad, 0.001);
    }

    [Fact]
    [Evidence(typeof(TemperatureBudget), EvidenceKind.RoundTrip)]
    public void CompensatingShare_Applied_LeavesNoDrift()
    {
        var share = TemperatureBudget.CompensatingShare(95, 0, -150)!.Value;

        Assert.Equal(0, TemperatureBudget.PpmPerKelvin(95, [new(Pf(100 * share), -150), new(Pf(100 * (1 - share)), 0)]), 1e-9);
    }

    [Theory]
    [InlineData(200, -150)]
    [InlineData(95, 150)]
    public void CompensatingShare_TypeThatCannotDoIt_HasNoSolution(double coil, double type) =>
        Assert.Null(TemperatureBudget.CompensatingShare(coil, 0, type));

    [Theory]
    [Evidence(typeof(OscillatorChoice), EvidenceKind.ClosedFormLimit)]
    [InlineData(7.000, 7.040, OscillatorKind.FreeRunning)]
    [InlineData(10.100, 10.130, OscillatorKind.StretchedCrystals)]
    [InlineData(14.055, 14.065, OscillatorKind.OneCrystal)]
    [InlineData(21.000, 21.070, OscillatorKind.StretchedCrystals)]
    [InlineData(3.555, 3.561, OscillatorKind.TwoCrystals)]
    [InlineData(14.045, 14.075, OscillatorKind.TwoCrystals)]
    [InlineData(28.050, 28.070, OscillatorKind.MultipliedCrystal)]
    [InlineData(14.000, 14.350, OscillatorKind.PremixOrDigital)]
    public void ChoiceFor_Range_FollowsItsCoverage(double low, double high, OscillatorKind expected) =>
        Assert.Equal(expected, OscillatorChoice.For(FrequencyRange.FromMegahertz(low, high)));

    private static double Figure(ReferenceRow row)
    {
        var (a, b) = (row.Number("a"), row.Number("b"));
        var c = row.Has("c") ? row.Number("c") : 0;
        var d = row.Has("d") ? row.Number("d") : 0;
        return row["quantity"] switch
        {
            "colpitts_mhz" => Megahertz(a, FreeRunning.Colpitts(Pf(d), new FeedbackPair(Pf(b), Pf(c)))),
            "clapp_mhz" => Megahertz(a, FreeRunning.Clapp(new FeedbackPair(Pf(b), Pf(c)), Pf(d))),
            "seiler_mhz" => Megahertz(a, FreeRunning.Seiler(Pf(d), new FeedbackPair(Pf(b), Pf(b)), Pf(c))),
            "hartley_mhz" => Megahertz(FreeRunning.Hartley(Uh(a * 0.6), Uh(a * 0.2), Uh(a * 0.1)).Microhenry, Pf(b)),
            "spread_pf" => Bandspread.For(FrequencyRange.FromMegahertz(a, b), Pf(c), Pf(d))!.Fixed.Picofarad,
            "spread_uh" => Bandspread.For(FrequencyRange.FromMegahertz(a, b), Pf(c), Pf(d))!.Coil.Microhenry,
            "ppm" => TemperatureBudget.PpmPerKelvin(a, [new(Pf(b), 0), new(Pf(c), d)]),
            "share" => TemperatureBudget.CompensatingShare(a, b, c)!.Value,
            "highest_mhz" => TemperatureBudget.HighestFrequency(a, b, TemperatureRise.FromKelvin(c)).Megahertz,
            "shift_hz" => FreeRunning.ShiftHertz(Frequency.FromMegahertz(a), b, Pf(c)),
            "drift_hz" => TemperatureBudget.DriftHertz(Frequency.FromMegahertz(a), b, TemperatureRise.FromKelvin(c)),
            "coverage_percent" => 100 * OscillatorChoice.Coverage(FrequencyRange.FromMegahertz(a, b)),
            var other => throw new InvalidOperationException(other),
        };
    }

    private static double Megahertz(double microhenry, Capacitance total) => TunedCircuit.ResonantFrequency(Uh(microhenry), total).Megahertz;

    private static Inductance Uh(double microhenry) => Inductance.FromMicrohenry(microhenry);
}
