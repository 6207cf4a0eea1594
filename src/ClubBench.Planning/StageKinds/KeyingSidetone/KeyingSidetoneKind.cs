using System.Resources;
using ClubBench.Calculation.Audio;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.KeyingSidetone.KeyingStage;

namespace ClubBench.Planning.StageKinds.KeyingSidetone;

/// <summary>Keyed supply with shaped edges, and a sidetone.</summary>
internal sealed class KeyingSidetoneKind : StageKind<KeyingStage, KeyingModel>
{
    public const string Key = "key";
    public const string KeyedSupply = "keyed-supply";
    public const string Sidetone = "sidetone";

    /// <summary>Rise times that neither click nor smear (common practice).</summary>
    private const double LeastRiseS = 3e-3;
    private const double MostRiseS = 8e-3;
    private const double SidetoneRoom = 0.05;

    public static StageDescription DescriptionOf { get; } = new(
        "keying-sidetone",
        DependsOn.AudioFrequency,
        [new PortDescription(Key, PortDirection.In, 10_000), new PortDescription(KeyedSupply, PortDirection.Out), new PortDescription(Sidetone, PortDirection.Out, 100_000)],
        [],
        [
            new PartRole(Roles.Transistor, PartClass.Transistor, RoleNeed.Required, []),
            new PartRole(Roles.Resistor, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance], Most: 3),
            new PartRole(Roles.ShapingCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance]),
            new PartRole(Roles.Timer, PartClass.IntegratedCircuit, RoleNeed.Optional, []),
            new PartRole(Roles.TimerResistorA, PartClass.Resistor, RoleNeed.Optional, [PartValue.Resistance]),
            new PartRole(Roles.TimerResistorB, PartClass.Resistor, RoleNeed.Optional, [PartValue.Resistance]),
            new PartRole(Roles.TimerCapacitor, PartClass.Capacitor, RoleNeed.Optional, [PartValue.Capacitance], IsTuned: true),
            new PartRole(Roles.SidetoneResistor, PartClass.Resistor, RoleNeed.Optional, [PartValue.Resistance]),
        ],
        [new SettingDescription(Settings.RiseTime, QuantityKind.Duration, 5e-3)],
        ["sidetone", "rise-time"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.KeyingSidetone.Texts", typeof(KeyingSidetoneKind).Assembly);

    public override Schematic Draw(StageDocument before, StageDocument? after)
    {
        var s = new SchematicSketch(DescriptionOf, before, after);
        s.Terminal(0, 8, Key);
        s.Wire(0, 8, 2, 8);
        s.Role(SymbolKind.Resistor, 2, 8, Orientation.Across, Roles.Resistor);
        s.Role(SymbolKind.TransistorPnp, 8, 8, Orientation.Across, Roles.Transistor);
        s.Wire(6, 8, 8, 8);
        if (s.Role(SymbolKind.Electrolytic, 6, 8, Orientation.Down, Roles.ShapingCapacitor)) s.Ground(6, 12);
        s.Sign(SymbolKind.Supply, 10, 4);
        s.Wire(10, 4, 10, 6);
        s.Wire(10, 10, 12, 10);
        s.Terminal(12, 10, KeyedSupply);
        if (s.Role(SymbolKind.Block, 24, 8, Orientation.Across, Roles.Timer))
        {
            s.Role(SymbolKind.Resistor, 19, 0, Orientation.Down, Roles.TimerResistorA);
            s.Sign(SymbolKind.Supply, 19, 0);
            s.Wire(19, 4, 26, 4);
            s.Wire(26, 4, 26, 7);
            s.Wire(19, 8, 24, 8);
            s.Role(SymbolKind.Resistor, 19, 4, Orientation.Down, Roles.TimerResistorB);
            s.Role(SymbolKind.Capacitor, 19, 8, Orientation.Down, Roles.TimerCapacitor);
            s.Ground(19, 12);
            s.Role(SymbolKind.Resistor, 28, 8, Orientation.Across, Roles.SidetoneResistor);
            s.Terminal(32, 8, Sidetone);
        }

        s.Point("A", 12, 10);
        return s.Finish();
    }

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.look-at-joints"), Line.Of("line.notch-right-way"), Line.Of("line.keyed-supply-off")],
        Figure.Of("limit", QuantityKind.Current, 0.05),
        [Line.Of("line.edge-fast"), Line.Of("line.sidetone-off"), Line.Of("line.call-mentor")],
        [Caution.Measuring("caution.no-key-down-before-filter")],
        Line.Of("set-up.final-disconnected"));

    protected override KeyingStage Read(StageDocument stage) => KeyingStage.Read(stage);

    protected override KeyingModel Model(KeyingStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(KeyingStage stage, KeyingModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key)
    {
        var findings = new List<Finding>();
        if (model.Sidetone is { } tone && Math.Abs(tone.Hertz - model.Pitch.Hertz) > PitchAgreement.LargestSpreadHertz)
            findings.Add(new Finding("keying.sidetone-off-pitch", Severity.Warning, key, null, [Figure.Of("sidetone", tone) with { Digits = 3 }, Figure.Of("pitch", model.Pitch) with { Digits = 3 }], StageAction.Check));
        var rise = Figure.Of("rise-time", QuantityKind.Duration, model.RiseTime.Second) with { Digits = 2 };
        if (model.RiseTime.Second is < LeastRiseS or > MostRiseS)
            findings.Add(new Finding("keying.rise-outside", Severity.Warning, key, null, [rise, Figure.Of("least", QuantityKind.Duration, LeastRiseS), Figure.Of("most", QuantityKind.Duration, MostRiseS)], StageAction.Check));
        if (model is { PartsAgree: false, ShapingRise: { } parts })
            findings.Add(new Finding("keying.parts-disagree", Severity.Warning, key, null, [rise, Figure.Of("shaping-rise", QuantityKind.Duration, parts.Second) with { Digits = 2 }], StageAction.Check));
        return findings;
    }

    protected override IReadOnlyList<ExpectedReading> Expect(KeyingStage stage, KeyingModel model, Surroundings surroundings, string key) =>
    [
        .. model.Sidetone is { } f
            ? [new ExpectedReading($"{key}.sidetone", QuantityKind.Frequency, f.Hertz, (1 - SidetoneRoom) * f.Hertz, (1 + SidetoneRoom) * f.Hertz, "set-up.listen-to-sidetone", InstrumentClass.Counter, WindowSides.Both, Sensitivities(stage))]
            : Array.Empty<ExpectedReading>(),
        new($"{key}.rise-time", QuantityKind.Duration, model.RiseTime.Second, LeastRiseS, MostRiseS, "set-up.scope-on-keyed-supply", InstrumentClass.Oscilloscope, WindowSides.Both, new Dictionary<string, double>()),
    ];

    private static Dictionary<string, double> Sensitivities(KeyingStage stage) =>
        new(StringComparer.Ordinal) { [stage.Document.OneInRole(Roles.TimerCapacitor)!.Designator] = -1 };
}
