using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Quantities;

namespace ClubBench.Calculation.Tests.Crystals;

public class ResonatorKindTests
{
    private static readonly QuartzPlate Plate = new(Frequency.FromMegahertz(10), Length.FromMillimetre(5));

    private static readonly CrystalParameters Ceramic =
        new(Frequency.FromMegahertz(3.92), Capacitance.FromPicofarad(4), Capacitance.FromPicofarad(25), default) { Kind = ResonatorKind.Ceramic };

    public static TheoryData<ReferenceRow> Plates => ReferenceTable.Theory("quartz-plate");

    [Theory]
    [Evidence(typeof(QuartzPlate), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Plates))]
    public void Plate_ReferenceRow_GivesItsFigure(ReferenceRow row)
    {
        var plate = new QuartzPlate(Frequency.FromMegahertz(row.Number("fundamental_mhz")), Length.FromMillimetre(row.Number("electrode_mm")));

        var figure = row["quantity"] == "electrodes_pf" ? plate.ElectrodeCapacitance.Picofarad : plate.MotionalCapacitance().Usual.Farad * 1e15;

        Assert.Equal(row.Number("expected"), figure, row.Number("tolerance"));
    }

    [Fact]
    [Evidence(typeof(QuartzPlate), EvidenceKind.Identity)]
    public void Plate_TwiceTheFrequency_HasHalfTheThicknessAndTwiceTheCapacitance()
    {
        var doubled = Plate with { Fundamental = Frequency.FromMegahertz(20) };

        Assert.Equal(0.5, doubled.Thickness / Plate.Thickness, 1e-12);
        Assert.Equal(2, doubled.ElectrodeCapacitance / Plate.ElectrodeCapacitance, 1e-12);
    }

    [Fact]
    public void Plate_SameFrequencyOnAnOvertone_HasItsMotionalCapacitanceByTheCube()
    {
        // The plate for an overtone is n times as thick.
        var third = new QuartzPlate(Frequency.FromMegahertz(10.0 / 3), Length.FromMillimetre(5));

        Assert.Equal(27, Plate.MotionalCapacitance().Usual / third.MotionalCapacitance(3).Usual, 1e-9);
    }

    [Fact]
    public void Plate_FundamentalOfTheTypicalTable_LiesAmongItsCrystals()
    {
        var typical = TypicalCrystals.Nearest(Frequency.FromMegahertz(10))!;

        Assert.InRange(Plate.MotionalCapacitance().Usual.Farad, typical.MotionalCapacitance.Low.Farad, typical.MotionalCapacitance.High.Farad);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(2)]
    public void Plate_EvenOvertone_Throws(int overtone) => Assert.Throws<ArgumentOutOfRangeException>(() => Plate.MotionalCapacitance(overtone));

    [Fact]
    public void Ceramic_TypicalResonator_IsPlausibleAndAQuartzIsNot()
    {
        Assert.True(CeramicResonators.IsPlausible(Ceramic));
        Assert.False(CeramicResonators.IsPlausible(Ceramic with { StaticCapacitance = Capacitance.FromPicofarad(1000) }));
        Assert.False(CeramicResonators.IsPlausible(Ceramic with { MotionalResistance = Resistance.FromOhm(1000) }));
    }

    [Fact]
    public void Ceramic_ParallelResonance_LiesFiveToTenPerCentUp() =>
        Assert.InRange(Ceramic.ParallelResonance / Ceramic.SeriesResonance, 1.05, 1.10);

    [Fact]
    [Evidence(typeof(CeramicResonators), EvidenceKind.ClosedFormLimit)]
    public void Ceramic_SixtyKelvin_DriftsByItsTolerance() =>
        Assert.Equal(0.003 * 3.92e6, CeramicResonators.LargestDriftHertz(Ceramic.SeriesResonance, TemperatureRise.FromKelvin(60)), 1e-6);

    [Fact]
    [Evidence(typeof(CrystalStability), EvidenceKind.ClosedFormLimit)]
    public void Stability_EconomicalCrystalAt14Megahertz_MayBeNearlyAKilohertzOff()
    {
        var reach = CrystalStability.Economical.Reach(Frequency.FromMegahertz(14.06));

        Assert.Equal(65, CrystalStability.Economical.WorstPpm);
        Assert.Equal(2 * 913.9, reach.WidthHertz, 0.1);
        Assert.Equal(14.06, reach.Middle.Megahertz, 1e-9);
        Assert.Equal(0, new CrystalStability(0, 0, 0).Reach(Frequency.FromMegahertz(14.06)).WidthHertz);
    }

    [Theory]
    [Evidence(typeof(MeasurementComparison), EvidenceKind.ClosedFormLimit)]
    [InlineData(17.0, 17.8, MeasurementAgreement.Good)]
    [InlineData(17.0, 18.5, MeasurementAgreement.Fair)]
    [InlineData(17.0, 19.0, MeasurementAgreement.SuspectFixture)]
    public void Comparison_TwoMethods_IsJudgedByTheirDifference(double first, double second, MeasurementAgreement expected)
    {
        Assert.Equal(expected, MeasurementComparison.Of(Capacitance.FromFarad(first * 1e-15), Capacitance.FromFarad(second * 1e-15)));
        Assert.Equal(expected, MeasurementComparison.Of(Capacitance.FromFarad(second * 1e-15), Capacitance.FromFarad(first * 1e-15)));
    }
}
