using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.SeriesTunedTap.TapStage;
using CardLine = ClubBench.Planning.Cards.Line;

namespace ClubBench.Planning.StageKinds.SeriesTunedTap;

/// <summary>Receive tap of the transmit-receive switch: a series-tuned circuit off the line with clamp diodes at its inner node.</summary>
internal sealed class SeriesTunedTapKind : StageKind<TapStage, TapModel>
{
    public const string Line = "line";
    public const string Receiver = "receiver";

    public static StageDescription DescriptionOf { get; } = new(
        "series-tuned-tap",
        DependsOn.SignalFrequency,
        [new PortDescription(Line, PortDirection.Both), new PortDescription(Receiver, PortDirection.Out)],
        [new Passage(Line, Receiver, OnReceive: true, OnTransmit: false)],
        [
            new PartRole(Roles.Choke, PartClass.MouldedChoke, RoleNeed.Required, [PartValue.Inductance], IsTuned: true),
            new PartRole(Roles.Trimmer, PartClass.Trimmer, RoleNeed.Required, [PartValue.MinimumCapacitance, PartValue.MaximumCapacitance], IsTuned: true),
            new PartRole(Roles.Padding, PartClass.Capacitor, RoleNeed.Optional, [PartValue.Capacitance], IsTuned: true),
            new PartRole(Roles.ClampDiode, PartClass.Diode, RoleNeed.Usual, [], Most: 4),
        ],
        [new SettingDescription(Settings.ChokeQ, QuantityKind.Number, 40)],
        ["needed-capacitance", "receive-loss", "reactance"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.SeriesTunedTap.Texts", typeof(SeriesTunedTapKind).Assembly);

    public override IReadOnlyList<Alternative> Convert(StageDocument stage, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf) =>
        TapConversion.Of(stage, to, shelf);

    public override Schematic Draw(StageDocument before, StageDocument? after)
    {
        var s = new SchematicSketch(DescriptionOf, before, after);
        s.Terminal(0, 4, Line);
        s.Wire(0, 4, 3, 4);
        s.Role(SymbolKind.Choke, 3, 4, Orientation.Across, Roles.Choke);
        s.Wire(7, 4, 16, 4);
        var diodes = (after ?? before).InRole(Roles.ClampDiode).ToList();
        for (var i = 0; i < diodes.Count; i++)
        {
            var x = 9 + (4 * (i / 2));
            if (x > 16) s.Wire(16, 4, x, 4);
            var (above, isBack) = (4 + (4 * (i % 2)), i / 2 % 2 == 1);
            s.Part(SymbolKind.Diode, x, isBack ? above + 4 : above, isBack ? Orientation.Up : Orientation.Down, diodes[i]);
            if (i % 2 == 1 || i == diodes.Count - 1) s.Ground(x, 8 + (4 * (i % 2)));
        }

        s.Role(SymbolKind.Trimmer, 16, 4, Orientation.Across, Roles.Trimmer);
        if (s.Role(SymbolKind.Capacitor, 16, -1, Orientation.Across, Roles.Padding))
        {
            s.Wire(16, -1, 16, 4);
            s.Wire(20, -1, 20, 4);
        }

        s.Wire(20, 4, 24, 4);
        s.Terminal(24, 4, Receiver);
        s.Point("A", 20, 4);
        return s.Finish();
    }

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [CardLine.Of("line.look-at-joints"), CardLine.Of("line.diodes-both-ways"), CardLine.Of("line.choke-through")],
        null,
        [CardLine.Of("line.peak-at-end"), CardLine.Of("line.no-peak"), CardLine.Of("line.call-mentor")],
        [Caution.Measuring("caution.tune-on-receive"), Caution.Measuring("caution.no-key-down-before-filter")],
        CardLine.Of("set-up.load-at-antenna"));

    protected override TapStage Read(StageDocument stage) => TapStage.Read(stage);

    protected override TapModel Model(TapStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(TapStage stage, TapModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key) =>
        TapJudgement.Of(stage, model, surroundings, key);

    protected override IReadOnlyList<ExpectedReading> Expect(TapStage stage, TapModel model, Surroundings surroundings, string key) =>
    [
        TrimmerExpectation.For(key, model.Place, surroundings.Reference, TunablePlace.BenchShare, "set-up.peak-on-noise"),
    ];
}
