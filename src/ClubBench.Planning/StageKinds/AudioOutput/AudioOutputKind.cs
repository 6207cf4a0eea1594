using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.AudioOutput.OutputStage;

namespace ClubBench.Planning.StageKinds.AudioOutput;

/// <summary>Audio output amplifier for phones, with muting while transmitting.</summary>
internal sealed class AudioOutputKind : StageKind<OutputStage, OutputModel>
{
    public const string Input = "input";
    public const string Output = "output";
    private const string Mute = "mute";

    /// <summary>A corner above this makes telegraphy thin (half the usual pitch; common practice).</summary>
    private const double MostCornerHertz = 350;

    public static StageDescription DescriptionOf { get; } = new(
        "audio-output",
        DependsOn.Nothing,
        [new PortDescription(Input, PortDirection.In, 50_000), new PortDescription(Output, PortDirection.Out, 32)],
        [new Passage(Input, Output, OnReceive: true, OnTransmit: false)],
        [
            new PartRole(Roles.Power, PartClass.IntegratedCircuit, RoleNeed.Required, []),
            new PartRole(Roles.GainCapacitor, PartClass.Capacitor, RoleNeed.Optional, [PartValue.Capacitance]),
            new PartRole(Roles.OutputCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance]),
            new PartRole(Roles.DampingResistor, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance]),
            new PartRole(Roles.DampingCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance]),
            new PartRole(Roles.SupplyCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance]),
            new PartRole(Roles.SupplyResistor, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance]),
            new PartRole(Roles.MuteTransistor, PartClass.Transistor, RoleNeed.Optional, []),
            new PartRole(Roles.MuteResistor, PartClass.Resistor, RoleNeed.Optional, [PartValue.Resistance]),
            new PartRole(Roles.MuteCapacitor, PartClass.Capacitor, RoleNeed.Optional, [PartValue.Capacitance]),
        ],
        [],
        ["gain", "idle-current"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.AudioOutput.Texts", typeof(AudioOutputKind).Assembly);

    public override Schematic Draw(StageDocument before, StageDocument? after)
    {
        var s = new SchematicSketch(DescriptionOf, before, after);
        s.Terminal(0, 7, Input);
        if (s.Role(SymbolKind.Jfet, 2, 5, Orientation.Across, Roles.MuteTransistor))
        {
            s.Wire(0, 7, 4, 7);
            s.Wire(0, 5, 2, 5);
            s.Terminal(0, 5, Mute);
            s.Wire(4, 3, 10, 3);
        }
        else
        {
            s.Wire(0, 7, 8, 7);
            s.Wire(8, 7, 8, 3);
            s.Wire(8, 3, 10, 3);
        }

        s.Role(SymbolKind.Amplifier, 10, 3, Orientation.Across, Roles.Power);
        s.Ground(10, 5);
        s.Wire(12, -1, 12, 3);
        s.Wire(12, -1, 20, -1);
        if (s.Role(SymbolKind.Electrolytic, 16, -1, Orientation.Down, Roles.SupplyCapacitor)) s.Ground(16, 3);
        s.Sign(SymbolKind.Supply, s.Role(SymbolKind.Resistor, 20, -1, Orientation.Across, Roles.SupplyResistor) ? 24 : 20, -1);
        s.Wire(14, 4, 14, 6);
        s.Wire(14, 6, 22, 6);
        s.Role(SymbolKind.Electrolytic, 22, 6, Orientation.Across, Roles.OutputCapacitor);
        s.Wire(26, 6, 28, 6);
        if (s.Role(SymbolKind.Resistor, 18, 6, Orientation.Down, Roles.DampingResistor))
        {
            s.Role(SymbolKind.Capacitor, 18, 10, Orientation.Down, Roles.DampingCapacitor);
            s.Ground(18, 14);
        }

        s.Terminal(28, 6, Output);
        s.Point("A", 26, 6);
        return s.Finish();
    }

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.look-at-joints"), Line.Of("line.notch-right-way"), Line.Of("line.electrolytics-right-way")],
        Figure.Of("limit", QuantityKind.Current, 0.05),
        [Line.Of("line.idle-high"), Line.Of("line.idle-none"), Line.Of("line.call-mentor")],
        [Caution.BeforePower("caution.phones-off-ears"), Caution.BeforePower("caution.electrolytics-burst"), Caution.Measuring("caution.meter-in-series")],
        null);

    protected override OutputStage Read(StageDocument stage) => OutputStage.Read(stage);

    protected override OutputModel Model(OutputStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(OutputStage stage, OutputModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key)
    {
        var findings = new List<Finding>();
        if (!stage.IsDecoupled) findings.Add(new Finding("output.supply-not-decoupled", Severity.Warning, key, null, [], StageAction.Check));
        if (!stage.IsDamped) findings.Add(new Finding("output.not-damped", Severity.Warning, key, null, [], StageAction.Check));
        if (model.OutputCorner is { Hertz: > MostCornerHertz } f)
            findings.Add(new Finding("output.thin", Severity.Warning, key, null, [Figure.Of("corner", f) with { Digits = 2 }, Figure.Of("load", model.Load)], StageAction.Check));
        return findings;
    }

    protected override IReadOnlyList<ExpectedReading> Expect(OutputStage stage, OutputModel model, Surroundings surroundings, string key) =>
    [
        new($"{key}.idle-current", QuantityKind.Current, OutputModel.IdleA, OutputModel.LeastIdleA, OutputModel.MostIdleA, "set-up.meter-in-supply", InstrumentClass.Multimeter, WindowSides.Both, new Dictionary<string, double>()),
    ];
}
