using System.Globalization;
using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Mixing;

public class TransmitProductsTests
{
    public static TheoryData<ReferenceRow> Cases => ReferenceTable.Theory("transmit-products");

    [Theory]
    [MemberData(nameof(Cases))]
    [Evidence(typeof(TransmitProducts), EvidenceKind.ClosedFormLimit)]
    public void In_Scheme_AreTheProductsOfTheTable(ReferenceRow row)
    {
        var expected = row["products"].Split(' ').Select(p => p.Split(':')).ToList();

        var found = TransmitProducts.In(
            Frequency.FromMegahertz(row.Number("oscillator_mhz")), Frequency.FromMegahertz(row.Number("carrier_mhz")), FrequencyRange.FromMegahertz(row.Number("low_mhz"), row.Number("high_mhz")));

        Assert.Equal(expected.Select(p => (Whole(p[1]), Whole(p[2]))), found.Select(p => (p.OscillatorOrder, p.CarrierOrder)));
        Assert.All(expected.Zip(found), pair => Assert.Equal(double.Parse(pair.First[0], CultureInfo.InvariantCulture) * 1e6, pair.Second.Frequency.Hertz, row.Number("tolerance_hz")));
    }

    [Fact]
    [Evidence(typeof(TransmitProducts), EvidenceKind.Identity)]
    public void In_BothFrequenciesScaled_AreTheSameProductsScaled() =>
        Gen.Select(Gen.Double[1, 30], Gen.Double[1, 30], Gen.Double[0.5, 2]).Sample((lo, fc, k) =>
        {
            var one = TransmitProducts.In(Frequency.FromMegahertz(lo), Frequency.FromMegahertz(fc), FrequencyRange.FromMegahertz(5.000123, 15.000456));
            var scaled = TransmitProducts.In(Frequency.FromMegahertz(lo * k), Frequency.FromMegahertz(fc * k), FrequencyRange.FromMegahertz(5.000123 * k, 15.000456 * k));
            return one.Count == scaled.Count;
        });

    // A distorted product of two sampled sines has its lines where the list says, and nowhere else.
    [Fact]
    [Evidence(typeof(TransmitProducts), EvidenceKind.IndependentRecomputation)]
    public void In_SampledDistortion_HasLinesOnlyThere()
    {
        const int points = 4096;
        const int lo = 192;
        const int fc = 49;
        var samples = Enumerable.Range(0, points).Select(i => Math.Tanh(0.6 * (Math.Cos(2 * Math.PI * lo * i / points) + (0.7 * Math.Cos(2 * Math.PI * fc * i / points)) + 0.3))).ToArray();
        var listed = TransmitProducts.In(Frequency.FromHertz(lo), Frequency.FromHertz(fc), new(Frequency.FromHertz(100), Frequency.FromHertz(420))).Select(p => (int)Math.Round(p.Frequency.Hertz)).ToHashSet();

        var lines = Enumerable.Range(100, 320).Where(bin => Amplitude(samples, bin) > 3e-4).ToList();

        Assert.NotEmpty(lines);
        Assert.All(lines, bin => Assert.Contains(bin, listed));
        Assert.Contains(lo - fc, lines);
        Assert.Contains(lo + fc, lines);
    }

    [Fact]
    public void OscillatorLeak_SevenDbmThroughThirtyFive_StandsOnlyNineHalfDown() =>
        Assert.Equal(-9.5, TransmitProducts.OscillatorLeak(PowerLevel.FromDbm(7), Decibels.FromDb(35), PowerLevel.FromDbm(-18.5)).Db, 0.1);

    [Fact]
    public void AtAntenna_FilterThatTakesBothAlike_LeavesTheLevel()
    {
        var level = Decibels.FromDb(-9.5);

        Assert.Equal(level.Db, TransmitProducts.AtAntenna(level, _ => Decibels.FromDb(3), Frequency.FromMegahertz(19.2), Frequency.FromMegahertz(14.3)).Db, 1e-12);
        Assert.Equal(-49.5, TransmitProducts.AtAntenna(level, f => Decibels.FromDb(f.Megahertz > 15 ? 42 : 2), Frequency.FromMegahertz(19.2), Frequency.FromMegahertz(14.3)).Db, 1e-12);
    }

    private static int Whole(string text) => int.Parse(text, CultureInfo.InvariantCulture);

    private static double Amplitude(double[] samples, int bin)
    {
        var (re, im) = (0.0, 0.0);
        for (var i = 0; i < samples.Length; i++)
        {
            re += samples[i] * Math.Cos(2 * Math.PI * bin * i / samples.Length);
            im += samples[i] * Math.Sin(2 * Math.PI * bin * i / samples.Length);
        }

        return 2 * Math.Sqrt((re * re) + (im * im)) / samples.Length;
    }
}
