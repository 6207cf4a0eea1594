using System.Globalization;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Text;
using CsCheck;

namespace ClubBench.Planning.Tests.Text;

public class QuantityTextFormatTests
{
    private static readonly CultureInfo English = CultureInfo.GetCultureInfo("en-GB");

    [Theory]
    [InlineData(QuantityKind.Frequency, 14.06e6, "14.060 MHz")]
    [InlineData(QuantityKind.Frequency, 7.03e6, "7.030 MHz")]
    [InlineData(QuantityKind.Frequency, 4.9152e6, "4.9152 MHz")]
    [InlineData(QuantityKind.Frequency, 10.11123e6, "10.111 MHz")]
    [InlineData(QuantityKind.Frequency, 455e3, "455 kHz")]
    [InlineData(QuantityKind.Frequency, 701.4, "701 Hz")]
    [InlineData(QuantityKind.Capacitance, 20.4e-15, "20.4 fF")]
    [InlineData(QuantityKind.Capacitance, 0, "0 pF")]
    [InlineData(QuantityKind.Capacitance, 0.2e-12, "0.2 pF")]
    [InlineData(QuantityKind.FrequencyShift, -882, "−882 Hz")]
    [InlineData(QuantityKind.FrequencyShift, -1441, "−1.44 kHz")]
    [InlineData(QuantityKind.FrequencyShift, 700, "+700 Hz")]
    [InlineData(QuantityKind.Inductance, 0.675e-6, "0.675 µH")]
    [InlineData(QuantityKind.Inductance, 20e-9, "20 nH")]
    [InlineData(QuantityKind.Inductance, 10e-6, "10 µH")]
    [InlineData(QuantityKind.Inductance, 1e-3, "1 mH")]
    [InlineData(QuantityKind.Capacitance, 270e-12, "270 pF")]
    [InlineData(QuantityKind.Capacitance, 2.2e-9, "2.2 nF")]
    [InlineData(QuantityKind.Capacitance, 999.9e-12, "1.00 nF")]
    [InlineData(QuantityKind.Capacitance, 470e-6, "470 µF")]
    [InlineData(QuantityKind.Resistance, 4700, "4.7 kΩ")]
    [InlineData(QuantityKind.Resistance, 4.7, "4.7 Ω")]
    [InlineData(QuantityKind.Resistance, 1e6, "1 MΩ")]
    [InlineData(QuantityKind.Voltage, 0.35, "350 mV")]
    [InlineData(QuantityKind.PeakToPeakVoltage, 0.25, "250 mV p-p")]
    [InlineData(QuantityKind.Current, 0.03, "30 mA")]
    [InlineData(QuantityKind.Power, 1.1834, "1.18 W")]
    [InlineData(QuantityKind.Power, 0.094, "94 mW")]
    [InlineData(QuantityKind.PowerLevel, -73.04, "−73.0 dBm")]
    [InlineData(QuantityKind.Decibels, -0.199, "−0.2 dB")]
    [InlineData(QuantityKind.Decibels, 43, "43 dB")]
    [InlineData(QuantityKind.RelativeLevel, -51.47, "−51.5 dBc")]
    [InlineData(QuantityKind.Ratio, 0.0577, "5.8 %")]
    [InlineData(QuantityKind.Ratio, 1.341, "134 %")]
    [InlineData(QuantityKind.Temperature, 63.2, "63 °C")]
    [InlineData(QuantityKind.Temperature, 112.4, "112 °C")]
    [InlineData(QuantityKind.TemperatureRise, 41.3, "41 K")]
    [InlineData(QuantityKind.Length, 0.4e-3, "0.4 mm")]
    [InlineData(QuantityKind.Length, 0.29, "290 mm")]
    [InlineData(QuantityKind.Duration, 5e-3, "5 ms")]
    [InlineData(QuantityKind.FluxDensity, 0.0767, "76.7 mT")]
    [InlineData(QuantityKind.InductanceFactor, 3.136e-9, "3.14 nH/turn²")]
    [InlineData(QuantityKind.Count, 15, "15")]
    [InlineData(QuantityKind.Number, 2.948, "2.95")]
    [InlineData(QuantityKind.Angle, 44.96, "45.0°")]
    public void Format_UsualValue_ReadsAsTheTradeWritesIt(QuantityKind kind, double si, string text) =>
        Assert.Equal(text.Replace(' ', '\u00A0').Replace("\u00A0p-p", " p-p", StringComparison.Ordinal), QuantityText.Format(kind, si, culture: English));

