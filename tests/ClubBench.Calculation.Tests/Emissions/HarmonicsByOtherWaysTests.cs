using ClubBench.Calculation.Emissions;
using ClubBench.Calculation.Networks;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Emissions;

public class HarmonicsByOtherWaysTests
{
    private static readonly Resistance FiftyOhm = Resistance.FromOhm(50);
    private static readonly Frequency Carrier = Frequency.FromMegahertz(7.1);

    private static readonly Ladder LowPass = new([
        LadderElement.ShuntCapacitor(Capacitance.FromPicofarad(470)),
        LadderElement.SeriesInductor(Inductance.FromMicrohenry(1.2), unloadedQ: 20),
        LadderElement.ShuntCapacitor(Capacitance.FromPicofarad(820))]);

    [Fact]
    [Evidence(typeof(ConductionAngle), EvidenceKind.Identity)]
    public void ConductionAngle_Wider_IsLessEfficientButGivesMoreFundamental() => Gen.Select(Gen.Double[10, 350], Gen.Double[0.1, 10]).Sample((degrees, wider) =>
    {
        var (narrow, wide) = (ConductionAngle.FromDegrees(degrees), ConductionAngle.FromDegrees(degrees + wider));
        Assert.True(wide.Efficiency < narrow.Efficiency);
        Assert.True(wide.DirectCurrent > narrow.DirectCurrent);
        Assert.InRange(narrow.Efficiency, 0.5, 1);
    });

    [Theory]
    [Evidence(typeof(HarmonicSuppression), EvidenceKind.IndependentRecomputation)]
    [InlineData(HarmonicSourceModel.Matched, 50)]
    [InlineData(HarmonicSourceModel.Current, 1e12)]
    [InlineData(HarmonicSourceModel.Voltage, 1e-6)]
    public void Suppression_FilterByItsNodes_Agrees(HarmonicSourceModel model, double sourceOhm)
    {
        double Output(double hertz)
        {
            var w = 2 * Math.PI * hertz;
            return new NodalCircuit(2)
                .Element(1, 0, sourceOhm).Element(1, 0, NodalCircuit.Capacitor(w, 470e-12)).Element(1, 2, NodalCircuit.Coil(w, 1.2e-6) + (w * 1.2e-6 / 20))
                .Element(2, 0, NodalCircuit.Capacitor(w, 820e-12)).Element(2, 0, 50)
                .Voltages(1, 1)[2].Magnitude;
        }

        for (var n = 2; n <= 5; n++)
            Assert.Equal(20 * Math.Log10(Output(7.1e6) / Output(n * 7.1e6)), HarmonicSuppression.Of(LowPass, Carrier, n, FiftyOhm, FiftyOhm, model).Db, 1e-5);
    }

    [Fact]
    [Evidence(typeof(HarmonicSuppression), EvidenceKind.ClosedFormLimit)]
    public void Suppression_SingleCapacitor_IsThatOfOnePoleOrNoneAtAVoltageSource()
    {
        var capacitor = new Ladder([LadderElement.ShuntCapacitor(Capacitance.FromPicofarad(1000))]);
        var x = Carrier.RadiansPerSecond * 1000e-12 * 50;

        Assert.Equal(10 * Math.Log10((1 + (9 * x * x)) / (1 + (x * x))), Of(capacitor, HarmonicSourceModel.Current), 1e-9);
        Assert.Equal(10 * Math.Log10((1 + (9 * x * x / 4)) / (1 + (x * x / 4))), Of(capacitor, HarmonicSourceModel.Matched), 1e-9);
        Assert.Equal(0, Of(capacitor, HarmonicSourceModel.Voltage), 1e-9);

        static double Of(Ladder filter, HarmonicSourceModel model) => HarmonicSuppression.Of(filter, Carrier, 3, FiftyOhm, FiftyOhm, model).Db;
    }

    [Fact]
    [Evidence(typeof(HarmonicSuppression), EvidenceKind.Identity)]
    public void Suppression_ImpedanceScaled_IsTheSameUnderEveryModel() => Gen.Select(Gen.Double[0.2, 5], Gen.Int[2, 5], Gen.Enum<HarmonicSourceModel>()).Sample((scale, n, model) =>
    {
        var scaled = new Ladder(LowPass.Elements.Select(e => e.Scaled(scale, 1 / scale)));
        Assert.Equal(
            HarmonicSuppression.Of(LowPass, Carrier, n, FiftyOhm, FiftyOhm, model).Db,
            HarmonicSuppression.Of(scaled, Carrier, n, FiftyOhm * scale, FiftyOhm * scale, model).Db,
            1e-9);
    });

