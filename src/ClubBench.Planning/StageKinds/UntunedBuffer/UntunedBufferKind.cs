using System.Resources;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.UntunedBuffer.BufferStage;

namespace ClubBench.Planning.StageKinds.UntunedBuffer;

/// <summary>Untuned buffer: a follower and an amplifying transistor, with a tap for the receiver's mixer.</summary>
internal sealed class UntunedBufferKind : StageKind<BufferStage, BufferModel>
{
    public const string Input = "input";
    public const string Output = "output";
    public const string Tap = "oscillator-tap";

    public static StageDescription DescriptionOf { get; } = new(
        "untuned-buffer",
        DependsOn.OscillatorFrequency,
        [new PortDescription(Input, PortDirection.In, 10_000), new PortDescription(Output, PortDirection.Out, 100), new PortDescription(Tap, PortDirection.Out, 5000)],
        [new Passage(Input, Output, OnReceive: false, OnTransmit: true), new Passage(Input, Tap, OnReceive: true, OnTransmit: false)],
        [
            new PartRole(Roles.FollowerTransistor, PartClass.Transistor, RoleNeed.Required, []),
            new PartRole(Roles.AmplifierTransistor, PartClass.Transistor, RoleNeed.Required, []),
            new PartRole(Roles.BiasResistor, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance], Most: 5),
            new PartRole(Roles.FollowerResistor, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance]),
            new PartRole(Roles.EmitterResistor, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance]),
            new PartRole(Roles.UnbypassedResistor, PartClass.Resistor, RoleNeed.Optional, [PartValue.Resistance]),
            new PartRole(Roles.CouplingCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance], Most: 3),
            new PartRole(Roles.BypassCapacitor, PartClass.Capacitor, RoleNeed.Usual, [PartValue.Capacitance], Most: 3),
            new PartRole(Roles.TapCapacitor, PartClass.Capacitor, RoleNeed.Required, [PartValue.Capacitance], IsTuned: true),
        ],
        [
            new SettingDescription(Settings.OutputPower, QuantityKind.Power, 2e-3),
            new SettingDescription(Settings.TapVoltage, QuantityKind.PeakToPeakVoltage, 0.35),
            new SettingDescription(Settings.CollectorCurrent, QuantityKind.Current, 5e-3),
            new SettingDescription(Settings.AroundCoupling, QuantityKind.Resistance, 300),
            new SettingDescription(Settings.Load, QuantityKind.Resistance, 100),
        ],
        ["output-power", "tap-voltage"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.UntunedBuffer.Texts", typeof(UntunedBufferKind).Assembly);

    /// <summary>Larger coupling and bypass capacitors where the band is too low for those fitted.</summary>
    public override IReadOnlyList<Alternative> Convert(StageDocument stage, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf)
    {
        var read = BufferStage.Read(stage);
        var emitter = Resistance.FromOhm(CouplingCapacitor.EmitterResistance(read.Collector).Ohm + read.UnbypassedOhm);
        var larger = read.Couplings.Select(c => Larger(c, to.Band.Low, read.AroundCoupling)).Concat(read.Bypasses.Select(c => Larger(c, to.Band.Low, emitter))).OfType<Part>().ToList();
        if (larger.Count == 0) return [];
        var after = stage.With(larger);
        var model = new BufferModel(BufferStage.Read(after), to);
        var changes = PartChanges.Between(stage, after);
        return
        [
            new Alternative("larger-capacitors", after, changes, [], [Figure.Of("coupling-loss", model.CouplingLoss), Figure.Of("bypass-loss", model.BypassLoss)],
                Figure.Of("worst-margin", QuantityKind.Decibels, 0.5 - Math.Max(model.CouplingLoss.Db, model.BypassLoss.Db)), changes.All(c => Places.Fits(c.After)), Stock.Covers(shelf, changes, DescriptionOf)),
        ];
    }

    public override Schematic Draw(StageDocument before, StageDocument? after)
    {
        var s = new SchematicSketch(DescriptionOf, before, after);
        s.Terminal(0, 8, Input);
        s.Wire(0, 8, 4, 8);
        s.Role(SymbolKind.TransistorNpn, 4, 8, Orientation.Across, Roles.FollowerTransistor);
        s.Sign(SymbolKind.Supply, 6, 6);
        s.Role(SymbolKind.Resistor, 6, 10, Orientation.Down, Roles.FollowerResistor);
        s.Ground(6, 14);
        s.Wire(6, 10, 12, 10);
        s.Role(SymbolKind.Capacitor, 12, 10, Orientation.Across, Roles.CouplingCapacitor);
        s.Role(SymbolKind.TransistorNpn, 18, 10, Orientation.Across, Roles.AmplifierTransistor);
        s.Wire(16, 10, 18, 10);
        s.Role(SymbolKind.Resistor, 20, 12, Orientation.Down, Roles.UnbypassedResistor);
        s.Ground(20, 16);
        s.Wire(20, 8, 30, 8);
        s.Terminal(30, 8, Output);
        s.Wire(12, 10, 12, 5);
        s.Role(SymbolKind.Capacitor, 12, 5, Orientation.Across, Roles.TapCapacitor);
        s.Wire(16, 5, 26, 5);
        s.Terminal(26, 5, Tap);
        s.Point("B", 20, 8);
        return s.Finish();
    }

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.look-at-joints"), Line.Of("line.supply-not-short")],
        Figure.Of("limit", QuantityKind.Current, 0.05),
        [Line.Of("line.level-low"), Line.Of("line.nothing-at-all")],
        [],
        null);

    protected override BufferStage Read(StageDocument stage) => BufferStage.Read(stage);

    protected override BufferModel Model(BufferStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(BufferStage stage, BufferModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key)
    {
        var findings = new List<Finding>();
        IReadOnlyList<Figure> figures = [Figure.Of("coupling-loss", model.CouplingLoss), Figure.Of("bypass-loss", model.BypassLoss), Figure.Of("at", model.Low)];
        var emitter = Resistance.FromOhm(CouplingCapacitor.EmitterResistance(stage.Collector).Ohm + stage.UnbypassedOhm);
        var worst = stage.Couplings.Select(c => CouplingCapacitor.Judge(Farads(c), model.Low, stage.AroundCoupling))
            .Concat(stage.Bypasses.Select(c => CouplingCapacitor.JudgeBypass(CouplingCapacitor.Loss(Farads(c), model.Low, emitter)))).DefaultIfEmpty(Calculation.Broadband.Verdict.Leave).Max();
        if (worst == Calculation.Broadband.Verdict.Change) findings.Add(new Finding("buffer.capacitors-too-small", Severity.Warning, key, null, figures, StageAction.Change, OpenItemCodes.CouplingCapacitors));
        else if (worst == Calculation.Broadband.Verdict.Check) findings.Add(new Finding("buffer.capacitors-small", Severity.Warning, key, null, figures, StageAction.Check));
        var ft = Transistors.Find(stage.Amplifier.Type)?.TransitionFrequencyForVerdict;
        if (CurrentGain.Suitability(ft, surroundings.Band.High) is FrequencySuitability.LowGainFinalOnly or FrequencySuitability.Unsuitable)
            findings.Add(new Finding("buffer.device-slow", Severity.Warning, key, stage.Amplifier.Designator, [Figure.Of("ratio", QuantityKind.Number, ft!.Value / surroundings.Band.High) with { Digits = 2 }], StageAction.Check));
        return findings;
    }

    protected override IReadOnlyList<ExpectedReading> Expect(BufferStage stage, BufferModel model, Surroundings surroundings, string key) =>
    [
        new($"{key}.tap-voltage", QuantityKind.PeakToPeakVoltage, stage.TapPeakToPeak.Volt, 0.7 * stage.TapPeakToPeak.Volt, 1.3 * stage.TapPeakToPeak.Volt, "set-up.scope-at-tap", InstrumentClass.Oscilloscope, WindowSides.Both, new Dictionary<string, double>()),
    ];

    private static Part? Larger(Part part, Frequency low, Resistance around) =>
        CouplingCapacitor.Judge(Farads(part), low, around) == Calculation.Broadband.Verdict.Leave ? null : part.With((PartValue.Capacitance, CouplingCapacitor.Wanted(low, around).Farad));

    private static Capacitance Farads(Part part) => Capacitance.FromFarad(part.Need(PartValue.Capacitance));
}