    [Fact]
    public void Format_ComputedFigure_KeepsItsZeros()
    {
        var computed = Figure.Of("inductance", Inductance.FromMicrohenry(0.9));
        var stated = Figure.Stated("inductance", QuantityKind.Inductance, 0.9e-6);

        Assert.Equal("0.900\u00A0µH", QuantityText.Format(computed, English));
        Assert.Equal("0.9\u00A0µH", QuantityText.Format(stated, English));
    }

    [Fact]
    public void Format_FigureWithDigits_ShowsNoMore()
    {
        var figure = new Figure("f", QuantityKind.Frequency, 14.0523456e6, Digits: 6);

        Assert.Equal("14.0523\u00A0MHz", QuantityText.Format(figure, English));
    }

    [Theory]
    [InlineData("de-DE", "−0,7 dB")]
    [InlineData("fi-FI", "−0,7 dB")]
    [InlineData("en-GB", "−0.7 dB")]
    public void Format_NegativeValue_HasTrueMinusAndTheCulturesMark(string culture, string text) =>
        Assert.Equal(text.Replace(' ', '\u00A0'), QuantityText.Format(QuantityKind.Decibels, -0.7, culture: CultureInfo.GetCultureInfo(culture)));

    [Fact]
    public void Format_NearlyZeroNegative_HasNoSign() =>
        Assert.Equal("0.0\u00A0dB", QuantityText.Format(QuantityKind.Decibels, -0.001, culture: English));

    [Fact]
    public void Format_NotFinite_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => QuantityText.Format(QuantityKind.Power, double.NaN));

    [Fact]
    public void FormatUncertain_KnownUncertainty_RoundsTheValueToIt()
    {
        var figure = new Figure("L", QuantityKind.Inductance, 0.71412e-6, 0.0203e-6, Provenance.Measured);

        Assert.Equal("0.714 ± 0.020\u00A0µH", QuantityText.FormatUncertain(figure, English));
    }

    [Fact]
    public void FormatSpan_TwoEnds_ShareOneUnit()
    {
        Assert.Equal("10.111–10.124\u00A0MHz", QuantityText.Format(FrequencyRange.FromMegahertz(10.111, 10.124), culture: English));
        Assert.Equal("0.65–0.71\u00A0µH", QuantityText.FormatSpan(QuantityKind.Inductance, 0.65e-6, 0.71e-6, culture: English));
        Assert.Equal("−43…−38\u00A0dBc", QuantityText.FormatSpan(QuantityKind.RelativeLevel, -43, -38, culture: English));
    }

    [Fact]
    public void Format_ThenParse_GivesTheValueBackToItsDigits()
    {
        QuantityKind[] notByDigits = [QuantityKind.Count, QuantityKind.Ratio, QuantityKind.Angle, QuantityKind.Number];
        var kinds = Enum.GetValues<QuantityKind>().Except(notByDigits).ToArray();
        var sample = Gen.Select(Gen.Int[0, kinds.Length - 1], Gen.Double[1, 10], Gen.Int[-5, 6], (kind, mantissa, exponent) => (kind: kinds[kind], si: mantissa * Math.Pow(10, exponent)));

        sample.Sample(s =>
        {
            var back = QuantityText.Parse(QuantityText.Format(s.kind, s.si, 6, English), s.kind);

            Assert.Equal(s.si, back.Value.Si, 1e-5 * s.si);
        });
    }
}