    [Fact]
    [Evidence(typeof(HarmonicMargin), EvidenceKind.RoundTrip)]
    public void AttenuationNeeded_PutBehindTheStage_LeavesTheWantedMargin() =>
        Gen.Select(Gen.Double[-40, -5], Gen.Double[30, 60], Gen.Double[0, 15], Gen.Double[0, 1]).Sample((rawDb, limitDb, wantedDb, carrierDb) =>
        {
            var needed = HarmonicMargin.AttenuationNeeded(Decibels.FromDb(rawDb), Decibels.FromDb(limitDb), Decibels.FromDb(wantedDb));
            var level = HarmonicMargin.BehindFilter(Level(rawDb, 5), Decibels.FromDb(carrierDb), needed + Decibels.FromDb(carrierDb), Decibels.FromDb(3));
            Assert.Equal(wantedDb, new HarmonicMargin(level, Decibels.FromDb(limitDb)).Margin.Db, 1e-9);
        });

    [Fact]
    [Evidence(typeof(HarmonicMargin), EvidenceKind.Identity)]
    public void BehindFilter_TwoFiltersInEitherOrder_IsTheSame() => Gen.Select(Gen.Double[0, 60], Gen.Double[0, 60], Gen.Double[0, 5], Gen.Double[0, 5]).Sample((a, b, ua, ub) =>
    {
        UncertainLevel Behind(UncertainLevel level, double db, double u) => HarmonicMargin.BehindFilter(level, Decibels.Zero, Decibels.FromDb(db), Decibels.FromDb(u));
        var (first, second) = (Behind(Behind(Level(-12, 5), a, ua), b, ub), Behind(Behind(Level(-12, 5), b, ub), a, ua));
        Assert.Equal(first.Value.Db, second.Value.Db, 1e-9);
        Assert.Equal(first.StandardUncertainty.Db, second.StandardUncertainty.Db, 1e-9);
        Assert.True(first.StandardUncertainty.Db >= 5 - 1e-12);
    });

    [Fact]
    [Evidence(typeof(LearntRawLevel), EvidenceKind.RoundTrip)]
    public void LearntRawLevel_BehindTheSameFilter_ReadsTheMeanAgain() => Gen.Double[-60, -30].Array[1, 9].Sample(readings =>
    {
        var learnt = LearntRawLevel.From([.. readings.Select(db => (Decibels.FromDb(db), Decibels.FromDb(25.11)))], HarmonicMargin.AnalyserUncertainty);
        Assert.Equal(readings.Average(), HarmonicMargin.BehindFilter(learnt.Raw, Decibels.Zero, Decibels.FromDb(25.11), Decibels.FromDb(3)).Value.Db, 1e-9);
    });

    [Fact]
    [Evidence(typeof(LearntRawLevel), EvidenceKind.Identity)]
    public void LearntRawLevel_AllReadingsMovedAlike_MovesTheMeanAndKeepsTheSpread() => Gen.Select(Gen.Double[-60, -30].Array[2, 9], Gen.Double[-10, 10]).Sample((readings, moved) =>
    {
        LearntRawLevel Learn(double by) =>
            LearntRawLevel.From([.. readings.Select(db => (Decibels.FromDb(db + by), Decibels.FromDb(20)))], HarmonicMargin.AnalyserUncertainty);
        Assert.Equal(Learn(0).Raw.Value.Db + moved, Learn(moved).Raw.Value.Db, 1e-9);
        Assert.Equal(Learn(0).SampleDeviation.Db, Learn(moved).SampleDeviation.Db, 1e-9);
        Assert.Equal(Learn(0).Raw.StandardUncertainty.Db, Learn(moved).Raw.StandardUncertainty.Db, 1e-9);
    });

    private static UncertainLevel Level(double db, double uncertaintyDb) => new(Decibels.FromDb(db), Decibels.FromDb(uncertaintyDb));
}
