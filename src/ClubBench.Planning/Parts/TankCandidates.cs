using ClubBench.Calculation.Quantities;
using ClubBench.Calculation.Resonators;
using ClubBench.Calculation.Windings;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Parts;

/// <summary>One way to build a tuned circuit: core, turns and a fixed capacitor around the trimmer and strays that stay.</summary>
/// <param name="Core">Core.</param>
/// <param name="Turns">Turns of the main winding.</param>
/// <param name="Fixed">Fixed capacitor, first part.</param>
/// <param name="Second">Second capacitor in parallel, or null.</param>
/// <param name="Place">The resulting place.</param>
/// <param name="Travel">Worst distance of the trimmer from its ends over the band.</param>
public sealed record TankCandidate(ToroidCore Core, int Turns, Capacitance Fixed, Capacitance? Second, TunablePlace Place, double Travel);

/// <summary>Searches tuned circuits for a band: reactance in the comfortable window, trimmer away from its ends.
/// Method: resonators and windings 2.3 (only the total capacitance scales) with real turns and capacitors.</summary>
public static class TankCandidates
{
    /// <summary>Comfortable reactance of a resonator on a toroid at HF (common practice).</summary>
    private const double LeastReactanceOhm = 80;
    private const double MostReactanceOhm = 320;

    private const double SmallestShare = 0.05;

    /// <summary>Fewest turns worth winding: below, leads matter too much.</summary>
    private const int FewestTurns = 8;

    /// <summary>All candidates on a core whose winding fits.</summary>
    public static IEnumerable<TankCandidate> On(ToroidCore core, Part winding, TunablePlace old, FrequencyRange band, Shelf shelf, LearntValues learnt)
    {
        var index = WindingPart.IndexOf(core, learnt);
        var wire = WindingPart.WireOf(winding);
        var capacity = ToroidWinding.CapacityOf(core, wire);
        var values = TunedCapacitors.Values(shelf, forPairs: true);
        for (var turns = FewestTurns; turns <= capacity; turns++)
        {
            var inductance = index.Of(turns);
            var reactance = TunedCircuit.Reactance(inductance, band.Middle).Ohm;
            if (reactance is < LeastReactanceOhm or > MostReactanceOhm) continue;
            if (Best(inductance, old, band, values) is { } best) yield return new TankCandidate(core, turns, best.First, best.Second, best.Place, best.Place.WorstTravel(band));
        }
    }

    /// <summary>The capacitor that brings the trimmer nearest to the middle of its travel; where a single one leaves less than a third of the travel, two in parallel.</summary>
    private static (Capacitance First, Capacitance? Second, TunablePlace Place)? Best(Inductance inductance, TunablePlace old, FrequencyRange band, IReadOnlyList<(Capacitance Value, int StockRank)> values)
    {
        var wanted = TunedCircuit.CapacitanceFor(inductance, band.Middle).Farad - old.Stray.Farad - (0.5 * (old.TrimmerLeast.Farad + old.TrimmerMost.Farad));
        if (wanted <= 0) return null;
        var single = Nearest(wanted, values);
        var place = old with { Inductance = inductance, Fixed = single };
        if (place.WorstTravel(band) >= 1.0 / 3 || single.Farad > wanted || Filler(wanted - single.Farad, single, values) is not { } filler) return (single, null, place);
        return (single, filler, place with { Fixed = single + filler });
    }

    private static Capacitance Nearest(double farad, IReadOnlyList<(Capacitance Value, int StockRank)> values) =>
        values.OrderBy(v => Math.Abs(v.Value.Farad - farad)).ThenBy(v => v.StockRank).First().Value;

    /// <summary>A second capacitor for the rest; null where it would be smaller than the tolerance of the first.</summary>
    private static Capacitance? Filler(double farad, Capacitance first, IReadOnlyList<(Capacitance Value, int StockRank)> values) =>
        Nearest(farad, values) is var filler && filler / first >= SmallestShare ? filler : null;
}
