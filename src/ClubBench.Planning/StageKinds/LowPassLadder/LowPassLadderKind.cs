using System.Resources;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Cards;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.LowPassLadder;

/// <summary>Low-pass ladder between 50 ohm ends: shunt capacitors and series windings, capacitor first.</summary>
internal sealed class LowPassLadderKind : StageKind<LowPassStage, LowPassModel>
{
    public const string Input = "input";
    public const string Output = "output";

    public static StageDescription DescriptionOf { get; } = new(
        "low-pass-ladder",
        DependsOn.SignalFrequency,
        [new PortDescription(Input, PortDirection.Both), new PortDescription(Output, PortDirection.Both)],
        [new Passage(Input, Output, OnReceive: false, OnTransmit: true), new Passage(Output, Input, OnReceive: true, OnTransmit: false)],
        [
            new PartRole(LowPassStage.Roles.ShuntCapacitor, PartClass.Capacitor, RoleNeed.Required, [PartValue.Capacitance], Most: 5, IsTuned: true),
            new PartRole(LowPassStage.Roles.SeriesWinding, PartClass.Winding, RoleNeed.Required, [PartValue.Turns], Most: 4, IsTuned: true),
        ],
        [
            new SettingDescription(LowPassStage.Settings.CoilQ, QuantityKind.Number, 150),
            new SettingDescription(LowPassStage.Settings.CapacitorQ, QuantityKind.Number, 1000),
        ],
        ["loss", "return-loss", "cut-off", "second-harmonic", "third-harmonic"]);

    public override StageDescription Description => DescriptionOf;

    public override ResourceManager Texts { get; } = new("ClubBench.Planning.StageKinds.LowPassLadder.Texts", typeof(LowPassLadderKind).Assembly);

    public override IReadOnlyList<Alternative> Convert(StageDocument stage, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf) =>
        LowPassConversion.Of(stage, from, to, demands, shelf);

    public override IReadOnlyList<Alternative> SearchThoroughly(ThoroughSearch search, IProgress<double>? progress, CancellationToken cancellation) =>
        LowPassConversion.Thoroughly(search, progress, cancellation);

    public override Schematic Draw(StageDocument before, StageDocument? after) => LowPassDrawing.Of(before, after);

    public override IReadOnlyList<Plot> Plots(StageComparison comparison) => [LowPassPlot.Of(comparison)];

    public override CardNotes Notes(StageDocument stage, Surroundings surroundings) => new(
        [Line.Of("line.look-at-joints"), Line.Of("line.through-under-one-ohm"), Line.Of("line.ends-to-ground-open")],
        null,
        [Line.Of("line.coil-off-a-little"), Line.Of("line.return-loss-low"), Line.Of("line.still-outside")],
        [Caution.Measuring("caution.no-key-down-before-filter"), Caution.Measuring("caution.rf-burns")],
        Line.Of("set-up.swept-cold"));

    public override BoardYield? Yield(StageDocument stage, Surroundings surroundings, IReadOnlyList<Demand> demands, ulong seed) =>
        LowPassYield.Of(LowPassStage.Read(stage), surroundings, demands, seed);

    protected override LowPassStage Read(StageDocument stage) => LowPassStage.Read(stage);

    protected override LowPassModel Model(LowPassStage stage, Surroundings surroundings) => new(stage, surroundings);

    protected override IReadOnlyList<Finding> Judge(LowPassStage stage, LowPassModel model, Surroundings surroundings, IReadOnlyList<Demand> demands, string key) =>
        LowPassJudgement.Of(model, surroundings, demands, key);

    protected override IReadOnlyList<ExpectedReading> Expect(LowPassStage stage, LowPassModel model, Surroundings surroundings, string key) =>
        LowPassReadings.Of(stage, model, surroundings, key);

    protected override IEnumerable<FieldMessage> Check(LowPassStage stage, StageDocument document, string path)
    {
        if (stage.Capacitors.Count - stage.Coils.Count != 1)
            yield return FieldMessage.Error($"{path}.parts", "kit.ladder-must-alternate", ("capacitors", $"{stage.Capacitors.Count}"), ("coils", $"{stage.Coils.Count}"));
    }
}
