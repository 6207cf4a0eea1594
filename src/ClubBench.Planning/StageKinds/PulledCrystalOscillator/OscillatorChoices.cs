using ClubBench.Calculation.Components;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.PulledCrystalOscillator;

/// <summary>Crystals for a target: from the drawer when it holds enough near the club's frequency, else to be bought, with the typical figures of the trade.</summary>
internal static class CrystalChoice
{
    /// <summary>A drawer crystal serves when its marking lies this close to the club's frequency.</summary>
    private const double Near = 1.5e-3;

    public static IReadOnlyList<Part> For(OscillatorStage old, Surroundings to, Shelf shelf)
    {
        var line = shelf.Tuned(PartClass.Crystal)
            .Where(l => l.ValueSi is { } hz && Math.Abs((hz / to.Reference.Hertz) - 1) < Near && to.Band.Contains(Frequency.FromHertz(hz)) && l.Quantity >= old.Crystals.Count)
            .MinBy(l => Math.Abs(l.ValueSi!.Value - to.Reference.Hertz));
        return [.. old.Crystals.Select(c => line is null ? Typical(c, to.Reference) : FromDrawer(c, line))];
    }

    private static Part FromDrawer(Part old, StockLine line)
    {
        var typical = Typical(old, Frequency.FromHertz(line.ValueSi!.Value));
        return line.MeasuredSi is { } measured
            ? typical.With(measured.Select(m => (m.Key, (double?)m.Value))) with { Type = line.Type, From = Provenance.Measured }
            : typical with { Type = line.Type };
    }

    private static Part Typical(Part old, Frequency marked)
    {
        var row = TypicalCrystals.Nearest(marked) ?? throw new InvalidOperationException("The table of typical crystals is empty.");
        return old.With(
            (PartValue.Frequency, marked.Hertz),
            (PartValue.MotionalCapacitance, row.MotionalCapacitance.Usual.Farad),
            (PartValue.StaticCapacitance, row.StaticCapacitance.Usual.Farad),
            (PartValue.MotionalResistance, row.MotionalResistance.Usual.Ohm)) with { From = Provenance.Typical };
    }
}

/// <summary>Keeps the feedback pair while the oscillator starts with it; else the largest equal pair that does, in E12.</summary>
internal static class FeedbackChoice
{
    /// <summary>Margin aimed at when the pair must change (quick start when keyed).</summary>
    private const double WantedMargin = 5;

    public static StageDocument Settle(StageDocument document)
    {
        var stage = OscillatorStage.Read(document);
        var loop = stage.Loop();
        if (loop.RefusalAt(stage.Least) != LoopRefusal.None) return document;
        var start = OscillatorStartUp.At(loop, stage.Least, OscillatorStage.ChokeQ, stage.Pair, stage.TransconductanceSiemens);
        if (start.Margin >= OscillatorJudgement.LeastStartUpMargin) return document;
        var at = loop.FrequencyAt(stage.Least);
        var exact = FeedbackPair.LargestEqual(stage.TransconductanceSiemens, at, start.LoopResistance, WantedMargin).BaseEmitter;
        var each = PreferredValues.Within(exact.Farad, 0.25, ESeries.E12).Where(v => v <= exact.Farad).DefaultIfEmpty(PreferredValues.Nearest(exact.Farad, ESeries.E12)).Max();
        return document.With([.. document.Parts.Where(p => p.Role is OscillatorStage.Roles.FeedbackUpper or OscillatorStage.Roles.FeedbackLower).Select(p => p.With((PartValue.Capacitance, each)))]);
    }
}

/// <summary>The E12 offset capacitor whose offset at the quoted dial position comes nearest to the pitch.</summary>
internal static class OffsetChoice
{
    public static StageDocument Settle(StageDocument document, Surroundings to)
    {
        var stage = OscillatorStage.Read(document);
        if (stage.OffsetCapacitor is not { } part || to.WantedPower is null) return document;
        var loop = stage.Loop();
        if (loop.RefusalAt(stage.Quoted) != LoopRefusal.None) return document;
        var exact = ReceiveOffset.Solve(loop, stage.OffsetPlace, to.Pitch.Hertz, stage.Quoted);
        if (!exact.IsFound) return document;
        var kept = Miss(loop, stage, part.Need(PartValue.Capacitance), to);
        if (kept <= OscillatorJudgement.OffsetRoom / 2) return document;
        var farad = PreferredValues.Within(exact.Capacitor.Farad, 0.25, ESeries.E12).MinBy(c => Miss(loop, stage, c, to));
        return farad > 0 ? document.With(part.With((PartValue.Capacitance, farad))) : document;
    }

    private static double Miss(PulledCrystalLoop loop, OscillatorStage stage, double farad, Surroundings to)
    {
        var added = Capacitance.FromFarad(farad);
        if (stage.OffsetPlace.With(loop, added).RefusalAt(stage.Quoted) != LoopRefusal.None) return double.MaxValue;
        return Math.Abs((Math.Abs(ReceiveOffset.At(loop, stage.OffsetPlace, added, stage.Quoted)) / to.Pitch.Hertz) - 1);
    }
}
