using System.Globalization;
using ClubBench.Calculation.Mixing;
using ClubBench.Calculation.Quantities;
using CsCheck;

namespace ClubBench.Calculation.Tests.Mixing;

public class PremixTests
{
    private static readonly PremixTask Fifteen = new(
        FrequencyRange.FromMegahertz(21.0, 21.1), Megahertz("9"), FrequencyRange.FromMegahertz(5.0, 5.5), Megahertz("3.58 4 4.9152 6 8 9 10 12 16 18 20 24"));

    public static TheoryData<ReferenceRow> Schemes => ReferenceTable.Theory("premix");

    public static TheoryData<ReferenceRow> Windows => ReferenceTable.Theory("premix-window");

    public static TheoryData<ReferenceRow> Converters => ReferenceTable.Theory("converter");

    [Theory]
    [Evidence(typeof(PremixSearch), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Schemes))]
    public void Search_ReferenceRow_FindsTheSchemeAtItsPlace(ReferenceRow row)
    {
        var found = PremixSearch.Of(new(
            Band(row, "low_mhz", "high_mhz"), Megahertz(row["if_mhz"]), Band(row, "oscillator_low_mhz", "oscillator_high_mhz"), Megahertz(row["stock_mhz"]))).Found;

        var scheme = found[(int)row.Number("place")];
        Assert.Equal(Enum.Parse<InjectionSide>(row["expected_side"]), scheme.Conversion.Side);
        Assert.Equal(row.Number("expected_if_mhz"), scheme.Conversion.Intermediate!.Value.Megahertz, 1e-9);
        Assert.Equal(row.Number("expected_crystal_mhz"), scheme.Crystal.Megahertz, 1e-9);
        Assert.Equal(Enum.Parse<PremixLaw>(row["expected_law"]), scheme.Law);
        AssertRange(row, "expected_low_mhz", "expected_high_mhz", scheme.Oscillator);
        if (row.Has("expected_image_mhz")) Assert.Equal(row.Number("expected_image_mhz") * 1e6, scheme.Image!.Value.Hertz, row.Number("tolerance_hz"));
    }

    [Theory]
    [Evidence(typeof(PremixSearch), EvidenceKind.ClosedFormLimit)]
    [Evidence(typeof(Premix), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Windows))]
    public void Search_NoCrystalDoes_NamesThoseThatWould(ReferenceRow row)
    {
        var search = PremixSearch.Of(Fifteen);

        Assert.Empty(search.Found);
        Assert.Equal(4, search.Windows.Count);
        var window = search.Windows.Single(w => w.Conversion.Side == Enum.Parse<InjectionSide>(row["side"]) && w.Law == Enum.Parse<PremixLaw>(row["law"]));
        AssertRange(row, "expected_oscillator_low_mhz", "expected_oscillator_high_mhz", window.LocalOscillator);
        AssertRange(row, "expected_crystal_low_mhz", "expected_crystal_high_mhz", window.Crystal);
    }

    [Theory]
    [InlineData(6.6, true)]
    [InlineData(6.7, true)]
    [InlineData(6.59, false)]
    [InlineData(7.01, false)]
    [InlineData(7.0, false)]
    public void Search_CrystalOfTheWindow_Does(double mhz, bool does)
    {
        // 7.0 MHz lies in the window, but its third harmonic is the band edge.
        var found = PremixSearch.Of(Fifteen with { Stock = [Frequency.FromMegahertz(mhz)] }).Found;

        Assert.Equal(does, found.Count == 1);
    }

    [Fact]
    public void Search_HalfTheBandIsEnough_TakesWhatCoversHalf()
    {
        var stock = Megahertz("6.57");

        Assert.Empty(PremixSearch.Of(Fifteen with { Stock = stock }).Found);
        Assert.Equal(0.7, PremixSearch.Of(Fifteen with { Stock = stock, LeastShare = 0.5 }).Found.Single().CoveredShare, 1e-9);
    }

    [Fact]
    [Evidence(typeof(PremixSearch), EvidenceKind.RoundTrip)]
    public void Search_AnyScheme_MixesBackToTheSignal() => Gen.Select(Gen.Double[3.5, 28], Gen.Double[2, 30], Gen.Double[0.455, 11]).Sample((mhz, crystal, mid) =>
    {
        var task = new PremixTask(FrequencyRange.FromMegahertz(mhz, mhz + 0.05), [Frequency.FromMegahertz(mid)], FrequencyRange.FromMegahertz(1, 20), [Frequency.FromMegahertz(crystal)]);
        return PremixSearch.Of(task).Found.All(s => Math.Abs(SignalAt(s, s.DialRunsBackwards ? s.Oscillator.High : s.Oscillator.Low) - (mhz * 1e6)) < 1e-3);
    });

    [Fact]
    [Evidence(typeof(Premix), EvidenceKind.Identity)]
    public void CrystalsFor_AnyLaw_HoldExactlyThoseTheOscillatorCovers() => Gen.Select(Gen.Int[1, 3], Gen.Double[0.1, 40], Gen.Double[1, 12], Gen.Double[0.1, 2]).Sample((law, crystal, low, width) =>
    {
        var (available, wanted, x) = (FrequencyRange.FromMegahertz(low, low + width), FrequencyRange.FromMegahertz(12.0, 12.1), Frequency.FromMegahertz(crystal));
        var covered = Premix.OscillatorFor((PremixLaw)law, x, wanted) is { } needed && available.Contains(needed.Low) && available.Contains(needed.High);
        return (Premix.CrystalsFor((PremixLaw)law, available, wanted)?.Contains(x) ?? false) == covered;
    });

    [Fact]
    public void Search_ForwardAndBackward_ForwardComesFirstThoughItsImageIsNearer()
    {
        var task = new PremixTask(FrequencyRange.FromMegahertz(10.100, 10.150), Megahertz("4.9152"), FrequencyRange.FromMegahertz(5.0, 5.5), Megahertz("10 20.3"));

        var found = PremixSearch.Of(task).Found;

        Assert.Equal([10, 20.3], found.Select(s => s.Crystal.Megahertz));
        Assert.Equal([false, true], found.Select(s => s.DialRunsBackwards));
        Assert.Equal(PremixSearch.Of(task with { Stock = Megahertz("20.3 10") }).Found, found);
    }

    [Theory]
    [Evidence(typeof(CrystalHarmonics), EvidenceKind.ClosedFormLimit)]
    [InlineData(8.9951, 1)]
    [InlineData(8.9949, null)]
    [InlineData(3.0016, 3)]
    [InlineData(3.0017, null)]
    [InlineData(1.5, null)]
    public void CrystalHarmonics_WithinFiveKilohertz_AreHeardUpToTheFifth(double mhz, int? harmonic) =>
        Assert.Equal(harmonic, CrystalHarmonics.Near(Frequency.FromMegahertz(9), Frequency.FromMegahertz(mhz)));

    [Fact]
    [Evidence(typeof(Premix), EvidenceKind.Identity)]
    public void DriftHertz_AnyLaw_IsWhatTheMixedFrequencyMovesBy() => Assert.All(Premix.Laws, law =>
    {
        double Needed(double crystalMhz) => Premix.OscillatorFor(law, Frequency.FromMegahertz(crystalMhz), FrequencyRange.FromMegahertz(4.0, 4.1))!.Value.Low.Hertz;

        // Where crystal and oscillator move together so that the result stands still, the drift is none.
        Assert.Equal(0, Premix.DriftHertz(law, 100, Needed(law == PremixLaw.CrystalPlusOscillator ? 1.0001 : 9.0001) - Needed(law == PremixLaw.CrystalPlusOscillator ? 1 : 9)), 1e-3);
        Assert.Equal(40, Math.Abs(Premix.DriftHertz(law, 0, 40)));
    });

    [Fact]
    [Evidence(typeof(Premix), EvidenceKind.ClosedFormLimit)]
    public void CrystalsFor_OscillatorNarrowerThanTheBand_AreNone() =>
        Assert.Null(Premix.CrystalsFor(PremixLaw.CrystalPlusOscillator, FrequencyRange.FromMegahertz(5.0, 5.05), FrequencyRange.FromMegahertz(12.0, 12.1)));

    [Fact]
    public void OscillatorFor_LawNotStated_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Premix.OscillatorFor(PremixLaw.Unknown, Frequency.FromMegahertz(9), FrequencyRange.FromMegahertz(12.0, 12.1)));

    [Theory]
    [Evidence(typeof(ConverterSearch), EvidenceKind.ClosedFormLimit)]
    [MemberData(nameof(Converters))]
    public void Converter_ReferenceRow_IsTheOnlyOne(ReferenceRow row)
    {
        var converter = Assert.Single(ConverterSearch.Of(Band(row, "low_mhz", "high_mhz"), Band(row, "dial_low_mhz", "dial_high_mhz"), Megahertz(row["stock_mhz"])));

        Assert.Equal(Enum.Parse<InjectionSide>(row["expected_side"]), converter.Side);
        Assert.Equal(row.Number("expected_crystal_mhz"), converter.Crystal.Megahertz, 1e-9);
        Assert.Equal(row.Number("expected_at_low_mhz") * 1e6, converter.AtBandLow.Hertz, row.Number("tolerance_hz"));
        Assert.Equal(row.Number("expected_at_high_mhz") * 1e6, converter.AtBandHigh.Hertz, row.Number("tolerance_hz"));
        Assert.Equal(row["inverts"] == "yes", converter.InvertsSpectrum);
    }

    [Fact]
    public void Converter_HarmonicOnTheBandOrTheDial_IsDropped()
    {
        var (band, dial) = (FrequencyRange.FromMegahertz(14.0, 14.1), FrequencyRange.FromMegahertz(6.9, 7.2));

        Assert.Empty(ConverterSearch.Of(band, dial, Megahertz("7.02")));
        Assert.Single(ConverterSearch.Of(band, dial, Megahertz("6.91")));
    }

    [Fact]
    public void Converter_ForwardAndBackward_ForwardComesFirst()
    {
        var found = ConverterSearch.Of(FrequencyRange.FromMegahertz(14.0, 14.1), FrequencyRange.FromMegahertz(3.5, 4.0), Megahertz("18 10.4"));

        Assert.Equal([10.4, 18], found.Select(c => c.Crystal.Megahertz));
        Assert.Equal([false, true], found.Select(c => c.DialRunsBackwards));
    }

    [Fact]
    public void Converter_ForwardWithTheNearerImage_StillComesFirst() => Assert.Equal(
        [3.61, 10.72],
        ConverterSearch.Of(FrequencyRange.FromMegahertz(3.5, 3.6), FrequencyRange.FromMegahertz(7.0, 7.4), Megahertz("10.72 3.61")).Select(c => c.Crystal.Megahertz));

    [Fact]
    [Evidence(typeof(ConverterSearch), EvidenceKind.RoundTrip)]
    public void Converter_AnyScheme_IsTheConversionOfItsSide() => Gen.Select(Gen.Double[3, 25], Gen.Double[1, 40]).Sample((mhz, crystal) =>
        ConverterSearch.Of(FrequencyRange.FromMegahertz(mhz, mhz + 0.1), FrequencyRange.FromMegahertz(0.1, 60), [Frequency.FromMegahertz(crystal)]).All(c =>
            Math.Abs(new FrequencyScheme(c.Side, c.AtBandLow).OscillatorFor(Frequency.FromMegahertz(mhz))!.Value.Megahertz - crystal) < 1e-9));

    internal static IReadOnlyList<Frequency> Megahertz(string text) =>
        [.. text.Split(' ').Select(t => Frequency.FromMegahertz(double.Parse(t, CultureInfo.InvariantCulture)))];

    private static double SignalAt(PremixScheme scheme, Frequency oscillator)
    {
        var local = scheme.Law switch
        {
            PremixLaw.CrystalPlusOscillator => scheme.Crystal.Hertz + oscillator.Hertz,
            PremixLaw.CrystalMinusOscillator => scheme.Crystal.Hertz - oscillator.Hertz,
            _ => oscillator.Hertz - scheme.Crystal.Hertz,
        };
        return scheme.Conversion.SignalFor(Frequency.FromHertz(local))!.Value.Hertz;
    }

    private static FrequencyRange Band(ReferenceRow row, string low, string high) => FrequencyRange.FromMegahertz(row.Number(low), row.Number(high));

    private static void AssertRange(ReferenceRow row, string low, string high, FrequencyRange actual)
    {
        Assert.Equal(row.Number(low) * 1e6, actual.Low.Hertz, row.Number("tolerance_hz"));
        Assert.Equal(row.Number(high) * 1e6, actual.High.Hertz, row.Number("tolerance_hz"));
    }
}
