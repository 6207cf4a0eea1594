using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Mixing;

public class MixingTests
{
    public static TheoryData<ReferenceRow> Schemes => ReferenceTable.Theory("mixing");

    public static TheoryData<ReferenceRow> Leakages => ReferenceTable.Theory("oscillator-leakage");

    public static TheoryData<ReferenceRow> Levels => ReferenceTable.Theory("oscillator-level");

    [Theory]
    [MemberData(nameof(Schemes))]
    public void Scheme_ReferenceRow_GivesOscillatorImageAndInversion(ReferenceRow row)
    {
        var scheme = Scheme(Enum.Parse<InjectionSide>(row["side"]), row.Number("if_mhz"));
        var signal = Frequency.FromMegahertz(row.Number("rf_mhz"));

        Assert.Equal(row.Number("expected_lo_mhz") * 1e6, scheme.OscillatorFor(signal)!.Value.Hertz, 1.0);
        Assert.Equal(row.Number("expected_image_mhz") * 1e6, scheme.ImageOf(signal)!.Value.Hertz, 1.0);
        Assert.Equal(row["inverts"] == "yes", scheme.InvertsSpectrum);
    }

    [Fact]
    [Evidence(typeof(FrequencyScheme), EvidenceKind.RoundTrip)]
    public void SignalFor_OscillatorOfASignal_ReturnsTheSignal() =>
        Gen.Select(Gen.Double[1.8, 29], Gen.Double[0.455, 11], Gen.Int[2, 4].Select(i => (InjectionSide)i))
            .Sample((rf, mid, side) =>
            {
                var scheme = Scheme(side, mid);
                if (scheme.OscillatorFor(Frequency.FromMegahertz(rf)) is { } lo) Assert.Equal(rf, scheme.SignalFor(lo)!.Value.Megahertz, 1e-9);
            });

    [Theory]
    [Evidence(typeof(FrequencyScheme), EvidenceKind.Identity)]
    [InlineData(InjectionSide.HighSide)]
    [InlineData(InjectionSide.LowSide)]
    [InlineData(InjectionSide.SumToIntermediate)]
    public void ImageOf_AnySide_MixesToTheSameIntermediate(InjectionSide side)
    {
        var (scheme, signal) = (Scheme(side, 9), Frequency.FromMegahertz(side == InjectionSide.SumToIntermediate ? 3.56 : 14.06));
        var (lo, image) = (scheme.OscillatorFor(signal)!.Value.Hertz, scheme.ImageOf(signal)!.Value.Hertz);

        Assert.Contains(9e6, new[] { Math.Abs(lo - image), lo + image }, new HertzComparer());
    }

    [Fact]
    [Evidence(typeof(FrequencyScheme), EvidenceKind.ClosedFormLimit)]
    public void OscillatorFor_LowSideBelowTheIntermediate_HasNoSolution() =>
        Assert.Null(Scheme(InjectionSide.LowSide, 9).OscillatorFor(Frequency.FromMegahertz(7.03)));

    [Fact]
    [Evidence(typeof(FrequencyScheme), EvidenceKind.ClosedFormLimit)]
    public void DirectConversion_Oscillator_IsTheSignal()
    {
        var signal = Frequency.FromMegahertz(10.116);

        Assert.Equal(signal, FrequencyScheme.DirectConversion.OscillatorFor(signal));
        Assert.Null(FrequencyScheme.DirectConversion.ImageOf(signal));
    }

    [Fact]
    public void Scheme_DirectConversionWithIntermediate_Throws() =>
        Assert.Throws<ArgumentException>(() => new FrequencyScheme(InjectionSide.DirectConversion, Frequency.FromMegahertz(9)));

    [Fact]
    public void OscillatorFor_Band_RunsBackwardsWithTheSum()
    {
        var range = Scheme(InjectionSide.SumToIntermediate, 6).OscillatorFor(FrequencyRange.FromMegahertz(3.5, 3.58))!.Value;

        Assert.Equal((2.42, 2.5), (Math.Round(range.Low.Megahertz, 9), Math.Round(range.High.Megahertz, 9)));
    }

    [Theory]
    [InlineData(InjectionSide.LowSide, 10.7, 21.0, 21.45, SchemeIssue.OscillatorEqualsIntermediate)]
    [InlineData(InjectionSide.HighSide, 0.455, 14.0, 14.35, SchemeIssue.ImageTooClose)]
    [InlineData(InjectionSide.HighSide, 7.1, 7.0, 7.2, SchemeIssue.IntermediateInBand)]
    [InlineData(InjectionSide.LowSide, 9, 18.0, 18.168, SchemeIssue.IntermediateHarmonicInBand)]
    [InlineData(InjectionSide.LowSide, 9, 7.0, 7.2, SchemeIssue.NoOscillator)]
    public void IssuesOver_PlantedFault_IsNamed(InjectionSide side, double mid, double low, double high, SchemeIssue expected) =>
        Assert.Contains(expected, Scheme(side, mid).IssuesOver(FrequencyRange.FromMegahertz(low, high)));

