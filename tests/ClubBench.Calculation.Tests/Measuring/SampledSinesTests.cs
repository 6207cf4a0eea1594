using System.Numerics;
using ClubBench.Calculation.Measuring;
using ClubBench.Calculation.Quantities;
using CsCheck;
using static ClubBench.Calculation.Tests.Filters.ReferenceFilters;

namespace ClubBench.Calculation.Tests.Measuring;

public class SampledSinesTests
{
    private const int Samples = 100_000;

    [Fact]
    [Evidence(typeof(RfVoltage), EvidenceKind.IndependentRecomputation)]
    public void FromPeakToPeak_SineSampledOverACycle_IsItsMeanPower()
    {
        var meanSquare = Cycle().Average(angle => Math.Pow(22.36 * Math.Sin(angle), 2));

        Assert.Equal(meanSquare / 50, RfVoltage.FromPeakToPeak(Voltage.FromVolt(2 * 22.36), FiftyOhm).Watt, 1e-9);
        Assert.Equal(meanSquare / 50, RfVoltage.FromRms(Voltage.FromVolt(Math.Sqrt(meanSquare)), FiftyOhm).Watt, 1e-9);
    }

    [Fact]
    [Evidence(typeof(RfVoltage), EvidenceKind.ClosedFormLimit)]
    public void ShareShown_AtTheBandwidth_IsHalfThePower()
    {
        Assert.Equal(Math.Sqrt(0.5), RfVoltage.ShareShown(Frequency.FromMegahertz(20), Frequency.FromMegahertz(20)), 1e-12);
        Assert.Equal(1, RfVoltage.ShareShown(Frequency.FromHertz(50), Frequency.FromMegahertz(20)), 1e-9);
    }

    [Fact]
    [Evidence(typeof(PeakDetector), EvidenceKind.ClosedFormLimit)]
    public void TryPower_IdealDiode_IsThatOfTheSine()
    {
        Assert.True(new PeakDetector(default, 1, FiftyOhm).TryPower(Voltage.FromVolt(10), out var power));

        Assert.Equal(1, power.Watt, 1e-12);
    }

    [Fact]
    [Evidence(typeof(PeakDetector), EvidenceKind.Identity)]
    public void ReverseVoltage_AnyPower_IsTwiceReadingAndDrop() => Gen.Select(Gen.Double[0.1, 100], Gen.Double[1, 5]).Sample((watt, divider) =>
    {
        var detector = new PeakDetector(Voltage.FromVolt(0.3), divider, FiftyOhm);
        Assert.Equal(2 * (detector.Reading(Power.FromWatt(watt)).Volt + 0.3), detector.ReverseVoltage(Power.FromWatt(watt)).Volt, 1e-9);
    });

    [Theory]
    [Evidence(typeof(ReturnLossInterval), EvidenceKind.IndependentRecomputation)]
    [InlineData(20, 30)]
    [InlineData(14, 25)]
    [InlineData(28, 24)]
    public void Interval_LeakTurnedThroughEveryPhase_IsTheSpanOfWhatItMayBe(double readingDb, double directivityDb)
    {
        var losses = Cycle().Select(angle => -20 * Math.Log10((Math.Pow(10, -readingDb / 20) + Complex.FromPolarCoordinates(Math.Pow(10, -directivityDb / 20), angle)).Magnitude)).ToList();

        var interval = ReturnLossInterval.Of(Decibels.FromDb(readingDb), Decibels.FromDb(directivityDb));

        Assert.Equal(losses.Min(), interval.Least.Db, 1e-6);
        Assert.Equal(losses.Max(), interval.Most!.Value.Db, 1e-6);
    }

    [Fact]
    [Evidence(typeof(ReturnLossInterval), EvidenceKind.Identity)]
    public void Interval_ReadingAndDirectivityExchanged_IsTheSameAndHoldsTheReading() => Gen.Select(Gen.Double[5, 40], Gen.Double[5, 40]).Sample((a, b) =>
    {
        var interval = ReturnLossInterval.Of(Decibels.FromDb(a), Decibels.FromDb(b));
        Assert.Equal(interval, ReturnLossInterval.Of(Decibels.FromDb(b), Decibels.FromDb(a)));
        Assert.True(interval.Least.Db < Math.Min(a, b));
    });

    [Fact]
    [Evidence(typeof(TwoTone), EvidenceKind.IndependentRecomputation)]
    public void TwoTone_SumSampledOverABeat_HasThatCrestAndMean()
    {
        // Tones on the 200th and 210th harmonic of the beat's period.
        var volts = Cycle().Select(angle => 10 * (Math.Cos(200 * angle) + Math.Cos(210 * angle))).ToList();

        var tones = TwoTone.FromCrest(Voltage.FromVolt(volts.Max(Math.Abs)), FiftyOhm);

        Assert.Equal(volts.Average(v => v * v / 50), tones.Average.Watt, 1e-9);
        Assert.Equal(10 * 10 / 2.0 / 50, tones.EachTone.Watt, 1e-9);
    }

    [Fact]
    [Evidence(typeof(TwoTone), EvidenceKind.Identity)]
    public void TwoTone_AnyPower_TonesAddToTheAverageAndStatementsAgree() => Gen.Select(Gen.Double[0.1, 100], Gen.Double[10, 60]).Sample((watt, belowDb) =>
    {
        var tones = new TwoTone(Power.FromWatt(watt));
        Assert.Equal(tones.Average.Watt, 2 * tones.EachTone.Watt, 1e-9);
        var product = tones.EachTone.ToLevel() - Decibels.FromDb(belowDb);
        Assert.Equal((tones.PeakEnvelope.ToLevel() - product).Db, TwoTone.BelowPeak(Decibels.FromDb(belowDb)).Db, 1e-9);
    });

    private static IEnumerable<double> Cycle() => Enumerable.Range(0, Samples).Select(k => 2 * Math.PI * k / Samples);
}
