using System.Resources;
using ClubBench.Calculation.Audio;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.AudioBandPass.BandPassStage;

namespace ClubBench.Planning.StageKinds.AudioBandPass;

/// <summary>Audio preamplifier with band-pass sections for telegraphy.</summary>
internal sealed class AudioBandPassKind : StageKind<BandPassStage, BandPassModel>
{
    public const string Input = "input";
    public const string Output = "output";
    private const string HalfSupply = "half-supply";

    /// <summary>Section capacitors further apart than their usual tolerances are mixed up.</summary>
    private const double MostCapacitorRatio = 1.25;
    private const double CentreRoom = 0.05;
    private const double GainRoomDb = 3;

    public static StageDescription DescriptionOf { get; } = new(
        "audio-band-pass",
        DependsOn.AudioFrequency,
        [new PortDescription(Input, PortDirection.In, 10_000), new PortDescription(Output, PortDirection.Out, 10_000)],
        [new Passage(Input, Output, OnReceive: true, OnTransmit: false)],
        [
            new PartRole(Roles.PreamplifierCircuit, PartClass.IntegratedCircuit, RoleNeed.Usual, []),
            new PartRole(Roles.Input, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance], Most: 2),
            new PartRole(Roles.Feedback, PartClass.Resistor, RoleNeed.Usual, [PartValue.Resistance], Most: 2),
            new PartRole(Roles.FeedbackCapacitor, PartClass.Capacitor, RoleNeed.Optional, [PartValue.Capacitance], Most: 2),
            new PartRole(Roles.FilterCircuit, PartClass.IntegratedCircuit, RoleNeed.Usual, []),
            new PartRole(Roles.SectionInput, PartClass.Resistor, RoleNeed.Required, [PartValue.Resistance], Most: 4),
            new PartRole(Roles.SectionShunt, PartClass.Resistor, RoleNeed.Required, [PartValue.Resistance], Most: 4),
            new PartRole(Roles.SectionFeedback, PartClass.Resistor, RoleNeed.Required, [PartValue.Resistance], Most: 4),
            new PartRole(Roles.SectionCapacitor, PartClass.Capacitor, RoleNeed.Required, [PartValue.Capacitance], Most: 8, IsTuned: true),
        ],
        [
            new SettingDescription(Settings.Sections, QuantityKind.Count, 2),
            new SettingDescription(Settings.NoiseFigure, QuantityKind.Decibels, 10),
        ],
        ["centre", "section-q", "section-gain", "preamplifier-gain"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.AudioBandPass.Texts", typeof(AudioBandPassKind).Assembly);

    public override Schematic Draw(StageDocument before, StageDocument? after)
    {
        var s = new SchematicSketch(DescriptionOf, before, after);
        var capacitors = (after ?? before).InRole(Roles.SectionCapacitor).ToList();
        s.Terminal(0, 7, Input);
        s.Wire(0, 7, 2, 7);
        s.Terminal(2, 9, HalfSupply);
        s.Role(SymbolKind.Amplifier, 2, 7, Orientation.Across, Roles.PreamplifierCircuit);
        s.Wire(6, 8, 8, 8);
        s.Role(SymbolKind.Resistor, 8, 8, Orientation.Across, Roles.SectionInput);
        s.Role(SymbolKind.Resistor, 12, 8, Orientation.Down, Roles.SectionShunt);
        s.Ground(12, 12);
        s.Wire(12, 8, 14, 8);
        s.Part(SymbolKind.Capacitor, 14, 8, Orientation.Across, capacitors[0]);
        s.Wire(18, 8, 20, 8);
        s.Role(SymbolKind.Amplifier, 20, 8, Orientation.Across, Roles.FilterCircuit);
        s.Terminal(20, 10, HalfSupply);
        s.Wire(18, 4, 18, 8);
        s.Role(SymbolKind.Resistor, 18, 4, Orientation.Across, Roles.SectionFeedback);
        s.Wire(22, 4, 24, 4);
        s.Wire(12, 0, 12, 8);
        if (capacitors.Count > 1) s.Part(SymbolKind.Capacitor, 18, 0, Orientation.Across, capacitors[1]);
        s.Wire(12, 0, 18, 0);
        s.Wire(22, 0, 24, 0);
        s.Wire(24, 0, 24, 9);
        s.Wire(24, 9, 30, 9);
        s.Terminal(30, 9, Output);
        s.Point("A", 24, 9);
        return s.Finish();
    }

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.look-at-joints"), Line.Of("line.notch-right-way"), Line.Of("line.values-read-aloud")],
        Figure.Of("limit", QuantityKind.Current, 0.03),
        [Line.Of("line.centre-off"), Line.Of("line.no-gain"), Line.Of("line.call-mentor")],
        [],
        Line.Of("set-up.audio-generator"));

    protected override BandPassStage Read(StageDocument stage) => BandPassStage.Read(stage);

    protected override BandPassModel Model(BandPassStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(BandPassStage stage, BandPassModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key)
    {
        var findings = new List<Finding>();
        if (Math.Abs(model.OffPitchHertz) > PitchAgreement.LargestSpreadHertz)
            findings.Add(new Finding(
                "band-pass.off-pitch",
                Severity.Warning,
                key,
                stage.SectionShunt.Designator,
                [Figure.Of("centre", model.Section.Centre) with { Digits = 3 }, Figure.Of("pitch", model.Pitch) with { Digits = 3 }],
                StageAction.Check));
        if (stage.CapacitorRatio > MostCapacitorRatio)
            findings.Add(new Finding("band-pass.capacitors-differ", Severity.Warning, key, stage.Capacitors[0].Designator, [Figure.Of("times", QuantityKind.Number, stage.CapacitorRatio) with { Digits = 2 }], StageAction.Check));
        return findings;
    }

    protected override IReadOnlyList<ExpectedReading> Expect(BandPassStage stage, BandPassModel model, Surroundings surroundings, string key)
    {
        var (centre, gain) = (model.Section.Centre.Hertz, model.Gain.Db);
        var sections = stage.Capacitors.ToDictionary(c => c.Designator, _ => -1.0 / stage.Capacitors.Count, StringComparer.Ordinal);
        return
        [
            new($"{key}.centre", QuantityKind.Frequency, centre, (1 - CentreRoom) * centre, (1 + CentreRoom) * centre, "set-up.audio-generator", InstrumentClass.Receiver, WindowSides.Both, sections),
            new($"{key}.gain", QuantityKind.Decibels, gain, gain - GainRoomDb, gain + GainRoomDb, "set-up.gain-at-centre", InstrumentClass.Oscilloscope, WindowSides.Both, new Dictionary<string, double>()),
        ];
    }
}
