using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.Supply.SupplyStage;

namespace ClubBench.Planning.StageKinds.Supply;

/// <summary>Supply input: polarity diode, fuse, reservoir, regulator.</summary>
internal sealed class SupplyKind : StageKind<SupplyStage, SupplyModel>
{
    public const string Input = "input";
    public const string Output = "output";

    /// <summary>A fuse below this multiple of the current ages and opens; above the other it protects the leads only (common practice).</summary>
    private const double LeastFuseRatio = 1.5;
    private const double MostFuseRatio = 10;

    /// <summary>What small three-pin regulators need over their output (from memory of data sheets).</summary>
    private const double LeastHeadroomV = 2;
    private const double RegulatorRoom = 0.03;

    public static StageDescription DescriptionOf { get; } = new(
        "supply",
        DependsOn.Nothing,
        [new PortDescription(Input, PortDirection.In), new PortDescription(Output, PortDirection.Out)],
        [],
        [
            new PartRole(Roles.PolarityDiode, PartClass.Diode, RoleNeed.Required, []),
            new PartRole(Roles.Fuse, PartClass.Hardware, RoleNeed.Required, [PartValue.RatedCurrent]),
            new PartRole(Roles.Reservoir, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance]),
            new PartRole(Roles.Regulator, PartClass.IntegratedCircuit, RoleNeed.Optional, [PartValue.Voltage]),
            new PartRole(Roles.RegulatorCapacitor, PartClass.Capacitor, RoleNeed.Optional, [PartValue.Capacitance], Most: 2),
        ],
        [
            new SettingDescription(Settings.DiodeDrop, QuantityKind.Voltage, 0.35),
            new SettingDescription(Settings.RestCurrent, QuantityKind.Current, 0.08),
            new SettingDescription(Settings.Efficiency, QuantityKind.Ratio, 0.5),
        ],
        ["regulated-voltage", "drawn-current"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.Supply.Texts", typeof(SupplyKind).Assembly);

    public override Schematic Draw(StageDocument before, StageDocument? after)
    {
        var s = new SchematicSketch(DescriptionOf, before, after);
        s.Terminal(0, 4, Input);
        s.Wire(0, 4, 2, 4);
        s.Role(SymbolKind.Fuse, 2, 4, Orientation.Across, Roles.Fuse);
        s.Wire(6, 4, 8, 4);
        s.Role(SymbolKind.Diode, 8, 4, Orientation.Across, Roles.PolarityDiode);
        s.Wire(12, 4, 18, 4);
        if (s.Role(SymbolKind.Electrolytic, 14, 4, Orientation.Down, Roles.Reservoir)) s.Ground(14, 8);
        if (s.Role(SymbolKind.Regulator, 18, 4, Orientation.Across, Roles.Regulator))
        {
            s.Wire(20, 5, 20, 6);
            s.Ground(20, 6);
            s.Wire(22, 4, 28, 4);
            if (s.Role(SymbolKind.Capacitor, 25, 4, Orientation.Down, Roles.RegulatorCapacitor)) s.Ground(25, 8);
        }
        else
        {
            s.Wire(18, 4, 28, 4);
        }

        s.Terminal(28, 4, Output);
        s.Point("A", 12, 4);
        s.Point("B", 22, 4);
        return s.Finish();
    }

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.look-at-joints"), Line.Of("line.diode-stripe"), Line.Of("line.supply-not-short")],
        Figure.Of("limit", QuantityKind.Current, 0.05),
        [Line.Of("line.no-volts"), Line.Of("line.volts-outside"), Line.Of("line.call-mentor")],
        [Caution.BeforePower("caution.polarity"), Caution.BeforePower("caution.fuse-at-source"), Caution.BeforePower("caution.lithium-pack"), Caution.Measuring("caution.probe-slips")],
        null);

    protected override SupplyStage Read(StageDocument stage) => SupplyStage.Read(stage);

    protected override IEnumerable<FieldMessage> Check(SupplyStage stage, StageDocument document, string path)
    {
        if (stage.Efficiency is <= 0 or > 1)
            yield return FieldMessage.Error($"{path}.settings.{Settings.Efficiency}", "kit.efficiency-outside");
    }

    protected override SupplyModel Model(SupplyStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(SupplyStage stage, SupplyModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key)
    {
        var findings = new List<Finding>();
        IReadOnlyList<Figure> fuse = [Figure.Of("fuse-rating", stage.FuseRating), Figure.Of("drawn-current", model.Drawn) with { Digits = 2 }];
        if (model.FuseRatio < LeastFuseRatio) findings.Add(new Finding("supply.fuse-too-small", Severity.Warning, key, stage.Fuse.Designator, fuse, StageAction.Check));
        else if (model.FuseRatio > MostFuseRatio) findings.Add(new Finding("supply.fuse-too-large", Severity.Warning, key, stage.Fuse.Designator, fuse, StageAction.Check));
        if (model.HeadroomVolt is { } volts and < LeastHeadroomV)
            findings.Add(new Finding("supply.little-headroom", Severity.Warning, key, stage.Regulator!.Designator, [Figure.Of("headroom", QuantityKind.Voltage, volts) with { Digits = 2 }, Figure.Of("least", QuantityKind.Voltage, LeastHeadroomV)], StageAction.Check));
        return findings;
    }

    protected override IReadOnlyList<ExpectedReading> Expect(SupplyStage stage, SupplyModel model, Surroundings surroundings, string key) =>
        stage.Regulated is { Volt: var v }
            ? [new($"{key}.regulated-voltage", QuantityKind.Voltage, v, (1 - RegulatorRoom) * v, (1 + RegulatorRoom) * v, "set-up.meter-behind-regulator", InstrumentClass.Multimeter, WindowSides.Both, new Dictionary<string, double>())]
            : [];
}
