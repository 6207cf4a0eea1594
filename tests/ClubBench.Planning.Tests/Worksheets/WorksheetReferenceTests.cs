using ClubBench.Planning.Worksheets;

namespace ClubBench.Planning.Tests.Worksheets;

/// <summary>Every worksheet opens on a case whose result is known: the invented kits, or a row checked for the method.</summary>
public class WorksheetReferenceTests
{
    private static readonly Dictionary<string, double> Defaults = new(StringComparer.Ordinal);

    [Theory]
    [InlineData("standard-value", "nearest-e12", 4700, 1e-9)] // geometric middle of 4700 and 5600 is 5130
    [InlineData("standard-value", "nearest-e24", 5100, 1e-9)]
    [InlineData("capacitor-pair", "pair-value", 360e-12, 1e-18)] // two of 180 pF
    [InlineData("capacitor-pair", "second-part", 180e-12, 1e-18)]
    [InlineData("resistor-pair", "first-part", 510, 1e-9)]
    [InlineData("resistor-pair", "second-part", 13, 1e-9)]
    [InlineData("resonance", "resonance", 10.12e6, 0.01e6)] // kit A, driver tank
    [InlineData("capacitance-for-resonance", "capacitance", 107.3e-12, 0.1e-12)]
    [InlineData("trimmer-coverage", "margin-high", 2.32e-12, 0.02e-12)] // worst case table
    [InlineData("trimmer-coverage", "margin-low", -7.53e-12, 0.02e-12)]
    [InlineData("trimmer-coverage", "yield", 0.572, 0.0105)]
    [InlineData("toroid-turns", "turns", 15, 0)] // kit A on 20 m
    [InlineData("toroid-fit", "cut-length", 0.290, 1e-9)] // 15 turns on a T37
    [InlineData("toroid-fit", "length-per-turn", 12.3e-3, 0.05e-3)]
    [InlineData("winding-adjustment", "turn-change", 0, 0)] // kit A, invented reading: leave the turns
    [InlineData("ferrite-choke", "loss-resistance", 680, 10)] // kit A, collector choke
    [InlineData("ferrite-choke", "choke-reactance", 730, 10)]
    [InlineData("ferrite-choke", "impedance-ratio", 20, 0.5)]
    [InlineData("ferrite-winding", "impedance-ratio", 4.18, 0.02)] // 5 turns FT37-43 at 7 MHz
    [InlineData("ferrite-winding", "loss", 0.657, 0.003)]
    [InlineData("ferrite-winding", "core-loss", 0.603, 0.003)]
    [InlineData("ferrite-winding", "proposed-turns", 8, 0)]
    [InlineData("chebyshev-low-pass", "shunt-capacitor", 387.23e-12, 0.01e-12)] // five elements, 0.1 reflection, 8 MHz
    [InlineData("chebyshev-low-pass", "series-coil", 1.36503e-6, 0.00002e-6)]
    [InlineData("five-element-ladder", "loss", 0.15555, 0.001)] // exact values for 8 MHz, Q 150 and 1000
    [InlineData("five-element-ladder", "second-harmonic", 25.1512, 0.001)]
    [InlineData("five-element-ladder", "third-harmonic", 45.0490, 0.001)]
    [InlineData("seven-element-ladder", "loss", 0.20, 0.005)] // kit A, output filter
    [InlineData("seven-element-ladder", "return-loss", 42, 1)]
    [InlineData("seven-element-ladder", "half-power-frequency", 13.50e6, 0.01e6)]
    [InlineData("low-pass-search", "coil-turns", 16, 0)] // 160 390 390 160 pF with 16 17 16 turns
    [InlineData("low-pass-search", "shunt-capacitor", 160e-12, 1e-15)]
    [InlineData("pulled-crystal-range", "lowest-frequency", 10.1112e6, 50)] // kit A
    [InlineData("pulled-crystal-range", "highest-frequency", 10.1244e6, 50)]
    [InlineData("pulled-crystal-range", "dial-span", 13.2e3, 50)]
    [InlineData("series-inductor", "series-inductor", 10e-6, 0.05e-6)]
    [InlineData("receive-offset", "offset-now", -663, 1)]
    [InlineData("output-stage", "output", 1.18, 0.005)]
    [InlineData("load-and-heat", "load-needed", 12.1, 0.001)] // 5 W from 12 V
    [InlineData("load-and-heat", "dissipation", 3.333, 0.001)]
    [InlineData("load-and-heat", "junction", 88.67, 0.01)]
    [InlineData("current-gain", "gain-there", 13.4, 0.1)] // 190 MHz over 14.06 MHz, one pole
    [InlineData("device-gain", "stage-gain", 27.61, 0.02)] // hybrid-pi table, 22 ohm at 7 MHz
    [InlineData("device-gain", "stability-factor", 1.42, 0.02)]
    [InlineData("base-return", "bias", 0.0859, 0.0004)] // base return table, 33 ohm
    [InlineData("base-return", "conduction-angle", 121.2, 0.6)]
    [InlineData("base-return", "drive-lost", 0.0388, 0.0002)]
    [InlineData("coupling-capacitor", "loss", 0.0304, 0.0001)] // 10 nF at 1.9 MHz
    [InlineData("emission-limit", "limit", 43, 0)]
    [InlineData("external-noise", "residential", 40.7, 0.1)]
    [InlineData("preamplifier", "degradation-quiet", 0.32, 0.01)] // diode mixer at a quiet rural site, 14 MHz
    [InlineData("preamplifier", "largest-noise-and-loss", 20.2, 0.1)]
    [InlineData("series-tuned-tap", "capacitance", 36.37e-12, 0.05e-12)] // kit A, tap at 10.12 MHz
    [InlineData("series-tuned-tap", "loss", 0.892, 0.005)]
    [InlineData("series-tuned-tap", "bandwidth", 2.594e6, 0.01e6)]
    [InlineData("series-tuned-tap", "diode-current", 0.0251, 0.0001)]
    [InlineData("audio-band-pass", "input-resistor", 62e3, 1e3)] // kit A, 62 k 3.0 k 180 k
    [InlineData("audio-band-pass", "shunt-resistor", 3.0e3, 50)]
    [InlineData("audio-band-pass", "feedback-resistor", 180e3, 3e3)]
    [InlineData("sidetone-timer", "pitch", 690, 5)] // kit A
    public void Run_Defaults_GiveTheKnownFigure(string id, string figure, double si, double within) =>
        Assert.Equal(si, Figure(id, figure), within);

