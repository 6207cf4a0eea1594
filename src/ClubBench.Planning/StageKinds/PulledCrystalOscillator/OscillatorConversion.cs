using ClubBench.Calculation.Components;
using ClubBench.Calculation.Crystals;
using ClubBench.Calculation.Oscillators;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Figures;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Parts;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.StageKinds.PulledCrystalOscillator;

/// <summary>Moves a pulled crystal oscillator: crystals for the club's frequency, a feedback pair that still starts, then every choke of the series
/// with the offset capacitor that suits it. Ranked by the smallest margin: span, crystal control, guard to the band edges, offset.</summary>
internal static class OscillatorConversion
{
    /// <summary>Fundamental crystals end about here; above it multiply or use another oscillator.</summary>
    private const double HighestFundamentalHertz = 24e6;

    /// <summary>Guard to each band edge (crystal tolerance, temperature).</summary>
    private const double GuardHertz = 1000;

    /// <summary>The club's frequency should not sit in the last bit of the dial.</summary>
    private const double DialEndShare = 0.05;

    private const int Offered = 4;

    public static IReadOnlyList<Alternative> Of(StageDocument document, Surroundings from, Surroundings to, Shelf shelf)
    {
        if (to.Reference.Hertz > HighestFundamentalHertz) return [];
        var old = OscillatorStage.Read(document);
        var wantedSpan = WantedSpan(old, from, to);
        var crystals = CrystalChoice.For(old, to, shelf);
        return
        [
            .. Chokes(shelf).Select(c => Candidate(old, crystals, c, wantedSpan, to, shelf)).OfType<Alternative>()
                .OrderByDescending(a => a.WorstMargin.Si).Take(Offered)
                .OrderByDescending(a => a.WorstMargin.Si >= 0).ThenByDescending(a => a.WorstMargin.Si),
        ];
    }

    /// <summary>Above the last fundamental crystals a pulled oscillator runs at half the frequency; in a narrow segment another oscillator serves better.</summary>
    public static Finding Rethink(StageDocument document, Surroundings to) =>
        to.Reference.Hertz > HighestFundamentalHertz
            ? new("oscillator.no-fundamental-crystal", Severity.Fault, document.Key, null, [Figure.Of("at", to.Reference), Figure.Of("half", Frequency.FromHertz(to.Reference.Hertz / 2)), Figure.Of("highest", Frequency.FromHertz(HighestFundamentalHertz)) with { Digits = 2 }], StageAction.Rethink, OpenItemCodes.Rethink)
            : new("oscillator.segment-too-narrow", Severity.Fault, document.Key, null, [Figure.Of("width", QuantityKind.Frequency, to.Band.WidthHertz) with { Digits = 3 }], StageAction.Rethink, OpenItemCodes.Rethink);

    /// <summary>The designer's span, kept as a share of the frequency.</summary>
    private static double WantedSpan(OscillatorStage old, Surroundings from, Surroundings to)
    {
        var model = new OscillatorModel(old, from);
        var share = model.Range is { } r ? r.SpanHertz / r.High.Hertz : OscillatorJudgement.LeastSpan(old.Crystals.Count) * 1.3;
        return share * to.Reference.Hertz;
    }

    private static IEnumerable<Inductance> Chokes(Shelf shelf) =>
        shelf.MayBuy
            ? PulledCrystalDesign.MouldedChokes
            : shelf.Tuned(PartClass.MouldedChoke).Where(l => l.ValueSi is not null).Select(l => Inductance.FromHenry(l.ValueSi!.Value));

    private static Alternative? Candidate(OscillatorStage old, IReadOnlyList<Part> crystals, Inductance choke, double wantedSpan, Surroundings to, Shelf shelf)
    {
        var document = old.Document.With([.. crystals, old.Choke.With((PartValue.Inductance, choke.Henry))]);
        document = FeedbackChoice.Settle(document);
        if (OscillatorStage.Read(document).Loop().Refusal() != LoopRefusal.None) return null;
        document = OffsetChoice.Settle(document, to);
        var stage = OscillatorStage.Read(document);
        var model = new OscillatorModel(stage, to);
        if (model.Range is not { State: not CrystalControlState.InductorControlled } range || !OscillatorJudgement.LiesInside(range, to.Band)) return null;
        var changes = PartChanges.Between(old.Document, document);
        return new Alternative(
            $"choke:{choke.Microhenry.ToString("0.##", System.Globalization.CultureInfo.InvariantCulture)}uH",
            document,
            changes,
            OscillatorJudgement.Of(stage, model, to, document.Key).Where(f => f.AtLeast >= StageAction.Check).ToList(),
            [.. model.Figures.Where(f => f.Name is "lowest-frequency" or "highest-frequency" or "span" or "receive-offset")],
            Figure.Of("worst-margin", QuantityKind.Ratio, WorstMargin(stage, model, range, wantedSpan, to)),
            changes.All(c => Places.Fits(c.After)),
            Stock.Covers(shelf, changes, PulledCrystalOscillatorKind.DescriptionOf));
    }

    /// <summary>The margin of a stage chosen by hand, by which alternatives are ranked; -1 where there is no usable dial.</summary>
    public static double MarginOf(StageDocument chosen, Surroundings from, StageDocument old, Surroundings to)
    {
        var stage = OscillatorStage.Read(chosen);
        var model = new OscillatorModel(stage, to);
        return model.Range is { } range ? WorstMargin(stage, model, range, WantedSpan(OscillatorStage.Read(old), from, to), to) : -1;
    }

    /// <summary>Smallest of the margins, each as a share of what is asked; zero is just enough.</summary>
    public static double WorstMargin(OscillatorStage stage, OscillatorModel model, PulledCrystalRange range, double wantedSpan, Surroundings to)
    {
        var span = (range.SpanHertz / wantedSpan) - 1;
        var control = 1 - (-range.AtMaximum.Sensitivities.Inductor / 0.02);
        var guard = (Math.Min(range.Low.Hertz - to.Band.Low.Hertz, to.Band.High.Hertz - range.High.Hertz) - GuardHertz) / GuardHertz;
        var fromEnd = Math.Min(to.Reference.Hertz - range.Low.Hertz, range.High.Hertz - to.Reference.Hertz) / range.SpanHertz;
        var reaches = (fromEnd / DialEndShare) - 1;
        var offset = model.QuotedOffsetHertz is { } hz ? 1 - (Math.Abs((Math.Abs(hz) / to.Pitch.Hertz) - 1) / OscillatorJudgement.OffsetRoom) : double.MaxValue;
        var start = (model.StartUp!.Margin / OscillatorJudgement.LeastStartUpMargin) - 1;
        return new[] { span, control, guard, reaches, offset, start }.Min();
    }
}
