using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using static ClubBench.Planning.StageKinds.SingleTunedFrontEnd.FrontEndStage;

namespace ClubBench.Planning.StageKinds.SingleTunedFrontEnd;

/// <summary>Receiver input with one tuned circuit: link to the antenna side, top of the coil to the mixer.</summary>
internal sealed class SingleTunedFrontEndKind : StageKind<FrontEndStage, FrontEndModel>
{
    public const string Input = "input";
    public const string Output = "output";

    /// <summary>What a mixer circuit shows across both inputs, where nobody presents it (from memory of data sheets).</summary>
    public const double NominalLoadOhm = 3000;

    public static StageDescription DescriptionOf { get; } = new(
        "single-tuned-front-end",
        DependsOn.SignalFrequency,
        [new PortDescription(Input, PortDirection.In), new PortDescription(Output, PortDirection.Out, NominalLoadOhm)],
        [new Passage(Input, Output, OnReceive: true, OnTransmit: false)],
        [
            new PartRole(Roles.Winding, PartClass.Winding, RoleNeed.Required, [PartValue.Turns, PartValue.LinkTurns], IsTuned: true),
            new PartRole(Roles.FixedCapacitor, PartClass.Capacitor, RoleNeed.Required, [PartValue.Capacitance], IsTuned: true),
            new PartRole(Roles.Trimmer, PartClass.Trimmer, RoleNeed.Required, [PartValue.MinimumCapacitance, PartValue.MaximumCapacitance], IsTuned: true),
        ],
        [
            new SettingDescription(Settings.Stray, QuantityKind.Capacitance, 8e-12),
            new SettingDescription(Settings.CoilQ, QuantityKind.Number, 180),
        ],
        ["tunes-low", "tunes-high", "needed-capacitance", "loaded-q", "loss"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.SingleTunedFrontEnd.Texts", typeof(SingleTunedFrontEndKind).Assembly);

    public override IReadOnlyList<Alternative> Convert(StageDocument stage, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf) =>
        FrontEndConversion.Of(stage, from, to, shelf);

    public override Schematic Draw(StageDocument before, StageDocument? after)
    {
        var s = new SchematicSketch(DescriptionOf, before, after);
        s.Terminal(0, 4, Input);
        s.Wire(0, 4, 6, 4);
        s.Role(SymbolKind.Transformer, 6, 4, Orientation.Down, Roles.Winding);
        s.Wire(6, 8, 6, 9);
        s.Ground(6, 9);
        s.Wire(8, 4, 28, 4);
        s.Role(SymbolKind.Capacitor, 14, 4, Orientation.Down, Roles.FixedCapacitor);
        s.Role(SymbolKind.Trimmer, 20, 4, Orientation.Down, Roles.Trimmer);
        s.Wire(8, 8, 20, 8);
        s.Ground(14, 8);
        s.Terminal(28, 4, Output);
        s.Point("A", 20, 4);
        return s.Finish();
    }

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.look-at-joints"), Line.Of("line.link-through")],
        null,
        [Line.Of("line.peak-at-end"), Line.Of("line.no-peak"), Line.Of("line.call-mentor")],
        [Caution.Measuring("caution.no-key-down-before-filter")],
        Line.Of("set-up.load-at-antenna"));

    protected override FrontEndStage Read(StageDocument stage) => FrontEndStage.Read(stage);

    protected override IEnumerable<FieldMessage> Check(FrontEndStage stage, StageDocument document, string path)
    {
        if (WindingPart.InductanceOf(stage.Winding) is null)
            yield return FieldMessage.Error($"{path}.parts", "kit.value-missing", ("part", stage.Winding.Designator), ("name", PartValue.Inductance));
    }

    protected override FrontEndModel Model(FrontEndStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(FrontEndStage stage, FrontEndModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key) =>
        FrontEndJudgement.Of(stage, model, surroundings, key);

    protected override IReadOnlyList<ExpectedReading> Expect(FrontEndStage stage, FrontEndModel model, Surroundings surroundings, string key) =>
    [
        .. WindingPart.Of(stage.Winding, surroundings.Learnt) is { } w ? [WindingExpectation.For(key, w, model.Tank.TrimRange(surroundings.Reference))] : Array.Empty<ExpectedReading>(),
        TrimmerExpectation.For(key, model.Tank, surroundings.Reference, TunablePlace.BenchShare, "set-up.peak-on-noise"),
    ];
}
