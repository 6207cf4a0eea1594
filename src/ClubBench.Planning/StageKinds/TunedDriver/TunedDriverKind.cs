using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.TunedDriver.DriverStage;

namespace ClubBench.Planning.StageKinds.TunedDriver;

/// <summary>Class A driver with a tuned collector circuit and a link to the next stage.</summary>
internal sealed class TunedDriverKind : StageKind<DriverStage, DriverModel>
{
    public const string Input = "input";
    public const string Output = "output";

    public static StageDescription DescriptionOf { get; } = new(
        "tuned-driver",
        DependsOn.SignalFrequency,
        [new PortDescription(Input, PortDirection.In, 100), new PortDescription(Output, PortDirection.Out, 12)],
        [new Passage(Input, Output, OnReceive: false, OnTransmit: true)],
        [
            new PartRole(Roles.Transistor, PartClass.Transistor, RoleNeed.Required, []),
            new PartRole(Roles.TankWinding, PartClass.Winding, RoleNeed.Required, [PartValue.Turns, PartValue.LinkTurns], IsTuned: true),
            new PartRole(Roles.TankCapacitor, PartClass.Capacitor, RoleNeed.Required, [PartValue.Capacitance], IsTuned: true),
            new PartRole(Roles.TankTrimmer, PartClass.Trimmer, RoleNeed.Required, [PartValue.MinimumCapacitance, PartValue.MaximumCapacitance], IsTuned: true),
            new PartRole(Roles.BaseResistor, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance], Most: 2),
            new PartRole(Roles.EmitterResistor, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance]),
            new PartRole(Roles.UnbypassedResistor, PartClass.Resistor, RoleNeed.Optional, [PartValue.Resistance]),
            new PartRole(Roles.BypassCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance], Most: 4),
            new PartRole(Roles.SupplyResistor, PartClass.Resistor, RoleNeed.Optional, [PartValue.Resistance]),
        ],
        [
            new SettingDescription(Settings.Stray, QuantityKind.Capacitance, 10e-12),
            new SettingDescription(Settings.CollectorCurrent, QuantityKind.Current, 0.03),
            new SettingDescription(Settings.PeakSwing, QuantityKind.Voltage, 9),
            new SettingDescription(Settings.Load, QuantityKind.Resistance, 12),
            new SettingDescription(Settings.CoilQ, QuantityKind.Number, 150),
        ],
        ["available-power", "tunes-low", "tunes-high", "reactance"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.TunedDriver.Texts", typeof(TunedDriverKind).Assembly);

    public override IReadOnlyList<Alternative> Convert(StageDocument stage, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf) =>
        DriverConversion.Of(stage, from, to, demands, shelf);

    public override Finding Rethink(StageDocument stage, Surroundings to) =>
        new("driver.device-too-slow-rethink", Severity.Fault, stage.Key, stage.OneInRole(Roles.Transistor)?.Designator, [Figure.Of("at", to.Reference), Figure.Of("wanted", to.Reference * 5)], StageAction.Rethink, OpenItemCodes.Rethink);

    public override Schematic Draw(StageDocument before, StageDocument? after)
    {
        var s = new SchematicSketch(DescriptionOf, before, after);
        s.Terminal(0, 6, Input);
        s.Wire(0, 6, 8, 6);
        s.Role(SymbolKind.Resistor, 4, 6, Orientation.Down, Roles.BaseResistor);
        s.Ground(4, 10);
        s.Role(SymbolKind.TransistorNpn, 8, 6, Orientation.Across, Roles.Transistor);
        s.Role(SymbolKind.Resistor, 10, 8, Orientation.Down, Roles.UnbypassedResistor);
        s.Ground(10, 12);
        s.Wire(10, 4, 29, 4);
        s.Role(SymbolKind.Transformer, 29, 4, Orientation.Down, Roles.TankWinding);
        s.Role(SymbolKind.Capacitor, 17, 4, Orientation.Down, Roles.TankCapacitor);
        s.Role(SymbolKind.Trimmer, 23, 4, Orientation.Down, Roles.TankTrimmer);
        s.Wire(16, 8, 29, 8);
        s.Sign(SymbolKind.Supply, 16, 8);
        s.Wire(31, 4, 38, 4);
        s.Terminal(38, 4, Output);
        s.Ground(31, 8);
        s.Point("A", 10, 4);
        return s.Finish();
    }

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.look-at-joints"), Line.Of("line.link-through"), Line.Of("line.supply-not-short")],
        Figure.Of("limit", QuantityKind.Current, 0.1),
        [Line.Of("line.peak-at-end"), Line.Of("line.peak-twice"), Line.Of("line.no-peak")],
        [Caution.Measuring("caution.peak-then-count"), Caution.Measuring("caution.warm-transistor")],
        Line.Of("set-up.final-disconnected"));

    protected override DriverStage Read(StageDocument stage) => DriverStage.Read(stage);

    protected override DriverModel Model(DriverStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(DriverStage stage, DriverModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key) =>
        DriverJudgement.Of(stage, model, surroundings, demands, key);

    protected override IReadOnlyList<ExpectedReading> Expect(DriverStage stage, DriverModel model, Surroundings surroundings, string key)
    {
        var volts = Math.Sqrt(8 * model.Available.Watt * model.LinkLoad);
        return
        [
            .. WindingPart.Of(stage.Winding, surroundings.Learnt) is { } w ? [WindingExpectation.For(key, w, model.Tank.TrimRange(surroundings.Reference))] : Array.Empty<ExpectedReading>(),
            TrimmerExpectation.For(key, model.Tank, surroundings.Reference, TunablePlace.ComfortableShare, "set-up.peak-the-tank"),
            new($"{key}.drive-voltage", QuantityKind.PeakToPeakVoltage, volts, 0.8 * volts, 1.25 * volts, "set-up.scope-at-link", InstrumentClass.Oscilloscope, WindowSides.Both, new Dictionary<string, double>()),
        ];
    }
}
