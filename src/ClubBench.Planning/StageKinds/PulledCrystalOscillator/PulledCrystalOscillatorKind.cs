using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.PulledCrystalOscillator.OscillatorStage;

namespace ClubBench.Planning.StageKinds.PulledCrystalOscillator;

/// <summary>Crystal oscillator pulled by a series choke and a variable capacitor, one or more crystals in parallel, Colpitts.</summary>
internal sealed class PulledCrystalOscillatorKind : StageKind<OscillatorStage, OscillatorModel>
{
    public const string Output = "output";

    public static StageDescription DescriptionOf { get; } = new(
        "pulled-crystal-oscillator",
        DependsOn.OscillatorFrequency,
        [new PortDescription(Output, PortDirection.Out, 1000)],
        [new Passage("", Output, OnReceive: true, OnTransmit: true)],
        [
            new PartRole(Roles.Crystal, PartClass.Crystal, RoleNeed.Required, [PartValue.Frequency, PartValue.LoadCapacitance, PartValue.MotionalCapacitance, PartValue.StaticCapacitance, PartValue.MotionalResistance], Most: 3),
            new PartRole(Roles.SeriesInductor, PartClass.MouldedChoke, RoleNeed.Required, [PartValue.Inductance], IsTuned: true),
            new PartRole(Roles.TuningCapacitor, PartClass.VariableCapacitor, RoleNeed.Required, [PartValue.MinimumCapacitance, PartValue.MaximumCapacitance], IsTuned: true),
            new PartRole(Roles.Transistor, PartClass.Transistor, RoleNeed.Required, []),
            new PartRole(Roles.FeedbackUpper, PartClass.Capacitor, RoleNeed.Required, [PartValue.Capacitance], IsTuned: true),
            new PartRole(Roles.FeedbackLower, PartClass.Capacitor, RoleNeed.Required, [PartValue.Capacitance], IsTuned: true),
            new PartRole(Roles.OffsetCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance], IsTuned: true),
            new PartRole(Roles.OffsetSwitch, PartClass.Transistor, RoleNeed.Optional, []),
            new PartRole(Roles.OffsetResistor, PartClass.Resistor, RoleNeed.Optional, [PartValue.Resistance]),
            new PartRole(Roles.BiasResistor, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance], Most: 3),
            new PartRole(Roles.EmitterResistor, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance]),
            new PartRole(Roles.BypassCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance], Most: 3),
            new PartRole(Roles.OutputCoupling, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance], IsTuned: true),
        ],
        [
            new SettingDescription(Settings.SmallestTuning, QuantityKind.Capacitance, 12e-12),
            new SettingDescription(Settings.LargestTuning, QuantityKind.Capacitance, 150e-12),
            new SettingDescription(Settings.QuotedTuning, QuantityKind.Capacitance, 50e-12),
            new SettingDescription(Settings.Holder, QuantityKind.Capacitance, 0),
            new SettingDescription(Settings.NodeStray, QuantityKind.Capacitance, 0),
            new SettingDescription(Settings.Transconductance, QuantityKind.Number, 0.02),
            new SettingDescription(Settings.CollectorCurrent, QuantityKind.Current, 1e-3),
        ],
        ["lowest-frequency", "highest-frequency", "span", "receive-offset"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.PulledCrystalOscillator.Texts", typeof(PulledCrystalOscillatorKind).Assembly);

    public override IReadOnlyList<Alternative> Convert(StageDocument stage, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf) =>
        OscillatorConversion.Of(stage, from, to, shelf);

    public override Finding Rethink(StageDocument stage, Surroundings to) => OscillatorConversion.Rethink(stage, to);

    public override Schematic Draw(StageDocument before, StageDocument? after) => OscillatorDrawing.Of(before, after);

    public override IReadOnlyList<Plot> Plots(StageComparison comparison) => [OscillatorDrawing.Dial(comparison)];

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.crystals-both-soldered"), Line.Of("line.supply-to-ground-not-short")],
        Figure.Of("limit", QuantityKind.Current, 0.05),
        [Line.Of("line.span-of-one-crystal"), Line.Of("line.end-off-a-little"), Line.Of("line.no-oscillation")],
        [Caution.Measuring("caution.final-stays-off"), Caution.Measuring("caution.measure-behind-buffer")],
        Line.Of("set-up.counter-at-buffer"));

    protected override OscillatorStage Read(StageDocument stage) => OscillatorStage.Read(stage);

    protected override OscillatorModel Model(OscillatorStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(OscillatorStage stage, OscillatorModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key) =>
        OscillatorJudgement.Of(stage, model, surroundings, key);

    protected override IReadOnlyList<ExpectedReading> Expect(OscillatorStage stage, OscillatorModel model, Surroundings surroundings, string key) =>
        OscillatorReadings.Of(model, surroundings, key);

    protected override IEnumerable<FieldMessage> Check(OscillatorStage stage, StageDocument document, string path)
    {
        if (stage.Most <= stage.Least)
            yield return FieldMessage.Error($"{path}.settings.{Settings.LargestTuning}", "kit.tuning-without-swing", ("part", stage.Tuning.Designator));
    }
}
