using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Oscillators.PulledCrystals;

namespace ClubBench.Calculation.Tests.Oscillators;

public class OscillatorStartUpTests
{
    private const double Gm = 0.020;

    private static readonly LoopTemperatureCoefficients Parts = new(95, 100, 0, -0.3);

    public static TheoryData<ReferenceRow> Rows => ReferenceTable.Theory("start-up-and-drift");

    public static TheoryData<ReferenceRow> Pairs => ReferenceTable.Theory("negative-resistance");

    public static TheoryData<ReferenceRow> Orders => ReferenceTable.Theory("crystal-order");

    [Theory]
    [MemberData(nameof(Rows))]
    public void Point_ReferenceRow_GivesLossAndDrift(ReferenceRow row)
    {
        var loop = Plain(row);
        var point = loop.PointAt(Pf(row.Number("variable_pf")));

        var figure = row["quantity"] switch
        {
            "crystal_ohm" => point.CrystalResistance.Ohm,
            "loop_ohm" => OscillatorStartUp.LossAt(loop, point, 150).Ohm,
            "drift_ppm" => OscillatorDrift.Ppm(point, Parts, TemperatureRise.FromKelvin(10)),
            "drift_hz" => OscillatorDrift.Hertz(point, Parts, TemperatureRise.FromKelvin(10)),
            var other => throw new InvalidOperationException(other),
        };

        Assert.Equal(row.Number("expected"), figure, row.Number("tolerance"));
    }

    [Theory]
    [MemberData(nameof(Pairs))]
    public void FeedbackPair_ReferenceRow_GivesItsFigure(ReferenceRow row)
    {
        var (gm, f) = (row.Number("gm_ms") * 1e-3, Frequency.FromMegahertz(row.Number("f_mhz")));

        var figure = row["quantity"] switch
        {
            "negative_ohm" => Pair(row).NegativeResistance(gm, f).Ohm,
            "margin" => new OscillatorStartUp(Resistance.FromOhm(row.Number("loop_ohm")), Pair(row).NegativeResistance(gm, f)).Margin,
            _ => FeedbackPair.LargestEqual(gm, f, Resistance.FromOhm(row.Number("loop_ohm")), row.Number("margin")).BaseEmitter.Picofarad,
        };

        Assert.Equal(row.Number("expected"), figure, row.Number("tolerance"));

        static FeedbackPair Pair(ReferenceRow row) => new(Pf(row.Number("pair_pf")), Pf(row.Number("pair_pf")));
    }

    [Theory]
    [InlineData(30, true)]
    [InlineData(31, false)]
    public void SwampsDevice_AFifthOfThePair_IsTheLimit(double devicePf, bool swamps) =>
        Assert.Equal(swamps, (KitAPair with { DeviceInput = Pf(devicePf) }).SwampsDevice);

    [Fact]
    [Evidence(typeof(FeedbackPair), EvidenceKind.Identity)]
    public void NegativeResistance_TwiceTheFrequency_IsAQuarter() =>
        Assert.Equal(
            KitAPair.NegativeResistance(Gm, Frequency.FromMegahertz(7)).Ohm / 4, KitAPair.NegativeResistance(Gm, Frequency.FromMegahertz(14)).Ohm, 1e-9);

    [Fact]
    [Evidence(typeof(FeedbackPair), EvidenceKind.RoundTrip)]
    public void LargestEqual_ForAMarginOfFive_GivesThatMargin()
    {
        var f = Frequency.FromMegahertz(14.06);

        var pair = FeedbackPair.LargestEqual(Gm, f, Resistance.FromOhm(30), 5);

        Assert.Equal(150, pair.NegativeResistance(Gm, f).Ohm, 1e-9);
    }

    [Theory]
    [Evidence(typeof(OscillatorStartUp), EvidenceKind.ClosedFormLimit)]
    [InlineData(89, StartUpVerdict.Doubtful)]
    [InlineData(113.9, StartUpVerdict.StartsSlowly)]
    [InlineData(150, StartUpVerdict.Starts)]
    [InlineData(601, StartUpVerdict.Overdriven)]
    public void Verdict_Against30Ohm_FollowsTheMargin(double negativeOhm, StartUpVerdict expected) =>
        Assert.Equal(expected, new OscillatorStartUp(Resistance.FromOhm(30), Resistance.FromOhm(negativeOhm)).Verdict);

    [Fact]
    public void At_CrystalWithoutResistance_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => OscillatorStartUp.At(KitA30, Pf(50), 60, KitAPair, Gm));

    [Fact]
    public void At_PlainOscillator_HasTheMarginOfItsParts()
    {
        var pair = new FeedbackPair(Pf(200), Pf(200));

        var startUp = OscillatorStartUp.At(Plain(7.03, 18, 4.5, 22), Pf(10), 150, pair, Gm);

        Assert.Equal(pair.NegativeResistance(Gm, Frequency.FromHertz(7_033_257.7)).Ohm / 40.37, startUp.Margin, 0.02);
    }

    [Theory]
    [Evidence(typeof(CrystalOrder), EvidenceKind.RoundTrip)]
    [Evidence(typeof(CrystalOrder), EvidenceKind.Identity)]
    [MemberData(nameof(Orders))]
    public void OrderForTop_ReferenceRow_GivesFrequencyAndGuaranteedSpan(ReferenceRow row)
    {
        var loop = Plain(7, row.Number("cm_ff"), row.Number("c0_pf"), row.Number("series_uh"));

        var order = CrystalOrder.ForTop(Frequency.FromHertz(row.Number("top_hz")), loop, Pf(30), 20)!;

        Assert.Equal(row.Number("expected_fs_hz"), order.Crystal.SeriesResonance.Hertz, row.Number("tolerance_hz"));
        Assert.Equal(row.Number("expected_order_hz"), order.Marked.Hertz, row.Number("tolerance_hz"));
        Assert.Equal(row.Number("expected_guaranteed_hz"), order.GuaranteedSpanHertz, row.Number("tolerance_hz"));
        Assert.Equal(row.Number("top_hz"), order.Nominal.High.Hertz, 1e-3);
        Assert.True(order.WorstReach.Low < order.GuaranteedLow && order.WorstReach.High > order.GuaranteedHigh);
    }

    [Fact]
    public void OrderKeepsInside_AKilohertzToSpareBelow_AndNotOneHertzLess()
    {
        var order = CrystalOrder.ForTop(Frequency.FromMegahertz(7.035), Plain(7, 18, 4.5, 22), Pf(30), 20)!;
        var (low, high) = (order.WorstReach.Low.Hertz - 1000, order.WorstReach.High);

        Assert.True(order.KeepsInside(new(Frequency.FromHertz(low - 1), high)));
        Assert.False(order.KeepsInside(new(Frequency.FromHertz(low + 1), high)));
        Assert.False(order.KeepsInside(new(Frequency.FromHertz(low - 1), high * (1 - 1e-7))));
    }

    [Fact]
    public void OrderForTop_CoilFarTooLarge_HasNoSolution() =>
        Assert.Null(CrystalOrder.ForTop(Frequency.FromMegahertz(7.035), Plain(7, 18, 4.5, 4000), Pf(30), 20));
}
