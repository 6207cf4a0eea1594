using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.SingleEndedFinal.FinalStage;

namespace ClubBench.Planning.StageKinds.SingleEndedFinal;

/// <summary>Single-ended class C final with a base return and a collector choke, into 50 ohm.</summary>
internal sealed class SingleEndedFinalKind : StageKind<FinalStage, FinalModel>
{
    public const string Input = "input";
    public const string Output = "output";

    public static StageDescription DescriptionOf { get; } = new(
        "single-ended-final",
        DependsOn.SignalFrequency,
        [new PortDescription(Input, PortDirection.In, 12), new PortDescription(Output, PortDirection.Out)],
        [new Passage(Input, Output, OnReceive: false, OnTransmit: true)],
        [
            new PartRole(Roles.Transistor, PartClass.Transistor, RoleNeed.Required, []),
            new PartRole(Roles.BaseReturn, PartClass.Resistor, RoleNeed.Required, [PartValue.Resistance]),
            new PartRole(Roles.CollectorChoke, PartClass.Winding, RoleNeed.Required, [PartValue.Turns]),
            new PartRole(Roles.ClampDiode, PartClass.Diode, RoleNeed.Usual, []),
            new PartRole(Roles.BypassCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance], Most: 4),
            new PartRole(Roles.CouplingCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance]),
            new PartRole(Roles.BaseBead, PartClass.Other, RoleNeed.Optional, []),
            new PartRole(Roles.HeatSink, PartClass.Hardware, RoleNeed.Usual, []),
        ],
        [
            new SettingDescription(Settings.Saturation, QuantityKind.Voltage, 0.8),
            new SettingDescription(Settings.SupplyDrop, QuantityKind.Voltage, 0.35),
            new SettingDescription(Settings.Efficiency, QuantityKind.Ratio, 0.6),
            new SettingDescription(Settings.DriveNeeded, QuantityKind.Power, 0.08),
            new SettingDescription(Settings.PeakBase, QuantityKind.Voltage, 1.6),
            new SettingDescription(Settings.ChokeParallel, QuantityKind.Capacitance, 0),
            new SettingDescription(Settings.HeatSink, QuantityKind.Number, 20),
            new SettingDescription(Settings.InputResistance, QuantityKind.Resistance, 12),
            new SettingDescription(Settings.DesignReturn, QuantityKind.Resistance, 33),
        ],
        ["output-power", "gain", "drive", "supply-current"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.SingleEndedFinal.Texts", typeof(SingleEndedFinalKind).Assembly);

    public override IReadOnlyList<Alternative> Convert(StageDocument stage, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf) =>
        FinalConversion.Of(stage, to, demands, shelf);

    public override Finding Rethink(StageDocument stage, Surroundings to) =>
        new("final.device-too-slow-rethink", Severity.Fault, stage.Key, stage.OneInRole(Roles.Transistor)?.Designator, [Figure.Of("at", to.Reference), Figure.Of("wanted", to.Reference * 5)], StageAction.Rethink, OpenItemCodes.Rethink);

    public override Schematic Draw(StageDocument before, StageDocument? after)
    {
        var s = new SchematicSketch(DescriptionOf, before, after);
        s.Terminal(0, 8, Input);
        s.Wire(0, 8, 7, 8);
        s.Role(SymbolKind.Resistor, 4, 8, Orientation.Down, Roles.BaseReturn);
        s.Ground(4, 12);
        s.Role(SymbolKind.Bead, 7, 8, Orientation.Across, Roles.BaseBead);
        s.Role(SymbolKind.TransistorNpn, 13, 8, Orientation.Across, Roles.Transistor);
        s.Wire(11, 8, 13, 8);
        s.Wire(15, 10, 15, 11);
        s.Ground(15, 11);
        s.Wire(15, 6, 26, 6);
        s.Role(SymbolKind.ToroidCoil, 15, 2, Orientation.Down, Roles.CollectorChoke);
        s.Sign(SymbolKind.Supply, 15, 2);
        if (s.Role(SymbolKind.ZenerDiode, 21, 10, Orientation.Up, Roles.ClampDiode)) s.Ground(21, 10);
        s.Role(SymbolKind.Capacitor, 26, 6, Orientation.Across, Roles.CouplingCapacitor);
        s.Terminal(30, 6, Output);
        s.Point("B", 15, 6);
        return s.Finish();
    }

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.filter-signed"), Line.Of("line.tab-insulated"), Line.Of("line.collector-to-ground-not-short")],
        Figure.Of("limit", QuantityKind.Current, Math.Max(0.1, 1.5 * new FinalModel(Read(stage), surroundings).SupplyCurrent.Ampere)),
        [Line.Of("line.low-power-low-current"), Line.Of("line.low-power-high-current"), Line.Of("line.current-without-drive")],
        [Caution.Measuring("caution.dummy-load-first"), Caution.Measuring("caution.hot-tab"), Caution.Measuring("caution.no-load-kills"), Caution.Measuring("caution.meter-in-series")],
        Line.Of("set-up.dummy-load"));

    protected override FinalStage Read(StageDocument stage) => FinalStage.Read(stage);

    protected override FinalModel Model(FinalStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(FinalStage stage, FinalModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key) =>
        FinalJudgement.Of(stage, model, surroundings, demands, key);

    protected override IReadOnlyList<ExpectedReading> Expect(FinalStage stage, FinalModel model, Surroundings surroundings, string key) => FinalReadings.Of(model, key);
}
