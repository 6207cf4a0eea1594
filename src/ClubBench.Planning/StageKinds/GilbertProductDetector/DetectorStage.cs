using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;

namespace ClubBench.Planning.StageKinds.GilbertProductDetector;

/// <summary>A product detector with a transistor-tree mixer circuit, read from its document. Defaults are from memory of data sheets.</summary>
internal sealed record DetectorStage(Part Mixer, Part? Regulator, IReadOnlyList<Part> Bypasses, StageDocument Document)
{
    public static DetectorStage Read(StageDocument stage) =>
        new(stage.OneInRole(Roles.Mixer)!, stage.OneInRole(Roles.Regulator), [.. stage.InRole(Roles.Bypass)], stage);

    public Figure ConversionGain => Given("conversion-gain", QuantityKind.Decibels, Settings.ConversionGain);

    public Figure NoiseFigure => Given("noise-figure", QuantityKind.Decibels, Settings.NoiseFigure);

    public Figure OscillatorLow => Given("oscillator-low", QuantityKind.PeakToPeakVoltage, Settings.OscillatorLow);

    public Figure OscillatorHigh => Given("oscillator-high", QuantityKind.PeakToPeakVoltage, Settings.OscillatorHigh);

    /// <summary>Supply of the mixer circuit; null where the papers name no regulator.</summary>
    public Voltage? Supply => Regulator?.Value(PartValue.Voltage) is { } v ? Voltage.FromVolt(v) : null;

    /// <summary>A setting as a figure: from memory where it is the default, else as the papers say.</summary>
    private Figure Given(string name, QuantityKind kind, string setting)
    {
        var usual = Settings.Usual[setting];
        var value = Document.Setting(setting, usual);
        return new Figure(name, kind, value, From: value.Equals(usual) ? Provenance.FromMemory : Provenance.Published, Digits: 2);
    }

    public static class Roles
    {
        public const string Mixer = "mixer-circuit";
        public const string Bypass = "bypass-capacitor";
        public const string Regulator = "supply-regulator";
        public const string AudioCoupling = "audio-coupling";
    }

    public static class Settings
    {
        public const string ConversionGain = "conversionGainDb";
        public const string NoiseFigure = "noiseFigureDb";
        public const string OscillatorLow = "oscillatorLowV";
        public const string OscillatorHigh = "oscillatorHighV";

        /// <summary>From memory of data sheets of this sort of mixer circuit.</summary>
        public static IReadOnlyDictionary<string, double> Usual { get; } = new Dictionary<string, double>(StringComparer.Ordinal)
        {
            [ConversionGain] = 17,
            [NoiseFigure] = 5,
            [OscillatorLow] = 0.2,
            [OscillatorHigh] = 0.3,
        };
    }
}
