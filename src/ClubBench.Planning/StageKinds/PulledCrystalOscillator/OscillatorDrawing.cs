using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Drawings;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.PulledCrystalOscillator;

/// <summary>Draws the oscillator and its dial.</summary>
internal static class OscillatorDrawing
{
    public static Schematic Of(StageDocument before, StageDocument? after)
    {
        var stage = OscillatorStage.Read(after ?? before);
        var s = new SchematicSketch(PulledCrystalOscillatorKind.DescriptionOf, before, after);
        s.Part(SymbolKind.VariableCapacitor, 2, 10, Orientation.Down, stage.Tuning);
        s.Ground(2, 14);
        s.Part(SymbolKind.Choke, 2, 4, Orientation.Down, stage.Choke);
        s.Wire(2, 8, 2, 10);
        s.Wire(2, 4, 8, 4);
        for (var i = 0; i < stage.Crystals.Count; i++)
        {
            var y = 4 - (4 * i);
            s.Part(SymbolKind.Crystal, 8, y, Orientation.Across, stage.Crystals[i]);
            if (i == 0) continue;
            s.Wire(8, y, 8, y + 4);
            s.Wire(12, y, 12, y + 4);
        }

        s.Wire(12, 4, 21, 4);
        s.Role(SymbolKind.Capacitor, 16, 4, Orientation.Down, OscillatorStage.Roles.FeedbackUpper);
        s.Role(SymbolKind.Capacitor, 16, 8, Orientation.Down, OscillatorStage.Roles.FeedbackLower);
        s.Ground(16, 12);
        s.Wire(16, 8, 31, 8);
        s.Role(SymbolKind.TransistorNpn, 21, 4, Orientation.Across, OscillatorStage.Roles.Transistor);
        s.Sign(SymbolKind.Supply, 23, 2);
        s.Wire(23, 6, 23, 8);
        s.Role(SymbolKind.Resistor, 31, 8, Orientation.Down, OscillatorStage.Roles.EmitterResistor);
        s.Ground(31, 12);
        if (stage.OffsetCapacitor is { } offset)
        {
            s.Part(SymbolKind.Capacitor, 25, 8, Orientation.Down, offset);
            s.Sign(SymbolKind.Switch, 25, 12, "offset");
            s.Ground(25, 16);
        }

        if (s.Role(SymbolKind.Capacitor, 34, 8, Orientation.Across, OscillatorStage.Roles.OutputCoupling)) s.Wire(31, 8, 34, 8);
        s.Terminal(38, 8, PulledCrystalOscillatorKind.Output);
        s.Point("A", 31, 8);
        return s.Finish();
    }

    /// <summary>Frequency against tuning capacitance, kept and planned, inside the band.</summary>
    public static Plot Dial(StageComparison c)
    {
        var changed = !ReferenceEquals(c.Before, c.After);
        var curves = new List<Curve>();
        if (changed && CurveOf(c.Before, "plot.old", CurveStyle.Old) is { } old && Overlaps(old, c.Surroundings.Band)) curves.Add(old);
        if (CurveOf(c.After, changed ? "plot.new" : "plot.kept", CurveStyle.New) is { } planned) curves.Add(planned);
        var (low, high) = (curves.SelectMany(k => k.Y).DefaultIfEmpty(c.Surroundings.Band.Low.Hertz).Min(), curves.SelectMany(k => k.Y).DefaultIfEmpty(c.Surroundings.Band.High.Hertz).Max());
        var stage = OscillatorStage.Read(c.After);
        return new Plot(
            "plot.dial",
            QuantityKind.Capacitance,
            true,
            QuantityKind.Frequency,
            low - (0.15 * (high - low)),
            high + (0.15 * (high - low)),
            curves,
            low < c.Surroundings.Band.Low.Hertz ? [new LimitLine("plot.band-edge", stage.Least.Farad, stage.Most.Farad, c.Surroundings.Band.Low.Hertz, ForbiddenAbove: false)] : [],
            ((OscillatorModel)c.AfterModel).ClubTuning is { } tuning ? [new PlotMark(tuning.Farad, c.Surroundings.Reference.Hertz, "plot.club-frequency")] : []);
    }

    private static bool Overlaps(Curve curve, FrequencyRange band) => curve.Y.Min() <= band.High.Hertz * 1.005 && curve.Y.Max() >= band.Low.Hertz * 0.995;

    private static Curve? CurveOf(StageDocument document, string label, CurveStyle style)
    {
        var stage = OscillatorStage.Read(document);
        var loop = stage.Loop();
        if (loop.Refusal() != Calculation.Oscillators.LoopRefusal.None) return null;
        const int points = 41;
        var x = Enumerable.Range(0, points).Select(i => stage.Least.Farad * Math.Pow(stage.Most / stage.Least, (double)i / (points - 1))).ToList();
        return new Curve(label, style, x, [.. x.Select(f => loop.FrequencyAt(Capacitance.FromFarad(f)).Hertz)]);
    }
}
