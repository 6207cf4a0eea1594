using System.Globalization;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.SingleTunedFrontEnd;

/// <summary>Moves a front end: every core, turn count, capacitor and link that tunes the band; ranked by the smaller of trimmer travel and likeness
/// of the loaded Q to the designer's.</summary>
internal static class FrontEndConversion
{
    private const int Offered = 4;

    /// <summary>A loaded Q this many times off the designer's is as far as it may go (common practice).</summary>
    private const double FarthestQRatio = 1.5;
    private static readonly int[] Links = [1, 2, 3, 4, 5, 6, 7, 8];

    public static IReadOnlyList<Alternative> Of(StageDocument document, Surroundings from, Surroundings to, Shelf shelf)
    {
        var stage = FrontEndStage.Read(document);
        var wantedQ = new FrontEndModel(stage, from).LoadedQ;
        var best = CoilCores.For(stage.Winding, to.Band, shelf)
            .SelectMany(core => TankCandidates.On(core, stage.Winding, stage.Tank(to.Learnt), to.Band, shelf, to.Learnt)
                .SelectMany(tank => Links.Select(link => After(document, stage, tank, link)))
                .Select(after => (After: after, Margin: Margin(after, wantedQ, to)))
                .OrderByDescending(x => x.Margin).Take(2));
        return
        [
            .. best.Select(x => AlternativeOf(document, x.After, x.Margin, to, shelf))
                .OrderByDescending(a => a.WorstMargin.Si >= 0).ThenByDescending(a => a.InStock).ThenByDescending(a => a.WorstMargin.Si).Take(Offered),
        ];
    }

    /// <summary>Smaller of two margins, each zero where it is just enough and one at its best: trimmer travel over the bench window, and loaded Q.</summary>
    public static double Margin(StageDocument after, double wantedQ, Surroundings to)
    {
        var model = new FrontEndModel(FrontEndStage.Read(after), to);
        var likeness = 1 - (Math.Abs(Math.Log(model.LoadedQ / wantedQ)) / Math.Log(FarthestQRatio));
        return Math.Min(likeness, TravelMargin(model, to.Band));
    }

    private static double TravelMargin(FrontEndModel model, FrequencyRange band) =>
        (model.Tank.WorstTravel(band) - TunablePlace.BenchShare) / (0.5 - TunablePlace.BenchShare);

    private static StageDocument After(StageDocument document, FrontEndStage stage, TankCandidate tank, int link) => document.With(
        stage.Winding.With((PartValue.Turns, tank.Turns), (PartValue.LinkTurns, link), (PartValue.Inductance, null), (PartValue.InductanceFactor, null)) with { Type = tank.Core.Designation },
        CapacitorPart.Holding(stage.FixedCapacitor, tank.Fixed, tank.Second));

    private static Alternative AlternativeOf(StageDocument before, StageDocument after, double margin, Surroundings to, Shelf shelf)
    {
        var stage = FrontEndStage.Read(after);
        var model = new FrontEndModel(stage, to);
        var changes = PartChanges.Between(before, after);
        return new Alternative(
            string.Create(CultureInfo.InvariantCulture, $"rewind:{stage.Winding.Type}:{stage.Turns:0}+{stage.LinkTurns:0}"),
            after,
            changes,
            FrontEndJudgement.Of(stage, model, to, after.Key),
            [
                Figure.Of("needed-capacitance", model.Needed) with { Digits = 3 },
                Figure.Of("travel", QuantityKind.Ratio, model.Tank.Travel(to.Reference)) with { Digits = 2 },
                Figure.Of("loaded-q", QuantityKind.Number, model.LoadedQ) with { Digits = 2 },
                Figure.Of("loss", model.Loss) with { Digits = 2 },
            ],
            Figure.Of("worst-margin", QuantityKind.Ratio, margin),
            changes.All(c => Places.Fits(c.After)),
            Stock.Covers(shelf, changes, SingleTunedFrontEndKind.DescriptionOf));
    }
}
