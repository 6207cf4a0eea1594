using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.GilbertProductDetector.DetectorStage;

namespace ClubBench.Planning.StageKinds.GilbertProductDetector;

/// <summary>Product detector with a transistor-tree mixer circuit: signal and oscillator in, audio out.</summary>
internal sealed class GilbertProductDetectorKind : StageKind<DetectorStage, DetectorModel>
{
    public const string Signal = "signal";
    public const string Oscillator = "oscillator";
    public const string Audio = "audio";

    /// <summary>Supply the mixer circuit works at, from memory of data sheets.</summary>
    private const double LeastSupplyV = 4.5;
    private const double MostSupplyV = 8;

    /// <summary>Two hundredths of a pin's resistance: a bypassed pin this far from ground costs nothing (common practice).</summary>
    private const double MostBypassOhm = 30;

    public static StageDescription DescriptionOf { get; } = new(
        "gilbert-product-detector",
        DependsOn.Nothing,
        [
            new PortDescription(Signal, PortDirection.In, 3000),
            new PortDescription(Oscillator, PortDirection.In, 18_000, IsOscillatorInput: true),
            new PortDescription(Audio, PortDirection.Out, 10_000),
        ],
        [new Passage(Signal, Audio, OnReceive: true, OnTransmit: false)],
        [
            new PartRole(Roles.Mixer, PartClass.IntegratedCircuit, RoleNeed.Required, []),
            new PartRole(Roles.Bypass, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance], Most: 3),
            new PartRole(Roles.Regulator, PartClass.Diode, RoleNeed.Usual, [PartValue.Voltage]),
            new PartRole(Roles.AudioCoupling, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance], Most: 2),
        ],
        [
            new SettingDescription(Settings.ConversionGain, QuantityKind.Decibels, Settings.Usual[Settings.ConversionGain]),
            new SettingDescription(Settings.NoiseFigure, QuantityKind.Decibels, Settings.Usual[Settings.NoiseFigure]),
            new SettingDescription(Settings.OscillatorLow, QuantityKind.PeakToPeakVoltage, Settings.Usual[Settings.OscillatorLow]),
            new SettingDescription(Settings.OscillatorHigh, QuantityKind.PeakToPeakVoltage, Settings.Usual[Settings.OscillatorHigh]),
        ],
        ["conversion-gain", "noise-figure"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.GilbertProductDetector.Texts", typeof(GilbertProductDetectorKind).Assembly);

    public override Schematic Draw(StageDocument before, StageDocument? after)
    {
        var s = new SchematicSketch(DescriptionOf, before, after);
        s.Terminal(0, 6, Signal);
        s.Wire(0, 6, 8, 6);
        s.Role(SymbolKind.Mixer, 8, 6, Orientation.Across, Roles.Mixer);
        s.Wire(10, 10, 10, 8);
        s.Terminal(10, 10, Oscillator);
        s.Wire(12, 6, 14, 6);
        s.Role(SymbolKind.Capacitor, 14, 6, Orientation.Across, Roles.AudioCoupling);
        s.Wire(18, 6, 20, 6);
        s.Terminal(20, 6, Audio);
        s.Sign(SymbolKind.Supply, 10, 2);
        s.Wire(10, 2, 10, 5);
        s.Wire(8, 2, 10, 2);
        if (s.Role(SymbolKind.ZenerDiode, 4, 2, Orientation.Across, Roles.Regulator)) s.Ground(4, 2);
        s.Point("A", 10, 9);
        s.Point("B", 10, 3);
        return s.Finish();
    }

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.look-at-joints"), Line.Of("line.notch-right-way"), Line.Of("line.supply-not-short")],
        Figure.Of("limit", QuantityKind.Current, 0.02),
        [Line.Of("line.level-outside"), Line.Of("line.supply-outside"), Line.Of("line.call-mentor")],
        [],
        null);

    protected override DetectorStage Read(StageDocument stage) => DetectorStage.Read(stage);

    protected override IEnumerable<FieldMessage> Check(DetectorStage stage, StageDocument document, string path)
    {
        if (stage.OscillatorHigh.Si <= stage.OscillatorLow.Si)
            yield return FieldMessage.Error($"{path}.settings.{Settings.OscillatorHigh}", "kit.oscillator-window-reversed");
    }

    protected override DetectorModel Model(DetectorStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(DetectorStage stage, DetectorModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key)
    {
        var findings = new List<Finding>();
        if (stage.Supply is { Volt: < LeastSupplyV or > MostSupplyV } v)
        {
            IReadOnlyList<Figure> figures = [Figure.Of("volts", QuantityKind.Voltage, v.Volt), Limit("least", LeastSupplyV), Limit("most", MostSupplyV)];
            findings.Add(new Finding("detector.supply-outside", Severity.Warning, key, stage.Regulator!.Designator, figures, StageAction.Check));
        }

        if (model.BypassReactance is { Ohm: > MostBypassOhm } x)
            findings.Add(new Finding("detector.bypass-small", Severity.Warning, key, null, [Figure.Of("reactance", x), Figure.Of("at", surroundings.Band.Low)], StageAction.Check));
        return findings;

        static Figure Limit(string name, double volt) => new(name, QuantityKind.Voltage, volt, From: Provenance.FromMemory);
    }

    protected override IReadOnlyList<ExpectedReading> Expect(DetectorStage stage, DetectorModel model, Surroundings surroundings, string key)
    {
        var (low, high) = model.Window;
        return
        [
            .. stage.Supply is { } v
                ? [new ExpectedReading($"{key}.supply-voltage", QuantityKind.Voltage, v.Volt, 0.95 * v.Volt, 1.05 * v.Volt, "set-up.meter-at-supply-pin", InstrumentClass.Multimeter, WindowSides.Both, new Dictionary<string, double>())]
                : Array.Empty<ExpectedReading>(),
            new($"{key}.oscillator-level", QuantityKind.PeakToPeakVoltage, 0.5 * (low.Volt + high.Volt), low.Volt, high.Volt, "set-up.scope-at-oscillator-pin", InstrumentClass.Oscilloscope, WindowSides.Both, new Dictionary<string, double>()),
        ];
    }
}
