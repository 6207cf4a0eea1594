using ClubBench.Calculation.Measuring;
using ClubBench.Calculation.Quantities;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Measuring;

public class MeasuringTests
{
    public static TheoryData<ReferenceRow> Voltages => ReferenceTable.Theory("rf_voltage");

    public static TheoryData<ReferenceRow> Directivities => ReferenceTable.Theory("directivity");

    [Theory]
    [Evidence(typeof(RfVoltage), EvidenceKind.RoundTrip)]
    [Evidence(typeof(RfVoltage), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Voltages))]
    public void RfVoltage_Power_MatchesTheRowBothWays(ReferenceRow row)
    {
        var power = Power.FromWatt(row.Number("power_w"));

        Assert.Equal(row.Number("dbm"), power.ToLevel().Dbm, row.Number("tolerance"));
        Assert.Equal(row.Number("peak_to_peak_v"), RfVoltage.PeakToPeak(power, FiftyOhm).Volt, row.Number("tolerance"));
        Assert.Equal(row.Number("rms_v"), RfVoltage.Rms(power, FiftyOhm).Volt, row.Number("tolerance"));
        Assert.Equal(power.Watt, RfVoltage.FromPeakToPeak(RfVoltage.PeakToPeak(power, FiftyOhm), FiftyOhm).Watt, 1e-9);
        Assert.Equal(power.Watt, RfVoltage.FromRms(RfVoltage.Rms(power, FiftyOhm), FiftyOhm).Watt, 1e-9);
    }

    [Fact]
    public void ShareShown_HundredMegahertzScopeAt30_IsAbout4PercentLow() =>
        Assert.Equal(0.96, RfVoltage.ShareShown(Frequency.FromMegahertz(30), Frequency.FromMegahertz(100)), 0.005);

    [Theory]
    [Evidence(typeof(PeakDetector), EvidenceKind.RoundTrip)]
    [InlineData(21.7, 1, 4.973)]
    [InlineData(10.1, 2, 4.580)]
    public void PeakDetector_Reading_MatchesWorkedFigures(double volt, double divider, double watt)
    {
        var detector = new PeakDetector(Voltage.FromVolt(0.6), divider, FiftyOhm);

        Assert.True(detector.TryPower(Voltage.FromVolt(volt), out var power));
        Assert.Equal(watt, power.Watt, 5e-4);
        Assert.Equal(volt, detector.Reading(power).Volt, 1e-9);
    }

    [Fact]
    public void PeakDetector_BelowOneVolt_IsNotTrusted() =>
        Assert.False(new PeakDetector(Voltage.FromVolt(0.3), 1, FiftyOhm).TryPower(Voltage.FromVolt(0.9), out _));

    [Fact]
    [Evidence(typeof(PeakDetector), EvidenceKind.ClosedFormLimit)]
    public void PeakDetector_PowerTooSmallForTheDiode_ReadsNothing() =>
        Assert.Equal(0, new PeakDetector(Voltage.FromVolt(0.6), 1, FiftyOhm).Reading(Power.FromMilliwatt(1)).Volt);

    [Theory]
    [Evidence(typeof(ReturnLossInterval), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Directivities))]
    public void ReturnLossInterval_Reading_MatchesTheRow(ReferenceRow row)
    {
        var interval = ReturnLossInterval.Of(Decibels.FromDb(row.Number("reading_db")), Decibels.FromDb(row.Number("directivity_db")));

        Assert.Equal(row.Number("least_db"), interval.Least.Db, 0.01);
        Assert.Equal(row.Number("most_db"), interval.Most!.Value.Db, row.Number("tolerance"));
    }

    [Fact]
    [Evidence(typeof(ReturnLossInterval), EvidenceKind.ClosedFormLimit)]
    public void ReturnLossInterval_ReadingAtTheDirectivity_LeavesAPerfectMatchPossible() =>
        Assert.Null(ReturnLossInterval.Of(Decibels.FromDb(25), Decibels.FromDb(25)).Most);

    [Fact]
    [Evidence(typeof(TwoTone), EvidenceKind.ClosedFormLimit)]
    public void TwoTone_Crest_GivesTheThreePowers()
    {
        var tones = TwoTone.FromCrest(Voltage.FromVolt(20), FiftyOhm);

        Assert.Equal(4, tones.PeakEnvelope.Watt, 1e-9);
        Assert.Equal(2, tones.Average.Watt, 1e-9);
        Assert.Equal(-6.02, (tones.EachTone.ToLevel() - tones.PeakEnvelope.ToLevel()).Db, 0.001);
        Assert.Equal(36.02, TwoTone.BelowPeak(Decibels.FromDb(30)).Db, 0.001);
    }
}