    [Fact]
    public void IssuesOver_20MetresWith9MegahertzLow_AreNone() =>
        Assert.Empty(Scheme(InjectionSide.LowSide, 9).IssuesOver(FrequencyRange.FromMegahertz(14.0, 14.35)));

    [Theory]
    [Evidence(typeof(OscillatorLevel), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Levels))]
    public void FromPeakToPeak_ReferenceRow_GivesTheLevel(ReferenceRow row) =>
        Assert.Equal(
            row.Number("expected_dbm"),
            OscillatorLevel.FromPeakToPeak(Voltage.FromVolt(row.Number("vpp")), Resistance.FromOhm(row.Number("load_ohm"))).Dbm,
            row.Number("tolerance_db"));

    [Fact]
    [Evidence(typeof(OscillatorLevel), EvidenceKind.RoundTrip)]
    public void PeakToPeak_OfALevel_GoesBack() =>
        Assert.Equal(1.3, OscillatorLevel.PeakToPeak(OscillatorLevel.FromPeakToPeak(Voltage.FromVolt(1.3), Resistance.FromOhm(50)), Resistance.FromOhm(50)).Volt, 1e-12);

    [Theory]
    [InlineData(3.9, MixerDrive.UnderDriven)]
    [InlineData(4.0, MixerDrive.Right)]
    [InlineData(10.0, MixerDrive.Right)]
    [InlineData(10.1, MixerDrive.OverDriven)]
    public void Judge_RingWantingPlus7_HasAWindowOf3Decibels(double dbm, MixerDrive expected) =>
        Assert.Equal(expected, OscillatorLevel.Judge(PowerLevel.FromDbm(dbm), PowerLevel.FromDbm(7)));

    [Theory]
    [Evidence(typeof(OscillatorLevel), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Leakages))]
    public void AtAntenna_ReferenceRow_GivesTheLevel(ReferenceRow row) => Assert.Equal(
        row.Number("expected_dbm"),
        OscillatorLevel.AtAntenna(
            PowerLevel.FromDbm(row.Number("oscillator_dbm")), Decibels.FromDb(row.Number("isolation_db")), Decibels.FromDb(row.Number("other_loss_db"))).Dbm,
        row.Number("tolerance_db"));

    [Theory]
    [InlineData(0)]
    [InlineData(-3)]
    public void AtAntenna_WithoutIsolation_Throws(double isolationDb) => Assert.Throws<ArgumentOutOfRangeException>(
        () => OscillatorLevel.AtAntenna(PowerLevel.FromDbm(7), Decibels.FromDb(isolationDb), Decibels.Zero));

    [Fact]
    public void MixerFigures_EveryKind_HasOrderedTypicalFigures()
    {
        Assert.Equal(Enum.GetValues<MixerKind>().Where(k => k != MixerKind.Unknown).Order(), MixerFigures.All.Keys.Order());
        Assert.All(MixerFigures.All.Values, m => Assert.True(m.Gain.Low <= m.Gain.High && m.NoiseFigure.Low <= m.NoiseFigure.High));
        Assert.Equal(3.92, MixerFigures.IdealSwitchingLoss.Db, 0.005);
    }

    [Fact]
    [Evidence(typeof(MixerFigures), EvidenceKind.Identity)]
    public void MixerFigures_DiodeMixers_HaveTheNoiseFigureOfTheirLoss() =>
        Assert.All(new[] { MixerKind.DiodeRingLevel7, MixerKind.SingleBalancedDiodes }.Select(k => MixerFigures.All[k]), m =>
        {
            Assert.Equal(m.NoiseFigure.Low.Db, MixerFigures.PassiveNoiseFigure(-m.Gain.High).Db, 1e-9);
            Assert.Equal(m.NoiseFigure.High.Db, MixerFigures.PassiveNoiseFigure(-m.Gain.Low).Db, 1e-9);
        });

    [Fact]
    public void MixerFigures_PassiveMixers_LoseMoreThanAnIdealSwitch() =>
        Assert.All(
            MixerFigures.All.Values.Where(m => m.Gain.High < Decibels.Zero),
            m => Assert.True(-m.Gain.High >= MixerFigures.IdealSwitchingLoss));

    private static FrequencyScheme Scheme(InjectionSide side, double intermediateMhz) => new(side, Frequency.FromMegahertz(intermediateMhz));

    private sealed class HertzComparer : IEqualityComparer<double>
    {
        public bool Equals(double x, double y) => Math.Abs(x - y) < 1e-3;

        public int GetHashCode(double obj) => 0;
    }
}
