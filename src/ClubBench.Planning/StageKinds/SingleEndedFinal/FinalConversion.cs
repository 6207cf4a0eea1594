using System.Globalization;
using ClubBench.Calculation.Broadband;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.SingleEndedFinal;

/// <summary>What can be done to a final without another device: another base return, more turns on the choke, a larger coupling capacitor.</summary>
internal static class FinalConversion
{
    private const int MostChokeTurns = 30;

    public static IReadOnlyList<Alternative> Of(StageDocument document, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf)
    {
        var stage = FinalStage.Read(document);
        var model = new FinalModel(stage, to);
        if (FinalJudgement.Of(stage, model, to, demands, document.Key).Any(f => f.Code == "final.device-too-slow")) return [];
        var repaired = Repaired(document, stage, to);
        var options = new List<(string Id, StageDocument After)>();
        if (PartChanges.Between(document, repaired).Count > 0) options.Add(("choke-and-coupling", repaired));
        if (Math.Abs(model.Lost.Db) > 0.1)
            options.AddRange((model.Lost.Db > 0 ? FinalJudgement.Upward : FinalJudgement.Downward).Select(ohm => (Id(ohm), WithReturn(repaired, stage, ohm))));
        return [.. options.Select(o => AlternativeOf(o.Id, document, o.After, to, demands, shelf))];
    }

    private static string Id(double ohm) => "base-return:" + ohm.ToString("0", CultureInfo.InvariantCulture);

    /// <summary>The design's resistor stays on record, so that the drive the papers give keeps its meaning.</summary>
    private static StageDocument WithReturn(StageDocument document, FinalStage stage, double ohm) =>
        document.With(stage.BaseReturn.With((PartValue.Resistance, ohm))).WithSetting(FinalStage.Settings.DesignReturn, stage.DesignReturn.Ohm);

    private static StageDocument Repaired(StageDocument document, FinalStage stage, Surroundings to)
    {
        var after = document;
        if (ChokeTurns(stage, to) is { } turns) after = after.With(stage.Choke.With((PartValue.Turns, turns), (PartValue.Inductance, null)));
        if (stage.Coupling?.Value(PartValue.Capacitance) is { } farad
            && CouplingCapacitor.Judge(Capacitance.FromFarad(farad), to.Band.Low, FinalStage.Load * 2) == Calculation.Broadband.Verdict.Change)
            after = after.With(stage.Coupling.With((PartValue.Capacitance, CouplingCapacitor.Wanted(to.Band.Low, FinalStage.Load * 2).Farad)));
        return after;
    }

    /// <summary>Fewest turns whose impedance is at least five times the load; null where the choke serves, or none do without saturating.</summary>
    private static int? ChokeTurns(FinalStage stage, Surroundings to)
    {
        if (Cores.FindToroid(stage.Choke.Type) is not { } core) return null;
        var now = (int)stage.Choke.Need(PartValue.Turns);
        var current = new FinalModel(stage, to).SupplyCurrent;
        if (Serves(now)) return null;
        var enough = Enumerable.Range(now + 1, MostChokeTurns).FirstOrDefault(n => Serves(n) && FluxDensity.BiasShare(core, n, current) is null or < 0.5);
        return enough > 0 ? enough : null;

        bool Serves(int turns) =>
            new FerriteWinding(core, turns).Impedance(to.Band.Low, stage.ChokeParallel) is { } z && ChokeJudgement.Of(z, FinalStage.Load).Verdict != Calculation.Broadband.Verdict.Change;
    }

    private static Alternative AlternativeOf(string id, StageDocument before, StageDocument after, Surroundings to, IReadOnlyList<Demand> demands, Shelf shelf)
    {
        var stage = FinalStage.Read(after);
        var model = new FinalModel(stage, to);
        var changes = PartChanges.Between(before, after);
        return new Alternative(
            id,
            after,
            changes,
            [.. FinalJudgement.Of(stage, model, to, demands, after.Key).Where(f => f.AtLeast >= StageAction.Check && f.Code is not ("final.gain-falls" or "final.gain-rises"))],
            [Figure.Of("gain", model.Gain(to.Reference)), Figure.Of("drive", model.DriveFor(model.Output, to.Reference))],
            Figure.Of("worst-margin", QuantityKind.Decibels, -Math.Abs(model.Lost.Db - Bought(stage))),
            changes.All(c => Places.Fits(c.After)),
            Stock.Covers(shelf, changes, SingleEndedFinalKind.DescriptionOf));

        double Bought(FinalStage s) => model.Bought(s.DesignReturn) is { } back ? -back.Db : 0;
    }
}
