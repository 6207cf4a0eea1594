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
    [InlineData("loaded-circuit", "loaded-q", 9.375, 0.001)] // X 220, 4400 and 4400, Q 150
    [InlineData("loaded-circuit", "loss", 0.561, 0.001)]
    [InlineData("rejection", "rejection", 38.203, 0.005)] // image of a 9 MHz intermediate frequency
    [InlineData("capacitive-divider", "resistance-at-top", 2920.1, 3)]
    [InlineData("capacitive-divider", "capacitance-at-top", 106.302e-12, 0.11e-12)]
    [InlineData("divider-design", "top-capacitor", 111.08e-12, 0.11e-12)]
    [InlineData("divider-design", "bottom-capacitor", 775.58e-12, 0.8e-12)]
    [InlineData("series-capacitor", "series-capacitor", 58.367e-12, 0.06e-12)]
    [InlineData("series-capacitor", "capacitance-at-top", 57.394e-12, 0.06e-12)]
    [InlineData("link-winding", "exact-turns", 3.382, 0.0035)]
    [InlineData("coupled-band-pass", "coupling-capacitor", 7.507e-12, 0.015e-12)] // 7.1 MHz, 300 kHz, two coils
    [InlineData("coupled-band-pass", "end-node", 243.74e-12, 0.5e-12)]
    [InlineData("coupled-band-pass", "end-resistance", 3586.4, 7.2)]
    [InlineData("coupled-band-pass", "loss", 1.583, 0.03)]
    [InlineData("coupled-band-pass", "bandwidth", 300.1e3, 0.9e3)]
    [InlineData("coupled-band-pass", "second-harmonic", 57.6, 0.2)]
    [InlineData("elliptic-low-pass", "shunt-capacitor", 355.38e-12, 0.018e-12)] // five elements, 0.1 reflection, 35 degrees, 8 MHz
    [InlineData("elliptic-low-pass", "trap-coil", 1.2537e-6, 0.00007e-6)]
    [InlineData("elliptic-low-pass", "trap-capacitor", 40.663e-12, 0.0021e-12)]
    [InlineData("elliptic-low-pass", "notch", 14.536e6, 0.001e6)]
    [InlineData("elliptic-with-notch", "notch", 14.06e6, 1)]
    [InlineData("high-pass-guard", "series-capacitor", 1868.99e-12, 0.02e-12)]
    [InlineData("high-pass-guard", "shunt-coil", 3.31368e-6, 0.00004e-6)]
    [InlineData("high-pass-guard", "rejection", 24.366, 0.002)]
    [InlineData("high-pass-guard", "loss", 0.0033, 0.002)]
    [InlineData("line-trap", "trap-depth", 29.87, 0.01)]
    [InlineData("line-trap", "loss", 0.692, 0.01)]
    [InlineData("air-core-coil", "inductance", 0.6417e-6, 0.002e-6)]
    [InlineData("air-core-coil", "self-capacitance", 0.463e-12, 0.0014e-12)]
    [InlineData("inductance-by-two-capacitors", "inductance", 4.2686e-6, 0.0085e-6)]
    [InlineData("inductance-by-two-capacitors", "stray", 6.543e-12, 0.014e-12)]
    [InlineData("alternating-flux", "flux", 2.797e-3, 0.014e-3)] // 27.97 G
    [InlineData("alternating-flux", "flux-guide", 5.66e-3, 0.028e-3)]
    [InlineData("apparent-inductance", "self-resonance", 56.26e6, 0.03e6)]
    [InlineData("apparent-inductance", "apparent-inductance", 5.422e-6, 0.003e-6)] // 5.336 uH by hand: / (1 - (7.1/56.26)^2)
    [InlineData("matching-l", "part-1", 0.485325e-6, 5e-11)]
    [InlineData("matching-l", "part-2", 776.52e-12, 0.08e-12)]
    [InlineData("matching-pi", "part-1", 1344.97e-12, 0.14e-12)]
    [InlineData("matching-pi", "part-2", 0.473513e-6, 5e-11)]
    [InlineData("matching-pi", "part-3", 2196.33e-12, 0.22e-12)]
    [InlineData("matching-t", "part-1", 0.840607e-6, 1e-10)]
    [InlineData("matching-t", "part-2", 757.62e-12, 0.08e-12)]
    [InlineData("matching-t", "part-3", 1.37271e-6, 2e-10)]
    [InlineData("resistive-pad", "outer-resistors", 150.48, 0.016)] // 6 dB
    [InlineData("resistive-pad", "inner-resistor", 37.352, 0.004)]
    [InlineData("mismatch", "line-voltage", 38.73, 0.01)] // 5 W at 3:1
    [InlineData("feedback-stage", "feedback-resistor", 850, 0.09)]
    [InlineData("feedback-stage", "stage-gain", 18.062, 0.002)]
    [InlineData("feedback-stage", "output-resistance", 150, 0.02)]
    [InlineData("class-e", "load-needed", 13.6648, 0.0014)]
    [InlineData("class-e", "switch-capacitor", 343.42e-12, 0.035e-12)]
    [InlineData("class-e", "series-capacitor", 441.38e-12, 0.045e-12)]
    [InlineData("class-e", "series-coil", 1.53156e-6, 0.00016e-6)]
    [InlineData("gate-drive", "peak-current", 0.0482, 0.00025)]
    [InlineData("power-from-voltage", "power", 1, 1e-6)]
    [InlineData("power-from-voltage", "power-level", 30, 1e-6)]
    [InlineData("power-from-voltage", "effective-voltage", 7.071, 0.001)]
    [InlineData("peak-detector", "power", 4.973, 0.001)]
    [InlineData("two-tone", "peak-envelope", 5, 0.001)] // 22.36 V is 5 W in 50 ohm
    [InlineData("two-tone", "each-tone", 1.25, 0.001)]
    [InlineData("directivity", "return-loss-least", 17.61, 0.01)]
    [InlineData("directivity", "return-loss-most", 23.30, 0.01)]
    [InlineData("mixer-level", "power-level", 7.0, 0.01)]
    [InlineData("telegraph-speed", "necessary-bandwidth", 100, 1e-9)]
    [InlineData("telegraph-speed", "necessary-bandwidth-steady", 60, 1e-9)]
    [InlineData("telegraph-speed", "dot", 0.048, 1e-12)]
    [InlineData("keying-edge", "hard-edge", -39.8, 0.1)]
    [InlineData("keying-edge", "soft-edge", -51.4, 0.1)]
    [InlineData("crystal-parameters", "motional-inductance", 28.47457e-3, 3e-7)]
    [InlineData("crystal-parameters", "parallel-resonance", 7_044_046, 1)]
    [InlineData("crystal-parameters", "crystal-q", 62_887, 1)]
    [InlineData("crystal-load", "loaded-frequency", 7_031_833.7, 0.5)]
    [InlineData("crystal-load", "slope-per-picofarad", -53.14, 0.05)]
    [InlineData("crystal-load", "loss-resistance", 26.45, 0.01)]
    [InlineData("crystal-pair", "midway-resistance", 82.0, 0.2)]
    [InlineData("crystal-by-two-loads", "motional-capacitance", 20.436e-15, 0.001e-15)] // by hand from both shifts
    [InlineData("crystal-by-two-loads", "static-capacitance", 5.145e-12, 0.001e-12)]
    [InlineData("crystal-by-sweep", "motional-resistance", 20.0, 0.005)] // 25 ohm times (1.8 - 1)
    [InlineData("crystal-by-sweep", "motional-inductance", 28.477e-3, 0.005e-3)] // 45 ohm over 2 pi 251.5 Hz
    [InlineData("intermediate-frequency", "oscillator", 18.975e6, 1)] // sum of 14.060 and 4.915 MHz
    [InlineData("intermediate-frequency", "image", 23.890e6, 1)]
    [InlineData("noise-cascade", "noise-figure", 12.0, 0.01)] // losses of 7 dB ahead of 5 dB
    public void Run_Defaults_GiveTheKnownFigure(string id, string figure, double si, double within) =>
        Assert.Equal(si, Figure(id, figure), within);

    [Theory]
    [InlineData("trimmer-coverage", "worksheet-verdict.not-covered")]
    [InlineData("link-winding", "worksheet-verdict.link-near")]
    [InlineData("coupled-band-pass", "worksheet-verdict.band-pass-good")]
    [InlineData("line-trap", "worksheet-verdict.trap-costs")]
    [InlineData("inductance-by-two-capacitors", "worksheet-verdict.stray-usual")]
    [InlineData("alternating-flux", "core-load.good")]
    [InlineData("class-e", "worksheet-verdict.device-fits")]
    [InlineData("mixer-level", "mixer-drive.right")]
    [InlineData("crystal-pair", "pair-match.loose")]
    [InlineData("intermediate-frequency", "worksheet-verdict.inverts")]
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