    [Theory]
    [InlineData("trimmer-coverage", "worksheet-verdict.not-covered")]
    [InlineData("toroid-fit", "worksheet-verdict.fits")]
    [InlineData("winding-adjustment", "winding-action.spread")]
    [InlineData("ferrite-choke", "verdict.leave")]
    [InlineData("ferrite-winding", "verdict.check")]
    [InlineData("series-inductor", "span-shortfall.none")]
    [InlineData("receive-offset", "worksheet-verdict.offset-found")]
    [InlineData("load-and-heat", "worksheet-verdict.cool-enough")]
    [InlineData("device-gain", "worksheet-verdict.stable")]
    [InlineData("base-return", "worksheet-verdict.bias-usual")]
    [InlineData("coupling-capacitor", "verdict.leave")]
    [InlineData("preamplifier", "preamplifier-verdict.not-needed")]
    [InlineData("low-pass-search", "low-pass-search-ending.met")]
    public void Run_Defaults_GiveTheKnownVerdict(string id, string code) => Assert.Equal(code, WorksheetList.Find(id)!.Run(Defaults).Value.VerdictCode);

    [Theory]
    [InlineData("toroid-fit", "turns", 60, "worksheet-verdict.does-not-fit")]
    [InlineData("trimmer-coverage", "trimmer-most", 30e-12, "worksheet-verdict.covered")]
    [InlineData("ferrite-choke", "node-resistance", 150, "verdict.check")]
    [InlineData("series-inductor", "wanted-span", 1000, "span-shortfall.already-wider")]
    [InlineData("series-inductor", "wanted-span", 5e6, "span-shortfall.inductor-takes-over")]
    [InlineData("receive-offset", "wanted-offset", 50e3, "worksheet-verdict.offset-out-of-reach")]
    [InlineData("load-and-heat", "sink-to-air", 40, "worksheet-verdict.too-hot")]
    [InlineData("device-gain", "base-shunt", 0, "worksheet-verdict.may-oscillate")]
    [InlineData("base-return", "base-resistor", 330, "worksheet-verdict.bias-high")]
    [InlineData("base-return", "drive-peak", 0.7, "worksheet-verdict.does-not-conduct")]
    [InlineData("low-pass-search", "wanted-second", 60, "low-pass-search-ending.falls-short")]
    public void Run_OneValueWorse_TurnsTheVerdict(string id, string input, double si, string code) =>
        Assert.Equal(code, WorksheetList.Find(id)!.Run(new Dictionary<string, double>(StringComparer.Ordinal) { [input] = si }).Value.VerdictCode);

    [Theory]
    [InlineData(1, 43)]
    [InlineData(2, 30)]
    [InlineData(4, 43.41)] // 43 + 10 log of 1.1 W
    public void EmissionLimit_EachSet_GivesItsOwnFigure(double set, double limit) =>
        Assert.Equal(limit, Figure("emission-limit", "limit", ("limit-set", set)), 0.01);

    [Fact]
    public void Preamplifier_DirectConversion_LosesAboutHalf() =>
        Assert.Equal(0.5 * Figure("preamplifier", "degradation-quiet"), Figure("preamplifier", "degradation-quiet", ("direct-conversion", 1)), 0.01);

    // A gain far above its corner falls with the frequency itself: 20 log of 14.06 over 10.12.
    [Fact]
    public void BaseReturnTrend_GainFarAboveItsCorner_LosesWhatTheKitLoses() =>
        Assert.Equal(2.9, Figure("base-return-trend", "gain-lost-by-moving", ("low-frequency-gain", 1e4)), 0.05);

    [Fact]
    public void BaseReturnTrend_DefaultGain_FollowsTheOnePoleLaw()
    {
        static double Size(double f) => Math.Sqrt(1 + Math.Pow(63 * f / 190, 2));

        Assert.Equal(20 * Math.Log10(Size(14.06) / Size(10.12)), Figure("base-return-trend", "gain-lost-by-moving"), 1e-6);
    }

    private static double Figure(string id, string figure, params (string Name, double Si)[] given) =>
        WorksheetList.Find(id)!.Run(given.ToDictionary(g => g.Name, g => g.Si, StringComparer.Ordinal)).Value.Figures.First(f => f.Name == figure).Si;
}
