using System.Globalization;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.TunedDriver;

/// <summary>Moves a tuned driver: every core, turn count, capacitor and link that tunes the band; ranked by the smaller of drive and trimmer margin.</summary>
internal static class DriverConversion
{
    private const int Offered = 4;
    private static readonly int[] Links = [2, 3, 4, 5, 6, 7, 8];

    public static IReadOnlyList<Alternative> Of(StageDocument document, Surroundings from, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf)
    {
        var stage = DriverStage.Read(document);
        if (DriverJudgement.Of(stage, new DriverModel(stage, to), to, demands, document.Key).Any(f => f.Code == "driver.device-too-slow")) return [];
        var wanted = demands.Where(d => d.Code == DemandCodes.OutputPower).Select(d => d.Wanted.Si).DefaultIfEmpty(0).Max();
        var old = new DriverModel(stage, to).Tank;
        var designedQ = new DriverModel(stage, from).LoadedQ;
        var best = CoilCores.For(stage.Winding, to.Band, shelf)
            .SelectMany(core => TankCandidates.On(core, stage.Winding, old, to.Band, shelf, to.Learnt)
                .SelectMany(tank => Links.Select(link => (Tank: tank, After: After(document, stage, tank, link))))
                .Select(x => (x.Tank, x.After, Margin: Margin(x.After, x.Tank, wanted, designedQ, to)))
                .OrderByDescending(x => x.Margin).Take(2))
            .OrderByDescending(x => x.Margin);
        return
        [
            .. best.Select(x => AlternativeOf(document, x.After, x.Margin, to, demands, shelf))
                .OrderByDescending(a => a.WorstMargin.Si >= 0).ThenByDescending(a => a.InStock).ThenByDescending(a => a.WorstMargin.Si).Take(Offered),
        ];
    }

    /// <summary>Smallest of three margins, each zero where it is just enough: drive over what is asked, trimmer travel over a comfortable fifth,
    /// loaded Q within half and twice the designer's (harmonics below, touchy tuning above).</summary>
    public static double Margin(StageDocument after, TankCandidate tank, double wantedWatt, double designedQ, Surroundings to)
    {
        var model = new DriverModel(DriverStage.Read(after), to);
        var drive = wantedWatt > 0 ? (model.Available.Watt / wantedWatt) - 1 : 1;
        var selectivity = 1 - Math.Abs(Math.Log2(model.LoadedQ / designedQ));
        return new[] { drive, selectivity, (tank.Travel - 0.2) / 0.3 }.Min();
    }

    private static StageDocument After(StageDocument document, DriverStage stage, TankCandidate tank, int link) => document.With(
        stage.Winding.With((PartValue.Turns, tank.Turns), (PartValue.LinkTurns, link), (PartValue.Inductance, null), (PartValue.InductanceFactor, null)) with { Type = tank.Core.Designation },
        CapacitorPart.Holding(stage.TankCapacitor, tank.Fixed, tank.Second));

    private static Alternative AlternativeOf(StageDocument before, StageDocument after, double margin, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf)
    {
        var stage = DriverStage.Read(after);
        var model = new DriverModel(stage, to);
        var changes = PartChanges.Between(before, after);
        return new Alternative(
            string.Create(CultureInfo.InvariantCulture, $"rewind:{stage.Winding.Type}:{stage.Turns:0}+{stage.LinkTurns:0}"),
            after,
            changes,
            [.. DriverJudgement.Of(stage, model, to, demands, after.Key).Where(f => f.AtLeast >= StageAction.Check)],
            [Figure.Of("available-power", model.Available), Figure.Of("needed-capacitance", model.Needed), Figure.Of("travel", QuantityKind.Ratio, model.Tank.Travel(to.Reference)), Figure.Of("loaded-q", QuantityKind.Number, model.LoadedQ) with { Digits = 2 }],
            Figure.Of("worst-margin", QuantityKind.Ratio, margin),
            changes.All(c => Places.Fits(c.After)),
            Stock.Covers(shelf, changes, TunedDriverKind.DescriptionOf));
    }
}
