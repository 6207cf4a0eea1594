using System.Globalization;
using ClubBench.Calculation.Components;
using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;
using Tap = ClubBench.Calculation.Switching.SeriesTunedTap;

namespace ClubBench.Planning.StageKinds.SeriesTunedTap;

/// <summary>Moves a receive tap: a capacitor beside the trimmer, or another choke of the usual series; ranked by the smallest of trimmer travel,
/// reactance, loss and diode current.</summary>
internal static class TapConversion
{
    private const int Offered = 4;

    public static IReadOnlyList<Alternative> Of(StageDocument document, Surroundings to, Shelf shelf)
    {
        var stage = TapStage.Read(document);
        return
        [
            .. Padded(stage, to, shelf).Concat(OtherChokes(stage, to, shelf))
                .OrderByDescending(a => a.WorstMargin.Si >= 0).ThenByDescending(a => a.InStock).ThenByDescending(a => a.WorstMargin.Si).Take(Offered),
        ];
    }

    /// <summary>Smallest of the margins, each zero where it is just enough: trimmer travel over the bench window, reactance inside its window, loss, diode current.</summary>
    public static double Margin(StageDocument after, Surroundings to)
    {
        var model = new TapModel(TapStage.Read(after), to);
        var (low, high, x) = (Tap.LeastReactance.Ohm, Tap.MostReactance.Ohm, model.Tap.Reactance.Ohm);
        return new[]
        {
            (model.Place.WorstTravel(to.Band) - TunablePlace.BenchShare) / (0.5 - TunablePlace.BenchShare),
            Math.Min(Math.Log(x / low), Math.Log(high / x)) / (0.5 * Math.Log(high / low)),
            1 - (model.Tap.Loss.Db / Tap.MostLoss.Db),
            model.DiodeCurrent is { } i ? 1 - (i / Tap.MostDiodeCurrent) : 1,
        }.Min();
    }

    /// <summary>The same choke with a capacitor beside the trimmer, where the trimmer alone is too small.</summary>
    private static IEnumerable<Alternative> Padded(TapStage stage, Surroundings to, Shelf shelf)
    {
        var place = stage.Place;
        var wanted = TunedCircuit.CapacitanceFor(stage.Inductance, to.Band.Middle).Farad - (0.5 * (place.TrimmerLeast.Farad + place.TrimmerMost.Farad));
        var values = TunedCapacitors.Values(shelf, forPairs: true);
        if (wanted <= 0 || values.Count == 0) return [];
        var value = values.OrderBy(v => Math.Abs(v.Value.Farad - wanted)).ThenBy(v => v.StockRank).First().Value;
        return [AlternativeOf(string.Create(CultureInfo.InvariantCulture, $"pad:{value.Picofarad:0.#} pF"), stage, WithPadding(stage, value), to, shelf)];
    }

    /// <summary>Another choke, no padding, where the trimmer then peaks inside its bench window and the choke is far from its own resonance.</summary>
    private static IEnumerable<Alternative> OtherChokes(TapStage stage, Surroundings to, Shelf shelf) =>
        from henry in Chokes(shelf)
        let inductance = Inductance.FromHenry(henry)
        where Serves(inductance, to.Band.High)
        let after = WithChoke(stage, inductance)
        where TapStage.Read(after).Place.WorstTravel(to.Band) >= TunablePlace.BenchShare
        select AlternativeOf(string.Create(CultureInfo.InvariantCulture, $"choke:{inductance.Microhenry:0.##} uH"), stage, after, to, shelf);

    private static IEnumerable<double> Chokes(Shelf shelf)
    {
        var stocked = shelf.Tuned(StageKinds.PartClass.MouldedChoke).Select(l => l.ValueSi).OfType<double>();
        var bought = shelf.MayBuy ? from decade in new[] { 1e-7, 1e-6 } from mantissa in PreferredValues.Mantissas(ESeries.E12) select mantissa * decade : [];
        return stocked.Concat(bought).DistinctBy(h => Math.Round(h * 1e9));
    }

    private static bool Serves(Inductance inductance, Frequency at) =>
        MouldedChoke.TypicalSelfResonance(inductance) is not { } own || MouldedChoke.Serves(own, at, ChokeUse.Resonator);

    private static StageDocument WithChoke(TapStage stage, Inductance inductance)
    {
        var changed = stage.Document.With(stage.Choke.With((PartValue.Inductance, inductance.Henry), (PartValue.SelfCapacitance, null), (PartValue.UnloadedQ, null)));
        return changed with { Parts = [.. changed.Parts.Where(p => p.Role != TapStage.Roles.Padding)] };
    }

    /// <summary>The board has no place for it: it sits across the trimmer's pins and takes the trimmer's name with a letter.</summary>
    private static StageDocument WithPadding(TapStage stage, Capacitance value)
    {
        if (stage.Padding is { } present) return stage.Document.With(CapacitorPart.Holding(present, value));
        var values = new Dictionary<string, double>(StringComparer.Ordinal) { [PartValue.Capacitance] = value.Farad };
        var added = new Part(stage.Trimmer.Designator + "a", TapStage.Roles.Padding, "NP0", values, From: Provenance.Derived);
        return stage.Document with { Parts = [.. stage.Document.Parts, added] };
    }

    private static Alternative AlternativeOf(string id, TapStage before, StageDocument after, Surroundings to, Shelf shelf)
    {
        var stage = TapStage.Read(after);
        var model = new TapModel(stage, to);
        var changes = PartChanges.Between(before.Document, after);
        return new Alternative(
            id,
            after,
            changes,
            TapJudgement.Of(stage, model, to, after.Key),
            [
                Figure.Of("needed-capacitance", model.Needed) with { Digits = 3 },
                Figure.Of("travel", QuantityKind.Ratio, model.Place.Travel(to.Reference)) with { Digits = 2 },
                Figure.Of("reactance", model.Tap.Reactance) with { Digits = 3 },
                Figure.Of("receive-loss", model.Loss) with { Digits = 2 },
            ],
            Figure.Of("worst-margin", QuantityKind.Ratio, Margin(after, to)),
            changes.All(c => Places.Fits(c.After)),
            Stock.Covers(shelf, changes, SeriesTunedTapKind.DescriptionOf));
    }
}
